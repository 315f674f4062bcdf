import { requireInRange } from "../errors.ts";
import { type SchedulePoint, scheduleValue } from "./schedule.ts";

/** What an animal lies on. */
export type Bed = "slats" | "dry" | "wetConcrete" | "deepStraw";

/** Change of the lower critical temperature by the bed, K. Source [DRAUGHTBED], common practice. */
const BED_SHIFT_K: Record<Bed, number> = { slats: 0, dry: 0, wetConcrete: 5, deepStraw: -4 };
/** Kelvin for each m/s of draught above still air: 2 to 4 K for 0.2 m/s. Source [DRAUGHTBED], common practice. */
const DRAUGHT_K_PER_MS = 15;

/**
 * Lower critical temperature of calves kept dry and out of draughts, by age in days. Source [CALFLCT].
 */
export const calfLowerCriticalC: readonly SchedulePoint[] = [
  [1, 13.4],
  [10, 10.8],
  [20, 8.4],
  [30, 6.4],
];

/**
 * Lower critical temperature of pigs by mass, kg → °C: newborn to 100 kg, groups on slats fed at will. Typical, from memory.
 * Source [PIGLCT].
 */
export const pigLowerCriticalC: readonly SchedulePoint[] = [
  [1.4, 34],
  [6, 27],
  [20, 20],
  [60, 15],
  [100, 13],
];

/**
 * Air temperature below which an animal burns feed to keep warm, with its bed and the draught it lies in.
 *
 * Units °C, m/s → °C. `stillDryC` is the value in still air on a dry floor. Valid −40 to 40 °C, draught 0 to 2 m/s.
 * Errors EngineInputError. Source [DRAUGHTBED].
 */
export function lowerCriticalTempC(stillDryC: number, bed: Bed, draughtMS = 0): number {
  requireInRange("stillDryC", stillDryC, -40, 40, "°C");
  requireInRange("draughtMS", draughtMS, 0, 2, "m/s");
  return stillDryC + BED_SHIFT_K[bed] + DRAUGHT_K_PER_MS * draughtMS;
}

/** Lower critical temperature of a pig by its mass. Units kg → °C. Valid 1 to 300 kg. Errors EngineInputError. Source [PIGLCT]. */
export function pigCriticalTempC(massKg: number): number {
  requireInRange("massKg", massKg, 1, 300, "kg");
  return scheduleValue(pigLowerCriticalC, massKg);
}

/** Least distance of a set-point from the lower critical temperature, K: 2 to 3 K are usual. Source [PIGLCT]. */
export const SETPOINT_ABOVE_CRITICAL_K = 2;

/**
 * Whether a set-point chills the animals: true below the lower critical temperature and its usual margin.
 *
 * Units °C → boolean. Errors EngineInputError. Source [PIGLCT].
 */
export function setpointTooCold(setpointC: number, lowerCriticalC: number): boolean {
  requireInRange("setpointC", setpointC, -40, 45, "°C");
  requireInRange("lowerCriticalC", lowerCriticalC, -50, 45, "°C");
  return setpointC < lowerCriticalC + SETPOINT_ABOVE_CRITICAL_K;
}
