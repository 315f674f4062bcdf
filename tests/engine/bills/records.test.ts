import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { dateOf, dayNumber } from "../../../server/engine/bills/calendar-day.ts";
import { type FuelRecord, recordFaults } from "../../../server/engine/bills/fuel-records.ts";
import { settleRecords } from "../../../server/engine/bills/settle-records.ts";
import { shareOut, useBetweenFills, useBetweenLevels } from "../../../server/engine/bills/tank-use.ts";
import { EngineInputError } from "../../../server/engine/errors.ts";

const line = (
  fromDay: number,
  toDay: number,
  amount: number,
  kind: FuelRecord["kind"] = "read",
): FuelRecord => ({
  fromDay,
  toDay,
  amount,
  kind,
});
const faultsOf = (records: FuelRecord[], today = 10_000) =>
  recordFaults(records, today).map(({ index, fault }) => `${index} ${fault}`);

describe("dates", () => {
  it("come back, and agree with the calendar of the machine", () => {
    fc.assert(
      fc.property(fc.integer({ min: -25_000, max: 80_000 }), (number) => {
        const { year, month, day } = dateOf(number);
        expect(dayNumber(year, month, day)).toBe(number);
        expect(Date.UTC(year, month - 1, day) / 86_400_000).toBe(number);
      }),
    );
  });

  it("that do not exist are refused", () => {
    expect(() => dayNumber(2025, 2, 29)).toThrow(EngineInputError);
    expect(dayNumber(2024, 2, 29)).toBe(dayNumber(2024, 3, 1) - 1);
    expect(() => dayNumber(2025, 13, 1)).toThrow(/month is 13/);
    expect(() => dayNumber(2025, 4, 31)).toThrow(/between 1 and 30/);
    expect(() => dayNumber(2025, 4, 1.5)).toThrow(/whole numbers/);
  });
});

describe("faults of a record", () => {
  it("are none in a plain year", () => {
    expect(faultsOf([line(0, 30, 500), line(30, 61, 480), line(61, 92, 300)])).toEqual([]);
  });

  it("are named at their line", () => {
    expect(faultsOf([line(0, 30, 500), line(0, 30, 500), line(30, 60, 400)])).toEqual(["1 duplicate"]);
    expect(faultsOf([line(0, 30, 500), line(20, 60, 400)])).toEqual(["1 overlap"]);
    expect(faultsOf([line(0, 30, 500), line(45, 60, 400)])).toEqual(["1 gap"]);
    expect(faultsOf([line(30, 10, 500)])).toEqual(["0 backwards"]);
    expect(faultsOf([line(0, 30, 500)], 20)).toEqual(["0 future"]);
    expect(faultsOf([line(0, 30, -500)])).toEqual(["0 negative"]);
    expect(faultsOf([line(0, 30, -500, "credit")])).toEqual([]);
    expect(faultsOf([line(0, 200, 500)])).toEqual(["0 longSpan"]);
    expect(faultsOf([line(0, 30, 500), line(30, 60, 480, "estimated")])).toEqual(["1 unsettledEstimate"]);
    expect(faultsOf([line(0, 30, 500), line(30, 60, 5000), line(60, 90, 450)])).toEqual(["1 outlier"]);
  });

  it("that falsify the sum block, the others warn", () => {
    const blocking = (records: FuelRecord[]) => recordFaults(records, 10_000).map((fault) => fault.blocking);
    expect(blocking([line(0, 30, 1), line(0, 30, 1)])).toEqual([true]);
    expect(blocking([line(0, 30, 1), line(40, 60, 1)])).toEqual([false]);
  });
});

describe("settled records", () => {
  it("join an estimate to the reading that sets it right", () => {
    expect(settleRecords([line(0, 30, 500, "estimated"), line(30, 60, 200), line(60, 90, 100)])).toEqual([
      { fromDay: 0, toDay: 60, amount: 700, readAtEnds: true },
      { fromDay: 60, toDay: 90, amount: 100, readAtEnds: true },
    ]);
  });

  it("leave duplicates out and take credits from their span", () => {
    expect(settleRecords([line(0, 30, 500), line(0, 30, 500), line(10, 11, -120, "credit")])).toEqual([
      { fromDay: 0, toDay: 30, amount: 380, readAtEnds: true },
    ]);
    expect(settleRecords([line(0, 30, 500), line(400, 401, 50, "credit")])[0]?.amount).toBe(450);
  });
});

describe("tanks", () => {
  it("use what was there and brought, less what is left", () => {
    const levels = [
      { day: 0, amount: 3000 },
      { day: 60, amount: 1000 },
      { day: 90, amount: 2500 },
    ];
    const spans = useBetweenLevels(levels, [{ day: 70, amount: 2000 }]);
    expect(spans.map(({ amount }) => amount)).toEqual([2000, 500]);
    expect(() => useBetweenLevels(levels, [])).toThrow(/a delivery or a level is missing/);
  });

  it("count a delivery of the day of a reading after the reading", () => {
    const levels = [
      { day: 0, amount: 500 },
      { day: 30, amount: 200 },
      { day: 60, amount: 1900 },
    ];
    expect(useBetweenLevels(levels, [{ day: 30, amount: 2000 }]).map(({ amount }) => amount)).toEqual([
      300, 300,
    ]);
  });

  it("leave the first fill out", () => {
    const spans = useBetweenFills([
      { day: 100, amount: 900 },
      { day: 0, amount: 4000 },
      { day: 40, amount: 1200 },
    ]);
    expect(spans.map(({ amount }) => amount)).toEqual([1200, 900]);
    expect(() =>
      useBetweenFills([
        { day: 0, amount: 1 },
        { day: 0, amount: 1 },
      ]),
    ).toThrow(EngineInputError);
  });

  it("share every litre out, more of it to the colder days", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 400 }),
        fc.double({ min: 0, max: 1e6, noNaN: true }),
        fc.double({ min: 0, max: 20, noNaN: true }),
        (days, amount, base) => {
          const sums = shareOut(
            [{ fromDay: 5, toDay: 5 + days, amount, readAtEnds: true }],
            (day) => Math.floor(day / 30),
            (day) => Math.max(0, 15 - (day % 30)) * base,
          );
          const total = [...sums.values()].reduce((sum, value) => sum + value, 0);
          expect(Math.abs(total - amount)).toBeLessThanOrEqual(1e-9 * Math.max(1, amount));
        },
      ),
    );
    const months = shareOut(
      [{ fromDay: 0, toDay: 60, amount: 900, readAtEnds: true }],
      (day) => (day < 30 ? "cold" : "mild"),
      (day) => (day < 30 ? 20 : 10),
    );
    expect(months.get("cold")).toBeCloseTo(600, 9);
  });
});
