import { abatementCost } from "../../../server/engine/money/abatement.ts";
import { annuityFactor, capitalRecoveryFactor } from "../../../server/engine/money/annuity.ts";
import {
  discountedPaybackYears,
  internalRate,
  netPresentValue,
  simplePaybackYears,
} from "../../../server/engine/money/investment.ts";
import { realRate } from "../../../server/engine/money/rates.ts";
import { type CheckRow, digits } from "../record-check.ts";

export const topic = "Money";

const HAND = "textbook formulas, by hand";
const HOUSES = "Poultry house evaluation service summary; propane at 2.00 $/gal";
const heater = { cost: 7000, yearlySaving: 1000, lifeYears: 15, discount: realRate(0.06) };
const large = { cost: 12_000, yearlySaving: 1850, lifeYears: 20, discount: realRate(0.05) };

const row = (
  quantity: string,
  source: string,
  computed: number | null,
  expected: number,
  tolerance: number,
): CheckRow => ({
  quantity,
  source,
  computed: computed ?? Number.NaN,
  expected,
  tolerance,
});

/** Measure, cost $, gallons a year, payback in years. */
const measures: [string, number, number, number][] = [
  ["sidewall curtain insulation", 4000, 800, 2.5],
  ["ceiling insulation", 2800, 450, 3.1],
  ["attic inlets", 1800, 600, 1.5],
  ["tunnel inlet doors", 5800, 500, 5.8],
  ["mixing fans", 500, 100, 2.5],
  ["radiant tube heaters", 7000, 500, 7],
];

export const rows: CheckRow[] = [
  row("Annuity factor, 6 %, 15 years", HAND, annuityFactor(0.06, 15), 9.7122, digits(4)),
  row("Capital recovery factor, 6 %, 15 years", HAND, capitalRecoveryFactor(0.06, 15), 0.10296, digits(5)),
  row("7000 for 1000 a year, present value", HAND, netPresentValue(heater), 2712.25, digits(2)),
  row(
    "7000 for 1000 a year, internal rate, %",
    HAND,
    100 * (internalRate(heater) ?? Number.NaN),
    11.491,
    digits(3),
  ),
  row("7000 for 1000 a year, simple payback, years", HAND, simplePaybackYears(7000, 1000), 7, digits(1)),
  row(
    "7000 for 1000 a year, discounted payback, years",
    HAND,
    discountedPaybackYears(heater),
    9.35,
    digits(2),
  ),
  row("12 000 for 1850 a year, present value", HAND, netPresentValue(large), 11_055.09, digits(2)),
  row(
    "The same with 2 % growth",
    HAND,
    netPresentValue({ ...large, growth: realRate(0.02) }),
    15_130.99,
    digits(2),
  ),
  ...measures.map(([name, cost, gallons, expected]) =>
    row(`Payback of ${name}, years`, HOUSES, simplePaybackYears(cost, gallons * 2), expected, digits(1)),
  ),
  row(
    "Abatement by radiant tube heaters, $/t",
    `${HOUSES}; 6 %, 15 years, 5.72 kg/gal, by hand`,
    abatementCost({
      cost: 7000,
      yearlySaving: 1000,
      lifeYears: 15,
      discount: realRate(0.06),
      avoidedTonnes: (500 * 5.72) / 1000,
    }).costPerTonne,
    -97.6,
    digits(1),
  ),
];
