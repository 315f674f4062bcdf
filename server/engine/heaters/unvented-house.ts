import { requireInRange } from "../errors.ts";

/** A rule for the air of a house that grows with the fuel burnt in it. */
export interface AirLine {
  rule: string;
  /** Air without any flame, m³/h. */
  baseM3H: number;
  /** More air for each kW of fuel burnt, gross, m³/h. */
  perKwM3H: number;
}

export interface UnventedHouseInput {
  /** Every rule; a rule that no flame touches has 0 for each kW. */
  lines: readonly AirLine[];
  /** Heat to warm the air that replaces a cubic metre of exhaust by a kelvin, Wh/(m³ K). */
  airHeatWhM3K: number;
  insideTempC: number;
  outdoorTempC: number;
  /** Shell loss less sensible gains, W; negative where the animals give more than the shell loses. */
  shellLessGainsW: number;
  /** Share of the fuel's gross heat that warms the air. */
  sensibleFrac: number;
}

export type UnventedHouse =
  | {
      holds: true;
      /** Fuel burnt, gross, W; 0 where no heat is needed. */
      burntW: number;
      airM3H: number;
      governs: string;
      /** Heat the flame's own air asks for, W for each W burnt, at the rule that governs. */
      feedback: number;
    }
  | { holds: false; rule: string; feedback: number };

/**
 * Fuel a house heated without flues burns, when every rule for its air also counts what the flames give off. The air is the most
 * any rule asks for, so the fuel is the most any rule alone would need: q = q₀ / (f − g), with g the heat of the air one unit of
 * fuel asks for. Where g reaches f each flame asks for more heat than it gives and the burner cannot hold the room.
 *
 * Units m³/h, m³/h per kW, Wh/(m³ K), °C, W → W. Valid −40 to 45 °C inside, share 0.5 to 1. Errors EngineInputError.
 * Source [STOICHIOMETRY], closed form.
 */
export function unventedHouse(input: UnventedHouseInput): UnventedHouse {
  requireInRange("lines", input.lines.length, 1, 20);
  requireInRange("airHeatWhM3K", input.airHeatWhM3K, 0.15, 0.5, "Wh/(m³ K)");
  requireInRange("insideTempC", input.insideTempC, -40, 45, "°C");
  requireInRange("outdoorTempC", input.outdoorTempC, -70, 50, "°C");
  requireInRange("shellLessGainsW", input.shellLessGainsW, -1e9, 1e9, "W");
  requireInRange("sensibleFrac", input.sensibleFrac, 0.5, 1);
  const wattPerM3H = input.airHeatWhM3K * Math.max(0, input.insideTempC - input.outdoorTempC);
  const rules = input.lines.map((line, index) => {
    requireInRange("baseM3H", line.baseM3H, 0, 1e8, "m³/h", index);
    requireInRange("perKwM3H", line.perKwM3H, 0, 10_000, "m³/h", index);
    return {
      rule: line.rule,
      missingW: line.baseM3H * wattPerM3H + input.shellLessGainsW,
      feedback: (line.perKwM3H * wattPerM3H) / 1000,
    };
  });
  const burntW = Math.max(
    0,
    ...rules
      .filter(({ missingW, feedback }) => missingW > 0 && feedback < input.sensibleFrac)
      .map(({ missingW, feedback }) => missingW / (input.sensibleFrac - feedback)),
  );
  // A rule whose flames ask for more than they give can still be kept while the animals' own heat covers it.
  const broken = rules.find(
    ({ missingW, feedback }) =>
      feedback >= input.sensibleFrac && missingW + (feedback - input.sensibleFrac) * burntW > 0,
  );
  if (broken) return { holds: false, rule: broken.rule, feedback: broken.feedback };
  const flowOf = (line: AirLine) => line.baseM3H + (line.perKwM3H * burntW) / 1000;
  const governing = input.lines.reduce((most, line) => (flowOf(line) > flowOf(most) ? line : most));
  return {
    holds: true,
    burntW,
    airM3H: flowOf(governing),
    governs: governing.rule,
    feedback: (governing.perKwM3H * wattPerM3H) / 1000,
  };
}

/**
 * Air a flame asks for under a limit of carbon dioxide.
 *
 * Units m³/kWh, ppm → m³/h for each kW burnt. Valid limit at least 100 ppm above outdoors. Errors EngineInputError.
 * Source [STOICHIOMETRY].
 */
export function flameAirByGasM3HKw(carbonDioxideM3Kwh: number, limitPpm: number, outdoorPpm: number): number {
  requireInRange("carbonDioxideM3Kwh", carbonDioxideM3Kwh, 0, 1, "m³/kWh");
  requireInRange("outdoorPpm", outdoorPpm, 300, 1000, "ppm");
  requireInRange("limitPpm", limitPpm, outdoorPpm + 100, 20_000, "ppm");
  return (carbonDioxideM3Kwh * 1e6) / (limitPpm - outdoorPpm);
}

/**
 * Air a flame asks for under a limit of humidity.
 *
 * Units kg/kWh, kg/kg, m³/kg → m³/h for each kW burnt. Valid where inside air holds more water than outdoor air. Errors
 * EngineInputError. Source [STOICHIOMETRY].
 */
export function flameAirByWaterM3HKw(
  waterKgKwh: number,
  insideRatio: number,
  outdoorRatio: number,
  insideVolumeM3Kg: number,
): number {
  requireInRange("waterKgKwh", waterKgKwh, 0, 1, "kg/kWh");
  requireInRange("outdoorRatio", outdoorRatio, 0, 0.1, "kg/kg");
  requireInRange("insideRatio", insideRatio, outdoorRatio + 1e-5, 0.2, "kg/kg");
  requireInRange("insideVolumeM3Kg", insideVolumeM3Kg, 0.5, 3, "m³/kg");
  return (waterKgKwh * insideVolumeM3Kg) / (insideRatio - outdoorRatio);
}
