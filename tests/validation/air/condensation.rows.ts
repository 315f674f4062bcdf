import { dryLimit, insideFaceTempC } from "../../../server/engine/air/condensation.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "Condensation";

const SOURCE = "Least resistance from the dew point (EN ISO 13788 method), dew points by PsychroLib 2.5";
const M2KW_IN_IP = 5.678263;

/** Inside °C, humidity, outside °C, inside film; dew point °C, least resistance m²K/W and h·ft²·°F/Btu, face factor. */
const rooms = [
  [20, 0.75, -20, 0.12, 15.44, 1.052, 5.97, 0.886],
  [15, 0.8, -25, 0.12, 11.58, 1.404, 7.97, 0.915],
  [24, 0.65, -15, 0.13, 17.02, 0.726, 4.12, 0.821],
  [30, 0.6, -10, 0.13, 21.39, 0.604, 3.43, 0.785],
] as const;

export const rows: CheckRow[] = [
  ...rooms.flatMap(([insideTempC, humidityFrac, outdoorTempC, film, dew, least, leastIp, factor]) => {
    const limit = dryLimit({ insideTempC, humidityFrac, outdoorTempC }, film);
    const at = `${insideTempC} °C, ${100 * humidityFrac} %, ${outdoorTempC} °C outside`;
    const row = (what: string, computed: number, expected: number, tolerance: number): CheckRow => ({
      quantity: `${what}, ${at}`,
      source: SOURCE,
      computed,
      expected,
      tolerance,
    });
    return [
      row("Dew point, °C", limit.dewPointC, dew, digits(2)),
      row("Least dry resistance, m²K/W", limit.leastResistanceM2KW, least, within(least, 0.005)),
      row(
        "Least dry resistance, h·ft²·°F/Btu",
        limit.leastResistanceM2KW * M2KW_IN_IP,
        leastIp,
        within(leastIp, 0.005),
      ),
      row("Least face factor", limit.leastFaceFactorFrac, factor, digits(3)),
    ];
  }),
  {
    quantity: "Inner face of 0.75 m²K/W between 20 and −20 °C, °C",
    source: "20 − 0.12/0.75 × 40, by hand",
    computed: insideFaceTempC(20, -20, 0.75, 0.12),
    expected: 13.6,
    tolerance: digits(2),
  },
];
