import type { StationClimate } from "../../../server/engine/climate/station-climate.ts";
import type { CoverStack } from "../../../server/engine/envelope/cover-types.ts";
import type { HousePlanInput, MonthUse } from "../../../server/engine/plan/house-input.ts";

/** Invented station of the temperate north: cold January. */
export const northStation: StationClimate = {
  id: "test-north",
  name: "Northfield",
  latitudeDeg: 52,
  longitudeDeg: 10,
  elevationM: 100,
  meanTempC: [0, 1, 4, 9, 14, 17, 19, 18, 14, 9, 4, 1],
  maxTempC: [3, 4, 9, 14, 19, 22, 24, 24, 19, 13, 7, 4],
  minTempC: [-3, -3, 0, 3, 8, 11, 13, 13, 9, 5, 1, -2],
  humidityFrac: [0.86, 0.83, 0.78, 0.72, 0.7, 0.7, 0.71, 0.73, 0.79, 0.84, 0.88, 0.88],
  dewPointC: null,
  windMS: [4.5, 4.3, 4.2, 3.9, 3.5, 3.3, 3.3, 3.1, 3.3, 3.6, 4, 4.3],
  globalKwhM2Day: [0.65, 1.3, 2.5, 4, 5, 5.4, 5.2, 4.5, 3.1, 1.8, 0.8, 0.5],
  hourlySpreadK: [5.4, 5.5, 5.6, 5.8, 5.8, 5.5, 5.6, 5.3, 4.8, 4.7, 4.6, 5],
  dailySpreadK: [4.8, 4.6, 4, 3.7, 3.6, 3.4, 3.5, 3.2, 3, 3.4, 3.9, 4.5],
  design996C: -10,
  design99C: -8,
  yearlyColdest: null,
  flags: { humidity: "R", wind: "R", global: "R", spread: "R", design: "E" },
};

/** A station given by its design nights alone: what the scenarios say. */
export function stationWithDesign(everydayC: number, onceIn20C: number, elevationM = 100): StationClimate {
  // One winter more than enough and a spread of nothing would be weighed against the typical spread, so the mean of the
  // yearly coldest is put where the formula gives the wanted night.
  return { ...northStation, elevationM, design996C: everydayC, yearlyColdest: coldestFor(onceIn20C) };
}

function coldestFor(onceIn20C: number) {
  // weight 1000/1010 of a zero estimate and 10/1010 of 3 K leave a spread of 0.0297 K; factor for 20 years 1.866.
  const winters = 200;
  const spreadK = (3 * 10) / (winters + 10);
  const meanC = onceIn20C + 1.8658 * spreadK;
  return { meanC, lowestC: meanC, winters };
}

export function shiftedBySixMonths<T>(values: T[]): T[] {
  return [...values.slice(6), ...values.slice(0, 6)];
}

/** The same climate on the other half of the world. */
export function mirrored(station: StationClimate): StationClimate {
  const shift = <T>(values: T[] | null) => (values === null ? null : shiftedBySixMonths(values));
  return {
    ...station,
    latitudeDeg: -station.latitudeDeg,
    meanTempC: shiftedBySixMonths(station.meanTempC),
    maxTempC: shiftedBySixMonths(station.maxTempC),
    minTempC: shiftedBySixMonths(station.minTempC),
    humidityFrac: shift(station.humidityFrac),
    windMS: shift(station.windMS),
    globalKwhM2Day: shift(station.globalKwhM2Day),
    hourlySpreadK: shift(station.hourlySpreadK),
    dailySpreadK: shift(station.dailySpreadK),
  };
}

export function everyMonth(use: Partial<MonthUse>): MonthUse[] {
  return Array.from({ length: 12 }, () => ({
    occupied: true,
    nightSetpointC: 16,
    daySetpointC: 18,
    headCount: 0,
    massKg: 0,
    ...use,
  }));
}

export function typedCover(uValueWM2K: number, solarTransmittance = 0) {
  return { kind: "uValue" as const, name: `U ${uValueWM2K}`, uValueWM2K, solarTransmittance };
}

const film = {
  name: "Clear film",
  resistanceM2KW: 0,
  solarTransmittance: 0.82,
  solarReflectance: 0.11,
  emissivityIn: 0.25,
  emissivityOut: 0.25,
  longwaveTransmittance: 0.65,
};

export const doubleFilm: CoverStack = {
  layers: [film, film],
  gaps: [{ kind: "still", thicknessM: 0.1, coefficientWM2K: 0, airLeakageM3HM2: 0 }],
};

export function stackCover(stack: CoverStack = doubleFilm, solarTransmittance = 0.68) {
  return { kind: "stack" as const, name: "Double film", stack, solarTransmittance };
}

/** A double-film tunnel of 9 × 30 m with a screen and two heaters. */
export function tunnel(change: Partial<HousePlanInput> = {}): HousePlanInput {
  return {
    kind: "greenhouse",
    site: { latitudeDeg: 52, longitudeDeg: 10, elevationM: 100, shelter: "normal", frostHollowK: 0 },
    climate: northStation,
    shape: { type: "roundArch", lengthM: 30, widthM: 9, riseM: 3.6, wallHeightM: 0 },
    ridgeBearingDeg: 90,
    covers: { roof: stackCover(), sideWall: stackCover(), endWall: stackCover() },
    kneewallHeightM: 0,
    screen: null,
    leakageAirChangesPerHour: 0.75,
    floorEdgeLossWMK: 1.38,
    frameAndDirtFrac: 0.85,
    crop: { name: "Tomatoes", sensibleShareFrac: 0.45, humidityFrac: 0.8 },
    stock: null,
    lampsWM2: 0,
    lampHoursPerDay: 0,
    months: everyMonth({}),
    criticalTempC: 5,
    heaters: [
      {
        label: "Unit heater",
        typeId: "unit-fan",
        ratedW: 40_000,
        basis: "input",
        efficiencyFrac: 0.8,
        vented: true,
        burnsFuel: true,
        fuelId: "lpg",
        count: 2,
      },
    ],
    fuel: {
      id: "lpg",
      name: "Propane",
      unit: "L",
      kwhGrossPerUnit: 7.045,
      carbonDioxideKgPerKwh: 0.2145,
    },
    fallbackEfficiencyFrac: 0.8,
    returnPeriodYears: 20,
    everydayPercent: 99.6,
    origins: {},
    ...change,
  };
}

export const energyScreen = {
  name: "Half-aluminised cloth",
  emissivityIn: 0.5,
  emissivityOut: 0.3,
  longwaveTransmittance: 0.1,
  solarTransmittance: 0.4,
  savingFrac: 0.5,
  coverageFrac: 0.95,
  edgeGapM: 0.01,
  opensForSnow: true,
};

/** A heated barn of weaned pigs under a ceiling with a cold attic. */
export function nursery(change: Partial<HousePlanInput> = {}): HousePlanInput {
  return tunnel({
    kind: "barn",
    shape: { type: "atticBarn", lengthM: 20, widthM: 10, eaveHeightM: 2.6, ridgeHeightM: 4.6 },
    covers: {
      roof: typedCover(7),
      sideWall: typedCover(0.4),
      endWall: typedCover(0.4),
      ceiling: typedCover(0.25),
    },
    leakageAirChangesPerHour: 0.3,
    floorEdgeLossWMK: 1,
    crop: null,
    stock: {
      classId: "piglet",
      name: "Weaned pigs",
      ventilation: { mode: "balance", perHeadM3H: 3.4 },
      humidityLimitFrac: 0.7,
      carbonDioxideLimitPpm: 3000,
      heatRecoveryFrac: 0,
    },
    months: everyMonth({ nightSetpointC: 28, daySetpointC: 28, headCount: 500, massKg: 6 }),
    criticalTempC: 20,
    ...change,
  });
}
