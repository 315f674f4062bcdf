import { requireInRange } from "../errors.ts";
import type { FuelProperties } from "../fuel/fuel-properties.ts";
import { type FuelUnit, kwhGrossPerUnit, unitsOf } from "../fuel/fuel-units.ts";

export type CauseKind =
  /** The column is in another unit than its heading says. */
  | "unitMistaken"
  /** A decimal point lost or won. */
  | "factorOfTen"
  /** Energy billed on the other heating value. */
  | "heatingValue"
  /** Something else hangs on the meter or tank. */
  | "sharedMeter"
  /** Fans move more air than reckoned. */
  | "fansTooFast"
  /** Less heated, stocked or set lower than reckoned, or another fuel beside. */
  | "usedLess";

export interface LikelyCause {
  kind: CauseKind;
  /** Billed over modelled that this cause would give. */
  expectedRatio: number;
  /** For a mistaken unit: what the column really is. */
  reallyUnit?: FuelUnit;
  /** Distance of the ratios as a share; the causes come nearest first. */
  distanceFrac: number;
}

export interface CauseInput {
  billedKwhGross: number;
  modelledKwhGross: number;
  fuel: FuelProperties;
  /** The unit the bills were read in. */
  unit: FuelUnit;
  /** How near a ratio must lie to count, a share; the model is no better than this. */
  withinFrac?: number;
  /** Measured air over needed air, where a fan was measured. */
  flowRatio?: number;
}

/** Planning models are within about a tenth. */
const TYPICAL_WITHIN = 0.1;
/** Units a farm's bill is seen in; tonnes for kilograms and the like are factors of ten already. */
const SEEN: readonly FuelUnit[] = [
  "kWh",
  "MJ",
  "GJ",
  "MWh",
  "therm",
  "MMBtu",
  "m3",
  "ccf",
  "Mcf",
  "L",
  "galUS",
  "galUK",
  "kg",
  "lb",
];
const DECIMALS = [1000, 100, 10, 0.1, 0.01, 0.001] as const;

/**
 * Why bills and model differ, likeliest first: causes to ask about, never a knob to turn. Empty where they agree.
 *
 * Units kWh gross. Valid amounts above 0, nearness 0.02 to 0.3. Errors EngineInputError. Source [BILLSLIPS].
 */
export function likelyCauses(input: CauseInput): LikelyCause[] {
  requireInRange("billedKwhGross", input.billedKwhGross, 1e-6, 1e12, "kWh");
  requireInRange("modelledKwhGross", input.modelledKwhGross, 1e-6, 1e12, "kWh");
  const within = requireInRange("withinFrac", input.withinFrac ?? TYPICAL_WITHIN, 0.02, 0.3);
  const ratio = input.billedKwhGross / input.modelledKwhGross;
  if (Math.abs(Math.log(ratio)) <= Math.log1p(within)) return netNetted(input, ratio);
  const distance = (expected: number) => Math.exp(Math.abs(Math.log(ratio / expected))) - 1;
  const causes: LikelyCause[] = [...unitCauses(input), ...decimalCauses()].map((cause) => ({
    ...cause,
    distanceFrac: distance(cause.expectedRatio),
  }));
  const near = causes.filter(({ distanceFrac }) => distanceFrac <= within).sort(nearestFirst);
  return [...near, ...plainCauses(input, ratio)];
}

const nearestFirst = (a: LikelyCause, b: LikelyCause) => a.distanceFrac - b.distanceFrac;

/** Within the model's own accuracy only the heating value can be told, and only where it is a smaller difference still. */
function netNetted({ fuel, unit }: CauseInput, ratio: number): LikelyCause[] {
  const isEnergy = ["kWh", "MJ", "GJ", "MWh", "therm", "MMBtu"].includes(unit);
  const distanceFrac = Math.exp(Math.abs(Math.log(ratio / fuel.netOverGrossFrac))) - 1;
  const telling = isEnergy && ratio < 0.95 && distanceFrac < 0.03;
  return telling ? [{ kind: "heatingValue", expectedRatio: fuel.netOverGrossFrac, distanceFrac }] : [];
}

/** A column of u read as v is worth v/u of what it holds. */
function unitCauses({ fuel, unit }: CauseInput): LikelyCause[] {
  const readAs = kwhGrossPerUnit(unit, fuel);
  return unitsOf(fuel)
    .filter((other) => other !== unit && SEEN.includes(other))
    .map((other) => ({
      kind: "unitMistaken",
      expectedRatio: readAs / kwhGrossPerUnit(other, fuel),
      reallyUnit: other,
      distanceFrac: 0,
    }));
}

function decimalCauses(): LikelyCause[] {
  return DECIMALS.map((expectedRatio) => ({ kind: "factorOfTen", expectedRatio, distanceFrac: 0 }));
}

/** Up to this ratio a dwelling or a dryer on the same meter is usual. */
const SHARED_UP_TO = 1.6;
/** Over-ventilation of a fifth burns up to half as much again; more than three times is something else. */
const FANS_UP_TO = 3;
const MEASURED_OVER = 1.2;

function plainCauses({ flowRatio }: CauseInput, ratio: number): LikelyCause[] {
  const plain = (kind: CauseKind): LikelyCause => ({ kind, expectedRatio: ratio, distanceFrac: 0 });
  if (ratio < 1) return [plain("usedLess")];
  const shared = ratio <= SHARED_UP_TO ? [plain("sharedMeter")] : [];
  const fans = ratio <= FANS_UP_TO ? [plain("fansTooFast")] : [];
  return (flowRatio ?? 0) > MEASURED_OVER ? [...fans, ...shared] : [...shared, ...fans];
}

/** One user of a meter or tank. */
export interface MeterUser {
  name: string;
  kwhGross: number;
}

/**
 * What a shared meter's users leave unexplained. The gap stands on its own line; it is never spread over the houses.
 *
 * Units kWh gross → kWh, share of the bill. Valid bill above 0. Errors EngineInputError. Source [BILLSLIPS].
 */
export function unexplained(
  billedKwhGross: number,
  users: readonly MeterUser[],
): { gapKwh: number; gapFrac: number } {
  requireInRange("billedKwhGross", billedKwhGross, 1e-6, 1e12, "kWh");
  const gapKwh =
    billedKwhGross -
    users.reduce(
      (sum, { kwhGross }, index) => sum + requireInRange("kwhGross", kwhGross, 0, 1e12, "kWh", index),
      0,
    );
  return { gapKwh, gapFrac: gapKwh / billedKwhGross };
}
