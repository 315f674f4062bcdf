import type { ReactNode } from "react";

export interface FigureColumn<Row> {
  id: string;
  header: string;
  unit?: string;
  /** What stands in the cell. */
  cell: (row: Row) => ReactNode;
  /** The same for a file: a bare number where there is one. */
  plain: (row: Row) => string | number;
  align?: "left" | "right";
  /** The row's name: read out before every cell of the row. */
  names?: boolean;
}

interface FigureTableProps<Row> {
  caption: string;
  showCaption?: boolean;
  columns: FigureColumn<Row>[];
  rows: Row[];
  rowKey: (row: Row) => string;
  foot?: Row;
  chosenKey?: string;
}

/** A ruled table of figures; it scrolls sideways inside its own frame when it must. */
export function FigureTable<Row>(props: FigureTableProps<Row>) {
  const { caption, showCaption, columns, rows, rowKey, foot, chosenKey } = props;
  const cells = (row: Row, bold: boolean) =>
    columns.map((column) => {
      const right = column.align !== "left" && !column.names;
      const look = `h-11 px-2 first:pl-0 last:pr-0 ${right ? "text-right" : "text-left"} ${bold ? "font-bold" : "font-normal"}`;
      return column.names ? (
        <th key={column.id} scope="row" className={look}>
          {column.cell(row)}
        </th>
      ) : (
        <td key={column.id} className={look}>
          {column.cell(row)}
        </td>
      );
    });
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a box that scrolls must be reachable by keyboard
    <div className="overflow-x-auto" tabIndex={0}>
      <table className="w-full border-collapse text-sm whitespace-nowrap">
        <caption className={showCaption ? "pb-1 text-left font-bold" : "sr-only"}>{caption}</caption>
        <thead>
          <tr className="border-b-2 border-ink">
            {columns.map((column) => (
              <th
                key={column.id}
                scope="col"
                className={`px-2 py-1.5 align-bottom text-xs font-semibold text-ink-2 first:pl-0 last:pr-0 ${column.align === "left" || column.names ? "text-left" : "text-right"}`}
              >
                {column.header}
                {column.unit ? <span className="block font-normal">{column.unit}</span> : null}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr
              key={rowKey(row)}
              className={`border-b border-rule hover:bg-trough ${rowKey(row) === chosenKey ? "bg-bottle-tint" : ""}`}
            >
              {cells(row, false)}
            </tr>
          ))}
        </tbody>
        {foot ? (
          <tfoot>
            <tr className="border-t-2 border-ink">{cells(foot, true)}</tr>
          </tfoot>
        ) : null}
      </table>
    </div>
  );
}
