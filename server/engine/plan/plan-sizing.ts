import { findZero } from "../balance/find-zero.ts";
import { hoursToCritical } from "../sizing/hours-to-critical.ts";
import { totalOutputW } from "../sizing/installed-units.ts";
import { judgedOptions } from "../sizing/judge-options.ts";
import type { HouseModel } from "./house-model.ts";
import { usualNight } from "./night-balances.ts";
import { noHeaterReason } from "./no-heater.ts";
import type { PlanClimate } from "./plan-climate.ts";
import type { HoldVerdict, HouseBalance, MonthResult, PlanSizing } from "./plan-types.ts";
import type { HeaterUnit } from "./sizing-types.ts";

/** Pick-up margin on the everyday need. The once-in-N-years need is met without it: that night is margin enough. Source [PLANMARGIN]. */
export const PICKUP_MARGIN_FRAC = 0.15;

/**
 * Sizing from the worst months: what to buy for, where the house settles, hours left when all heat stops, and ways to fit it.
 * Shape: model, climate, months, fitted units → sizing. Source [PLANMARGIN], [COOLINGMASS], [SIZE-STEPS].
 */
export function planSizing(
  model: HouseModel,
  climate: PlanClimate,
  months: readonly MonthResult[],
  existing: HeaterUnit[],
): PlanSizing {
  const everyday = worstMonth(months, (month) => month.everydayRequiredW);
  const rare = worstMonth(months, (month) => month.onceInYearsRequiredW);
  const targetW = Math.max(everyday.everydayRequiredW * (1 + PICKUP_MARGIN_FRAC), rare.onceInYearsRequiredW);
  const rareUsual = rare.onceInYears.screensShut as HouseBalance;
  const reason = noHeaterReason(model, months, existing);
  const hours = rare.occupied ? coolingHours(model, rareUsual) : { low: null, high: null };
  const settlesWithC = settler(model, climate, rare);
  return {
    everydayMonth: everyday.month,
    everydayRequiredW: everyday.everydayRequiredW,
    onceInYearsMonth: rare.month,
    onceInYearsRequiredW: rare.onceInYearsRequiredW,
    marginFrac: PICKUP_MARGIN_FRAC,
    targetW,
    installedW: totalOutputW(existing),
    verdictEveryday: worstVerdict(months, "everyday", reason !== null),
    verdictOnceInYears: worstVerdict(months, "onceInYears", reason !== null),
    settlesAtEverydayC: settledC(everyday, "everyday"),
    settlesAtOnceInYearsC: settledC(rare, "onceInYears"),
    largestUnitOutSettlesAtC: rare.onceInYears.largestUnitOut?.settlesAtC ?? settlesWithC(0),
    hoursToCriticalLow: hours.low,
    hoursToCriticalHigh: hours.high,
    balanceTempC: balanceOutdoorC(model, climate, rare),
    options:
      reason !== null || targetW <= 0
        ? []
        : judgedOptions({
            everydayRequiredW: everyday.everydayRequiredW,
            onceInYearsRequiredW: rare.onceInYearsRequiredW,
            targetW,
            criticalTempC: model.input.criticalTempC,
            setpointC: rareUsual.insideTempC,
            existing,
            settlesWithC,
          }),
    noHeaterReason: reason,
  };
}

/** The month with the greatest need; where nothing is needed, the coldest month in use, else the coldest of all. */
function worstMonth(months: readonly MonthResult[], needW: (month: MonthResult) => number): MonthResult {
  const pick = (a: MonthResult, b: MonthResult) => {
    if (needW(a) !== needW(b)) return needW(a) > needW(b) ? a : b;
    if (a.occupied !== b.occupied) return a.occupied ? a : b;
    return a.climate.onceInYearsDesignC <= b.climate.onceInYearsDesignC ? a : b;
  };
  return months.reduce(pick);
}

const SEVERITY: readonly HoldVerdict[] = [
  "notApplicable",
  "holds",
  "belowSetpoint",
  "belowCritical",
  "cannotSay",
];
const COUNTED_STATES = ["screensShut", "snowOnRoof"] as const;

function worstVerdict(
  months: readonly MonthResult[],
  night: "everyday" | "onceInYears",
  unheated: boolean,
): HoldVerdict {
  if (unheated) return "notApplicable";
  const verdicts = months.flatMap((month) =>
    COUNTED_STATES.flatMap((state) => month[night][state]?.verdict ?? []),
  );
  return verdicts.reduce((worst, verdict) =>
    SEVERITY.indexOf(verdict) > SEVERITY.indexOf(worst) ? verdict : worst,
  );
}

function settledC(month: MonthResult, night: "everyday" | "onceInYears"): number {
  const settled = COUNTED_STATES.flatMap((state) => month[night][state]?.settlesAtC ?? []);
  return Math.min(...settled);
}

function coolingHours(model: HouseModel, night: HouseBalance) {
  const differenceK = night.insideTempC - night.outdoorTempC;
  const lossW =
    night.lossesW.cover + night.lossesW.sky + night.lossesW.air + night.lossesW.ground - night.surplusW;
  if (differenceK < 1 || lossW <= 0) return { low: null, high: null };
  return hoursToCritical({
    floorAreaM2: model.geometry.floorAreaM2,
    volumeM3: model.geometry.volumeM3,
    lossCoefficientWK: lossW / differenceK,
    startTempC: night.insideTempC,
    outdoorTempC: night.outdoorTempC,
    criticalTempC: model.input.criticalTempC,
    remainingHeatW: night.gainsW.stock,
  });
}

/** Coldest and warmest outdoor temperature the balance temperature is looked for in, °C. */
const BALANCE_SEARCH_C = { coldest: -55, belowInsideK: 0.5 } as const;

/** Outdoor temperature at which the stock just covers shell and air at night; null without stock. Source [DESIGNNIGHT]. */
function balanceOutdoorC(model: HouseModel, climate: PlanClimate, worst: MonthResult): number | null {
  const use = model.input.months[worst.month - 1];
  if (model.input.stock === null || use === undefined || use.headCount === 0 || !use.occupied) return null;
  const surplusW = (outdoorTempC: number) => {
    const balance = usualNight(model, {
      month: worst.month,
      use,
      outdoorTempC,
      windMS: climate.windMS[worst.month - 1] ?? 0,
      soilTempC: climate.soilTempC,
      unitOutputsW: [],
    });
    return balance.surplusW - balance.requiredHeatW;
  };
  const warmestC = Math.min(45, worst.setpointNightC - BALANCE_SEARCH_C.belowInsideK);
  return findZero(surplusW, {
    low: BALANCE_SEARCH_C.coldest,
    high: warmestC,
    guess: (worst.climate.onceInYearsDesignC + worst.setpointNightC) / 2,
    tolerance: 1e-3,
  });
}

/** Where the house settles on the rare night of its worst month with any heat fitted. */
function settler(model: HouseModel, climate: PlanClimate, worst: MonthResult): (heatW: number) => number {
  const use = model.input.months[worst.month - 1];
  return (heatW) => {
    if (use === undefined) return worst.setpointNightC;
    return usualNight(model, {
      month: worst.month,
      use,
      outdoorTempC: worst.climate.onceInYearsDesignC,
      windMS: climate.windMS[worst.month - 1] ?? 0,
      soilTempC: climate.soilTempC,
      unitOutputsW: [heatW],
    }).settlesAtC;
  };
}
