import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { fuelEmissions, warmingAr4 } from "../../../server/engine/fuel/emissions.ts";
import {
  deliveredFrom,
  type GrossKwh,
  grossFor,
  grossFromNet,
  grossKwh,
  netFromGross,
  netKwh,
} from "../../../server/engine/fuel/energy-kinds.ts";
import type { FuelProperties } from "../../../server/engine/fuel/fuel-properties.ts";
import { amountOf, energyOf, fuelUnits, unitsOf } from "../../../server/engine/fuel/fuel-units.ts";
import { periodCost, savingValue, type Tariff } from "../../../server/engine/fuel/tariff.ts";
import { litresAt15C, standardGasM3 } from "../../../server/engine/fuel/volume-correction.ts";
import { wetBasisMoisture, woodFuel, woodValue } from "../../../server/engine/fuel/wood.ts";

const propane: FuelProperties = {
  id: "lpg",
  netOverGrossFrac: 0.921,
  kwhGrossPerKg: 13.98,
  kgPerL: 0.504,
  carbonDioxideKgPerKwh: 0.2145,
  biogenic: false,
};
const gas: FuelProperties = {
  id: "natural-gas",
  netOverGrossFrac: 0.901,
  kwhGrossPerM3: 10.62,
  carbonDioxideKgPerKwh: 0.18105,
  biogenic: false,
};
const chips: FuelProperties = {
  id: "chips",
  netOverGrossFrac: 0.87,
  kwhGrossPerKg: 3.3,
  bulkKgPerM3: 250,
  carbonDioxideKgPerKwh: 0.3201,
  biogenic: true,
  methaneGPerKwh: 0.0246,
  nitrousOxideGPerKwh: 0.0123,
};
const amount = fc.double({ min: 0.1, max: 1e6, noNaN: true });

describe("units of fuel", () => {
  it("come back from energy to amount in every unit a fuel is counted in", () => {
    fc.assert(
      fc.property(
        fc.constantFrom(propane, gas, chips),
        fc.integer({ min: 0, max: 40 }),
        amount,
        (fuel, pick, some) => {
          const units = unitsOf(fuel);
          const unit = units[pick % units.length] ?? "kWh";
          expect(amountOf(energyOf(some, unit, fuel), unit, fuel) / some).toBeCloseTo(1, 9);
        },
      ),
    );
  });

  it("keep the ratios behind the usual slips", () => {
    const ratio = (one: Parameters<typeof energyOf>[1], other: typeof one, fuel: FuelProperties) =>
      energyOf(1, one, fuel) / energyOf(1, other, fuel);
    expect(ratio("kg", "L", propane)).toBeCloseTo(1.98, 2);
    expect(ratio("Mcf", "ccf", gas)).toBeCloseTo(10, 9);
    expect(ratio("MMBtu", "therm", gas)).toBeCloseTo(10, 9);
    expect(ratio("galUK", "galUS", propane)).toBeCloseTo(1.201, 3);
    expect(ratio("MWh", "GJ", gas)).toBeCloseTo(3.6, 9);
  });

  it("refuse a fuel they do not fit", () => {
    expect(() => energyOf(100, "m3", propane)).toThrow(EngineInputError);
    expect(() => energyOf(100, "m3", propane)).toThrow(/kwhGrossPerM3 is not known for it/);
    expect(unitsOf(gas)).not.toContain("L");
    expect(unitsOf(chips)).toContain("looseM3");
    expect(fuelUnits.length).toBeGreaterThan(18);
  });

  it("count energy on the value the bill says", () => {
    expect(energyOf(1000, "kWh", gas, "net")).toBeCloseTo(1000 / 0.901, 6);
    expect(energyOf(1000, "kWh", gas)).toBe(1000);
  });
});

describe("gross, net and delivered energy", () => {
  it("come back", () => {
    fc.assert(
      fc.property(amount, fc.double({ min: 0.6, max: 1, noNaN: true }), (some, share) => {
        expect(grossFromNet(netFromGross(grossKwh(some), share), share) / some).toBeCloseTo(1, 9);
        expect(grossFor(deliveredFrom(grossKwh(some), share), share) / some).toBeCloseTo(1, 9);
      }),
    );
  });

  it("cannot be mixed: the compiler refuses net where gross is wanted", () => {
    const takesGross = (energy: GrossKwh) => energy;
    // @ts-expect-error net energy is not gross energy
    takesGross(netKwh(100));
    // @ts-expect-error neither is a bare number
    takesGross(100);
    expect(takesGross(grossKwh(100))).toBe(100);
  });
});

describe("emissions", () => {
  it("keep grown carbon beside the total", () => {
    const wood = fuelEmissions(grossKwh(1000), chips);
    expect(wood.fossilKg).toBe(0);
    expect(wood.biogenicKg).toBeCloseTo(320.1, 6);
    expect(wood.totalKgEquivalent).toBeCloseTo(0.0246 * 28 + 0.0123 * 265, 6);
    expect(fuelEmissions(grossKwh(1000), gas)).toMatchObject({ biogenicKg: 0, warmingSet: "AR5" });
    expect(fuelEmissions(grossKwh(1000), chips, warmingAr4).warmingSet).toBe("AR4");
  });
});

describe("tariffs", () => {
  const tariff: Tariff = {
    standingCharge: 20,
    blocks: [
      { upTo: 1000, pricePerUnit: 0.1 },
      { upTo: null, pricePerUnit: 0.06 },
    ],
    levyPerUnit: 0.01,
    taxFrac: 0.2,
  };

  it("charge block by block", () => {
    expect(periodCost(tariff, 0)).toBeCloseTo(24, 9);
    expect(periodCost(tariff, 1500)).toBeCloseTo((20 + 1000 * 0.11 + 500 * 0.07) * 1.2, 9);
  });

  it("value a saving at its last units", () => {
    expect(savingValue(tariff, [1500, 1500], [1400, 1500])).toBeCloseTo(100 * 0.07 * 1.2, 9);
    fc.assert(
      fc.property(amount, amount, (one, other) => {
        expect(savingValue(tariff, [Math.max(one, other)], [Math.min(one, other)])).toBeGreaterThanOrEqual(
          -1e-6,
        );
      }),
    );
  });

  it("refuse blocks that do not rise or do not end open", () => {
    const bad = { ...tariff, blocks: [{ upTo: 1000, pricePerUnit: 0.1 }] };
    expect(() => periodCost(bad, 10)).toThrow(/only the last one is open/);
  });
});

describe("volumes and wood", () => {
  it("stand at 15 °C and standard pressure", () => {
    expect(litresAt15C(1000, 15, 0.0028)).toBe(1000);
    expect(litresAt15C(1000, 0, 0.0028)).toBeGreaterThan(1000);
    expect(standardGasM3(100, 101_325, 15)).toBeCloseTo(100, 9);
    expect(standardGasM3(100, 101_325 + 2000, 5)).toBeCloseTo(105.64, 1);
  });

  it("lose heat with moisture", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 0.6, noNaN: true }), (moisture) => {
        const one = woodValue(moisture);
        expect(woodValue(moisture + 0.05).netKwhKg).toBeLessThan(one.netKwhKg);
        expect(one.netOverGrossFrac).toBeLessThan(1);
      }),
    );
    expect(wetBasisMoisture(1)).toBe(0.5);
    // 2.9 MWh net in a tonne of chips of 40 % moisture is the figure of the trade.
    const wood = woodFuel("chips", 0.4, 250);
    expect(netFromGross(energyOf(1, "t", wood), wood.netOverGrossFrac) / 1000).toBeCloseTo(2.9, 1);
    expect(energyOf(1, "looseM3", wood)).toBeCloseTo(energyOf(250, "kg", wood), 9);
  });
});
