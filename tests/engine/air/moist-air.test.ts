import fc from "fast-check";
import psychrolib from "psychrolib";
import { beforeAll, describe, expect, it } from "vitest";
import {
  dewPointC,
  enthalpyKjKg,
  humidityRatio,
  pressureAtAltitudePa,
  relativeHumidityFrac,
  specificVolumeM3Kg,
} from "../../../server/engine/air/moist-air.ts";
import { dewPointFromPressureC, saturationPressurePa } from "../../../server/engine/air/saturation.ts";
import { EngineInputError } from "../../../server/engine/errors.ts";

const temperature = fc.double({ min: -40, max: 45, noNaN: true });
const humidity = fc.double({ min: 0.05, max: 1, noNaN: true });

describe("moist air against PsychroLib", () => {
  beforeAll(() => psychrolib.SetUnitSystem(psychrolib.SI));

  it("agrees over a grid of states and heights", () => {
    const worst = { ratio: 0, dew: 0, enthalpy: 0, volume: 0 };
    for (const altitude of [0, 500, 1500]) {
      const pressure = pressureAtAltitudePa(altitude);
      expect(Math.abs(pressure / psychrolib.GetStandardAtmPressure(altitude) - 1)).toBeLessThan(1e-6);
      for (let tempC = -40; tempC <= 45; tempC += 2.5) {
        for (const share of [0.05, 0.3, 0.6, 0.9, 1]) {
          const ratio = humidityRatio(tempC, share, pressure);
          const reference = psychrolib.GetHumRatioFromRelHum(tempC, share, pressure);
          // Below its floor of 1e-7 the library answers the floor itself.
          worst.ratio = Math.max(worst.ratio, Math.abs(ratio - reference));
          worst.dew = Math.max(
            worst.dew,
            Math.abs(dewPointC(tempC, share) - psychrolib.GetTDewPointFromRelHum(tempC, share)),
          );
          worst.enthalpy = Math.max(
            worst.enthalpy,
            Math.abs(enthalpyKjKg(tempC, ratio) - psychrolib.GetMoistAirEnthalpy(tempC, ratio) / 1000),
          );
          worst.volume = Math.max(
            worst.volume,
            Math.abs(
              specificVolumeM3Kg(tempC, ratio, pressure) -
                psychrolib.GetMoistAirVolume(tempC, ratio, pressure),
            ),
          );
        }
      }
    }
    expect(worst.ratio).toBeLessThan(1e-8);
    expect(worst.dew).toBeLessThan(0.002);
    expect(worst.enthalpy).toBeLessThan(1e-6);
    expect(worst.volume).toBeLessThan(1e-6);
  });
});

describe("moist air", () => {
  it("comes back from water content to relative humidity", () => {
    fc.assert(
      fc.property(temperature, humidity, (tempC, share) => {
        expect(relativeHumidityFrac(tempC, humidityRatio(tempC, share))).toBeCloseTo(share, 9);
      }),
    );
  });

  it("has a dew point that gives the vapour pressure back and never lies above the air", () => {
    fc.assert(
      fc.property(temperature, humidity, (tempC, share) => {
        const dew = dewPointC(tempC, share);
        expect(dew).toBeLessThanOrEqual(tempC + 1e-6);
        expect(saturationPressurePa(dew) / (share * saturationPressurePa(tempC))).toBeCloseTo(1, 6);
      }),
    );
  });

  it("has no step where ice turns to water", () => {
    expect(saturationPressurePa(0.011) - saturationPressurePa(0.009)).toBeLessThan(0.3);
    expect(dewPointFromPressureC(saturationPressurePa(0))).toBeCloseTo(0, 2);
  });

  it("names what is out of range", () => {
    expect(() => humidityRatio(20, 1.2)).toThrow(EngineInputError);
    expect(() => humidityRatio(20, 1.2)).toThrow(/humidityFrac is 1.2; it must lie between 0 and 1/);
    expect(() => saturationPressurePa(Number.NaN)).toThrow(/tempC is not a finite number/);
    expect(() => pressureAtAltitudePa(9000)).toThrow(/altitudeM is 9000 m/);
  });
});
