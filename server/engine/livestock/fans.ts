import { requireInRange } from "../errors.ts";

/** Fans of one stage of a controller. */
export interface FanStage {
  name: string;
  count: number;
  /** Flow of one fan at full speed against the house's pressure, m³/h. */
  flowM3H: number;
  /** Lowest speed as a share of the full flow; 1 for fans that only run or stand. */
  leastFlowFrac: number;
  /** Whether a clock can run it a part of each few minutes. */
  timer: boolean;
}

function check(stage: FanStage, index: number): void {
  requireInRange("count", stage.count, 1, 200, "", index);
  requireInRange("flowM3H", stage.flowM3H, 10, 200_000, "m³/h", index);
  requireInRange("leastFlowFrac", stage.leastFlowFrac, 0.05, 1, "", index);
}

/**
 * Mean flow of a fan that runs a part of each cycle.
 *
 * Units m³/h, s → m³/h. Valid run 0 to the cycle, cycle 10 to 3600 s. Errors EngineInputError. Source: share of time.
 */
export function timerFlowM3H(flowM3H: number, runS: number, cycleS: number): number {
  requireInRange("flowM3H", flowM3H, 0, 1e7, "m³/h");
  requireInRange("cycleS", cycleS, 10, 3600, "s");
  requireInRange("runS", runS, 0, cycleS, "s");
  return (flowM3H * runS) / cycleS;
}

/**
 * Seconds of each cycle a fan must run for a mean flow.
 *
 * Units m³/h, s → s. A need above the fan's own flow throws EngineInputError: the fan is too small. Source: share of time.
 */
export function timerRunS(neededM3H: number, flowM3H: number, cycleS: number): number {
  requireInRange("flowM3H", flowM3H, 1, 1e7, "m³/h");
  requireInRange("neededM3H", neededM3H, 0, flowM3H, "m³/h");
  requireInRange("cycleS", cycleS, 10, 3600, "s");
  return (neededM3H / flowM3H) * cycleS;
}

/** Shortest useful run of a timer, as a share of its cycle: the inlets must open and close. Common practice: 30 s in 5 min. */
const LEAST_TIMER_SHARE = 0.1;

/**
 * Least steady flow a controller can hold with its smallest stage: one fan at its lowest speed, or on its timer.
 *
 * Units m³/h → m³/h. Errors EngineInputError. Source: common practice.
 */
export function leastFlowM3H(stages: readonly FanStage[]): number {
  requireInRange("stages", stages.length, 1, 50);
  stages.forEach(check);
  return Math.min(
    ...stages.map(({ flowM3H, leastFlowFrac, timer }) =>
      timer ? flowM3H * Math.min(leastFlowFrac, LEAST_TIMER_SHARE) : flowM3H * leastFlowFrac,
    ),
  );
}

export interface FanPlanStep {
  name: string;
  /** Fans of the stage that run. */
  running: number;
  flowM3H: number;
}

export interface FanPlan {
  /** What the fans really move, m³/h: at least the need, more where the smallest fan is too large for it. */
  flowM3H: number;
  steps: FanPlanStep[];
  /** The need is below what the smallest fan can hold. */
  smallestTooLarge: boolean;
  /** All fans together are below the need. */
  tooFew: boolean;
}

/**
 * Which fans run for a needed flow, stages in their order, the last one at part speed or on its timer where it can.
 *
 * Units m³/h → m³/h. Valid need 0 to 10 000 000 m³/h, 1 to 50 stages. Errors EngineInputError. Source: common practice.
 */
export function fanPlan(stages: readonly FanStage[], neededM3H: number): FanPlan {
  requireInRange("neededM3H", neededM3H, 0, 1e7, "m³/h");
  const least = leastFlowM3H(stages);
  const steps: FanPlanStep[] = [];
  let left = neededM3H;
  for (const stage of stages) {
    if (left <= 1e-9) break;
    const running = Math.min(stage.count, Math.ceil(left / stage.flowM3H - 1e-9));
    const lowest =
      stage.flowM3H * (stage.timer ? Math.min(stage.leastFlowFrac, LEAST_TIMER_SHARE) : stage.leastFlowFrac);
    const partM3H = Math.max(running * lowest, Math.min(left, running * stage.flowM3H));
    steps.push({ name: stage.name, running, flowM3H: partM3H });
    left -= partM3H;
  }
  return {
    flowM3H: steps.reduce((sum, step) => sum + step.flowM3H, 0),
    steps,
    smallestTooLarge: neededM3H > 0 && neededM3H < least,
    tooFew: left > 1e-6 * Math.max(1, neededM3H),
  };
}

export interface FlowComparison {
  /** Measured over needed. */
  ratio: number;
  excessM3H: number;
  /** Heat thrown out with the excess air, W; negative where air is short. */
  excessHeatW: number;
  verdict: "short" | "asNeeded" | "over";
}

/** Measured flow within these shares of the need counts as right: vane readings are no better. Common practice. */
const RIGHT = { from: 0.9, to: 1.2 } as const;

/**
 * Measured winter flow against what the animals need, and what the difference costs in heat.
 *
 * Units m³/h, Wh/(m³ K), K → W. Valid flows up to 10 000 000 m³/h. Errors EngineInputError. Source: heat of the excess air.
 */
export function compareFlow(
  measuredM3H: number,
  neededM3H: number,
  airHeatWhM3K: number,
  differenceK: number,
): FlowComparison {
  requireInRange("measuredM3H", measuredM3H, 0, 1e7, "m³/h");
  requireInRange("neededM3H", neededM3H, 1e-3, 1e7, "m³/h");
  requireInRange("airHeatWhM3K", airHeatWhM3K, 0.15, 0.5, "Wh/(m³ K)");
  requireInRange("differenceK", differenceK, 0, 100, "K");
  const ratio = measuredM3H / neededM3H;
  const excessM3H = measuredM3H - neededM3H;
  return {
    ratio,
    excessM3H,
    excessHeatW: excessM3H * airHeatWhM3K * differenceK,
    verdict: ratio < RIGHT.from ? "short" : ratio > RIGHT.to ? "over" : "asNeeded",
  };
}
