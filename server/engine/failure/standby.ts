import { requireInRange } from "../errors.ts";

/** Something a generator must carry. */
export interface StandbyLoad {
  name: string;
  /** Power while it runs, W. */
  runW: number;
  count: number;
  /** Current at the start over running: motors 3 to 6, electronics and lamps 1. */
  startFactor: number;
}

export interface StandbyNeed {
  /** All loads running, W. */
  runningW: number;
  /** Highest moment when they start one after the other, the hardest starter first, W. */
  startingW: number;
  /** Rating to look for, W: what the start asks for, with a margin. */
  ratingW: number;
  /** Fuel for the hours asked for, L of diesel. */
  dieselL: number;
}

/** Margin on the rating: hot days and height. Common practice. */
const MARGIN = 1.2;
/** Diesel for each kWh of electricity at part load, L. Common practice. */
const DIESEL_L_KWH = 0.35;

/**
 * Generator for the loads that must not stop: heater blowers and controls, least fans, alarm, water. Motors are started one after
 * the other, the hardest first.
 *
 * Units W, h → W, L. Valid 1 to 100 loads, start factor 1 to 8, 1 to 200 h. Errors EngineInputError. Source [ALARMS].
 */
export function standbyNeed(loads: readonly StandbyLoad[], hours: number): StandbyNeed {
  requireInRange("loads", loads.length, 1, 100);
  requireInRange("hours", hours, 1, 200, "h");
  const single = loads.flatMap(({ runW, count, startFactor }, index) => {
    requireInRange("runW", runW, 0, 1e6, "W", index);
    requireInRange("startFactor", startFactor, 1, 8, "", index);
    const pieces = requireInRange("count", Math.round(count), 0, 500, "", index);
    return Array<{ runW: number; startW: number }>(pieces).fill({ runW, startW: runW * startFactor });
  });
  const sorted = single.toSorted((a, b) => b.startW - b.runW - (a.startW - a.runW));
  let runningW = 0;
  let startingW = 0;
  for (const { runW, startW } of sorted) {
    startingW = Math.max(startingW, runningW + startW);
    runningW += runW;
  }
  startingW = Math.max(startingW, runningW);
  return {
    runningW,
    startingW,
    ratingW: Math.max(startingW, MARGIN * runningW),
    dieselL: (runningW / 1000) * hours * DIESEL_L_KWH,
  };
}

/**
 * Whether a generator that a person has to bring and connect comes in time: call, way and connecting within the shortest time to
 * harm.
 *
 * Units h. Valid 0 to 48 h. Errors EngineInputError. Source [ALARMS].
 */
export function connectsInTime(
  soonestHarmHours: number | null,
  hoursToConnect: number,
): { inTime: boolean; spareHours: number | null } {
  requireInRange("hoursToConnect", hoursToConnect, 0, 48, "h");
  if (soonestHarmHours === null) return { inTime: true, spareHours: null };
  requireInRange("soonestHarmHours", soonestHarmHours, 0, 1000, "h");
  const spareHours = soonestHarmHours - hoursToConnect;
  return { inTime: spareHours > 0, spareHours };
}
