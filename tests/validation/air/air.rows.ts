import {
  airHeatCapacityWhM3K,
  dewPointC,
  enthalpyKjKg,
  evaporationHeatKjKg,
  humidityRatio,
  pressureAtAltitudePa,
  specificVolumeM3Kg,
} from "../../../server/engine/air/moist-air.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "Moist air";

const TABLE =
  "ASHRAE Fundamentals 2017, ch. 1 formulas, evaluated with the psychrometric library PsychroLib 2.5";
const STANDARD = "ASHRAE Fundamentals 2017, ch. 1, standard atmosphere";

const states = [
  [20, 0.6, 8.734, 0.8421, 42.29, 12.01],
  [15, 0.75, 7.952, 0.8267, 35.2, 10.61],
  [30, 0.6, 16.041, 0.8809, 71.19, 21.39],
  [-25, 1, 0.389, 0.7034, -24.2, -25],
  [-10, 0.9, 1.439, 0.7472, -6.49, -11.18],
  [0, 0.9, 3.395, 0.778, 8.49, -1.27],
] as const;

export const rows: CheckRow[] = [
  ...states.flatMap(([tempC, humidity, water, volume, heat, dew]): CheckRow[] => {
    const ratio = humidityRatio(tempC, humidity);
    const at = `${tempC} °C, ${100 * humidity} %`;
    return [
      {
        quantity: `Water in air of ${at}, g/kg`,
        source: TABLE,
        computed: 1000 * ratio,
        expected: water,
        tolerance: digits(3),
      },
      {
        quantity: `Volume of air of ${at}, m³/kg`,
        source: TABLE,
        computed: specificVolumeM3Kg(tempC, ratio),
        expected: volume,
        tolerance: digits(4),
      },
      {
        quantity: `Heat of air of ${at}, kJ/kg`,
        source: TABLE,
        computed: enthalpyKjKg(tempC, ratio),
        expected: heat,
        tolerance: digits(2),
      },
      {
        quantity: `Dew point of air of ${at}, °C`,
        source: TABLE,
        computed: dewPointC(tempC, humidity),
        expected: dew,
        tolerance: digits(2),
      },
    ];
  }),
  ...(
    [
      [0, 101_325],
      [500, 95_461],
      [1000, 89_875],
      [1500, 84_556],
    ] as const
  ).map(([altitude, expected]) => ({
    quantity: `Pressure at ${altitude} m, Pa`,
    source: STANDARD,
    computed: pressureAtAltitudePa(altitude),
    expected,
    tolerance: digits(0),
  })),
  {
    quantity: "Heat to warm 1 m³ of dry air at 20 °C by 1 K, Wh",
    source: "1.2 kg/m³ × 1006 J/(kg K) / 3600, common engineering value",
    computed: airHeatCapacityWhM3K(20),
    expected: 0.3353,
    tolerance: within(0.3353, 0.005),
  },
  {
    quantity: "Heat of evaporation at 18 °C, kJ/kg",
    source: "2501 - 2.361 t, ASHRAE Fundamentals 2017 (from memory)",
    computed: evaporationHeatKjKg(18),
    expected: 2458.5,
    tolerance: digits(1),
  },
];
