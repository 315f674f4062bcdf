import { requireInRange } from "../errors.ts";

/** Commonly rated inputs, kBtu/h. Source [SIZE-STEPS]. */
const INPUT_STEPS_KBTUH = [30, 45, 60, 75, 100, 125, 150, 175, 200, 225, 250, 300, 350, 400] as const;
const KBTUH_W = 293.07107;
/** Output of a step at the efficiency of a fan-vented unit heater. */
const STEP_EFFICIENCY = 0.8;

/** Outputs of small electric heat and single units up to boilers, W. Above the largest step sizes grow by a quarter. */
const SMALL_STEPS_W = [500, 1000, 1500, 2000, 3000, 4500, 6000];

/** Outputs heaters are offered in, W, rising. Source [SIZE-STEPS]. */
export const outputStepsW: readonly number[] = [
  ...SMALL_STEPS_W,
  ...INPUT_STEPS_KBTUH.map((step) => Math.round((step * KBTUH_W * STEP_EFFICIENCY) / 100) * 100),
];

/**
 * The smallest step that gives at least `neededW`; boilers above the largest step in rounded sizes a quarter apart.
 *
 * Units W → W. Valid 0 to 100 MW. Errors EngineInputError. Source [SIZE-STEPS].
 */
export function nextStepW(neededW: number): number {
  requireInRange("neededW", neededW, 0, 1e8, "W");
  const step = outputStepsW.find((size) => size >= neededW);
  if (step !== undefined) return step;
  let size = 100_000;
  while (size < neededW) size *= 1.25;
  const digits = 10 ** (Math.floor(Math.log10(size)) - 1);
  return Math.ceil(size / digits) * digits;
}
