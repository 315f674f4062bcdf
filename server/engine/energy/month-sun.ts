import type { SurfaceModel } from "../balance/surface-model.ts";
import type { HouseShape } from "../geometry/house-shape.ts";
import { representativeDaySun, type SunHour } from "../solar/representative-day.ts";
import { planeIrradiance } from "../solar/transposition.ts";

/** Mean transmittance over all directions as a share of that at a right angle. Source [FRESNEL]: 0.915 to 0.925 for film and glass. */
const ALL_DIRECTIONS_SHARE = 0.92;
/** Share of the sun in the room that is not sent out again by crop, floor and stock. Source [ALBEDO]. */
const KEPT_SHARE = 0.85;

/** Sun of a month's mean day, hour by hour. */
export interface MonthSun {
  daylight: boolean[];
  /** Mean sun on each group of surfaces, W/m²: [hour][group]. */
  groupSunWM2: number[][];
  /** Sun kept in the room, W, with screens open. */
  inRoomW: number[];
}

export interface MonthSunInput {
  latitudeDeg: number;
  longitudeDeg: number;
  month: number;
  globalKwhM2Day: number;
  surfaces: readonly SurfaceModel[];
  groupCount: number;
  shape: HouseShape;
  floorAreaM2: number;
}

/**
 * Sun on the surfaces and into the room through the mean day of a month. The roofs of a range shade each other, so they are
 * counted by the flat ground they cover.
 * Shape: place, month, mean daily sum kWh/m², surfaces → 24 hours. Throws EngineInputError as the sun functions do.
 * Source [FRESNEL], [ALBEDO].
 */
export function monthSun(input: MonthSunInput): MonthSun {
  const hours = representativeDaySun(input);
  const range = input.shape.type === "venlo" || input.shape.type === "multiSpan";
  const roofAreaM2 = input.surfaces.reduce(
    (sum, surface) => sum + (surface.role === "roof" ? surface.areaM2 : 0),
    0,
  );
  const groupAreaM2 = Array<number>(input.groupCount).fill(0);
  for (const surface of input.surfaces)
    groupAreaM2[surface.group] = (groupAreaM2[surface.group] ?? 0) + surface.areaM2;
  const groupSunWM2: number[][] = [];
  const inRoomW: number[] = [];
  for (const hour of hours) {
    const groupW = Array<number>(input.groupCount).fill(0);
    let roomW = 0;
    for (const surface of input.surfaces) {
      const flatShare = range && surface.role === "roof" ? input.floorAreaM2 / roofAreaM2 : null;
      const onSurfaceW = surface.areaM2 * sunOnSurfaceWM2(hour, surface, flatShare);
      groupW[surface.group] = (groupW[surface.group] ?? 0) + onSurfaceW;
      roomW += onSurfaceW * surface.solarTransmittance * ALL_DIRECTIONS_SHARE * KEPT_SHARE;
    }
    groupSunWM2.push(groupW.map((watts, index) => watts / (groupAreaM2[index] || 1)));
    inRoomW.push(roomW);
  }
  return { daylight: hours.map((hour) => hour.ghiWM2 > 0), groupSunWM2, inRoomW };
}

function sunOnSurfaceWM2(hour: SunHour, surface: SurfaceModel, flatShare: number | null): number {
  if (hour.ghiWM2 <= 0) return 0;
  if (flatShare !== null) return hour.ghiWM2 * flatShare;
  return planeIrradiance(hour, hour.sun, surface).totalWM2;
}
