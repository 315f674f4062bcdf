import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { animalHeat } from "../../../server/engine/livestock/animal-heat.ts";
import {
  calfLowerCriticalC,
  lowerCriticalTempC,
  pigCriticalTempC,
  setpointTooCold,
} from "../../../server/engine/livestock/critical-temperature.ts";
import {
  dayOfMass,
  massOnDayKg,
  type SchedulePoint,
  scheduleValue,
} from "../../../server/engine/livestock/schedule.ts";
import { stockNow } from "../../../server/engine/livestock/stock-entry.ts";

const curve: SchedulePoint[] = [
  [0, 0.043],
  [7, 0.21],
  [14, 0.52],
  [21, 1],
  [28, 1.6],
  [35, 2.3],
  [42, 3],
];
const batch = {
  kind: "batch",
  placedCount: 38_000,
  curve,
  placedAgeDays: 0,
  lengthDays: 42,
  lossFrac: 0.04,
} as const;

describe("schedules", () => {
  it("run straight between points and hold on outside them", () => {
    const set: SchedulePoint[] = [
      [0, 31],
      [3, 28],
      [27, 20],
    ];
    expect(scheduleValue(set, 1.5)).toBeCloseTo(29.5, 9);
    expect(scheduleValue(set, 40)).toBe(20);
    expect(scheduleValue([[5, 12]], 0)).toBe(12);
  });

  it("refuse to be empty or to run backwards", () => {
    expect(() => scheduleValue([], 1)).toThrow(/A schedule needs a point/);
    expect(() =>
      scheduleValue(
        [
          [3, 1],
          [3, 2],
        ],
        1,
      ),
    ).toThrow(/must rise/);
  });
});

describe("growth", () => {
  it("passes through its points, rises, and comes back from mass to day", () => {
    for (const [day, mass] of curve) expect(massOnDayKg(curve, day)).toBeCloseTo(mass, 9);
    fc.assert(
      fc.property(fc.double({ min: 0, max: 41.9, noNaN: true }), (day) => {
        const mass = massOnDayKg(curve, day);
        expect(massOnDayKg(curve, day + 0.1)).toBeGreaterThan(mass);
        expect(dayOfMass(curve, mass)).toBeCloseTo(day, 6);
      }),
    );
  });

  it("is not known beyond the curve", () => {
    expect(() => massOnDayKg(curve, 60)).toThrow(EngineInputError);
    expect(() => dayOfMass(curve, 9)).toThrow(/massKg is 9 kg/);
  });
});

describe("stock", () => {
  it("gives hardly any heat on the day of placing, though the same birds give 700 kW and more when grown", () => {
    const heatOn = (day: number) => {
      const { headCount, massKg } = stockNow({ ...batch, day });
      return animalHeat({ animal: "broiler", headCount, massKg, houseTempC: 25 }).totalW / 1000;
    };
    expect(heatOn(0)).toBeLessThan(40);
    expect(heatOn(38)).toBeGreaterThan(700);
  });

  it("is nothing before placing, after leaving and in an empty house", () => {
    for (const day of [-10, -1, 43, 55])
      expect(stockNow({ ...batch, day })).toEqual({ headCount: 0, massKg: 0 });
    expect(stockNow({ kind: "mass", headCount: 0, massKg: 2 })).toEqual({ headCount: 0, massKg: 0 });
  });

  it("loses its share by the end", () => {
    expect(stockNow({ ...batch, day: 42 }).headCount).toBeCloseTo(38_000 * 0.96, 6);
    expect(stockNow({ ...batch, day: 0 }).headCount).toBe(38_000);
  });

  it("can be given by its live mass", () => {
    expect(stockNow({ kind: "liveMass", liveMassKg: 6000, massKg: 60 })).toEqual({
      headCount: 100,
      massKg: 60,
    });
  });
});

describe("lower critical temperature", () => {
  it("falls with age and mass", () => {
    expect(scheduleValue(calfLowerCriticalC, 15)).toBeCloseTo(9.6, 9);
    fc.assert(
      fc.property(fc.double({ min: 1, max: 250, noNaN: true }), (massKg) => {
        expect(pigCriticalTempC(massKg + 10)).toBeLessThanOrEqual(pigCriticalTempC(massKg));
      }),
    );
  });

  it("rises with draught and wet floors and falls on straw", () => {
    expect(lowerCriticalTempC(10, "dry", 0.2)).toBeCloseTo(13, 9);
    expect(lowerCriticalTempC(10, "wetConcrete")).toBe(15);
    expect(lowerCriticalTempC(10, "deepStraw")).toBe(6);
  });

  it("tells a set-point that chills", () => {
    expect(setpointTooCold(21, 20)).toBe(true);
    expect(setpointTooCold(22, 20)).toBe(false);
  });
});
