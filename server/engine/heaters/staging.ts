import { requireInRange } from "../errors.ts";

/** Hours with one heat load. */
export interface LoadHours {
  loadW: number;
  hours: number;
}

export interface StageUse {
  outputW: number;
  /** Hours in which the stage runs at all, over the hours of the whole span. */
  runsFrac: number;
  /** Its heat over what it could give in the whole span. */
  usedFrac: number;
  heatKwh: number;
}

export interface StagingResult {
  stages: StageUse[];
  /** Hours whose load is above all stages together. */
  shortHours: number;
  unmetKwh: number;
}

/**
 * How stages that follow each other share a season's loads: which run, and for how much of the time.
 *
 * Units W, h → shares, kWh. Valid 1 to 20 stages, loads up to 100 MW. Errors EngineInputError. Source [STAGING].
 */
export function stageUse(stageOutputsW: readonly number[], loads: readonly LoadHours[]): StagingResult {
  requireInRange("stages", stageOutputsW.length, 1, 20);
  const spanHours = loads.reduce((sum, { hours }) => sum + hours, 0);
  requireInRange("hours", spanHours, 1e-6, 100_000, "h");
  loads.forEach(({ loadW, hours }, index) => {
    requireInRange("loadW", loadW, 0, 1e8, "W", index);
    requireInRange("hours", hours, 0, 10_000, "h", index);
  });
  let belowW = 0;
  const stages = stageOutputsW.map((outputW, index) => {
    requireInRange("stageOutputsW", outputW, 1, 1e8, "W", index);
    let runHours = 0;
    let heatWh = 0;
    for (const { loadW, hours } of loads) {
      const shareW = Math.min(outputW, Math.max(0, loadW - belowW));
      if (shareW > 0) runHours += hours;
      heatWh += shareW * hours;
    }
    belowW += outputW;
    return {
      outputW,
      runsFrac: runHours / spanHours,
      usedFrac: heatWh / (outputW * spanHours),
      heatKwh: heatWh / 1000,
    };
  });
  const short = loads.filter(({ loadW }) => loadW > belowW);
  return {
    stages,
    shortHours: short.reduce((sum, { hours }) => sum + hours, 0),
    unmetKwh: short.reduce((sum, { loadW, hours }) => sum + ((loadW - belowW) * hours) / 1000, 0),
  };
}

/** How a heater follows its load. */
export type HeaterControl = "onOff" | "twoStage" | "modulating" | "inverter";

/** Least output over rated output. Source [STAGING]. */
export const leastOutputFrac: Readonly<Record<HeaterControl, number>> = {
  onOff: 1,
  twoStage: 0.5,
  modulating: 0.22,
  inverter: 0.28,
};

/** Loss of seasonal efficiency by short cycles: 2 % at twice the mean load, 5 % from four times on. Typical. */
const CYCLE_LOSS = { fromRatio: 2, lossFrom: 0.02, toRatio: 4, lossTo: 0.05 } as const;

/**
 * Share of the seasonal efficiency lost to short cycles when a heater is larger than its mean load needs.
 *
 * Units W → 0 to 0.05. Valid outputs above 0. A heater that turns down as far as its mean load loses nothing.
 * Errors EngineInputError. Source [STAGING], typical.
 */
export function cyclingLossFrac(ratedW: number, meanLoadW: number, control: HeaterControl): number {
  requireInRange("ratedW", ratedW, 1, 1e8, "W");
  requireInRange("meanLoadW", meanLoadW, 1, 1e8, "W");
  const ratio = (ratedW * leastOutputFrac[control]) / meanLoadW;
  if (ratio <= CYCLE_LOSS.fromRatio) return 0;
  const share = Math.min(1, (ratio - CYCLE_LOSS.fromRatio) / (CYCLE_LOSS.toRatio - CYCLE_LOSS.fromRatio));
  return CYCLE_LOSS.lossFrom + share * (CYCLE_LOSS.lossTo - CYCLE_LOSS.lossFrom);
}
