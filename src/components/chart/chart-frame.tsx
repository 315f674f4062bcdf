import { Download } from "lucide-react";
import { type ReactNode, useId, useState } from "react";
import { downloadCsv, toCsv } from "./csv.ts";
import { type FigureColumn, FigureTable } from "./figure-table.tsx";

interface ChartFrameProps<Row> {
  title: string;
  /** Beside the title: what hatched or dashed parts mean, or the worst value in words. */
  aside?: ReactNode;
  /** Unit of the upright axis, written above it. */
  unit: string;
  /** What the picture says, for those who do not see it. */
  sentence: string;
  columns: FigureColumn<Row>[];
  rows: Row[];
  rowKey: (row: Row) => string;
  foot?: Row;
  fileName: string;
  children: ReactNode;
}

/** A chart with its own table behind a button and its figures as a file. */
export function ChartFrame<Row>(props: ChartFrameProps<Row>) {
  const { title, aside, unit, sentence, columns, rows, rowKey, foot, fileName, children } = props;
  const [asTable, setAsTable] = useState(false);
  const headingId = useId();
  const csv = () =>
    toCsv(
      columns.map((column) => (column.unit ? `${column.header} (${column.unit})` : column.header)),
      [...rows, ...(foot ? [foot] : [])].map((row) => columns.map((column) => column.plain(row))),
    );
  return (
    <section aria-labelledby={headingId} className="min-w-0">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1">
        <h2 id={headingId} className="font-sign text-lg font-bold">
          {title}
        </h2>
        <div className="text-sm text-ink-2">{aside}</div>
      </div>
      {asTable ? (
        <FigureTable caption={title} columns={columns} rows={rows} rowKey={rowKey} foot={foot} />
      ) : (
        <figure className="m-0">
          <div className="text-xs text-ink-2" aria-hidden="true">
            {unit}
          </div>
          <div role="img" aria-label={`${title}. ${sentence}`}>
            {children}
          </div>
        </figure>
      )}
      <div className="flex gap-2 print:hidden">
        <button
          type="button"
          aria-pressed={asTable}
          onClick={() => setAsTable(!asTable)}
          className="min-h-11 text-sm font-semibold text-bottle underline underline-offset-4 hover:text-bottle-deep"
        >
          {asTable ? "Show as chart" : "Show as table"}
        </button>
        <button
          type="button"
          onClick={() => downloadCsv(fileName, csv())}
          className="ml-4 inline-flex min-h-11 items-center gap-1.5 text-sm font-semibold text-bottle underline underline-offset-4 hover:text-bottle-deep"
        >
          <Download size={16} aria-hidden="true" />
          Figures as CSV
        </button>
      </div>
    </section>
  );
}
