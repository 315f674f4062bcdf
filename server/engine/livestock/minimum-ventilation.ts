import { humidityRatio, specificVolumeM3Kg } from "../air/moist-air.ts";
import { STANDARD_PRESSURE_PA } from "../constants.ts";
import { requireInRange } from "../errors.ts";

export type VentilationRule = "moisture" | "carbonDioxide" | "perHead" | "legal";

export interface MinimumVentilation {
  /** At inside conditions, m³/h. */
  flowM3H: number;
  governs: VentilationRule;
  /** What each rule asks for, m³/h. */
  partsM3H: Record<VentilationRule, number>;
  /** False where outdoor air is so wet that no flow can hold the humidity limit; the moisture part is then 0. */
  humidityCanBeHeld: boolean;
}

export interface MinimumVentilationInput {
  moistureKgH: number;
  carbonDioxideM3H: number;
  insideTempC: number;
  humidityLimitFrac: number;
  outdoorTempC: number;
  outdoorHumidityFrac: number;
  pressurePa?: number;
  carbonDioxideLimitPpm?: number;
  outdoorCarbonDioxidePpm?: number;
  headCount: number;
  perHeadM3H: number;
  /** Whole house, where a rule of law gives one. */
  legalM3H?: number;
}

/** More than this is summer ventilation; moisture cannot be carried off by air that is nearly as wet. */
const MOST_AIR_FOR_MOISTURE_KG_H = 1e7;

/**
 * Air that must pass a stocked house in cold weather: the most of what water, carbon dioxide, the rate per head and the law ask for.
 *
 * Units kg/h, m³/h, °C, 0 to 1, ppm, Pa → m³/h at inside conditions. When outdoor air holds as much water as the limit allows
 * inside, moisture cannot govern: its part is 0 and `humidityCanBeHeld` false. Errors EngineInputError.
 * Source: mass balances; limits [EU-2007-43].
 */
export function minimumVentilation(input: MinimumVentilationInput): MinimumVentilation {
  const {
    pressurePa = STANDARD_PRESSURE_PA,
    carbonDioxideLimitPpm = 3000,
    outdoorCarbonDioxidePpm = 450,
  } = input;
  requireInRange("moistureKgH", input.moistureKgH, 0, 1e5, "kg/h");
  requireInRange("carbonDioxideM3H", input.carbonDioxideM3H, 0, 1e5, "m³/h");
  requireInRange("outdoorCarbonDioxidePpm", outdoorCarbonDioxidePpm, 300, 1000, "ppm");
  requireInRange(
    "carbonDioxideLimitPpm",
    carbonDioxideLimitPpm,
    outdoorCarbonDioxidePpm + 100,
    20_000,
    "ppm",
  );
  requireInRange("headCount", input.headCount, 0, 1_000_000);
  requireInRange("perHeadM3H", input.perHeadM3H, 0, 2000, "m³/h");
  const moistureM3H = moistureFlowM3H(input, pressurePa);
  const partsM3H: Record<VentilationRule, number> = {
    moisture: moistureM3H ?? 0,
    carbonDioxide: (input.carbonDioxideM3H * 1e6) / (carbonDioxideLimitPpm - outdoorCarbonDioxidePpm),
    perHead: input.headCount * input.perHeadM3H,
    legal: requireInRange("legalM3H", input.legalM3H ?? 0, 0, 1e8, "m³/h"),
  };
  const rules = Object.keys(partsM3H) as VentilationRule[];
  const governs = rules.reduce(
    (best, rule) => (partsM3H[rule] > partsM3H[best] ? rule : best),
    rules[0] as VentilationRule,
  );
  return { flowM3H: partsM3H[governs], governs, partsM3H, humidityCanBeHeld: moistureM3H !== null };
}

/** Null where no flow can carry the water off. */
function moistureFlowM3H(input: MinimumVentilationInput, pressurePa: number): number | null {
  const inside = humidityRatio(input.insideTempC, input.humidityLimitFrac, pressurePa);
  const outside = humidityRatio(input.outdoorTempC, input.outdoorHumidityFrac, pressurePa);
  if (input.moistureKgH === 0) return 0;
  if (inside - outside < input.moistureKgH / MOST_AIR_FOR_MOISTURE_KG_H) return null;
  const dryAirKgH = input.moistureKgH / (inside - outside);
  return dryAirKgH * specificVolumeM3Kg(input.insideTempC, inside, pressurePa);
}

/**
 * Share of the ventilation heat an exchanger brings back, cut where its outlet would freeze.
 *
 * Units 0 to 1, °C → 0 to 1. Below the frost limit t_in − t_in / share the exchanger is held so that the exhaust leaves at 0 °C.
 * Valid share 0 to 0.95. Errors EngineInputError. Source: heat balance of the exhaust.
 */
export function heatRecoveryFrac(shareFrac: number, insideTempC: number, outdoorTempC: number): number {
  requireInRange("shareFrac", shareFrac, 0, 0.95);
  const difference = insideTempC - outdoorTempC;
  if (difference <= 0 || shareFrac === 0 || insideTempC <= 0) return 0;
  return Math.min(shareFrac, insideTempC / difference);
}

/**
 * Outdoor temperature at which a house needs no heat: its animals just cover shell and air.
 *
 * Units °C, W, W/K → °C. Errors EngineInputError. Source: steady balance.
 */
export function balanceTempC(insideTempC: number, gainsW: number, lossCoefficientWK: number): number {
  requireInRange("lossCoefficientWK", lossCoefficientWK, 1e-6, 1e9, "W/K");
  requireInRange("gainsW", gainsW, 0, 1e9, "W");
  return insideTempC - gainsW / lossCoefficientWK;
}
