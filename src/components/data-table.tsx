import { ArrowDown, ArrowUp } from "lucide-react";
import type { ReactNode } from "react";

export interface DataColumn<Row, Key extends string> {
  key: Key;
  header: string;
  unit?: string;
  align?: "left" | "right";
  /** The row's name, read out before every other cell of the row. */
  names?: boolean;
  sortable?: boolean;
  /** Left out on narrow screens where the row is a small sheet of its own. */
  deskOnly?: boolean;
  /** Drawn under the words of the head, such as the scale of the drawings below. */
  under?: ReactNode;
  cell(row: Row): ReactNode;
}

interface DataTableProps<Row, Key extends string> {
  caption: string;
  columns: DataColumn<Row, Key>[];
  rows: Row[];
  rowId(row: Row): string;
  chosenId?: string | null;
  sort?: { key: Key; reversed: boolean };
  onSort?(key: Key): void;
  /** What stands in place of the rows when there is none. */
  empty: ReactNode;
}

function Head<Row, Key extends string>(props: Pick<DataTableProps<Row, Key>, "columns" | "sort" | "onSort">) {
  const { columns, sort, onSort } = props;
  return (
    <thead className="max-md:sr-only">
      <tr className="border-b-2 border-ink">
        {columns.map((column) => {
          const right = column.align === "right";
          const active = sort?.key === column.key;
          const Arrow = sort?.reversed ? ArrowUp : ArrowDown;
          const words = (
            <>
              <span className={active ? "font-extrabold" : ""}>{column.header}</span>
              {column.unit ? (
                <span className="block text-xs font-normal text-ink-2">{column.unit}</span>
              ) : null}
              {column.under}
            </>
          );
          return (
            <th
              key={column.key}
              scope="col"
              aria-sort={active ? (sort.reversed ? "descending" : "ascending") : undefined}
              className={`p-0 align-bottom text-sm font-semibold ${right ? "text-right" : "text-left"}`}
            >
              {column.sortable && onSort ? (
                <button
                  type="button"
                  className={`flex min-h-11 w-full items-end gap-1 px-2 py-1 leading-tight hover:bg-trough ${right ? "justify-end text-right" : "text-left"}`}
                  onClick={() => onSort(column.key)}
                >
                  {active ? <Arrow size={15} aria-hidden="true" className="mb-0.5 flex-none" /> : null}
                  <span>{words}</span>
                </button>
              ) : (
                <span className="block px-2 py-1 leading-tight">{words}</span>
              )}
            </th>
          );
        })}
      </tr>
    </thead>
  );
}

/** A ruled table. On a phone each row is a small sheet with the names of its figures beside them. */
export function DataTable<Row, Key extends string>(props: DataTableProps<Row, Key>) {
  const { caption, columns, rows, rowId, chosenId, sort, onSort, empty } = props;
  return (
    <table className="w-full border-collapse text-sm max-md:block">
      <caption className="sr-only">{caption}</caption>
      <Head columns={columns} sort={sort} onSort={onSort} />
      <tbody className="max-md:block">
        {rows.length === 0 ? (
          <tr className="max-md:block">
            <td colSpan={columns.length} className="px-2 py-6 text-base max-md:block">
              {empty}
            </td>
          </tr>
        ) : null}
        {rows.map((row) => (
          <tr
            key={rowId(row)}
            data-row={rowId(row)}
            className={`border-b border-rule hover:bg-trough max-md:block max-md:py-3 print:break-inside-avoid ${rowId(row) === chosenId ? "bg-bottle-tint outline-2 -outline-offset-2 outline-bottle" : ""}`}
          >
            {columns.map((column) => {
              if (column.names) {
                return (
                  <th
                    key={column.key}
                    scope="row"
                    className="px-2 py-1.5 text-left font-normal max-md:block max-md:px-0"
                  >
                    {column.cell(row)}
                  </th>
                );
              }
              return (
                <td
                  key={column.key}
                  className={`px-2 py-1.5 max-md:flex max-md:items-center max-md:justify-between max-md:gap-4 max-md:px-0 max-md:py-0.5 ${column.align === "right" ? "text-right" : ""} ${column.deskOnly ? "max-md:hidden" : ""}`}
                >
                  <span className="text-ink-2 md:hidden" aria-hidden="true">
                    {column.unit ? `${column.header}, ${column.unit}` : column.header}
                  </span>
                  <span className="max-md:text-right">{column.cell(row)}</span>
                </td>
              );
            })}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
