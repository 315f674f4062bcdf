import { altitudeFactor, deliveredOutputW } from "../../../server/engine/heaters/delivered-output.ts";
import { nextStepW } from "../../../server/engine/heaters/size-steps.ts";
import { unventedBurner } from "../../../server/engine/heaters/unvented.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "Heaters";

const FOOT = 0.3048;
const BTUH = 0.29307107;

/** 20 000 chicks at −5 °C outside, held at 3000 ppm by a propane burner without a flue. */
const burner = unventedBurner({
  missingHeatW: 47_630,
  sensibleFrac: 0.9206,
  airPerKwM3H: 0.117 / 2550e-6,
  airHeatWhM3K: (0.5114 / (0.117 / 2550e-6) / 35) * 1000,
  insideTempC: 30,
  outdoorTempC: -5,
});

export const rows: CheckRow[] = [
  {
    quantity: "Output left at 5000 ft",
    source: "4 % for each 1000 ft, NFPA 54 and heater manuals (from memory)",
    computed: altitudeFactor(5000 * FOOT),
    expected: 0.8,
    tolerance: 1e-9,
  },
  {
    quantity: "Output left at 1900 ft",
    source: "no correction below 2000 ft",
    computed: altitudeFactor(1900 * FOOT),
    expected: 1,
    tolerance: 1e-9,
  },
  {
    quantity: "Six heaters of 250 000 Btu/h input, 80 %, at 5000 ft, Btu/h",
    source: "1 500 000 × 0.8 × 0.8, by hand",
    computed:
      (6 *
        deliveredOutputW({
          ratedW: 250_000 * BTUH,
          basis: "input",
          efficiencyFrac: 0.8,
          burnsFuel: true,
          altitudeM: 5000 * FOOT,
        })) /
      BTUH,
    expected: 960_000,
    tolerance: 1,
  },
  {
    quantity: "Size for 32.9 kW of output, kW",
    source: "150 kBtu/h input at 80 %, next step",
    computed: nextStepW(32_900) / 1000,
    expected: 35.2,
    tolerance: digits(1),
  },
  {
    quantity: "Unvented propane at 3000 ppm, fuel burnt, kW",
    source: "stoichiometry of propane, closed form by hand",
    computed: burner.burntW / 1000,
    expected: 116.4,
    tolerance: digits(1),
  },
  {
    quantity: "Unvented propane at 3000 ppm, air for the flame, m³/h",
    source: "9027 m³/h in all, of which 3687 for the chicks",
    computed: burner.extraAirM3H,
    expected: 9027 - 3687,
    tolerance: within(5340, 0.001),
  },
];
