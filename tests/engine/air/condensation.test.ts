import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { dryHumidityFrac, dryLimit, insideFaceTempC } from "../../../server/engine/air/condensation.ts";
import { dewPointC, exhaustEnthalpyW } from "../../../server/engine/air/moist-air.ts";
import { EngineInputError } from "../../../server/engine/errors.ts";

const inside = fc.double({ min: 0, max: 35, noNaN: true });
const outside = fc.double({ min: -40, max: -1, noNaN: true });
const humidity = fc.double({ min: 0.4, max: 0.95, noNaN: true });

describe("condensation on inner faces", () => {
  it("just begins at the least resistance", () => {
    fc.assert(
      fc.property(inside, outside, humidity, (insideTempC, outdoorTempC, humidityFrac) => {
        const limit = dryLimit({ insideTempC, outdoorTempC, humidityFrac }, 0.12);
        if (limit.leastResistanceM2KW < 0.12) return;
        const face = insideFaceTempC(insideTempC, outdoorTempC, limit.leastResistanceM2KW, 0.12);
        expect(face).toBeCloseTo(dewPointC(insideTempC, humidityFrac), 6);
        const allowed = dryHumidityFrac(insideTempC, outdoorTempC, limit.leastResistanceM2KW, 0.12);
        expect(allowed).toBeCloseTo(humidityFrac, 6);
      }),
    );
  });

  it("asks for more insulation in damper rooms and colder weather", () => {
    fc.assert(
      fc.property(inside, outside, humidity, (insideTempC, outdoorTempC, humidityFrac) => {
        const least = dryLimit({ insideTempC, outdoorTempC, humidityFrac }, 0.12).leastResistanceM2KW;
        const damper = dryLimit({ insideTempC, outdoorTempC, humidityFrac: humidityFrac + 0.04 }, 0.12);
        const colder = dryLimit({ insideTempC, outdoorTempC: outdoorTempC - 5, humidityFrac }, 0.12);
        expect(damper.leastResistanceM2KW).toBeGreaterThanOrEqual(least);
        expect(colder.leastResistanceM2KW).toBeGreaterThanOrEqual(least);
      }),
    );
  });

  it("has no remedy in insulation when the air is saturated, and none is needed in warm weather", () => {
    expect(dryLimit({ insideTempC: 20, humidityFrac: 1, outdoorTempC: 0 }, 0.12).leastResistanceM2KW).toBe(
      Number.POSITIVE_INFINITY,
    );
    expect(dryLimit({ insideTempC: 20, humidityFrac: 0.9, outdoorTempC: 25 }, 0.12).leastResistanceM2KW).toBe(
      0,
    );
  });

  it("refuses a wall that insulates less than its own film", () => {
    expect(() => insideFaceTempC(20, -10, 0.05, 0.12)).toThrow(EngineInputError);
    expect(() => insideFaceTempC(20, -10, 0.05, 0.12)).toThrow(/resistanceM2KW is 0.05/);
  });
});

describe("heat in exhaust air", () => {
  it("is the warmth and the water's evaporation together", () => {
    const flowM3H = 1000;
    const warm = exhaustEnthalpyW(flowM3H, { tempC: 20, ratio: 0.003 }, { tempC: -10, ratio: 0.003 });
    const wet = exhaustEnthalpyW(flowM3H, { tempC: 20, ratio: 0.008 }, { tempC: -10, ratio: 0.003 });
    // 0.335 Wh/(m³ K) is the usual engineering figure for the warmth alone.
    expect(warm / (flowM3H * 30)).toBeCloseTo(0.335, 2);
    // By hand: 1188.8 kg/h of dry air, 40.43 kJ/kg inside, −2.61 kJ/kg outside.
    expect(wet).toBeCloseTo(14_213, -1);
  });
});
