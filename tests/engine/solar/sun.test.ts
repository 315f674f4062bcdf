import * as Astronomy from "astronomy-engine";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { EngineInputError } from "../../../server/engine/errors.ts";
import { dailyExtraterrestrialKwhM2 } from "../../../server/engine/solar/extraterrestrial.ts";
import { incidenceCosine } from "../../../server/engine/solar/incidence.ts";
import { representativeDaySun } from "../../../server/engine/solar/representative-day.ts";
import { representativeDayOfYear, sunPosition } from "../../../server/engine/solar/sun-position.ts";
import { planeIrradiance } from "../../../server/engine/solar/transposition.ts";

function reference(timeMs: number, latitude: number, longitude: number) {
  const time = Astronomy.MakeTime(new Date(timeMs));
  const observer = new Astronomy.Observer(latitude, longitude, 0);
  const equator = Astronomy.Equator(Astronomy.Body.Sun, time, observer, true, true);
  return Astronomy.Horizon(time, observer, equator.ra, equator.dec);
}

describe("sun position against astronomy-engine", () => {
  it("stays within 0.02° from 1950 to 2100 at every latitude", () => {
    const worst = { elevation: 0, azimuth: 0 };
    for (let year = 1950; year <= 2100; year += 10) {
      for (let step = 0; step < 40; step += 1) {
        const timeMs = Date.UTC(year, 0, 1) + step * 9.13 * 86_400_000;
        for (const latitude of [-89, -66, -45, -20, 0, 20, 45, 66, 89]) {
          const sun = sunPosition(timeMs, latitude, 12.5);
          const truth = reference(timeMs, latitude, 12.5);
          worst.elevation = Math.max(worst.elevation, Math.abs(sun.elevationDeg - truth.altitude));
          // Near the zenith a small error turns the compass a long way, so the turn is weighed with the distance from it.
          const turn = Math.abs(((sun.azimuthDeg - truth.azimuth + 540) % 360) - 180);
          worst.azimuth = Math.max(worst.azimuth, turn * Math.cos((truth.altitude * Math.PI) / 180));
        }
      }
    }
    expect(worst.elevation).toBeLessThan(0.02);
    expect(worst.azimuth).toBeLessThan(0.02);
  });
});

const month = fc.integer({ min: 1, max: 12 });
const latitude = fc.double({ min: -65, max: 65, noNaN: true });
const clearness = fc.double({ min: 0.1, max: 0.75, noNaN: true });

function dayOf(latitudeDeg: number, monthNumber: number, share: number) {
  const outside = dailyExtraterrestrialKwhM2(latitudeDeg, representativeDayOfYear[monthNumber - 1]!);
  return {
    sum: outside * share,
    hours: representativeDaySun({
      latitudeDeg,
      longitudeDeg: 10,
      month: monthNumber,
      globalKwhM2Day: outside * share,
    }),
  };
}

describe("a month's mean day", () => {
  it("adds up to the month's sun, is dark at night and nowhere negative", () => {
    fc.assert(
      fc.property(latitude, month, clearness, (latitudeDeg, monthNumber, share) => {
        const { sum, hours } = dayOf(latitudeDeg, monthNumber, share);
        expect(hours).toHaveLength(24);
        expect(hours.reduce((total, hour) => total + hour.ghiWM2, 0) / 1000).toBeCloseTo(sum, 9);
        for (const hour of hours) {
          if (hour.sun.elevationDeg <= 0) expect(hour.ghiWM2).toBe(0);
          expect(hour.dniWM2).toBeGreaterThanOrEqual(0);
          expect(hour.dhiWM2).toBeGreaterThanOrEqual(-1e-9);
          const flat =
            hour.dhiWM2 + hour.dniWM2 * Math.max(0, Math.sin((hour.sun.elevationDeg * Math.PI) / 180));
          expect(flat).toBeCloseTo(hour.ghiWM2, 6);
        }
      }),
    );
  });

  it("is even around noon", () => {
    fc.assert(
      fc.property(latitude, month, clearness, (latitudeDeg, monthNumber, share) => {
        const { hours } = dayOf(latitudeDeg, monthNumber, share);
        for (let hour = 0; hour < 12; hour += 1) {
          expect(Math.abs(hours[hour]!.ghiWM2 - hours[23 - hour]!.ghiWM2)).toBeLessThan(2);
        }
      }),
    );
  });

  it("refuses more sun than there is outside the air", () => {
    expect(() =>
      representativeDaySun({ latitudeDeg: 60, longitudeDeg: 0, month: 12, globalKwhM2Day: 5 }),
    ).toThrow(EngineInputError);
  });
});

describe("a tilted plane", () => {
  it("lying flat receives what the flat receives", () => {
    fc.assert(
      fc.property(latitude, month, clearness, (latitudeDeg, monthNumber, share) => {
        for (const hour of dayOf(latitudeDeg, monthNumber, share).hours) {
          const plane = planeIrradiance(hour, hour.sun, { tiltDeg: 0, azimuthDeg: 180, model: "isotropic" });
          expect(plane.totalWM2).toBeCloseTo(hour.ghiWM2, 6);
        }
      }),
      { numRuns: 30 },
    );
  });

  it("turned once around is the same plane", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -5, max: 90, noNaN: true }),
        fc.double({ min: 0, max: 359, noNaN: true }),
        fc.double({ min: 0, max: 90, noNaN: true }),
        (elevationDeg, azimuthDeg, tiltDeg) => {
          const sun = { elevationDeg, azimuthDeg };
          expect(incidenceCosine(sun, tiltDeg, 40)).toBeCloseTo(incidenceCosine(sun, tiltDeg, 400), 9);
        },
      ),
    );
  });

  it("has no step at sunrise", () => {
    const flat = { ghiWM2: 20, dniWM2: 0, dhiWM2: 20 };
    const before = planeIrradiance(
      flat,
      { elevationDeg: -0.001, azimuthDeg: 110 },
      { tiltDeg: 60, azimuthDeg: 110 },
    );
    const after = planeIrradiance(
      flat,
      { elevationDeg: 0.001, azimuthDeg: 110 },
      { tiltDeg: 60, azimuthDeg: 110 },
    );
    expect(Math.abs(after.totalWM2 - before.totalWM2)).toBeLessThan(0.01);
  });
});
