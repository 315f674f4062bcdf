import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { endGasFrac, gasAfterHoursFrac, hoursToGas } from "../../../server/engine/failure/air-decay.ts";
import { hoursToTemp, tempAfterHoursC } from "../../../server/engine/failure/cooling.ts";
import { alarmTempsC } from "../../../server/engine/failure/danger.ts";
import { houseMass, massAround } from "../../../server/engine/failure/house-mass.ts";
import {
  hoursUntil,
  type OutageHouse,
  outageCourse,
  saturatedWaterKgM3,
} from "../../../server/engine/failure/outage.ts";
import { connectsInTime, standbyNeed } from "../../../server/engine/failure/standby.ts";
import { twoNights } from "../../../server/engine/failure/two-nights.ts";
import { animalHeat } from "../../../server/engine/livestock/animal-heat.ts";

const FOOT = 0.3048;

/** A nursery of 2000 pigs of 23 kg in 45 × 125 × 8 ft, 14 °C outside, as in the trials of the University of Illinois. */
const nurseryM3 = 45 * 125 * 8 * FOOT ** 3;
const nursery = {
  volumeM3: nurseryM3,
  shellWK: 500,
  airHeatWhM3K: 0.335,
  startTempC: 24,
  outdoorTempC: 14,
  startCarbonDioxideFrac: 0.003,
  outdoorCarbonDioxideFrac: 0.00045,
  startWaterKgM3: 0.013,
  outdoorWaterKgM3: 0.008,
  otherHeatW: 0,
  stockAt: (houseTempC: number) => {
    const heat = animalHeat({ animal: "piglet", headCount: 2000, massKg: 22.7, feedLevel: 3, houseTempC });
    return {
      sensibleW: heat.sensibleW,
      moistureKgH: heat.moistureKgH,
      carbonDioxideM3H: heat.carbonDioxideM3H,
    };
  },
};
const empty = { sensibleW: 0, moistureKgH: 0, carbonDioxideM3H: 0 };
const cooling: OutageHouse = {
  ...nursery,
  capacityJK: 150e6,
  shellWK: 2500,
  airM3H: 0,
  startTempC: 20,
  outdoorTempC: -10,
  stockAt: () => empty,
};

describe("the course of an outage", () => {
  it("is the closed form where nothing depends on temperature", () => {
    const course = outageCourse(cooling, 12);
    for (const { hours, tempC } of course)
      expect(tempC).toBeCloseTo(
        tempAfterHoursC(
          { capacityJK: 150e6, lossCoefficientWK: 2500, startTempC: 20, outdoorTempC: -10 },
          hours,
        ),
        8,
      );
    expect(hoursUntil(course, ({ tempC }) => tempC, 5, "below")).toBeCloseTo(11.55, 2);
  });

  it("does not depend on its step", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(0.5, 1, 5, 15),
        fc.double({ min: 0, max: 20_000, noNaN: true }),
        (step, airM3H) => {
          const source = { sensibleW: 20_000, moistureKgH: 0, carbonDioxideM3H: 5 };
          const at = (minutes: number) =>
            outageCourse({ ...cooling, airM3H, stockAt: () => source }, 3, minutes).at(-1);
          expect(at(step)?.tempC).toBeCloseTo(at(1)?.tempC ?? 0, 6);
          expect(at(step)?.carbonDioxideFrac).toBeCloseTo(at(1)?.carbonDioxideFrac ?? 0, 9);
        },
      ),
    );
  });

  it("gathers gas as the balance of mixed air says", () => {
    const gas = { volumeM3: nurseryM3, sourceM3H: 40, airM3H: 400, startFrac: 0.003, outdoorFrac: 0.00045 };
    const course = outageCourse(
      { ...cooling, airM3H: 400, stockAt: () => ({ ...empty, carbonDioxideM3H: 40 }) },
      2,
    );
    expect(course.at(-1)?.carbonDioxideFrac).toBeCloseTo(gasAfterHoursFrac(gas, 2), 8);
  });

  it("holds no more water than its air can", () => {
    for (const { tempC, waterKgM3 } of outageCourse({ ...nursery, capacityJK: 40e6, airM3H: 0 }, 2))
      expect(waterKgM3).toBeLessThanOrEqual(saturatedWaterKgM3(tempC) + 1e-12);
    // Steam tables: 17.3 g/m³ at 20 °C.
    expect(1000 * saturatedWaterKgM3(20)).toBeCloseTo(17.3, 1);
  });

  it("refuses what cannot be", () => {
    expect(() => outageCourse({ ...cooling, capacityJK: 0 }, 3)).toThrow(EngineInputError);
    expect(() => outageCourse(cooling, 100)).toThrow(/hours is 100 h/);
  });
});

describe("two nights", () => {
  const limits = { coldC: 18, hotC: 35, carbonDioxideFrac: 0.04 };
  const result = twoNights({
    house: nursery,
    mass: houseMass(nurseryM3, 45 * 125 * FOOT ** 2),
    fansM3H: 6800,
    leaksM3H: 0.3 * nurseryM3,
    limits,
    hours: 6,
  });

  it("overheat a full nursery without power; they do not cool it", () => {
    expect(result.everythingOff.toCold).toEqual({ low: null, likely: null, high: null });
    expect(["hot", "gas"]).toContain(result.everythingOff.firstThreat?.threat);
    expect(result.everythingOff.firstThreat?.soonestHours).toBeLessThan(2);
  });

  it("hold the measured 115 minutes to 35 °C and 80 to 4 % gas within their band", () => {
    const { toHot, toGas } = result.everythingOff;
    expect(60 * (toHot.low ?? 0)).toBeLessThan(115);
    expect(60 * (toHot.high ?? 0)).toBeGreaterThan(115);
    // With leaks of 0.3 an hour the gas comes somewhat later than in the closed house of the trial.
    expect(60 * (toGas.likely ?? 0)).toBeGreaterThan(65);
    expect(60 * (toGas.likely ?? 0)).toBeLessThan(120);
  });

  it("order the band by the heat a house holds", () => {
    for (const { low, likely, high } of [result.everythingOff.toHot]) {
      expect(low).toBeLessThan(likely ?? 0);
      expect(likely).toBeLessThan(high ?? 0);
    }
  });

  it("cool small animals, faster with the fans running than without", () => {
    const chicks = twoNights({
      house: {
        ...nursery,
        startTempC: 32,
        outdoorTempC: -5,
        shellWK: 880,
        stockAt: (houseTempC) => {
          const heat = animalHeat({ animal: "broiler", headCount: 20_000, massKg: 0.043, houseTempC });
          return {
            sensibleW: heat.sensibleW,
            moistureKgH: heat.moistureKgH,
            carbonDioxideM3H: heat.carbonDioxideM3H,
          };
        },
      },
      mass: massAround(60e6),
      fansM3H: 6000,
      leaksM3H: 800,
      limits: { coldC: 26, hotC: 36, carbonDioxideFrac: 0.03 },
      hours: 12,
    });
    expect(chicks.heaterOut.firstThreat?.threat).toBe("cold");
    expect(chicks.everythingOff.firstThreat?.threat).toBe("cold");
    expect(chicks.heaterOut.toCold.likely).toBeLessThan(chicks.everythingOff.toCold.likely ?? 0);
  });
});

describe("gas in a house", () => {
  it("reaches its limit when its course says so", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 60, noNaN: true }),
        fc.double({ min: 0, max: 3000, noNaN: true }),
        (sourceM3H, airM3H) => {
          const gas = { volumeM3: 1000, sourceM3H, airM3H, startFrac: 0.003, outdoorFrac: 0.00045 };
          const hours = hoursToGas(gas, 0.03);
          if (hours === null) expect(endGasFrac(gas)).toBeLessThanOrEqual(0.03);
          else if (hours < 1000) expect(gasAfterHoursFrac(gas, hours)).toBeCloseTo(0.03, 9);
        },
      ),
    );
  });
});

describe("heat a house holds", () => {
  it("is given with half and twice of it, and lengthens the hours in proportion", () => {
    const { lowJK, likelyJK, highJK } = houseMass(1274, 522);
    expect(likelyJK / lowJK).toBe(2);
    expect(highJK / likelyJK).toBe(2);
    const hours = (capacityJK: number) =>
      hoursToTemp({ capacityJK, lossCoefficientWK: 2500, startTempC: 20, outdoorTempC: -10 }, 5) ?? 0;
    expect(hours(highJK) / hours(lowJK)).toBeCloseTo(4, 9);
  });
});

describe("standby power and alarms", () => {
  it("carry every load and the hardest start", () => {
    const need = standbyNeed(
      [
        { name: "Heater blowers", runW: 250, count: 4, startFactor: 4 },
        { name: "Least fans", runW: 750, count: 2, startFactor: 5 },
        { name: "Water and controls", runW: 600, count: 1, startFactor: 1 },
      ],
      24,
    );
    expect(need.runningW).toBe(1000 + 1500 + 600);
    // The second fan starts while the first one runs.
    expect(need.startingW).toBe(750 + 3750);
    expect(need.ratingW).toBe(4500);
    expect(need.dieselL).toBeCloseTo(3.1 * 24 * 0.35, 6);
  });

  it("never rate below what runs", () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.record({
            name: fc.constant("x"),
            runW: fc.double({ min: 1, max: 5000, noNaN: true }),
            count: fc.integer({ min: 1, max: 5 }),
            startFactor: fc.double({ min: 1, max: 6, noNaN: true }),
          }),
          { minLength: 1, maxLength: 6 },
        ),
        (loads) => {
          const need = standbyNeed(loads, 10);
          expect(need.startingW).toBeGreaterThanOrEqual(need.runningW - 1e-9);
          expect(need.ratingW).toBeGreaterThan(need.runningW);
        },
      ),
    );
  });

  it("come in time or not", () => {
    expect(connectsInTime(0.8, 1.5)).toMatchObject({ inTime: false });
    expect(connectsInTime(5, 1.5)).toEqual({ inTime: true, spareHours: 3.5 });
    expect(connectsInTime(null, 3)).toEqual({ inTime: true, spareHours: null });
  });

  it("call before harm", () => {
    expect(alarmTempsC(28)).toEqual({ lowC: 24.5, highC: 33.5 });
  });
});
