import { STEFAN_BOLTZMANN_WM2K4, ZERO_CELSIUS_K } from "../constants.ts";
import { requireInRange } from "../errors.ts";
import { bisect } from "../numeric/bisect.ts";

/** Convection of a free pipe of 51 mm, W/(m² K): 1.99 ΔT^0.32; thinner pipes give a little more. Source [PIPERAIL]. */
const PIPE = { factor: 1.99, power: 0.32 } as const;
/** Longwave emissivity of a painted pipe. Source [PIPERAIL]. */
const PAINT_EMISSIVITY = 0.88;

/**
 * Heat of a metre of heating pipe in the room, half of it convection, half radiation or so.
 *
 * Units m, °C → W/m. Valid diameter 0.02 to 0.12 m, water 0 to 110 °C, room −10 to 45 °C and cooler than the water.
 * Errors EngineInputError. Source [PIPERAIL].
 */
export function pipeHeatWM(diameterM: number, waterTempC: number, roomTempC: number): number {
  requireInRange("diameterM", diameterM, 0.02, 0.12, "m");
  requireInRange("roomTempC", roomTempC, -10, 45, "°C");
  requireInRange("waterTempC", waterTempC, roomTempC, 110, "°C");
  const differenceK = waterTempC - roomTempC;
  const convection = PIPE.factor * differenceK ** (1 + PIPE.power);
  const radiation =
    PAINT_EMISSIVITY *
    STEFAN_BOLTZMANN_WM2K4 *
    ((waterTempC + ZERO_CELSIUS_K) ** 4 - (roomTempC + ZERO_CELSIUS_K) ** 4);
  return Math.PI * diameterM * (convection + radiation);
}

/**
 * Water temperature at which so many metres of pipe give a heat; null where not even 110 °C does.
 *
 * Units W, m, °C → °C. Valid heat 0 to 100 MW, length 0.1 to 1e6 m. Errors EngineInputError. Source [PIPERAIL].
 */
export function pipeWaterTempC(
  heatW: number,
  lengthM: number,
  diameterM: number,
  roomTempC: number,
): number | null {
  requireInRange("heatW", heatW, 0, 1e8, "W");
  requireInRange("lengthM", lengthM, 0.1, 1e6, "m");
  const missing = (waterTempC: number) => pipeHeatWM(diameterM, waterTempC, roomTempC) * lengthM - heatW;
  return missing(110) < 0 ? null : bisect(missing, roomTempC, 110, 1e-6);
}

/** Warmest floor animals and people may stand on, °C. Source [EN1264]. */
export const WARMEST_FLOOR_C = { people: 29, edge: 35, piglets: 38 } as const;

/**
 * Heat of a heated floor by its mean surface temperature.
 *
 * Units °C → W/m². Valid floor 0 to 45 °C and at least the room's. Errors EngineInputError. Source [EN1264] basic characteristic
 * curve, 8.92 ΔT^1.1.
 */
export function floorHeatWM2(floorTempC: number, roomTempC: number): number {
  requireInRange("roomTempC", roomTempC, -10, 45, "°C");
  requireInRange("floorTempC", floorTempC, roomTempC, 45, "°C");
  return 8.92 * (floorTempC - roomTempC) ** 1.1;
}
