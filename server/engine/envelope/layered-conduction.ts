import { requireInRange } from "../errors.ts";

/** A plane, even layer: by thickness and conductivity, or by its resistance. */
export type ConductionLayer =
  | { name?: string; thicknessM: number; conductivityWMK: number }
  | { name?: string; resistanceM2KW: number };

export interface ConductionInput {
  /** From the inside outwards. */
  layers: ConductionLayer[];
  insideSurfaceM2KW: number;
  outsideSurfaceM2KW: number;
  insideTempC: number;
  outsideTempC: number;
}

export interface ConductionResult {
  resistanceM2KW: number;
  uValueWM2K: number;
  heatFluxWM2: number;
  /** Inner surface, every interface, outer surface: one more than there are layers. */
  interfaceTempsC: number[];
}

/** Resistance of one layer. Units m, W/(m K) → m² K/W. Valid thickness 0 to 10 m, conductivity 0.001 to 500 W/(m K). Errors EngineInputError. Source [ISO6946]. */
export function layerResistanceM2KW(layer: ConductionLayer, index = 0): number {
  if ("resistanceM2KW" in layer)
    return requireInRange("resistanceM2KW", layer.resistanceM2KW, 0, 100, "m²·K/W", index);
  requireInRange("thicknessM", layer.thicknessM, 0, 10, "m", index);
  requireInRange("conductivityWMK", layer.conductivityWMK, 0.001, 500, "W/(m·K)", index);
  return layer.thicknessM / layer.conductivityWMK;
}

/**
 * One heat flow through layers in series, with the temperature at every interface.
 *
 * Shapes: n layers give n + 1 temperatures. Units m² K/W, °C, W/m². Positive flux leaves the inside.
 * Valid: surface resistances 0 to 1 m² K/W, temperatures −90 to 90 °C, total resistance above 0. Errors EngineInputError.
 * Source [ISO6946].
 */
export function layeredConduction(input: ConductionInput): ConductionResult {
  requireInRange("insideSurfaceM2KW", input.insideSurfaceM2KW, 0, 1, "m²·K/W");
  requireInRange("outsideSurfaceM2KW", input.outsideSurfaceM2KW, 0, 1, "m²·K/W");
  requireInRange("insideTempC", input.insideTempC, -90, 90, "°C");
  requireInRange("outsideTempC", input.outsideTempC, -90, 90, "°C");
  const resistances = input.layers.map(layerResistanceM2KW);
  const total =
    input.insideSurfaceM2KW + input.outsideSurfaceM2KW + resistances.reduce((sum, value) => sum + value, 0);
  requireInRange("resistanceM2KW", total, 1e-6, 1000, "m²·K/W");
  const heatFluxWM2 = (input.insideTempC - input.outsideTempC) / total;
  const interfaceTempsC = [input.insideTempC - heatFluxWM2 * input.insideSurfaceM2KW];
  for (const resistance of resistances) {
    interfaceTempsC.push((interfaceTempsC.at(-1) as number) - heatFluxWM2 * resistance);
  }
  return { resistanceM2KW: total, uValueWM2K: 1 / total, heatFluxWM2, interfaceTempsC };
}
