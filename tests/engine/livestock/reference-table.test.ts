import { readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, it } from "vitest";
import {
  animalClasses,
  massRangeKg,
  totalHeatAt20W,
} from "../../../server/engine/livestock/animal-classes.ts";
import { setpointTooCold } from "../../../server/engine/livestock/critical-temperature.ts";
import { type HeadRateRule, headRateM3H } from "../../../server/engine/livestock/head-rate.ts";
import { massOnDayKg, type SchedulePoint, scheduleValue } from "../../../server/engine/livestock/schedule.ts";

interface Curve {
  points: SchedulePoint[];
  source: string;
}
interface Row {
  id: string;
  classId: (typeof animalClasses)[number];
  typicalMassKg: number;
  typicalSetpointC: number;
  criticalC: number;
  perHeadM3H: number;
  rates?: { id: string; rule: HeadRateRule; source: string }[];
  growthDayKg?: Curve;
  setpointDayC?: Curve;
  lowerCriticalC?: Curve & { by: "day" | "kg" };
}
const rows = JSON.parse(
  readFileSync(join(import.meta.dirname, "../../../data/livestock.json"), "utf8"),
) as Row[];

describe("the table of animals", () => {
  it("has a row for every class that is kept for its own sake", () => {
    const present = new Set(rows.map(({ classId }) => classId));
    expect(animalClasses.filter((animal) => !present.has(animal))).toEqual([]);
    expect(new Set(rows.map(({ id }) => id)).size).toBe(rows.length);
  });

  it.each(rows)("$id stands in the range of its class, warmer than where it comes to harm", (row) => {
    expect(animalClasses).toContain(row.classId);
    const { minKg, maxKg } = massRangeKg(row.classId);
    expect(row.typicalMassKg).toBeGreaterThanOrEqual(minKg);
    expect(row.typicalMassKg).toBeLessThanOrEqual(maxKg);
    expect(totalHeatAt20W(row.classId, { massKg: row.typicalMassKg })).toBeGreaterThan(0);
    expect(row.typicalSetpointC).toBeGreaterThan(row.criticalC);
  });

  it.each(rows.filter(({ rates }) => rates))(
    "$id has rates that can be read, each with its source",
    (row) => {
      for (const { rule, source } of row.rates ?? []) {
        expect(headRateM3H(rule, row.typicalMassKg, 10)).toBeGreaterThan(0);
        expect(source.length).toBeGreaterThan(5);
      }
    },
  );

  it.each(rows.filter(({ growthDayKg }) => growthDayKg))("$id grows within its class", (row) => {
    const { minKg, maxKg } = massRangeKg(row.classId);
    const points = row.growthDayKg?.points ?? [];
    const first = points[0]?.[0] ?? 0;
    const last = points.at(-1)?.[0] ?? 0;
    let before = 0;
    for (let day = first; day <= last; day += 1) {
      const mass = massOnDayKg(points, day);
      expect(mass).toBeGreaterThan(before);
      expect(mass).toBeGreaterThanOrEqual(minKg);
      expect(mass).toBeLessThanOrEqual(maxKg);
      before = mass;
    }
  });

  it.each(rows.filter(({ setpointDayC }) => setpointDayC))("$id is kept cooler as it grows", (row) => {
    const points = row.setpointDayC?.points ?? [];
    let before = 40;
    for (let day = 0; day <= 60; day += 1) {
      const wanted = scheduleValue(points, day);
      expect(wanted).toBeLessThanOrEqual(before);
      before = wanted;
    }
  });

  it("does not chill weaned pigs by its own schedule", () => {
    const pig = rows.find(({ id }) => id === "nursery-pig");
    const lower = scheduleValue(pig?.lowerCriticalC?.points ?? [], 12);
    expect(setpointTooCold(scheduleValue(pig?.setpointDayC?.points ?? [], 7), lower)).toBe(false);
  });
});
