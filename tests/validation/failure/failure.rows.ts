import { hoursToGas } from "../../../server/engine/failure/air-decay.ts";
import {
  endTempC,
  hoursToCarbonDioxide,
  hoursToTemp,
  tempAfterHoursC,
} from "../../../server/engine/failure/cooling.ts";
import { totalHeatAt20W } from "../../../server/engine/livestock/animal-classes.ts";
import { type CheckRow, digits } from "../record-check.ts";

export const topic = "Failure";

const house = { capacityJK: 150e6, lossCoefficientWK: 2500, startTempC: 20, outdoorTempC: -10 };
const FOOT = 0.3048;
/** Nursery of 2000 pigs of 22.7 kg in 45 × 125 × 8 ft. */
const nurseryM3 = 45 * 125 * 8 * FOOT ** 3;

const closedNursery = {
  volumeM3: nurseryM3,
  airM3H: 0,
  startFrac: 0.003,
  outdoorFrac: 0.00045,
};

export const rows: CheckRow[] = [
  {
    quantity: "Time constant of 150 MJ/K at 2500 W/K, h",
    source: "C/UA, by hand: 63 % of the way to the end",
    computed: hoursToTemp(house, endTempC(house) + (20 - endTempC(house)) / Math.E) ?? Number.NaN,
    expected: 16.67,
    tolerance: digits(2),
  },
  {
    quantity: "Volume of the nursery of 45 × 125 × 8 ft, m³",
    source: "by hand",
    computed: nurseryM3,
    expected: 1274,
    tolerance: 1,
  },
  {
    quantity: "Heat of 2000 pigs of 22.7 kg at feed level 3, in units of 1000 W",
    source: "CIGR 2002, piglet formula, by hand",
    computed: 2 * totalHeatAt20W("piglet", { massKg: 22.7, feedLevel: 3 }),
    expected: 223.6,
    tolerance: digits(1),
  },
  {
    quantity: "The same nursery at 0.185 m³/h, min",
    source: "223.6 heat units at 0.185 m³/h, by hand",
    computed: 60 * (hoursToGas({ ...closedNursery, sourceM3H: 223.6 * 0.185 }, 0.04) ?? Number.NaN),
    expected: 68.4,
    tolerance: digits(1),
  },
  {
    quantity: "The same nursery, as measured, min",
    source:
      "Robert, Univ. of Illinois trials: about 80 min; between the two sources of gas and a little leakage",
    computed: 60 * (hoursToGas({ ...closedNursery, sourceM3H: 223.6 * 0.163 }, 0.04) ?? Number.NaN),
    expected: 80,
    tolerance: 8,
  },
  {
    quantity: "20 to 5 °C at −10 °C outside, h",
    source: "lumped capacity, by hand",
    computed: hoursToTemp(house, 5) ?? Number.NaN,
    expected: 11.55,
    tolerance: digits(2),
  },
  {
    quantity: "Temperature after 2 h, °C",
    source: "lumped capacity, by hand",
    computed: tempAfterHoursC(house, 2),
    expected: 16.61,
    tolerance: digits(2),
  },
  {
    quantity: "Nursery without fans, 0.3 to 4 % carbon dioxide, min",
    source: "Robert, Univ. of Illinois trials: about 80 min; 223.6 heat units at 0.163 m³/h by hand",
    computed: 60 * (hoursToCarbonDioxide(nurseryM3, 223.6 * 0.163, 0.04) ?? Number.NaN),
    expected: 77.6,
    tolerance: 0.1,
  },
];
