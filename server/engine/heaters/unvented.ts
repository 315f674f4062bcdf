import { EngineInputError, requireInRange } from "../errors.ts";

export interface UnventedInput {
  /** Heat missing at the ventilation the animals alone need, W. */
  missingHeatW: number;
  /** Share of the fuel's gross heat that warms the air. */
  sensibleFrac: number;
  /** Air each kW burnt asks for, m³/h per kW. */
  airPerKwM3H: number;
  /** Heat capacity of that air, Wh/(m³ K). */
  airHeatWhM3K: number;
  insideTempC: number;
  outdoorTempC: number;
}

export interface UnventedResult {
  /** Fuel to burn, gross, W. */
  burntW: number;
  /** Air the flame itself asks for, m³/h. */
  extraAirM3H: number;
}

/** Propane and natural gas burnt without a flue, for each kWh gross. Source [STOICHIOMETRY]. */
export const combustionProducts = {
  lpg: { waterKgKwh: 0.1168, carbonDioxideM3Kwh: 0.117, sensibleFrac: 0.921 },
  "natural-gas": { waterKgKwh: 0.1457, carbonDioxideM3Kwh: 0.0973, sensibleFrac: 0.901 },
} as const;

/**
 * Fuel an unvented burner must burn when the air its own gases ask for has to be warmed as well: q = q0 / (f − g).
 *
 * Units W, m³/h per kW, Wh/(m³ K), °C → W, m³/h. Errors EngineInputError; when every kW burnt asks for more heat than it gives,
 * the burner cannot hold the room and the error says so. Source [STOICHIOMETRY], closed form.
 */
export function unventedBurner(input: UnventedInput): UnventedResult {
  requireInRange("missingHeatW", input.missingHeatW, 0, 1e8, "W");
  requireInRange("sensibleFrac", input.sensibleFrac, 0.5, 1);
  requireInRange("airPerKwM3H", input.airPerKwM3H, 0, 1000, "m³/h");
  const perKw = (input.airPerKwM3H * input.airHeatWhM3K * (input.insideTempC - input.outdoorTempC)) / 1000;
  const left = input.sensibleFrac - Math.max(0, perKw);
  if (left <= 0) {
    throw new EngineInputError({
      quantity: "airPerKwM3H",
      value: input.airPerKwM3H,
      reason: "inconsistent",
      note: "The air this burner asks for takes more heat than the burner gives.",
    });
  }
  const burntW = input.missingHeatW / left;
  return { burntW, extraAirM3H: (burntW / 1000) * input.airPerKwM3H };
}
