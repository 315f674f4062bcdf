import { EngineInputError, requireInRange } from "../errors.ts";
import type { UnitSystem } from "../units.ts";

/** Kinds of heaters that come in sizes of their own. */
export const heaterFamilies = [
  "unitHeater",
  "boxHeater",
  "radiantTube",
  "brooder",
  "boiler",
  "heatPump",
  "electric",
] as const;
export type HeaterFamily = (typeof heaterFamilies)[number];

const KBTUH_W = 293.07107;

/** Rated inputs where plates are in kBtu/h. Source [SIZE-STEPS]. */
const KBTUH: Record<HeaterFamily, readonly number[]> = {
  unitHeater: [30, 45, 60, 75, 100, 125, 150, 175, 200, 225, 250, 300, 350, 400],
  boxHeater: [75, 100, 150, 200, 225, 250],
  radiantTube: [40, 50, 60, 75, 80, 100, 125, 150, 175, 200],
  brooder: [5, 10, 15, 17, 20, 30, 40],
  boiler: [100, 150, 200, 300, 400, 500, 750, 1000, 1500, 2000, 3000, 4000, 5000],
  heatPump: [24, 36, 48, 60, 90, 120, 150, 170],
  electric: [3.4, 6.8, 10.2, 17, 25.6, 34.1, 51.2, 68.2, 85.3, 102.4],
};

/** Rated inputs (electric heat and heat pumps: outputs) where plates are in kW. Source [SIZE-STEPS]. */
const KILOWATT: Record<HeaterFamily, readonly number[]> = {
  unitHeater: [10, 15, 20, 25, 30, 35, 40, 50, 60, 70, 80, 100, 120],
  boxHeater: [20, 30, 40, 60, 70, 80],
  radiantTube: [12, 15, 20, 25, 30, 35, 40, 45, 50, 60],
  brooder: [1.5, 3, 5, 7, 9, 12],
  boiler: [30, 45, 60, 80, 100, 150, 200, 300, 400, 500, 750, 1000, 1500],
  heatPump: [5, 8, 12, 16, 20, 25, 30, 40, 50],
  electric: [1, 2, 3, 5, 7.5, 10, 15, 20, 25, 30],
};

/** Families whose plate names the heat given. */
const PLATE_IS_OUTPUT: readonly HeaterFamily[] = ["heatPump", "electric"];

export interface UnitSize {
  /** As the plate says, in kBtu/h or kW. */
  plate: number;
  plateUnit: "kBtu/h" | "kW";
  plateIs: "input" | "output";
  /** Heat given at sea level, W. */
  outputW: number;
}

/**
 * Sizes of a family, smallest first, with the heat each gives.
 *
 * Units efficiency 0.1 to 1.1 (not used where the plate is the output) → W. Errors EngineInputError. Source [SIZE-STEPS].
 */
export function unitSizes(family: HeaterFamily, efficiencyFrac: number, units: UnitSystem): UnitSize[] {
  requireInRange("efficiencyFrac", efficiencyFrac, 0.1, 1.1);
  const plateIs = PLATE_IS_OUTPUT.includes(family) ? "output" : "input";
  const inW = units === "us" ? KBTUH_W : 1000;
  const share = plateIs === "output" ? 1 : efficiencyFrac;
  return (units === "us" ? KBTUH : KILOWATT)[family].map((plate) => ({
    plate,
    plateUnit: units === "us" ? "kBtu/h" : "kW",
    plateIs,
    outputW: plate * inW * share,
  }));
}

/**
 * Smallest size of a family that gives so much heat; where even the largest gives less, EngineInputError says so: take more units.
 *
 * Units W → size. Valid need 0 to 100 MW. Source [SIZE-STEPS].
 */
export function smallestUnit(
  family: HeaterFamily,
  neededW: number,
  efficiencyFrac: number,
  units: UnitSystem,
): UnitSize {
  requireInRange("neededW", neededW, 0, 1e8, "W");
  const sizes = unitSizes(family, efficiencyFrac, units);
  const found = sizes.find(({ outputW }) => outputW >= neededW - 1e-6);
  if (found) return found;
  throw new EngineInputError({
    quantity: "neededW",
    value: neededW,
    reason: "range",
    min: 0,
    max: sizes.at(-1)?.outputW ?? 0,
    unit: "W",
    note: "No single unit of this kind is so large.",
  });
}

/**
 * Fewest equal units of a family that give so much heat together, the smallest size that does it with that number.
 *
 * Units W → number and size. Valid need above 0 to 100 MW, at least `leastCount` units. Errors EngineInputError.
 * Source [SIZE-STEPS].
 */
export function equalUnits(
  family: HeaterFamily,
  neededW: number,
  efficiencyFrac: number,
  units: UnitSystem,
  leastCount = 1,
): { count: number; size: UnitSize; totalW: number } {
  requireInRange("neededW", neededW, 1e-3, 1e8, "W");
  requireInRange("leastCount", leastCount, 1, 200);
  const largestW = unitSizes(family, efficiencyFrac, units).at(-1)?.outputW ?? 1;
  const count = Math.max(leastCount, Math.ceil(neededW / largestW - 1e-9));
  const size = smallestUnit(family, neededW / count, efficiencyFrac, units);
  return { count, size, totalW: count * size.outputW };
}
