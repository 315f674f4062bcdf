import { absoluteAirMass, relativeAirMass } from "../../../server/engine/solar/air-mass.ts";
import { haurwitzWM2, ineichenPerez } from "../../../server/engine/solar/clear-sky.ts";
import {
  diffuseShareErbs,
  diffuseShareMonthly,
  diffuseShareOrgillHollands,
  hourShareOfDay,
} from "../../../server/engine/solar/decomposition.ts";
import {
  dailyExtraterrestrialKwhM2,
  declinationDeg,
  distanceFactor,
  equationOfTimeMin,
  sunsetHourAngleDeg,
} from "../../../server/engine/solar/extraterrestrial.ts";
import { incidenceCosine } from "../../../server/engine/solar/incidence.ts";
import { sunPosition } from "../../../server/engine/solar/sun-position.ts";
import { diffuseModels, planeIrradiance } from "../../../server/engine/solar/transposition.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "Sun";

const SPA = "Reda and Andreas 2008, NREL SPA example, without refraction";
const EPHEMERIS = "astronomy-engine 2.1.19, unrefracted";
const SPENCER = "Spencer 1971 series; day 1 as in the NREL Bird workbook";
const DB = "Duffie and Beckman, Solar engineering of thermal processes";
const PVLIB = "pvlib-python, test values, commit 6382338";

const spa = sunPosition(Date.UTC(2003, 9, 17, 19, 30, 30), 39.742476, -105.1786);
const places: [string, number, number, number, number, number][] = [
  ["Warsaw, 15 January 2024 11:00 UTC", Date.UTC(2024, 0, 15, 11), 52.2297, 21.0122, 16.5256, 183.6074],
  ["Greenwich, 21 June 2024 12:00 UTC", Date.UTC(2024, 5, 21, 12), 51.4779, 0, 61.9556, 179.0626],
  [
    "Helsinki, 21 December 2024 10:30 UTC",
    Date.UTC(2024, 11, 21, 10, 30),
    60.1699,
    24.9384,
    6.3562,
    182.6522,
  ],
  ["Madrid, 20 March 2025 08:00 UTC", Date.UTC(2025, 2, 20, 8), 40.4168, -3.7038, 18.3499, 106.4332],
  ["52 N 4.3 E, 22 September 2025 15:00 UTC", Date.UTC(2025, 8, 22, 15), 52, 4.3, 22.7609, 237.6284],
];
const days: [number, number, number, number][] = [
  [1, -23.0586, -2.9196, 1.03505],
  [80, -0.0659, -7.8736, 1.0079],
  [172, 23.452, -1.3437, 0.96744],
  [355, -23.4199, 2.1551, 1.03412],
];
const flat = {
  ghiWM2: 1042.48031487,
  dniWM2: 939.95469881,
  dhiWM2: 118.45831879,
  extraterrestrialWM2: 1321.16558348,
};
const high = { elevationDeg: 90 - 10.56413562, azimuthDeg: 144.76567754 };
const tilted = {
  isotropic: 104.6013,
  hayDavies: 102.9949,
  reindl: 104.1317,
  klucher: 109.2093,
  perez: 109.0843,
};
const clear = ineichenPerez({
  zenithDeg: 10,
  airMass: 1,
  linkeTurbidity: 3,
  altitudeM: 0,
  extraterrestrialWM2: 1364,
});
const low = ineichenPerez({
  zenithDeg: 46.0468,
  airMass: 1.32355,
  linkeTurbidity: 3,
  altitudeM: 2000,
  extraterrestrialWM2: 1364,
});

/** Elevation and azimuth of a sun of a given declination and hour angle, for the textbook incidence example. */
function textbookSun(latitude: number, declination: number, hourAngle: number) {
  const rad = Math.PI / 180;
  const sine =
    Math.sin(latitude * rad) * Math.sin(declination * rad) +
    Math.cos(latitude * rad) * Math.cos(declination * rad) * Math.cos(hourAngle * rad);
  const elevation = Math.asin(sine);
  const cosAzimuth =
    (Math.sin(declination * rad) - sine * Math.sin(latitude * rad)) /
    (Math.cos(elevation) * Math.cos(latitude * rad));
  const azimuth = Math.acos(cosAzimuth) / rad;
  return { elevationDeg: elevation / rad, azimuthDeg: hourAngle < 0 ? azimuth : 360 - azimuth };
}

export const rows: CheckRow[] = [
  {
    quantity: "SPA example, elevation, °",
    source: SPA,
    computed: spa.elevationDeg,
    expected: 39.872046,
    tolerance: 0.01,
  },
  {
    quantity: "SPA example, azimuth, °",
    source: SPA,
    computed: spa.azimuthDeg,
    expected: 194.340241,
    tolerance: 0.01,
  },
  ...places.flatMap(([name, time, latitude, longitude, elevation, azimuth]): CheckRow[] => {
    const sun = sunPosition(time, latitude, longitude);
    return [
      {
        quantity: `${name}, elevation, °`,
        source: EPHEMERIS,
        computed: sun.elevationDeg,
        expected: elevation,
        tolerance: 0.02,
      },
      {
        quantity: `${name}, azimuth, °`,
        source: EPHEMERIS,
        computed: sun.azimuthDeg,
        expected: azimuth,
        tolerance: 0.02,
      },
    ];
  }),
  ...days.flatMap(([day, declination, minutes, factor]): CheckRow[] => [
    {
      quantity: `Declination, day ${day}, °`,
      source: SPENCER,
      computed: declinationDeg(day),
      expected: declination,
      tolerance: digits(4),
    },
    {
      quantity: `Equation of time, day ${day}, min`,
      source: SPENCER,
      computed: equationOfTimeMin(day),
      expected: minutes,
      tolerance: 0.001,
    },
    {
      quantity: `Distance factor, day ${day}`,
      source: SPENCER,
      computed: distanceFactor(day),
      expected: factor,
      tolerance: digits(5),
    },
  ]),
  {
    quantity: "Sun outside the air, 43° N, 15 April, MJ/m²",
    source: `${DB}, example 1.10.1`,
    computed: 3.6 * dailyExtraterrestrialKwhM2(43, 105, 1367),
    expected: 33.8,
    tolerance: within(33.8, 0.005),
  },
  {
    quantity: "Sun outside the air, 20° S, 3 September, MJ/m²",
    source: "Allen et al. 1998, FAO 56, example 8",
    computed: 3.6 * dailyExtraterrestrialKwhM2(-20, 246, 1367),
    expected: 32.2,
    tolerance: within(32.2, 0.02),
    remark: "FAO 56 takes a declination of 0.120 rad where the Spencer series gives 0.137",
  },
  {
    quantity: "Hour angle of sunset, 43° N, 15 April, °",
    source: `${DB}, example 1.10.1`,
    computed: sunsetHourAngleDeg(43, declinationDeg(105)),
    expected: 98.9,
    tolerance: 0.1,
  },
  {
    quantity: "Incidence on a plane of 45°, 15° west of south, 43° N, 13 February 10:30, °",
    source: `${DB}, example 1.6.1`,
    computed: (Math.acos(incidenceCosine(textbookSun(43, -14, -22.5), 45, 195)) * 180) / Math.PI,
    expected: 35,
    tolerance: 0.3,
  },
  {
    quantity: "Air mass at 60°",
    source: "Kasten and Young 1989",
    computed: relativeAirMass(60),
    expected: 1.99429,
    tolerance: digits(5),
  },
  {
    quantity: "Air mass at 80°",
    source: "Kasten and Young 1989",
    computed: relativeAirMass(80),
    expected: 5.58604,
    tolerance: digits(5),
  },
  {
    quantity: "Air mass 2 at 84 556 Pa",
    source: "definition",
    computed: absoluteAirMass(2, 84_556),
    expected: 1.669,
    tolerance: digits(3),
  },
  {
    quantity: "Haurwitz, 30° up, W/m²",
    source: PVLIB,
    computed: haurwitzWM2(30),
    expected: 487.894,
    tolerance: digits(3),
  },
  {
    quantity: "Haurwitz, 90° up, W/m²",
    source: PVLIB,
    computed: haurwitzWM2(90),
    expected: 1035.092,
    tolerance: digits(3),
  },
  {
    quantity: "Ineichen and Perez, global, W/m²",
    source: PVLIB,
    computed: clear.ghiWM2,
    expected: 1038.159,
    tolerance: digits(2),
  },
  {
    quantity: "Ineichen and Perez, beam, W/m²",
    source: PVLIB,
    computed: clear.dniWM2,
    expected: 942.208,
    tolerance: digits(2),
  },
  {
    quantity: "Ineichen and Perez, diffuse, W/m²",
    source: PVLIB,
    computed: clear.dhiWM2,
    expected: 110.265,
    tolerance: digits(2),
  },
  {
    quantity: "Ineichen and Perez at 2000 m, beam over global",
    source: "the beam may not pass the global",
    computed: Math.min(1, (low.dniWM2 * Math.cos((46.0468 * Math.PI) / 180)) / low.ghiWM2),
    expected: 0.9,
    tolerance: 0.1,
  },
  ...(
    [
      [0.1, 0.991, 0.9751],
      [0.3, 0.9486, 0.9253],
      [0.5, 0.6591, 0.637],
      [0.65, 0.3336, 0.361],
      [0.8, 0.1653, 0.177],
    ] as const
  ).flatMap(([clearness, erbs, orgill]): CheckRow[] => [
    {
      quantity: `Diffuse share at clearness ${clearness}`,
      source: "Erbs, Klein and Duffie 1982",
      computed: diffuseShareErbs(clearness),
      expected: erbs,
      tolerance: digits(4),
    },
    {
      quantity: `Diffuse share at clearness ${clearness}, second formula`,
      source: "Orgill and Hollands 1977",
      computed: diffuseShareOrgillHollands(clearness),
      expected: orgill,
      tolerance: digits(4),
    },
  ]),
  {
    quantity: "Monthly diffuse share, clearness 0.5, winter",
    source: "Erbs et al. 1982",
    computed: diffuseShareMonthly(0.5, 70),
    expected: 0.3911,
    tolerance: digits(4),
  },
  {
    quantity: "Monthly diffuse share, clearness 0.5, summer",
    source: "Erbs et al. 1982",
    computed: diffuseShareMonthly(0.5, 100),
    expected: 0.4291,
    tolerance: digits(4),
  },
  {
    quantity: "Share of a day's sun from 13 to 14 h, 43° N, day 235",
    source: "Collares-Pereira and Rabl 1979, by hand",
    computed: hourShareOfDay(22.5, 100.49),
    expected: 0.11773,
    tolerance: digits(5),
  },
  ...diffuseModels.map((model) => ({
    quantity: `Sky diffuse on 40° south, ${model}, W/m²`,
    source: PVLIB,
    computed: planeIrradiance(flat, high, { tiltDeg: 40, azimuthDeg: 180, model }).skyDiffuseWM2,
    expected: tilted[model],
    tolerance: 0.001,
  })),
];
