import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { barnHeat, hoursBelow } from "../../../server/engine/livestock/barn-heat.ts";
import {
  compareFlow,
  type FanStage,
  fanPlan,
  leastFlowM3H,
  timerFlowM3H,
  timerRunS,
} from "../../../server/engine/livestock/fans.ts";
import { headRateM3H } from "../../../server/engine/livestock/head-rate.ts";
import { exchanger } from "../../../server/engine/livestock/heat-recovery.ts";
import {
  airWithLeaksM3H,
  leakAtPressure,
  tightnessFromSuction,
} from "../../../server/engine/livestock/leaks.ts";
import { ventilationCosts } from "../../../server/engine/livestock/ventilation-cost.ts";

const stages: FanStage[] = [
  { name: "Minimum", count: 2, flowM3H: 3000, leastFlowFrac: 0.3, timer: false },
  { name: "Large", count: 4, flowM3H: 17_000, leastFlowFrac: 1, timer: true },
];
// A thousandth of a cubic metre an hour is no air at all, and no fan runs for it.
const flow = fc.double({ min: 1, max: 60_000, noNaN: true });

describe("fans", () => {
  it("give at least what is needed while they can", () => {
    fc.assert(
      fc.property(flow, (needed) => {
        const plan = fanPlan(stages, needed);
        expect(plan.flowM3H).toBeGreaterThanOrEqual(needed - 1e-6);
        expect(plan.tooFew).toBe(false);
        for (const step of plan.steps) expect(step.running).toBeGreaterThan(0);
      }),
    );
  });

  it("say when they are too few or the smallest is too large", () => {
    expect(fanPlan(stages, 90_000).tooFew).toBe(true);
    const one: FanStage[] = [{ name: "18 in", count: 1, flowM3H: 2380, leastFlowFrac: 1, timer: false }];
    const plan = fanPlan(one, 816);
    expect(plan.smallestTooLarge).toBe(true);
    expect(plan.flowM3H).toBe(2380);
    expect(leastFlowM3H(one)).toBe(2380);
    expect(leastFlowM3H(stages)).toBe(900);
  });

  it("of one stage share the flow, none below its lowest speed", () => {
    const pair: FanStage[] = [{ name: "Pair", count: 2, flowM3H: 1000, leastFlowFrac: 0.9, timer: false }];
    expect(fanPlan(pair, 1100).flowM3H).toBe(1800);
    expect(fanPlan(pair, 950).steps).toEqual([{ name: "Pair", running: 1, flowM3H: 950 }]);
  });

  it("run on a clock for a mean flow, and back", () => {
    fc.assert(
      fc.property(flow, fc.double({ min: 1, max: 299, noNaN: true }), (full, run) => {
        fc.pre(full > 1);
        expect(timerRunS(timerFlowM3H(full, run, 300), full, 300)).toBeCloseTo(run, 6);
      }),
    );
    expect(() => timerRunS(5000, 3000, 300)).toThrow(EngineInputError);
  });

  it("that move too much air cost its heat", () => {
    const found = compareFlow(2380, 816, 0.335, 42.2);
    expect(found.verdict).toBe("over");
    expect(found.excessHeatW).toBeCloseTo(1564 * 0.335 * 42.2, 6);
    expect(compareFlow(700, 816, 0.335, 40).verdict).toBe("short");
    expect(compareFlow(830, 816, 0.335, 40).verdict).toBe("asNeeded");
  });
});

describe("rates for each animal", () => {
  it("follow the table's steps by mass", () => {
    const rule = {
      kind: "massSteps",
      steps: [
        { fromKg: 5, perHeadM3H: 3.4 },
        { fromKg: 14, perHeadM3H: 5.1 },
        { fromKg: 34, perHeadM3H: 11.9 },
      ],
    } as const;
    expect([4, 5, 13.9, 14, 60].map((mass) => headRateM3H(rule, mass))).toEqual([3.4, 3.4, 3.4, 5.1, 11.9]);
  });

  it("follow body, mass or day", () => {
    expect(headRateM3H({ kind: "metabolic", perKg075M3H: 0.76 }, 1)).toBeCloseTo(0.76, 9);
    expect(headRateM3H({ kind: "mass", perKgM3H: 0.5 }, 4)).toBe(2);
    expect(headRateM3H({ kind: "fixed", perHeadM3H: 34 }, 180)).toBe(34);
    expect(
      headRateM3H(
        {
          kind: "days",
          points: [
            [0, 0.16],
            [7, 0.42],
          ],
        },
        0.2,
        3.5,
      ),
    ).toBeCloseTo(0.29, 9);
  });
});

describe("leaks", () => {
  it("are never added to the fans' flow", () => {
    fc.assert(
      fc.property(flow, flow, (fans, leaks) => {
        const larger = airWithLeaksM3H(fans, leaks);
        const squares = airWithLeaksM3H(fans, leaks, "rootOfSquares");
        expect(larger).toBe(Math.max(fans, leaks));
        expect(squares).toBeGreaterThanOrEqual(larger - 1e-9);
        expect(squares).toBeLessThanOrEqual(fans + leaks + 1e-9);
      }),
    );
  });

  it("and wind meet as the root of squares where that is asked for", () => {
    expect(airWithLeaksM3H(3000, 4000, "rootOfSquares")).toBeCloseTo(5000, 9);
  });

  it("keep their rank at another pressure", () => {
    expect(leakAtPressure(leakAtPressure(3, 20, 50), 50, 20)).toBeCloseTo(3, 9);
    expect(tightnessFromSuction(30, "curtain")).toBe("leaky");
    expect(tightnessFromSuction(38, "curtain")).toBe("tight");
    expect(tightnessFromSuction(38, "solid")).toBe("leaky");
    expect(tightnessFromSuction(52, "solid")).toBe("ordinary");
  });
});

describe("exchangers", () => {
  const air = { flowM3H: 3600, shareFrac: 0.7, insideTempC: 20, insideDewPointC: 15, airHeatWhM3K: 0.335 };

  it("never freeze their exhaust, and never give more than the ventilation loses", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 0.9, noNaN: true }),
        fc.double({ min: -50, max: 30, noNaN: true }),
        (shareFrac, outdoorTempC) => {
          const result = exchanger({ ...air, shareFrac, outdoorTempC });
          const lossW = 3600 * 0.335 * Math.max(0, 20 - outdoorTempC);
          expect(result.recoveredW).toBeLessThanOrEqual(shareFrac * lossW + 1e-6);
          if (outdoorTempC < 0) expect(result.exhaustTempC).toBeGreaterThanOrEqual(-1e-9);
          expect(result.frostLimited).toBe(outdoorTempC < result.frostLimitC);
        },
      ),
    );
  });

  it("condense when the exhaust falls below its dew point, and do nothing in warm weather", () => {
    expect(exchanger({ ...air, outdoorTempC: -5 }).condenses).toBe(true);
    expect(exchanger({ ...air, outdoorTempC: 18 }).condenses).toBe(false);
    expect(exchanger({ ...air, outdoorTempC: 25 })).toMatchObject({ recoveredW: 0, fanW: 0, netW: 0 });
  });
});

describe("a barn's balance", () => {
  const barn = {
    insideTempC: 18,
    outdoorTempC: -10,
    shellWK: 1200,
    airM3H: 12_000,
    airHeatWhM3K: 0.335,
    stockSensibleW: 120_000,
  };

  it("settles unheated where its gains meet its losses", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 500_000, noNaN: true }),
        fc.double({ min: -40, max: 10, noNaN: true }),
        (stockSensibleW, outdoorTempC) => {
          const { unheatedTempC } = barnHeat({ ...barn, stockSensibleW, outdoorTempC });
          fc.pre(unheatedTempC < 44);
          const there = barnHeat({ ...barn, stockSensibleW, outdoorTempC, insideTempC: unheatedTempC });
          expect(there.heatNeededW).toBeCloseTo(0, 4);
          expect(there.surplusW).toBeCloseTo(0, 4);
        },
      ),
    );
  });

  it("needs no more heat with more insulation, more animals or heat recovery", () => {
    const need = barnHeat(barn).heatNeededW;
    expect(barnHeat({ ...barn, shellWK: 900 }).heatNeededW).toBeLessThan(need);
    expect(barnHeat({ ...barn, stockSensibleW: 130_000 }).heatNeededW).toBeLessThan(need);
    expect(barnHeat({ ...barn, recoveryFrac: 0.4 }).heatNeededW).toBeLessThan(need);
  });

  it("steps its fans up for a surplus instead of saving it", () => {
    const full = barnHeat({ ...barn, stockSensibleW: 300_000 });
    expect(full.heatNeededW).toBe(0);
    expect(full.airToHoldM3H).toBeGreaterThan(barn.airM3H);
    expect(barnHeat({ ...barn, stockSensibleW: 300_000, airM3H: full.airToHoldM3H }).surplusW).toBeCloseTo(
      0,
      4,
    );
    expect(barnHeat({ ...barn, outdoorTempC: 25 }).airToHoldM3H).toBe(Number.POSITIVE_INFINITY);
  });

  it("counts hours below a temperature, more of them the higher it is", () => {
    const year = [{ meanC: 0, spreadK: 6, hours: 744 }];
    expect(hoursBelow(0, year)).toBeCloseTo(372, 6);
    expect(hoursBelow(-6, year)).toBeCloseTo(744 * 0.158655, 1);
    expect(hoursBelow(5, year)).toBeGreaterThan(hoursBelow(0, year));
  });
});

describe("what a ventilation rule costs", () => {
  it("is in proportion to its flow, the dearest first", () => {
    const costs = ventilationCosts({
      partsM3H: { moisture: 11_883, carbonDioxide: 13_858, perHead: 12_000, legal: 0 },
      airHeatWhM3K: 0.335,
      nightDifferenceK: 28,
      degreeHoursKh: 60_000,
      efficiencyFrac: 0.8,
    });
    expect(costs.map(({ rule }) => rule)).toEqual(["carbonDioxide", "perHead", "moisture", "legal"]);
    expect(costs[0]?.nightW).toBeCloseTo(13_858 * 0.335 * 28, 6);
    expect(costs[0]?.seasonFuelKwh).toBeCloseTo((13_858 * 0.335 * 60) / 0.8, 6);
  });
});
