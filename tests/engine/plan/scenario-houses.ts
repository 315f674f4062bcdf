import type { Assembly, HeaterInput, HousePlanInput } from "../../../server/engine/plan/house-input.ts";
import { toSi } from "../../../server/engine/units.ts";
import { everyMonth, stationWithDesign, tunnel } from "./example-houses.ts";

export const ft = (value: number) => toSi(value, "ft");
export const degF = (value: number) => toSi(value, "F");

export function plate(kBtuH: number, basis: "input" | "output", count: number): HeaterInput {
  return {
    label: "Unit heater",
    typeId: "unit-fan",
    ratedW: toSi(kBtuH, "kBtuH"),
    basis,
    efficiencyFrac: 0.8,
    vented: true,
    burnsFuel: true,
    fuelId: "lpg",
    count,
  };
}

/** Double-film tunnel of 30 by 96 ft, 60 °F, 3 and -15 °F outside, two heaters of 150,000 Btu/h input. */
export function doubleFilmTunnel(film: Assembly, ends: Assembly): HousePlanInput {
  return tunnel({
    climate: stationWithDesign(degF(3), degF(-15)),
    shape: { type: "roundArch", lengthM: ft(96), widthM: ft(30), riseM: ft(12), wallHeightM: 0 },
    covers: { roof: film, sideWall: film, endWall: ends },
    leakageAirChangesPerHour: 1,
    floorEdgeLossWMK: 0,
    months: everyMonth({ nightSetpointC: degF(60), daySetpointC: degF(65) }),
    criticalTempC: degF(40),
    heaters: [plate(150, "input", 2)],
  });
}

/** Venlo-type glasshouse of 1.6 ha, 18 °C, -10 and -15 °C outside, a screen and a boiler of 3 MW. */
export function glasshouse(glass: Assembly): HousePlanInput {
  return tunnel({
    climate: stationWithDesign(-10, -15),
    shape: {
      type: "venlo",
      lengthM: 160,
      spanWidthM: 4,
      spanCount: 25,
      gutterHeightM: 6,
      roofSlopeDeg: 22.5,
    },
    covers: { roof: glass, sideWall: glass, endWall: glass },
    leakageAirChangesPerHour: 0.5,
    floorEdgeLossWMK: 0,
    screen: {
      name: "Screen",
      emissivityIn: 0.6,
      emissivityOut: 0.6,
      longwaveTransmittance: 0.2,
      solarTransmittance: 0.5,
      savingFrac: 1 - 3.4 / 6.2,
      coverageFrac: 1,
      edgeGapM: 0,
      opensForSnow: true,
    },
    months: everyMonth({ nightSetpointC: 18, daySetpointC: 20 }),
    criticalTempC: 10,
    heaters: [{ ...plate(100, "output", 1), label: "Boiler", ratedW: 3_000_000 }],
  });
}

/** Gutter-connected range of three bays at 5,000 ft, 65 °F, -5 and -20 °F outside. */
export function gutterRange(sheet: Assembly, heaters: HeaterInput[]): HousePlanInput {
  return tunnel({
    site: { latitudeDeg: 40, longitudeDeg: 10, elevationM: ft(5000), shelter: "normal", frostHollowK: 0 },
    climate: stationWithDesign(degF(-5), degF(-20), ft(5000)),
    shape: {
      type: "multiSpan",
      lengthM: ft(144),
      spanWidthM: ft(30),
      spanCount: 3,
      gutterHeightM: ft(12),
      ridgeHeightM: ft(19.5),
    },
    covers: { roof: sheet, sideWall: sheet, endWall: sheet },
    leakageAirChangesPerHour: 1,
    floorEdgeLossWMK: 0,
    months: everyMonth({ nightSetpointC: degF(65), daySetpointC: degF(68) }),
    criticalTempC: degF(45),
    heaters,
  });
}
