import { saturationPressurePa } from "../air/saturation.ts";
import { ZERO_CELSIUS_K } from "../constants.ts";
import { requireInRange } from "../errors.ts";

/** What a house does by itself from the moment something stops. */
export interface OutageHouse {
  volumeM3: number;
  capacityJK: number;
  /** Shell and floor edge, W/K. */
  shellWK: number;
  /** Air still moving, m³/h: the fans' least flow while they run, leaks alone when they stand. */
  airM3H: number;
  airHeatWhM3K: number;
  startTempC: number;
  outdoorTempC: number;
  startCarbonDioxideFrac: number;
  outdoorCarbonDioxideFrac: number;
  /** Water in the air at the start and outdoors, kg for each m³. */
  startWaterKgM3: number;
  outdoorWaterKgM3: number;
  /** What the animals give off at a temperature: they share their heat out otherwise as it warms. */
  stockAt(tempC: number): { sensibleW: number; moistureKgH: number; carbonDioxideM3H: number };
  /** Heat of lamps and the like that goes on, W. */
  otherHeatW: number;
}

/** The house at one moment of an outage. */
export interface OutageMoment {
  hours: number;
  tempC: number;
  carbonDioxideFrac: number;
  waterKgM3: number;
}

/** Gas constant of water vapour, J/(kg K). Source [MIXEDAIR]. */
const VAPOUR_GAS_CONSTANT = 461.5;

/** Most water air of a temperature holds. Units °C → kg/m³. Valid −60 to 60 °C. Errors EngineInputError. Source [MIXEDAIR], ideal gas. */
export function saturatedWaterKgM3(tempC: number): number {
  return saturationPressurePa(tempC) / (VAPOUR_GAS_CONSTANT * (tempC + ZERO_CELSIUS_K));
}

/** Air changes within a step below which the air counts as still. */
const STILL_CHANGES = 1e-9;
/** Animals do not live on beyond this; the course is not followed further. */
const HOTTEST_C = 45;
const COLDEST_C = -40;

/**
 * Temperature, carbon dioxide and water of a house minute by minute after something stops. Within each step heat, gas and water
 * follow their exact exponentials, so that the step does not bend the curve. Water beyond saturation condenses on the cold shell,
 * which passes its heat outwards; the heat is not counted as warming the room.
 *
 * Units as named → hours, °C, shares, kg/m³. Valid 0.1 to 72 h, step 0.25 to 30 min. Stops early beyond −40 or 45 °C.
 * Errors EngineInputError. Source [LUMPED], [MIXEDAIR].
 */
export function outageCourse(house: OutageHouse, hours: number, stepMinutes = 1): OutageMoment[] {
  requireInRange("hours", hours, 0.1, 72, "h");
  requireInRange("stepMinutes", stepMinutes, 0.25, 30, "min");
  requireInRange("volumeM3", house.volumeM3, 1, 1e8, "m³");
  requireInRange("capacityJK", house.capacityJK, 1, 1e13, "J/K");
  requireInRange("shellWK", house.shellWK, 0.1, 1e8, "W/K");
  requireInRange("airM3H", house.airM3H, 0, 1e8, "m³/h");
  requireInRange("airHeatWhM3K", house.airHeatWhM3K, 0.15, 0.5, "Wh/(m³ K)");
  requireInRange("startTempC", house.startTempC, COLDEST_C, HOTTEST_C, "°C");
  requireInRange("outdoorTempC", house.outdoorTempC, -70, 50, "°C");
  requireInRange("otherHeatW", house.otherHeatW, 0, 1e8, "W");
  requireInRange("startCarbonDioxideFrac", house.startCarbonDioxideFrac, 0, 0.3);
  requireInRange("outdoorCarbonDioxideFrac", house.outdoorCarbonDioxideFrac, 0, 0.01);
  requireInRange("startWaterKgM3", house.startWaterKgM3, 0, 0.1, "kg/m³");
  requireInRange("outdoorWaterKgM3", house.outdoorWaterKgM3, 0, 0.1, "kg/m³");
  const lossWK = house.shellWK + house.airM3H * house.airHeatWhM3K;
  const stepH = stepMinutes / 60;
  const heatKept = Math.exp((-stepH * 3600 * lossWK) / house.capacityJK);
  // Volume of air that a steady source is spread over within a step; the plain volume when no air moves.
  const changes = (stepH * house.airM3H) / house.volumeM3;
  const airKept = Math.exp(-changes);
  const spreadM3 = changes < STILL_CHANGES ? house.volumeM3 / stepH : house.airM3H / -Math.expm1(-changes);
  let now: OutageMoment = {
    hours: 0,
    tempC: house.startTempC,
    carbonDioxideFrac: house.startCarbonDioxideFrac,
    waterKgM3: house.startWaterKgM3,
  };
  const course = [now];
  const steps = Math.round(hours / stepH);
  for (let step = 1; step <= steps; step += 1) {
    const stock = house.stockAt(Math.min(HOTTEST_C, Math.max(COLDEST_C, now.tempC)));
    const endC = house.outdoorTempC + (stock.sensibleW + house.otherHeatW) / lossWK;
    const tempC = endC + (now.tempC - endC) * heatKept;
    now = {
      hours: step * stepH,
      tempC,
      carbonDioxideFrac:
        house.outdoorCarbonDioxideFrac +
        (now.carbonDioxideFrac - house.outdoorCarbonDioxideFrac) * airKept +
        stock.carbonDioxideM3H / spreadM3,
      waterKgM3: Math.min(
        saturatedWaterKgM3(tempC),
        house.outdoorWaterKgM3 +
          (now.waterKgM3 - house.outdoorWaterKgM3) * airKept +
          stock.moistureKgH / spreadM3,
      ),
    };
    course.push(now);
    if (now.tempC > HOTTEST_C || now.tempC < COLDEST_C) break;
  }
  return course;
}

/** First moment a course crosses a limit, straight between its steps; null when it never does. Errors none. Source [LUMPED]. */
export function hoursUntil(
  course: readonly OutageMoment[],
  value: (moment: OutageMoment) => number,
  limit: number,
  way: "above" | "below",
): number | null {
  const past = (moment: OutageMoment) => (way === "above" ? value(moment) >= limit : value(moment) <= limit);
  const at = course.findIndex(past);
  const found = course[at];
  if (found === undefined) return null;
  const before = course[at - 1];
  if (before === undefined) return 0;
  const share = (limit - value(before)) / (value(found) - value(before));
  return before.hours + share * (found.hours - before.hours);
}
