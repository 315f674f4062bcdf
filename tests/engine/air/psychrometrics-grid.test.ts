import psychrolib from "psychrolib";
import { beforeAll, describe, expect, it } from "vitest";
import {
  airDensityKgM3,
  humidityRatio,
  humidityRatioFromDewPoint,
  pressureAtAltitudePa,
} from "../../../server/engine/air/moist-air.ts";
import { saturationPressurePa } from "../../../server/engine/air/saturation.ts";
import { wetBulbC } from "../../../server/engine/air/wet-bulb.ts";

/** Worst difference between two functions over the grid, and where it was found. */
function worstOver(
  states: readonly { tempC: number; humidityFrac: number; pressurePa: number }[],
  difference: (state: { tempC: number; humidityFrac: number; pressurePa: number }) => number,
): number {
  return Math.max(...states.map((state) => Math.abs(difference(state))));
}

const states = [0, 500, 1500, 2500].flatMap((altitudeM) =>
  Array.from({ length: 35 }, (_, step) => -40 + 2.5 * step).flatMap((tempC) =>
    [0.1, 0.35, 0.6, 0.85, 1].map((humidityFrac) => ({
      tempC,
      humidityFrac,
      pressurePa: pressureAtAltitudePa(altitudeM),
    })),
  ),
);

describe("moist air against PsychroLib, wider grid", () => {
  beforeAll(() => psychrolib.SetUnitSystem(psychrolib.SI));

  it("has the same saturation pressure, water from dew point and density", () => {
    const saturation = worstOver(
      states,
      ({ tempC }) => saturationPressurePa(tempC) / psychrolib.GetSatVapPres(tempC) - 1,
    );
    const fromDew = worstOver(
      states,
      ({ tempC, pressurePa }) =>
        humidityRatioFromDewPoint(tempC, pressurePa) - psychrolib.GetHumRatioFromTDewPoint(tempC, pressurePa),
    );
    const density = worstOver(states, ({ tempC, humidityFrac, pressurePa }) => {
      const ratio = humidityRatio(tempC, humidityFrac, pressurePa);
      return (
        airDensityKgM3(tempC, ratio, pressurePa) - psychrolib.GetMoistAirDensity(tempC, ratio, pressurePa)
      );
    });
    expect({ saturation, fromDew, density }).toEqual({
      saturation: expect.closeTo(0, 9),
      fromDew: expect.closeTo(0, 9),
      density: expect.closeTo(0, 6),
    });
  });

  it("has the same wet bulb to the library's own 0.001 K", () => {
    const worst = worstOver(
      states.filter(({ humidityFrac }) => humidityFrac < 1),
      ({ tempC, humidityFrac, pressurePa }) =>
        wetBulbC(tempC, humidityFrac, pressurePa) -
        psychrolib.GetTWetBulbFromRelHum(tempC, humidityFrac, pressurePa),
    );
    expect(worst).toBeLessThan(0.0015);
  });
});
