import type { BuildingSummary } from "../../../server/contracts/buildings.ts";
import type { PlanView } from "../../../server/contracts/plans.ts";
import type { Quantity } from "../../../server/contracts/quantity.ts";
import type { Survey } from "../../../server/contracts/survey.ts";
import type {
  HouseBalance,
  HouseStateId,
  MonthResult,
  PlanResult,
} from "../../../server/engine/plan/plan-types.ts";

/*
 * An invented plan for tests of what is shown. Its figures are made up, balance by construction
 * and are never compared with the engine.
 */

export const measured = (typed: string, unit: Quantity["unit"]): Quantity => ({
  typed,
  unit,
  origin: "measured",
});
export const typical = (typed: string, unit: Quantity["unit"]): Quantity => ({
  typed,
  unit,
  origin: "default",
});

export function surveyFixture(): Survey {
  return {
    shape: {
      type: "gothicArch",
      length: measured("36", "m"),
      width: measured("9.6", "m"),
      eaveHeight: measured("1.7", "m"),
      ridgeHeight: measured("4.7", "m"),
      roofBow: typical("0.46", "m"),
    },
    ridgeBearing: measured("10", "deg"),
    elevation: typical("12", "m"),
    shelter: { value: "normal", origin: "guess" },
    frostHollow: typical("0", "K"),
    covers: {
      roof: { cover: { value: "double-film", origin: "measured" }, uValue: null },
      sides: { cover: { value: "double-film", origin: "measured" }, uValue: null },
      ends: { cover: { value: "twin-wall", origin: "default" }, uValue: null },
      ceiling: null,
      kneewall: null,
    },
    screen: null,
    leakage: { class: { value: "film-new", origin: "guess" }, airChanges: null },
    floor: { edge: { value: "bare", origin: "default" }, edgeLoss: null },
    use: {
      kind: "greenhouse",
      crop: { value: "tomato", origin: "measured" },
      lamps: measured("0", "WM2"),
      lampHours: measured("0", "h"),
    },
    criticalTemp: measured("6", "C"),
    months: Array.from({ length: 12 }, (_, i) => ({
      occupied: i !== 6,
      nightSetpoint: measured(i < 4 || i > 8 ? "14" : "12", "C"),
      daySetpoint: measured("16", "C"),
      headCount: measured("0", "each"),
      mass: measured("0", "kg"),
    })),
    heaters: [
      {
        label: "Air heater by the door",
        type: { value: "unit-heater", origin: "measured" },
        rating: { typed: "50", unit: "kW", origin: "plate" },
        basis: { value: "input", origin: "plate" },
        efficiency: typical("90", "percent"),
        count: measured("1", "each"),
        fuel: { value: "propane", origin: "measured" },
      },
    ],
    fuel: { value: "propane", origin: "measured" },
    fuelPrice: null,
  };
}

const INSTALLED_W = 45_000;
const FLOOR_M2 = 345.6;
const monthNeedW = [
  63_800, 62_900, 55_700, 47_600, 40_500, 31_900, 25_700, 27_000, 34_100, 45_000, 54_700, 61_200,
];

function balance(month: number, needW: number, outdoorTempC: number, state: HouseStateId): HouseBalance {
  const scale = (state === "snowOnRoof" ? 0.9 : 1) * needW;
  const lossesW = { cover: scale * 0.59, sky: scale * 0.226, air: scale * 0.15, ground: scale * 0.034 };
  const all = lossesW.cover + lossesW.sky + lossesW.air + lossesW.ground;
  const installedHeatW = state === "largestUnitOut" ? 0 : INSTALLED_W;
  const settlesAtC = Math.min(14, outdoorTempC + ((14 - outdoorTempC) * installedHeatW) / all);
  const surface = (surfaceId: string, label: string, role: string, areaM2: number, share: number) => ({
    surfaceId,
    label,
    role,
    areaM2,
    assemblyName: role === "endWall" ? "Twin wall, 8 mm" : "Double film, blown",
    uValueWM2K: ((lossesW.cover + lossesW.sky) * share) / areaM2 / (14 - outdoorTempC),
    lossW: (lossesW.cover + lossesW.sky) * share,
    toAirW: lossesW.cover * share,
    toSkyW: lossesW.sky * share,
    faceTempsC: [4.0, outdoorTempC + 0.4],
    layerNames: ["Inner film", "Outer film"],
    wetInside: role === "roof",
  });
  return {
    month,
    state,
    outdoorTempC,
    skyTempC: outdoorTempC - 18,
    soilTempC: 6.5,
    windMS: 3,
    insideTempC: 14,
    insideHumidityFrac: 0.85,
    lossesW,
    gainsW: { sun: 0, stock: 0, lights: 0 },
    requiredHeatW: all,
    surplusW: 0,
    surfaces: [
      surface("roof-left", "Roof, left side", "roof", 207, 0.37),
      surface("roof-right", "Roof, right side", "roof", 207, 0.37),
      surface("side-left", "Side wall, left", "sideWall", 61, 0.08),
      surface("side-right", "Side wall, right", "sideWall", 61, 0.08),
      surface("end-front", "End wall, front", "endWall", 34, 0.05),
      surface("end-back", "End wall, back", "endWall", 34, 0.05),
    ],
    ventilationM3H: 1230,
    ventilationGoverns: "leakage",
    settlesAtC,
    installedHeatW,
    verdict: settlesAtC >= 14 ? "holds" : settlesAtC >= 6 ? "belowSetpoint" : "belowCritical",
  };
}

function month(index: number): MonthResult {
  const needW = monthNeedW[index] ?? 0;
  const everydayW = needW * 0.78;
  const rareC = -8.5 + Math.min(index, 12 - index) * 2.4;
  const everydayC = rareC + 4;
  const state = (id: HouseStateId, watt: number, outC: number) => balance(index + 1, watt, outC, id);
  const kwh = needW * 0.18;
  return {
    month: index + 1,
    occupied: index !== 6,
    setpointNightC: 14,
    setpointDayC: 16,
    climate: {
      month: index + 1,
      meanTempC: rareC + 11,
      meanMinTempC: rareC + 8,
      meanMaxTempC: rareC + 15,
      humidityFrac: 0.83,
      windMS: 3,
      globalKwhM2Day: 1 + Math.min(index, 12 - index) * 0.8,
      everydayDesignC: everydayC,
      onceInYearsDesignC: rareC,
      origins: {},
    },
    everyday: {
      screensShut: state("screensShut", everydayW, everydayC),
      largestUnitOut: state("largestUnitOut", everydayW, everydayC),
    },
    onceInYears: {
      screensShut: state("screensShut", needW, rareC),
      snowOnRoof: state("snowOnRoof", needW, rareC),
      largestUnitOut: state("largestUnitOut", needW, rareC),
    },
    everydayRequiredW: everydayW,
    onceInYearsRequiredW: needW,
    energy: {
      heaterKwh: kwh,
      lossesKwh: { cover: kwh * 0.8, sky: kwh * 0.3, air: kwh * 0.25, ground: kwh * 0.05 },
      gainsKwh: { sun: kwh * 0.4, stock: 0, lights: 0 },
      ventedSurplusKwh: 0,
      unmetKwh: 0,
      heatingHours: 400,
      hoursBelowSetpoint: 12,
      wetCoverHours: 210,
      heaterByHourW: Array.from({ length: 24 }, () => needW * 0.25),
      outdoorByHourC: Array.from({ length: 24 }, () => rareC + 11),
    },
  };
}

export function resultFixture(): PlanResult {
  const needW = monthNeedW[0] ?? 0;
  return {
    engineVersion: "0.0.0-test",
    returnPeriodYears: 20,
    everydayPercent: 99.6,
    geometry: { floorAreaM2: FLOOR_M2, volumeM3: 1230, perimeterM: 91.2, coverAreaM2: 605 },
    station: {
      id: "ness",
      name: "Ness of Keld",
      distanceKm: 18,
      heightDifferenceM: -32,
      siteCorrectionK: -0.8,
      reasons: ["The house lies 32 m higher than the station: 0.2 K colder.", "Frost hollow: 0.6 K colder."],
    },
    months: Array.from({ length: 12 }, (_, i) => month(i)),
    sizing: {
      everydayMonth: 1,
      everydayRequiredW: needW * 0.78,
      onceInYearsMonth: 1,
      onceInYearsRequiredW: needW,
      marginFrac: 0.1,
      targetW: needW * 1.1,
      installedW: INSTALLED_W,
      verdictEveryday: "belowSetpoint",
      verdictOnceInYears: "belowSetpoint",
      settlesAtEverydayC: 13,
      settlesAtOnceInYearsC: 7.9,
      largestUnitOutSettlesAtC: -8.5,
      hoursToCriticalLow: 0.9,
      hoursToCriticalHigh: 1.6,
      options: [
        option(
          "keep",
          "Keep the 45 kW as it is",
          [[45_000, true]],
          "On a cold night the house falls below what is wanted.",
        ),
        option(
          "add-25",
          "Keep the 45, add a 25",
          [
            [45_000, true],
            [25_000, false],
          ],
          "Covers the coldest night, but not if the 45 stops.",
        ),
        option(
          "add-40",
          "Keep the 45, add a 40",
          [
            [45_000, true],
            [40_000, false],
          ],
          "Covers the coldest night. Either heater alone keeps the crop.",
        ),
        option(
          "new-70",
          "One new 70 instead",
          [[70_000, false]],
          "Covers the coldest night. Nothing left if it stops.",
        ),
      ],
      noHeaterReason: null,
    },
    annual: {
      heaterKwh: 99_000,
      heaterKwhM2: 286,
      unmetKwh: 0,
      fuelId: "propane",
      fuelKwhGross: 110_000,
      fuelAmount: 15_400,
      fuelUnit: "L",
      carbonDioxideKg: 25_000,
    },
    assumptions: [
      {
        field: "shape.roofBow",
        label: "Roof bow",
        value: 0.46,
        unit: "m",
        origin: "default",
        source: "common practice",
      },
      {
        field: "covers.roof.cover",
        label: "Roof cover",
        value: "Double film, blown",
        unit: "",
        origin: "measured",
        source: "library of covers",
      },
      {
        field: "leakage.class",
        label: "Tightness",
        value: "New film",
        unit: "",
        origin: "guess",
        source: "library of tightness",
      },
      {
        field: "floor.edge",
        label: "Edge of the floor",
        value: 1.1,
        unit: "WMK",
        origin: "default",
        source: "library of floor edges",
      },
    ],
    warnings: [
      {
        code: "wet",
        severity: "note",
        message: "The inner film is wet on most nights.",
        action: "Expect drips on the row under the ridge.",
      },
      {
        code: "short",
        severity: "caution",
        message: "19 kW is missing on the coldest night.",
        action: "Choose more heat or a better cover.",
        field: "heaters",
      },
    ],
  };
}

function option(id: string, title: string, heaters: [number, boolean][], note: string) {
  const totalW = heaters.reduce((sum, [watt]) => sum + watt, 0);
  const needW = monthNeedW[0] ?? 0;
  return {
    id,
    title,
    units: heaters.map(([outputW, existing]) => ({
      outputW,
      count: 1,
      existing,
      label: existing ? "Air heater" : "New",
    })),
    totalW,
    spareW: totalW - needW,
    holdsEveryday: totalW > needW * 0.78,
    holdsOnceInYears: totalW >= needW,
    largestUnitOutSettlesAtC: heaters.length > 1 ? 6.2 : -8.5,
    largestUnitOutAboveCritical: heaters.length > 1,
    note,
  };
}

export function buildingFixture(): BuildingSummary {
  return {
    id: "b1",
    farmId: "f1",
    farmName: "Low Sallow",
    name: "Tunnel 2",
    kind: "greenhouse",
    shapeType: "gothicArch",
    latitudeDeg: 54.4,
    longitudeDeg: -0.6,
    ridgeBearingDeg: 10,
    lengthM: 36,
    widthM: 9.6,
    floorAreaM2: FLOOR_M2,
    outline: [
      { x: -4.8, y: 0 },
      { x: -4.8, y: 1.7 },
      { x: -2.6, y: 3.7 },
      { x: 0, y: 4.7 },
      { x: 2.6, y: 3.7 },
      { x: 4.8, y: 1.7 },
      { x: 4.8, y: 0 },
    ],
    answered: 31,
    questions: 34,
    plan: null,
  };
}

export function planFixture(change: Partial<PlanView> = {}): PlanView {
  return {
    id: "p1",
    number: 12,
    buildingId: "b1",
    building: buildingFixture(),
    status: "sent",
    createdAt: "2026-11-24T16:10:00.000Z",
    createdBy: "Marit Oldroyd",
    sentAt: "2026-11-24T16:30:00.000Z",
    answeredAt: null,
    answeredBy: null,
    changeableUntil: null,
    outdated: false,
    choices: { returnPeriodYears: 20, everydayPercent: 99.6 },
    proposedOptionId: "add-40",
    survey: surveyFixture(),
    result: resultFixture(),
    messages: [
      {
        id: "m1",
        authorName: "Tomas Wray",
        authorRole: "farmer",
        mine: true,
        text: "Could I just buy one big heater and scrap the old one?",
        answer: "ask",
        sentAt: "2026-11-25T08:00:00.000Z",
      },
      {
        id: "m2",
        authorName: "Marit Oldroyd",
        authorRole: "advisor",
        mine: false,
        text: "You could. If it stops you have nothing. Two heaters cover each other.",
        answer: null,
        sentAt: "2026-11-25T15:00:00.000Z",
      },
    ],
    advisor: { name: "Marit Oldroyd", email: "marit@example.org" },
    can: { send: false, answer: true, write: true },
    ...change,
  };
}
