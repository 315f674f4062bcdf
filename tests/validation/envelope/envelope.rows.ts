import { airLayerM2KW } from "../../../server/engine/envelope/air-layer.ts";
import { bridgedConduction } from "../../../server/engine/envelope/bridged-conduction.ts";
import { insideConvectionWM2K, outsideConvectionWM2K } from "../../../server/engine/envelope/convection.ts";
import { solveCoverBalance } from "../../../server/engine/envelope/cover-balance.ts";
import type { CoverLayer } from "../../../server/engine/envelope/cover-types.ts";
import { layeredConduction } from "../../../server/engine/envelope/layered-conduction.ts";
import {
  blackBodyWM2,
  parallelPlatesWM2,
  radiativeBalanceTempC,
} from "../../../server/engine/envelope/longwave.ts";
import {
  type SkyModel,
  skyEmissivity,
  skyTemperatureC,
  skyTempFromEmissivityC,
  viewFactors,
} from "../../../server/engine/envelope/sky.ts";
import { insideSurfaceM2KW, outsideSurfaceM2KW } from "../../../server/engine/envelope/surface-resistance.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "Envelope";

const ISO = "ISO 6946:2017, formulas of the annex evaluated by hand";
const ISO_TABLE = "ISO 6946:2017, table of unventilated air layers (DIN EN ISO 6946 extract, 100gon.de)";
const NETWORK = "radiosity network of grey plates solved independently with a general root finder, 2026";
const SKY = "each author's published formula evaluated by hand";

const film = (
  longwaveTransmittance: number,
  emissivityIn: number,
  emissivityOut = emissivityIn,
): CoverLayer => ({
  name: "layer",
  resistanceM2KW: 0,
  solarTransmittance: 0,
  solarReflectance: 0,
  emissivityIn,
  emissivityOut,
  longwaveTransmittance,
});

/** 16 °C inside, 0 °C outside, black sky of −20 °C overhead, fixed coefficients. */
function reference(layers: CoverLayer[], windCoefficient = 14.8, skyC = -20) {
  return solveCoverBalance(
    {
      layers,
      gaps: layers
        .slice(1)
        .map(() => ({ kind: "fixed" as const, thicknessM: 0.1, coefficientWM2K: 2, airLeakageM3HM2: 0 })),
    },
    {
      insideAirC: 16,
      insideRadiantC: 16,
      outsideAirC: 0,
      skyC,
      groundC: 0,
      skyViewFrac: 1,
      tiltDeg: 0,
      outsideCoefficientWM2K: windCoefficient,
      insideCoefficientWM2K: 3,
    },
  );
}

const covers: [name: string, layers: CoverLayer[], fluxWM2: number, innerC: number][] = [
  ["glass", [film(0, 0.84)], 101.426, 1.704],
  ["dry polyethylene", [film(0.75, 0.2)], 171.016, 2.349],
  ["infrared polyethylene", [film(0.3, 0.63)], 132.526, 1.846],
  ["polyethylene wet inside", [film(0.02, 0.93, 0.9)], 110.349, 1.718],
  ["two polyethylene films", [film(0.75, 0.2), film(0.75, 0.2)], 133.165, 7.572],
  ["infrared film inside polyethylene", [film(0.3, 0.63), film(0.75, 0.2)], 105.622, 5.323],
  ["wet film inside polyethylene", [film(0.02, 0.93, 0.9), film(0.75, 0.2)], 88.13, 4.731],
  ["two panes", [film(0, 0.84), film(0, 0.84)], 52.802, 8.714],
  ["polyester screen under glass", [film(0.15, 0.7), film(0, 0.84)], 57.446, 8.894],
  ["aluminised screen, bright side up, under glass", [film(0, 0.45, 0.08), film(0, 0.84)], 29.859, 10.41],
  ["aluminised screen, bright side down, under glass", [film(0, 0.08, 0.45), film(0, 0.84)], 32.951, 6.352],
  ["aluminised screen under polyethylene", [film(0, 0.45, 0.08), film(0.75, 0.2)], 30.564, 10.276],
];

const skies: [air: number, dew: number, Record<SkyModel, number | null>][] = [
  [
    20,
    10,
    {
      swinbank: 0.7979,
      brunt: 0.7478,
      brutsaert: 0.7881,
      berdahlFromberg: 0.803,
      berdahlMartin: 0.7743,
      clarkAllen: 0.8149,
      prata: 0.7926,
      idsoJackson: null,
    },
  ],
  [
    0,
    -3,
    {
      swinbank: 0.6927,
      brunt: 0.6638,
      brutsaert: 0.6981,
      berdahlFromberg: 0.7224,
      berdahlMartin: 0.6949,
      clarkAllen: 0.779,
      prata: 0.7322,
      idsoJackson: null,
    },
  ],
  [
    -20,
    -23,
    {
      swinbank: 0.595,
      brunt: 0.5836,
      brutsaert: 0.5589,
      berdahlFromberg: 0.5984,
      berdahlMartin: 0.6208,
      clarkAllen: 0.7202,
      prata: 0.6841,
      idsoJackson: null,
    },
  ],
];

const studWall = bridgedConduction({
  layers: [
    { thicknessM: 0.012, conductivityWMK: 0.13 },
    {
      parts: [
        { areaFrac: 0.15, layer: { thicknessM: 0.14, conductivityWMK: 0.13 } },
        { areaFrac: 0.85, layer: { thicknessM: 0.14, conductivityWMK: 0.035 } },
      ],
    },
    { thicknessM: 0.0125, conductivityWMK: 0.25 },
  ],
  insideSurfaceM2KW: 0.13,
  outsideSurfaceM2KW: 0.04,
});

const wall = layeredConduction({
  layers: [
    { thicknessM: 0.012, conductivityWMK: 0.13 },
    { thicknessM: 0.14, conductivityWMK: 0.035 },
    { resistanceM2KW: 0.18 },
    { thicknessM: 0.1025, conductivityWMK: 0.77 },
  ],
  insideSurfaceM2KW: 0.13,
  outsideSurfaceM2KW: 0.04,
  insideTempC: 20,
  outsideTempC: 0,
});

const wetGlass = solveCoverBalance(
  { layers: [film(0, 0.84)], gaps: [] },
  {
    insideAirC: 16,
    insideRadiantC: 16,
    outsideAirC: 0,
    skyC: -20,
    groundC: 0,
    skyViewFrac: 1,
    tiltDeg: 0,
    outsideCoefficientWM2K: 14.8,
    insideCoefficientWM2K: 3,
    vapourPressurePa: 1545.5,
  },
);

export const rows: CheckRow[] = [
  ...covers.flatMap(([name, layers, flux, inner]): CheckRow[] => {
    const balance = reference(layers);
    return [
      {
        quantity: `Loss through ${name}, W/m²`,
        source: NETWORK,
        computed: balance.fromRoomWM2,
        expected: flux,
        tolerance: 0.002,
      },
      {
        quantity: `Inner face of ${name}, °C`,
        source: NETWORK,
        computed: balance.faceTempsC[0] ?? Number.NaN,
        expected: inner,
        tolerance: digits(3),
      },
    ];
  }),
  ...(
    [
      [2.8, 5.699],
      [8.8, 6.117],
      [26.8, 6.57],
    ] as const
  ).map(([coefficient, expected]) => ({
    quantity: `U-value of glass, outside ${coefficient} W/(m² K)`,
    source: NETWORK,
    computed: reference([film(0, 0.84)], coefficient).uValueWM2K,
    expected,
    tolerance: digits(3),
  })),
  ...(
    [
      [0, 5.18],
      [-10, 5.794],
    ] as const
  ).map(([skyC, expected]) => ({
    quantity: `U-value of glass, sky ${skyC} °C`,
    source: NETWORK,
    computed: reference([film(0, 0.84)], 14.8, skyC).uValueWM2K,
    expected,
    tolerance: digits(3),
  })),
  {
    quantity: "Wet glass: face warmed by condensing water, °C",
    source: "Lewis relation 6.4e-9, coupled balance solved by hand",
    computed: wetGlass.faceTempsC[0] ?? Number.NaN,
    expected: 3.137,
    tolerance: digits(3),
  },
  {
    quantity: "Wet glass: heat of condensing water, W/m²",
    source: "as above",
    computed: wetGlass.fromRoomLatentWM2,
    expected: 36.71,
    tolerance: 0.02,
  },
  ...skies.flatMap(([air, dew, models]) =>
    Object.entries(models).flatMap(([model, expected]): CheckRow[] =>
      expected === null
        ? []
        : [
            {
              quantity: `Clear sky, ${model}, air ${air} °C, dew ${dew} °C`,
              source: SKY,
              computed: skyEmissivity({ airTempC: air, dewPointC: dew, model: model as SkyModel }),
              expected,
              tolerance: 0.0002,
            },
          ],
    ),
  ),
  {
    quantity: "Sky temperature of Swinbank at 20 °C, °C",
    source: "Swinbank 1963, 0.0552 T^1.5",
    computed: skyTempFromEmissivityC(20, skyEmissivity({ airTempC: 20, dewPointC: 10, model: "swinbank" })),
    expected: 3.91,
    tolerance: digits(1),
  },
  ...(
    [
      [0, -23.76],
      [0.25, -18.2],
      [0.5, -12.98],
      [0.75, -8.06],
      [1, -3.4],
    ] as const
  ).map(([cloudFrac, expected]) => ({
    quantity: `Sky over air of 0 °C, dew −3 °C, cloud ${cloudFrac}, °C`,
    source: "Berdahl and Martin 1984 with Unsworth and Monteith 1975, by hand",
    computed: skyTemperatureC({ airTempC: 0, dewPointC: -3, cloudFrac }),
    expected,
    tolerance: 0.02,
  })),
  {
    quantity: "View of the sky at 26.57° tilt",
    source: "(1 + cos tilt) / 2",
    computed: viewFactors(26.57).skyFrac,
    expected: 0.94719,
    tolerance: 0.00002,
  },
  {
    quantity: "Sky share at 30°, horizon given to the air",
    source: "Walton 1983",
    computed: viewFactors(30, "walton").skyFrac,
    expected: 0.90122,
    tolerance: digits(5),
  },
  {
    quantity: "Sky share upright, horizon given to the air",
    source: "Walton 1983",
    computed: viewFactors(90, "walton").skyFrac,
    expected: 0.35355,
    tolerance: digits(5),
  },
  ...(
    [
      ["iso6946", 2, 12],
      ["mcAdams", 2, 13.3],
      ["mcAdams", 8, 32.76],
      ["watmuff", 4, 14.8],
      ["garzoliBlackwell", 6, 30.24],
      ["papadakis", 4, 14.28],
      ["bot", 2, 5.2],
      ["bot", 6, 10.48],
    ] as const
  ).map(([model, wind, expected]) => ({
    quantity: `Outside convection, ${model}, ${wind} m/s, W/(m² K)`,
    source: "the author's published formula, by hand",
    computed: outsideConvectionWM2K(wind, model),
    expected,
    tolerance: digits(2),
  })),
  {
    quantity: "Inside convection under a flat cold roof, 10 K, W/(m² K)",
    source: "Walton 1983, 9.482/(7.283 - 1) ΔT^1/3",
    computed: insideConvectionWM2K(10, 0),
    expected: 3.251,
    tolerance: 0.002,
  },
  {
    quantity: "Inside convection at a wall, 10 K, W/(m² K)",
    source: "Walton 1983, 1.31 ΔT^1/3 (printed to two decimals)",
    computed: insideConvectionWM2K(10, 90),
    expected: 1.31 * 10 ** (1 / 3),
    tolerance: within(2.82, 0.01),
  },
  ...(
    [
      ["up", 0.0986],
      ["horizontal", 0.1308],
      ["down", 0.1712],
    ] as const
  ).map(([direction, expected]) => ({
    quantity: `Inner surface, heat ${direction}, m² K/W`,
    source: ISO,
    computed: insideSurfaceM2KW(direction),
    expected,
    tolerance: digits(4),
  })),
  ...(
    [
      [1, 0.0822],
      [4, 0.0414],
      [10, 0.0208],
    ] as const
  ).map(([wind, expected]) => ({
    quantity: `Outer surface, ${wind} m/s, m² K/W`,
    source: ISO,
    computed: outsideSurfaceM2KW(wind),
    expected,
    tolerance: digits(4),
  })),
  ...(
    [
      ["up", 10, 0.15],
      ["up", 25, 0.16],
      ["up", 300, 0.16],
      ["horizontal", 15, 0.17],
      ["horizontal", 50, 0.18],
      ["down", 50, 0.21],
      ["down", 100, 0.22],
      ["down", 300, 0.23],
    ] as const
  ).map(([direction, millimetres, expected]) => ({
    quantity: `Air layer ${millimetres} mm, heat ${direction}, m² K/W`,
    source: ISO_TABLE,
    computed: airLayerM2KW({ thicknessM: millimetres / 1000, direction }),
    expected,
    tolerance: digits(2),
  })),
  {
    quantity: "Air layer 20 mm with one bright face, horizontal, m² K/W",
    source: ISO,
    computed: airLayerM2KW({ thicknessM: 0.02, direction: "horizontal", emissivity1: 0.05 }),
    expected: 0.664,
    tolerance: digits(4),
  },
  {
    quantity: "Air layer 16 mm across 20 K, horizontal, m² K/W",
    source: ISO,
    computed: airLayerM2KW({ thicknessM: 0.016, direction: "horizontal", differenceK: 20 }),
    expected: 0.1614,
    tolerance: digits(4),
  },
  {
    quantity: "Wall of boards, wool, cavity and brick, U",
    source: ISO,
    computed: wall.uValueWM2K,
    expected: 0.2186,
    tolerance: digits(4),
  },
  {
    quantity: "Stud wall, upper limit, m² K/W",
    source: ISO,
    computed: studWall.upperM2KW,
    expected: 3.2778,
    tolerance: digits(4),
  },
  {
    quantity: "Stud wall, lower limit, m² K/W",
    source: ISO,
    computed: studWall.lowerM2KW,
    expected: 3.1549,
    tolerance: digits(4),
  },
  {
    quantity: "Stud wall, U",
    source: ISO,
    computed: studWall.uValueWM2K,
    expected: 0.3109,
    tolerance: digits(4),
  },
  {
    quantity: "Black body at 20 °C, W/m²",
    source: "CODATA 2018 constants",
    computed: blackBodyWM2(20),
    expected: 418.766,
    tolerance: digits(3),
  },
  {
    quantity: "Parallel plates 20 / 0 °C, emissivity 0.9, W/m²",
    source: "fourth-power law, by hand",
    computed: parallelPlatesWM2(20, 0.9, 0, 0.9),
    expected: 84.3612,
    tolerance: digits(3),
  },
  {
    quantity: "The same with one bright screen, W/m²",
    source: "fourth-power law, by hand",
    computed: parallelPlatesWM2(20, 0.9, 0, 0.9, [{ emissivity1: 0.05, emissivity2: 0.05 }]),
    expected: 2.5635,
    tolerance: digits(4),
  },
  {
    quantity: "Grey ball in sunlight of 1361 W/m², albedo 0.30, K",
    source: "balance of the sunlit earth, textbook value 254.58 K",
    computed: radiativeBalanceTempC(1361, 0.7) + 273.15,
    expected: 254.58,
    tolerance: digits(2),
  },
];
