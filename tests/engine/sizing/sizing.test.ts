import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { hoursToCritical } from "../../../server/engine/sizing/hours-to-critical.ts";
import { installedUnits, totalOutputW, unitOutputsW } from "../../../server/engine/sizing/installed-units.ts";
import { judgedOptions } from "../../../server/engine/sizing/judge-options.ts";
import { toSi } from "../../../server/engine/units.ts";
import { plate } from "../plan/scenario-houses.ts";

const house = {
  floorAreaM2: 268,
  volumeM3: 730,
  lossCoefficientWK: 1891,
  startTempC: toSi(60, "F"),
  outdoorTempC: toSi(3, "F"),
  criticalTempC: 0,
  remainingHeatW: 0,
};

describe("hours to the critical temperature", () => {
  it("of the double-film tunnel reach 32 °F in about 0.6 to 1.7 hours", () => {
    const { low, high } = hoursToCritical(house);
    expect(low).toBeGreaterThan(0.3);
    expect(low).toBeLessThan(0.9);
    expect(high).toBeGreaterThan(1.2);
    expect(high).toBeLessThan(2.2);
  });

  it("are ordered, and longer for a tighter house and a lower critical temperature", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 200, max: 6000, noNaN: true }),
        fc.double({ min: -14, max: 14, noNaN: true }),
        (lossCoefficientWK, criticalTempC) => {
          const at = (loss: number, critical: number) =>
            hoursToCritical({ ...house, lossCoefficientWK: loss, criticalTempC: critical });
          const { low, high } = at(lossCoefficientWK, criticalTempC);
          expect(low!).toBeLessThanOrEqual(high!);
          expect(at(lossCoefficientWK * 0.8, criticalTempC).high!).toBeGreaterThan(high!);
          expect(at(lossCoefficientWK, criticalTempC - 1).high!).toBeGreaterThan(high!);
        },
      ),
    );
  });

  it("are none where the stock's heat keeps the house above, and nothing where it is there already", () => {
    expect(hoursToCritical({ ...house, remainingHeatW: 60_000 })).toEqual({ low: null, high: null });
    expect(hoursToCritical({ ...house, criticalTempC: 20 })).toEqual({ low: 0, high: 0 });
  });
});

describe("fitted heaters", () => {
  it("give what is left after efficiency, by row and one by one", () => {
    const units = installedUnits([plate(150, "input", 2), plate(100, "output", 1)], 100);
    expect(totalOutputW(units)).toBeCloseTo(toSi(150 * 2 * 0.8 + 100, "kBtuH"), 3);
    expect(unitOutputsW(units)).toHaveLength(3);
  });

  it("give less in thin air when they burn fuel, and the same when they do not", () => {
    const burner = plate(250, "input", 1);
    const high = installedUnits([burner], 1524)[0]!.outputW;
    expect(high / installedUnits([burner], 0)[0]!.outputW).toBeCloseTo(0.8, 3);
    const electric = { ...burner, burnsFuel: false };
    expect(installedUnits([electric], 1524)).toEqual(installedUnits([electric], 0));
  });
});

describe("ways to fit a house", () => {
  const judge = {
    everydayRequiredW: 50_000,
    onceInYearsRequiredW: 62_000,
    targetW: 62_000,
    criticalTempC: 5,
    setpointC: 16,
    existing: installedUnits([plate(150, "input", 1)], 0),
    settlesWithC: (heatW: number) => -15 + Math.min(31, heatW / 2000),
  };

  it("start with what is there and say what it means", () => {
    const options = judgedOptions(judge);
    expect(options[0]?.id).toBe("keep");
    expect(options[0]?.holdsEveryday).toBe(false);
    expect(options[0]?.spareW).toBeLessThan(0);
    expect(options[0]?.note).toContain("nothing to fall back on");
    for (const option of options.slice(1)) expect(option.holdsOnceInYears).toBe(true);
  });

  it("tell where the house settles with the largest unit out", () => {
    for (const option of judgedOptions(judge)) {
      const largest = Math.max(...option.units.map((unit) => unit.outputW));
      expect(option.largestUnitOutSettlesAtC).toBeCloseTo(judge.settlesWithC(option.totalW - largest), 9);
      expect(option.largestUnitOutAboveCritical).toBe(option.largestUnitOutSettlesAtC >= 5);
    }
  });
});
