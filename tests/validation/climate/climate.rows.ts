import {
  degreeDaysErbs,
  degreeDaysHitchin,
  degreeDaysNormal,
  meanShortfallK,
} from "../../../server/engine/climate/degree-days.ts";
import { monthPercentileTempC } from "../../../server/engine/climate/design-temperature.ts";
import { returnPeriodFactor } from "../../../server/engine/climate/extremes.ts";
import { hourlySpreadK } from "../../../server/engine/climate/hourly-spread.ts";
import { normalQuantile } from "../../../server/engine/climate/normal-distribution.ts";
import { type CheckRow, digits } from "../record-check.ts";

export const topic = "Climate";

const ASHRAE = "ASHRAE Handbook of Fundamentals, chapter 14, Gumbel factors (from memory)";
const NORMAL = "Abramowitz and Stegun 1964, table 26.5";
const SCHOENAU = "Schoenau and Kehrig 1990, formula evaluated by hand";
const ERBS = "Erbs, Klein and Beckman 1983, formula evaluated by hand";
const HITCHIN = "Hitchin 1983, k 0.71, formula evaluated by hand";

/** Spread of the twelve means 10 K and mean 0: the month's own spread is 1.45 + 0.664. */
export const rows: CheckRow[] = [
  ...(
    [
      [2, -0.164],
      [5, 0.72],
      [10, 1.305],
      [20, 1.866],
      [50, 2.592],
    ] as const
  ).map(([years, expected]) => ({
    quantity: `Factor of the once-in-${years}-years minimum`,
    source: ASHRAE,
    computed: returnPeriodFactor(years),
    expected,
    // One step of the last printed digit: the table prints 0.720 for 0.7194.
    tolerance: 0.001,
  })),
  ...(
    [
      [0.004, -2.6521],
      [0.01, -2.3263],
      [0.02, -2.0537],
      [0.05, -1.6449],
    ] as const
  ).map(([share, expected]) => ({
    quantity: `z below which ${100 * share} % lie`,
    source: NORMAL,
    computed: normalQuantile(share),
    expected,
    tolerance: digits(4),
  })),
  {
    quantity: "Month of mean -2 °C, spread 6 K: passed in 99.6 % of hours, °C",
    source: NORMAL,
    computed: monthPercentileTempC(-2, 6, 99.6),
    expected: -17.91,
    tolerance: digits(2),
  },
  {
    quantity: "Month of mean -2 °C, spread 6 K: passed in 99 % of hours, °C",
    source: NORMAL,
    computed: monthPercentileTempC(-2, 6, 99),
    expected: -15.96,
    tolerance: digits(2),
  },
  {
    quantity: "Hourly spread of range 9 K and daily spread 3.5 K, K",
    source: "sine of the day plus day-to-day change, evaluated by hand",
    computed: hourlySpreadK(9, 3.5),
    expected: 4.73,
    tolerance: digits(2),
  },
  {
    quantity: "Degree-days, base 18, mean 5, spread 6, 31 days",
    source: SCHOENAU,
    computed: degreeDaysNormal(18, 5, 6, 31),
    expected: 404.0,
    tolerance: digits(2),
  },
  {
    quantity: "Degree-days, base and mean 18, spread 6, 31 days",
    source: SCHOENAU,
    computed: degreeDaysNormal(18, 18, 6, 31),
    expected: 74.2,
    tolerance: digits(2),
  },
  {
    quantity: "Degree-days, base 10, mean 15, spread 5, 30 days",
    source: SCHOENAU,
    computed: degreeDaysNormal(10, 15, 5, 30),
    expected: 12.5,
    tolerance: digits(2),
  },
  {
    quantity: "Mean shortfall, base 8, mean 6, spread 5, K",
    source: SCHOENAU,
    computed: meanShortfallK(8, 6, 5),
    expected: 3.152,
    tolerance: digits(3),
  },
  {
    quantity: "Mean shortfall, base 16, mean 4, spread 5, K",
    source: SCHOENAU,
    computed: meanShortfallK(16, 4, 5),
    expected: 12.01,
    tolerance: digits(2),
  },
  {
    quantity: "Degree-days, base 18, mean 0, yearly spread 10, 31 days",
    source: ERBS,
    computed: degreeDaysErbs(18, 0, 10, 31),
    expected: 558.6,
    tolerance: digits(1),
  },
  {
    quantity: "Degree-days, base 0, mean 0, yearly spread 10, 31 days",
    source: ERBS,
    computed: degreeDaysErbs(0, 0, 10, 31),
    expected: 74.47,
    tolerance: digits(2),
  },
  {
    quantity: "Degree-days, base 15.5, mean 10, 30 days",
    source: HITCHIN,
    computed: degreeDaysHitchin(15.5, 10, 30),
    expected: 168.39,
    tolerance: digits(2),
  },
  {
    quantity: "Degree-days, base and mean equal, 31 days",
    source: HITCHIN,
    computed: degreeDaysHitchin(15.5, 15.5, 31),
    expected: 43.66,
    tolerance: digits(2),
  },
  {
    quantity: "Degree-days, base 15.5, mean 18, 30 days",
    source: HITCHIN,
    computed: degreeDaysHitchin(15.5, 18, 30),
    expected: 15.31,
    tolerance: digits(2),
  },
];
