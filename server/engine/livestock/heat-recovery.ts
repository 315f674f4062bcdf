import { requireInRange } from "../errors.ts";

export interface ExchangerInput {
  flowM3H: number;
  /** Sensible share recovered, balanced flows, 0 to 0.9. */
  shareFrac: number;
  insideTempC: number;
  outdoorTempC: number;
  /** Dew point of the exhaust; below it the exhaust gives water and some more heat. */
  insideDewPointC: number;
  airHeatWhM3K: number;
  /** Power of both fans, W for each m³/h of one stream. */
  fanWPerM3H?: number;
}

export interface ExchangerResult {
  recoveredW: number;
  supplyTempC: number;
  exhaustTempC: number;
  /** Outdoor temperature below which the exhaust freezes at the full share, °C. */
  frostLimitC: number;
  /** Share really used: held where the exhaust would freeze. */
  usedShareFrac: number;
  frostLimited: boolean;
  condenses: boolean;
  fanW: number;
  netW: number;
}

/** Two fans at 0.3 to 0.6 W for each m³/h. Typical. */
const TYPICAL_FAN_W_PER_M3H = 0.9;

/** Outdoor temperature at which the exhaust of an exchanger reaches 0 °C. Units °C, 0 to 1 → °C. Errors EngineInputError. Source [EXCHANGER]. */
export function frostLimitC(insideTempC: number, shareFrac: number): number {
  requireInRange("insideTempC", insideTempC, 0, 45, "°C");
  requireInRange("shareFrac", shareFrac, 0.05, 0.95);
  return insideTempC - insideTempC / shareFrac;
}

/**
 * Heat an air-to-air exchanger brings back, with its frost limit and its fans. Nothing is recovered while it is warmer outside.
 *
 * Units m³/h, °C, Wh/(m³ K) → W, °C. Valid share 0.05 to 0.9, inside 0 to 45 °C, outside −60 to 45 °C. The flow must not exceed the
 * house's least ventilation: more air than needed would count as saving what was never lost. Errors EngineInputError.
 * Source [EXCHANGER].
 */
export function exchanger(input: ExchangerInput): ExchangerResult {
  const { flowM3H, shareFrac, insideTempC, outdoorTempC, airHeatWhM3K } = input;
  requireInRange("flowM3H", flowM3H, 0, 1e6, "m³/h");
  requireInRange("shareFrac", shareFrac, 0.05, 0.9);
  requireInRange("outdoorTempC", outdoorTempC, -60, 45, "°C");
  requireInRange("airHeatWhM3K", airHeatWhM3K, 0.15, 0.5, "Wh/(m³ K)");
  const fanWPerM3H = requireInRange("fanWPerM3H", input.fanWPerM3H ?? TYPICAL_FAN_W_PER_M3H, 0, 5, "W");
  const limit = frostLimitC(insideTempC, shareFrac);
  const differenceK = Math.max(0, insideTempC - outdoorTempC);
  const usedShareFrac = differenceK === 0 ? 0 : Math.min(shareFrac, Math.max(0, insideTempC) / differenceK);
  const recoveredW = usedShareFrac * flowM3H * airHeatWhM3K * differenceK;
  const exhaustTempC = insideTempC - usedShareFrac * differenceK;
  const fanW = differenceK === 0 ? 0 : fanWPerM3H * flowM3H;
  return {
    recoveredW,
    supplyTempC: outdoorTempC + usedShareFrac * differenceK,
    exhaustTempC,
    frostLimitC: limit,
    usedShareFrac,
    frostLimited: usedShareFrac < shareFrac && differenceK > 0,
    condenses: differenceK > 0 && exhaustTempC < input.insideDewPointC,
    fanW,
    netW: recoveredW - fanW,
  };
}
