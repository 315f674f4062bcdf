import { useController } from "react-hook-form";
import type { Quantity } from "../../../../server/contracts/quantity.ts";
import type { UnitId } from "../../../../server/engine/units.ts";
import { OriginSelect } from "../../../components/form/origin-select.tsx";
import { shownQuantity } from "../../../components/form/shown-quantity.ts";
import { stepped } from "../../../components/form/stepping.ts";
import { UnitSelect } from "../../../components/form/unit-select.tsx";
import { monthLong, monthShort } from "../../../lib/format.ts";
import { inUnit } from "../../../lib/quantity-value.ts";
import { errorWords } from "../fields/error-words.ts";
import { useSurveyForm } from "../form-context.ts";
import { copyMonth, type MonthColumn } from "../fresh-parts.ts";

const columnWords: Record<MonthColumn, string> = {
  nightSetpoint: "Night",
  daySetpoint: "Day",
  headCount: "Animals",
  mass: "Mass of one",
};

interface MonthTableProps {
  columns: MonthColumn[];
  withOccupied: boolean;
  title: string;
}

/** The year as twelve rows. Unit and origin are set for a whole column, a figure for one month or copied to all. */
export function MonthTable({ columns, withOccupied, title }: MonthTableProps) {
  const form = useSurveyForm();
  const { field, fieldState } = useController({ name: "months", control: form.control });
  const months = field.value;
  const shown = (row: number, column: MonthColumn): Quantity | undefined => {
    const quantity = months[row]?.[column];
    return quantity && shownQuantity(quantity, form.system);
  };
  const setCell = (row: number, column: MonthColumn, quantity: Quantity) => {
    form.forget(`months.${row}.${column}`);
    field.onChange(months.map((month, i) => (i === row ? { ...month, [column]: quantity } : month)));
  };
  const setColumn = (column: MonthColumn, change: (quantity: Quantity) => Quantity) =>
    field.onChange(
      months.map((month) => ({ ...month, [column]: change(shownQuantity(month[column], form.system)) })),
    );
  const problem = (row: number, column: MonthColumn) =>
    errorWords(
      (fieldState.error as unknown as Record<number, Record<string, unknown>> | undefined)?.[row]?.[column],
    ) ?? form.refused[`months.${row}.${column}`];
  const firstProblem = months
    .flatMap((_, row) => columns.map((column) => ({ row, words: problem(row, column) })))
    .find((entry) => entry.words !== undefined);
  return (
    <div className="overflow-x-auto px-4 py-2 md:px-0">
      <table className="w-full border-collapse text-sm">
        <caption className="sr-only">{title}</caption>
        <thead>
          <tr className="border-b-2 border-ink align-bottom">
            <th scope="col" className="py-1 text-left font-semibold">
              Month
            </th>
            {withOccupied ? (
              <th scope="col" className="px-1 py-1 text-left font-semibold">
                In use
              </th>
            ) : null}
            {columns.map((column) => {
              const first = shown(0, column);
              return (
                <th key={column} scope="col" className="px-1 py-1 text-left font-semibold">
                  <span className="flex items-center gap-2">
                    {columnWords[column]}
                    {first ? (
                      <UnitSelect
                        subject={`${columnWords[column]}, all months`}
                        value={first.unit}
                        disabled={form.disabled}
                        onChange={(unit: UnitId) => setColumn(column, (quantity) => inUnit(quantity, unit))}
                      />
                    ) : null}
                  </span>
                  {first ? (
                    <OriginSelect
                      subject={`${columnWords[column]}, all months`}
                      value={first.origin}
                      disabled={form.disabled}
                      onChange={(origin) => setColumn(column, (quantity) => ({ ...quantity, origin }))}
                    />
                  ) : null}
                </th>
              );
            })}
            <th scope="col" className="sr-only">
              Copy
            </th>
          </tr>
        </thead>
        <tbody>
          {months.map((month, row) => (
            <tr key={monthShort[row]} className="border-b border-rule">
              <th scope="row" className="py-1 pr-2 text-left font-semibold">
                {monthShort[row]}
              </th>
              {withOccupied ? (
                <td className="px-1">
                  <label className="flex size-11 cursor-pointer items-center justify-center">
                    <span className="sr-only">{`In use in ${monthLong[row]}`}</span>
                    <input
                      type="checkbox"
                      checked={month.occupied}
                      disabled={form.disabled}
                      onChange={(event) =>
                        field.onChange(
                          months.map((entry, i) =>
                            i === row ? { ...entry, occupied: event.target.checked } : entry,
                          ),
                        )
                      }
                      className="size-[22px] accent-ink"
                    />
                  </label>
                </td>
              ) : null}
              {columns.map((column) => {
                const quantity = shown(row, column);
                if (!quantity) return <td key={column} />;
                const typed = (text: string) =>
                  setCell(row, column, {
                    ...quantity,
                    typed: text,
                    origin: quantity.origin === "default" ? form.typedOrigin : quantity.origin,
                  });
                return (
                  <td key={column} className="px-1 py-1">
                    <input
                      type="text"
                      inputMode="decimal"
                      autoComplete="off"
                      aria-label={`${columnWords[column]}, ${monthLong[row]}`}
                      aria-invalid={problem(row, column) !== undefined}
                      aria-describedby="month-problem"
                      value={quantity.typed}
                      disabled={form.disabled || !month.occupied}
                      onFocus={(event) => event.target.select()}
                      onChange={(event) => typed(event.target.value)}
                      onKeyDown={(event) => {
                        if (event.key !== "ArrowUp" && event.key !== "ArrowDown") return;
                        event.preventDefault();
                        typed(stepped(quantity.typed, quantity.unit, event.key === "ArrowUp" ? 1 : -1));
                      }}
                      className={`h-11 w-full min-w-16 rounded-control border-[1.5px] bg-sheet px-2 text-right font-bold disabled:bg-trough disabled:text-ink-2 ${problem(row, column) ? "border-redlead" : quantity.origin === "default" ? "border-dashed border-rule-strong" : "border-rule-strong"}`}
                    />
                  </td>
                );
              })}
              <td className="pl-1 text-right">
                <button
                  type="button"
                  disabled={form.disabled}
                  onClick={() => field.onChange(copyMonth(months, row, columns))}
                  className="min-h-11 px-1 text-xs font-semibold text-bottle underline underline-offset-4 hover:text-bottle-deep disabled:text-ink-2"
                >
                  {row === 0 ? "Fill all months" : "To all"}
                  <span className="sr-only">{` with ${monthLong[row]}`}</span>
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <p id="month-problem" aria-live="polite" className="min-h-[18px] text-xs font-medium text-redlead">
        {firstProblem ? `${monthLong[firstProblem.row]}: ${firstProblem.words}` : ""}
      </p>
    </div>
  );
}
