import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { abatementCost } from "../../../server/engine/money/abatement.ts";
import { annuityFactor, capitalRecoveryFactor } from "../../../server/engine/money/annuity.ts";
import {
  discountedPaybackYears,
  type Investment,
  internalRate,
  netPresentValue,
  simplePaybackYears,
  withAndWithoutGrant,
} from "../../../server/engine/money/investment.ts";
import { lifeCycleCost } from "../../../server/engine/money/life-cycle.ts";
import { nominalRate, realRate, toReal } from "../../../server/engine/money/rates.ts";

const money = fc.double({ min: 100, max: 1e6, noNaN: true });
const rate = fc.double({ min: -0.05, max: 0.3, noNaN: true });
const years = fc.integer({ min: 1, max: 40 });

/** Year by year, as anyone would check the closed form on paper. */
function summed(saving: number, discount: number, growth: number, life: number): number {
  let sum = 0;
  for (let year = 1; year <= life; year += 1)
    sum += (saving * (1 + growth) ** (year - 1)) / (1 + discount) ** year;
  return sum;
}

describe("present value", () => {
  it("is the sum of the years", () => {
    fc.assert(
      fc.property(rate, rate, years, (discount, growth, life) => {
        expect(annuityFactor(discount, life, growth) / summed(1, discount, growth, life)).toBeCloseTo(1, 6);
      }),
    );
    expect(annuityFactor(0, 12)).toBe(12);
    expect(annuityFactor(0.05, 10) * capitalRecoveryFactor(0.05, 10)).toBeCloseTo(1, 12);
  });

  it("falls with the rate and rises with the life", () => {
    fc.assert(
      fc.property(money, money, rate, years, (cost, yearlySaving, perYear, lifeYears) => {
        const investment: Investment = { cost, yearlySaving, lifeYears, discount: realRate(perYear) };
        const value = netPresentValue(investment);
        expect(netPresentValue({ ...investment, discount: realRate(perYear + 0.01) })).toBeLessThan(value);
        expect(netPresentValue({ ...investment, lifeYears: lifeYears + 1 })).toBeGreaterThan(value);
      }),
    );
  });

  it("is nothing after the discounted payback and at the internal rate", () => {
    fc.assert(
      fc.property(money, fc.double({ min: 0.08, max: 0.6, noNaN: true }), rate, (cost, share, perYear) => {
        const base = { cost, yearlySaving: share * cost, discount: realRate(perYear) };
        const payback = discountedPaybackYears({ ...base, lifeYears: 20 });
        if (payback !== null && payback > 0.1 && payback < 100)
          expect(netPresentValue({ ...base, lifeYears: payback }) / cost).toBeCloseTo(0, 6);
        const own = internalRate({ ...base, lifeYears: 20 });
        if (own !== null)
          expect(netPresentValue({ ...base, lifeYears: 20, discount: realRate(own) }) / cost).toBeCloseTo(
            0,
            6,
          );
      }),
    );
  });

  it("has no payback where nothing is saved", () => {
    expect(simplePaybackYears(1000, 0)).toBeNull();
    expect(simplePaybackYears(0, 0)).toBe(0);
    const never = { cost: 1000, yearlySaving: 50, lifeYears: 20, discount: realRate(0.06) };
    expect(discountedPaybackYears(never)).toBeNull();
    expect(internalRate({ ...never, yearlySaving: -10 })).toBeNull();
  });
});

describe("prices", () => {
  it("of different kinds are not mixed", () => {
    const mixed = {
      cost: 1000,
      yearlySaving: 100,
      lifeYears: 10,
      discount: nominalRate(0.07),
      growth: realRate(0.01),
    };
    expect(() => netPresentValue(mixed)).toThrow(EngineInputError);
    expect(() => netPresentValue(mixed)).toThrow(/discount rate is nominal, the price growth real/);
    expect(() =>
      lifeCycleCost({
        cost: 1,
        energyPerYear: 1,
        servicePerYear: 0,
        years: 5,
        discount: realRate(0.05),
        energyGrowth: nominalRate(0.02),
      }),
    ).toThrow(/bring both to the same prices/);
  });

  it("give the same value in either kind", () => {
    const inflation = 0.025;
    const nominal = netPresentValue({
      cost: 5000,
      yearlySaving: 800 * (1 + inflation),
      lifeYears: 12,
      discount: nominalRate(0.07),
      growth: nominalRate(inflation),
    });
    const real = netPresentValue({
      cost: 5000,
      yearlySaving: 800,
      lifeYears: 12,
      discount: toReal(nominalRate(0.07), inflation),
    });
    expect(nominal).toBeCloseTo(real, 6);
  });

  it("refuse 6 for 6 %", () => {
    expect(() => realRate(6)).toThrow(/perYear is 6/);
  });
});

describe("grants, life cycles, abatement", () => {
  it("show the case without the grant beside the one with it", () => {
    const { without, with: granted } = withAndWithoutGrant(
      { cost: 7000, yearlySaving: 1000, lifeYears: 15, discount: realRate(0.06) },
      2000,
    );
    expect(granted.netPresentValue - without.netPresentValue).toBeCloseTo(2000, 6);
    expect(granted.simplePaybackYears).toBe(5);
    expect(() =>
      withAndWithoutGrant({ cost: 7000, yearlySaving: 1, lifeYears: 5, discount: realRate(0) }, 8000),
    ).toThrow(/grant is 8000/);
  });

  it("count replacements and what is left in the money of today", () => {
    const plain = { cost: 1000, energyPerYear: 0, servicePerYear: 0, years: 20, discount: realRate(0.05) };
    expect(
      lifeCycleCost({ ...plain, replacements: [{ year: 10, cost: 500 }] }) - lifeCycleCost(plain),
    ).toBeCloseTo(500 / 1.05 ** 10, 9);
    expect(lifeCycleCost(plain) - lifeCycleCost({ ...plain, residualValue: 200 })).toBeCloseTo(
      200 / 1.05 ** 20,
      9,
    );
  });

  it("tell two ways apart by the difference of their life cycles", () => {
    const common = { years: 15, servicePerYear: 0, discount: realRate(0.06) };
    const before = lifeCycleCost({ ...common, cost: 0, energyPerYear: 3000 });
    const after = lifeCycleCost({ ...common, cost: 7000, energyPerYear: 2000 });
    expect(before - after).toBeCloseTo(
      netPresentValue({ cost: 7000, yearlySaving: 1000, lifeYears: 15, discount: realRate(0.06) }),
      6,
    );
  });

  it("do not rank what saves money by its cost for each tonne", () => {
    const saving = abatementCost({
      cost: 1000,
      yearlySaving: 500,
      lifeYears: 10,
      discount: realRate(0.05),
      avoidedTonnes: 2,
    });
    expect(saving).toMatchObject({ savesMoney: true, mayBeRanked: false });
    const dear = abatementCost({
      cost: 20_000,
      yearlySaving: 500,
      lifeYears: 10,
      discount: realRate(0.05),
      avoidedTonnes: 2,
    });
    expect(dear).toMatchObject({ savesMoney: false, mayBeRanked: true });
  });
});
