import {
  hoursToCarbonDioxide,
  hoursToTemp,
  tempAfterHoursC,
} from "../../../server/engine/failure/cooling.ts";
import { type CheckRow, digits } from "../record-check.ts";

export const topic = "Failure";

const house = { capacityJK: 150e6, lossCoefficientWK: 2500, startTempC: 20, outdoorTempC: -10 };
const FOOT = 0.3048;
/** Nursery of 2000 pigs of 22.7 kg in 45 × 125 × 8 ft. */
const nurseryM3 = 45 * 125 * 8 * FOOT ** 3;

export const rows: CheckRow[] = [
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
