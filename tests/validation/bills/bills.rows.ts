import { fitDegreeDays, normalisedUse } from "../../../server/engine/bills/degree-day-fit.ts";
import { fitFigures } from "../../../server/engine/bills/fit-figures.ts";
import { type CheckRow, digits } from "../record-check.ts";

export const topic = "Bills";

const HAND = "Guideline 14 formulas, by hand";
const LINE = "least squares, by hand";
const billed = [820, 700, 560, 330, 120, 40, 20, 25, 110, 310, 540, 760];
const modelled = [780, 730, 540, 350, 100, 45, 18, 30, 120, 290, 570, 740];
const degreeDays = [620, 540, 430, 250, 90, 15, 0, 5, 80, 240, 420, 570];
const withOne = fitFigures(billed, modelled);
const withNone = fitFigures(billed, modelled, 0);
const line = fitDegreeDays(
  billed.map((use, index) => ({ use, days: 30, degreeDays: degreeDays[index] ?? 0 })),
  "reading",
);

const row = (
  quantity: string,
  source: string,
  computed: number,
  expected: number,
  tolerance: number,
): CheckRow => ({
  quantity,
  source,
  computed,
  expected,
  tolerance,
});

export const rows: CheckRow[] = [
  row("NMBE, one parameter, %", HAND, withOne.nmbePercent, 0.554, digits(3)),
  row("NMBE, no parameter, %", HAND, withNone.nmbePercent, 0.507, digits(3)),
  row("CV(RMSE), one parameter, %", HAND, withOne.cvRmsePercent, 6.22, digits(3)),
  row("CV(RMSE), no parameter, %", HAND, withNone.cvRmsePercent, 5.955, digits(3)),
  row("Degree-day line, use without weather", LINE, line.basePerDay, 11.679, digits(3)),
  row("Degree-day line, use for each degree-day", LINE, line.perDegreeDay, 1.28677, digits(5)),
  row("Degree-day line, R²", LINE, line.r2, 0.99907, digits(5)),
  row("Degree-day line, CV(RMSE), %", LINE, line.cvRmsePercent, 2.689, digits(3)),
  row("Use of a normal year of 3100 K d", LINE, normalisedUse(line, 12, 3100), 4129.1, digits(1)),
];
