import {
  type AnimalClass,
  type AnimalState,
  type SplitGroup,
  totalHeatAt20W,
} from "../../../server/engine/livestock/animal-classes.ts";
import { animalHeat } from "../../../server/engine/livestock/animal-heat.ts";
import { sensibleShare1984, totalFactor1984 } from "../../../server/engine/livestock/heat-rules.ts";
import { activityRatio, unitHeat } from "../../../server/engine/livestock/house-split.ts";
import { minimumVentilation } from "../../../server/engine/livestock/minimum-ventilation.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "Livestock";

const CIGR = "CIGR 4th report 2002 (Pedersen and Sällvik), formula evaluated by hand";
const WORKED = "CIGR 2002 formulas with psychrometric tables, worked by hand";
const CANADA = "Fan ventilation principles and rates, Canadian factsheet 87-06: 7.6 g/kg, 70 g/h per pig";

const heats: [AnimalClass, AnimalState, number][] = [
  ["calf", { massKg: 50, gainKgDay: 0.5 }, 156.1],
  ["beef", { massKg: 300, gainKgDay: 1, feedEnergyMjKg: 11 }, 585.7],
  ["heifer", { massKg: 300, gainKgDay: 0.6, feedEnergyMjKg: 10, pregnantDays: 0 }, 519.6],
  ["heifer", { massKg: 450, gainKgDay: 0.6, feedEnergyMjKg: 10, pregnantDays: 150 }, 739.3],
  ["dairyCow", { massKg: 650, milkKgDay: 30, pregnantDays: 160 }, 1446.4],
  ["piglet", { massKg: 10, feedLevel: 3 }, 67.65],
  ["piglet", { massKg: 20, feedLevel: 3 }, 103.7],
  ["fatteningPig", { massKg: 60, feedLevel: 3 }, 186.5],
  ["fatteningPig", { massKg: 90, feedLevel: 2.7 }, 214.5],
  ["drySow", { massKg: 180, pregnantDays: 70, gainKgDay: 0.18 }, 279.5],
  ["nursingSow", { massKg: 180, milkKgDay: 6 }, 406.3],
  ["broiler", { massKg: 0.05 }, 1.123],
  ["broiler", { massKg: 0.5 }, 6.315],
  ["broiler", { massKg: 1 }, 10.62],
  ["broiler", { massKg: 2 }, 17.86],
  ["broiler", { massKg: 3 }, 24.21],
  ["layerCage", { massKg: 1.6, gainKgDay: 0.05 }, 10.18],
  ["layerFloor", { massKg: 1.6, gainKgDay: 0.05 }, 10.92],
  ["turkey", { massKg: 1 }, 9.86],
  ["turkey", { massKg: 10 }, 58.06],
  ["turkey", { massKg: 20 }, 99.01],
  ["horse", { massKg: 500 }, 645],
  ["ewe", { massKg: 70, milkKgDay: 1 }, 187.9],
];

/** Group, °C, total and sensible W of 1000 W at 20 °C. */
const splits: [SplitGroup, number, number, number][] = [
  ["cattle", 0, 1080, 766.8],
  ["cattle", 10, 1040, 697.6],
  ["cattle", 15, 1020, 632.4],
  ["cattle", 20, 1000, 546.8],
  ["cattle", 25, 980, 440.8],
  ["cattle", 30, 960, 314.4],
  ["pigs", 0, 1240, 768.8],
  ["pigs", 10, 1120, 694.3],
  ["pigs", 15, 1060, 655.9],
  ["pigs", 20, 1000, 612.6],
  ["pigs", 25, 940, 554.7],
  ["pigs", 30, 880, 461.8],
  ["broilers", 0, 1400, 854],
  ["broilers", 10, 1200, 709.2],
  ["broilers", 15, 1100, 619.7],
  ["broilers", 20, 1000, 518.8],
  ["broilers", 25, 900, 406.5],
  ["broilers", 30, 800, 282.8],
  ["layers", 0, 1400, 938],
  ["layers", 10, 1200, 803.9],
  ["layers", 15, 1100, 735.9],
  ["layers", 20, 1000, 663.7],
  ["layers", 25, 900, 579.1],
  ["layers", 30, 800, 464.6],
];

/** The older rule: °C, total factor, factor × sensible share. */
const older: [number, number, number][] = [
  [20, 1, 0.6502],
  [15, 1.005, 0.7314],
  [30, 0.96, 0.3133],
];
const onePig = animalHeat({ animal: "fatteningPig", headCount: 1, massKg: 54, feedLevel: 3, houseTempC: 15 });

const pigs = animalHeat({
  animal: "fatteningPig",
  headCount: 1000,
  massKg: 60,
  feedLevel: 3,
  houseTempC: 18,
});
const pigAir = minimumVentilation({
  ...pigs,
  insideTempC: 18,
  humidityLimitFrac: 0.7,
  outdoorTempC: -10,
  outdoorHumidityFrac: 0.9,
  headCount: 1000,
  perHeadM3H: 0,
});
const chicks = animalHeat({ animal: "broiler", headCount: 20_000, massKg: 0.2, houseTempC: 30 });
const chickAir = minimumVentilation({
  ...chicks,
  insideTempC: 30,
  humidityLimitFrac: 0.6,
  outdoorTempC: -5,
  outdoorHumidityFrac: 0.85,
  headCount: 20_000,
  perHeadM3H: 0,
});
const canadian = minimumVentilation({
  moistureKgH: 0.07,
  carbonDioxideM3H: 0,
  insideTempC: 15,
  humidityLimitFrac: 0.75,
  outdoorTempC: -25,
  outdoorHumidityFrac: 1,
  headCount: 1,
  perHeadM3H: 0,
});

export const rows: CheckRow[] = [
  ...heats.map(([animal, state, expected]) => ({
    quantity: `Heat of a ${animal} of ${state.massKg} kg, W`,
    source: CIGR,
    computed: totalHeatAt20W(animal, state),
    expected,
    tolerance: Math.max(within(expected, 0.0005), 0.001),
  })),
  ...splits.flatMap(([group, tempC, total, sensible]): CheckRow[] => [
    {
      quantity: `1000 W of ${group} at ${tempC} °C, total, W`,
      source: CIGR,
      computed: unitHeat(group, tempC).totalW,
      expected: total,
      tolerance: digits(1),
    },
    {
      quantity: `1000 W of ${group} at ${tempC} °C, sensible, W`,
      source: CIGR,
      computed: unitHeat(group, tempC).sensibleW,
      expected: sensible,
      tolerance: digits(1),
    },
  ]),
  ...older.flatMap(([tempC, factor, sensible]): CheckRow[] => [
    {
      quantity: `Older rule at ${tempC} °C, total over 20 °C`,
      source: "CIGR 1984 (from memory), by hand",
      computed: totalFactor1984(tempC),
      expected: factor,
      tolerance: digits(4),
    },
    {
      quantity: `Older rule at ${tempC} °C, sensible over total at 20 °C`,
      source: "CIGR 1984 (from memory), by hand",
      computed: totalFactor1984(tempC) * sensibleShare1984(tempC),
      expected: sensible,
      tolerance: digits(4),
    },
  ]),
  ...(
    [
      [10, 1.04],
      [0, 1.32],
    ] as const
  ).map(([tempC, expected]) => ({
    quantity: `Older rule at ${tempC} °C, total over 20 °C`,
    source: "CIGR 1984 (from memory), by hand",
    computed: totalFactor1984(tempC),
    expected,
    tolerance: digits(4),
  })),
  {
    quantity: "Pig of 54 kg at feed level 3, W at 20 °C",
    source: CIGR,
    computed: totalHeatAt20W("fatteningPig", { massKg: 54, feedLevel: 3 }),
    expected: 176,
    tolerance: digits(0),
  },
  {
    quantity: "Pig of 54 kg at 15 °C, water, g/h",
    source: `${CIGR}; Lu et al. 2017: tables of the 1980s (70 g/h) lie 31 % low, hence about 101 g/h`,
    computed: 1000 * onePig.moistureKgH,
    expected: 103.9,
    tolerance: digits(1),
  },
  {
    quantity: "1000 pigs of 60 kg at 18 °C, heat at 20 °C, kW",
    source: WORKED,
    computed: totalHeatAt20W("fatteningPig", { massKg: 60, feedLevel: 3 }),
    expected: 186.54,
    tolerance: digits(2),
  },
  {
    quantity: "1000 pigs of 60 kg at 18 °C, latent, kW",
    source: WORKED,
    computed: pigs.latentW / 1000,
    expected: 73.31,
    tolerance: 0.02,
  },
  {
    quantity: "1000 pigs of 60 kg at 18 °C, carbon dioxide, m³/h",
    source: WORKED,
    computed: pigs.carbonDioxideM3H,
    expected: 35.34,
    tolerance: digits(2),
  },
  {
    quantity: "1000 pigs of 60 kg at 18 °C, sensible, kW",
    source: WORKED,
    computed: pigs.sensibleW / 1000,
    expected: 117.7,
    tolerance: digits(1),
  },
  {
    quantity: "1000 pigs of 60 kg at 18 °C, water, kg/h",
    source: WORKED,
    computed: pigs.moistureKgH,
    expected: 107.35,
    tolerance: 0.02,
  },
  {
    quantity: "Their air by water, m³/h",
    source: WORKED,
    computed: pigAir.partsM3H.moisture,
    expected: 11_883,
    tolerance: 2,
  },
  {
    quantity: "Their air by carbon dioxide, m³/h",
    source: WORKED,
    computed: pigAir.flowM3H,
    expected: 13_858,
    tolerance: 1,
  },
  {
    quantity: "20 000 chicks of 0.2 kg at 30 °C, sensible, kW",
    source: WORKED,
    computed: chicks.sensibleW / 1000,
    expected: 17.96,
    tolerance: digits(2),
  },
  {
    quantity: "Their air by water, m³/h (chicks)",
    source: WORKED,
    computed: chickAir.partsM3H.moisture,
    expected: 3076,
    tolerance: 2,
  },
  {
    quantity: "Their air by carbon dioxide, m³/h (chicks)",
    source: WORKED,
    computed: chickAir.flowM3H,
    expected: 3687,
    tolerance: 1,
  },
  {
    quantity: "Air for 70 g/h of water at −25 °C outside, m³/h",
    source: CANADA,
    computed: canadian.flowM3H,
    expected: 7.65,
    tolerance: within(7.65, 0.005),
  },
  {
    quantity: "20 000 chicks of 0.2 kg, heat at 20 °C, kW",
    source: WORKED,
    computed: 20 * totalHeatAt20W("broiler", { massKg: 0.2 }),
    expected: 63.52,
    tolerance: digits(2),
  },
  {
    quantity: "20 000 chicks of 0.2 kg at 30 °C, latent, kW",
    source: WORKED,
    computed: chicks.latentW / 1000,
    expected: 32.85,
    tolerance: digits(2),
  },
  {
    quantity: "20 000 chicks of 0.2 kg at 30 °C, water, kg/h",
    source: WORKED,
    computed: chicks.moistureKgH,
    expected: 48.67,
    tolerance: digits(2),
  },
  {
    quantity: "Activity of pigs at a middling hour",
    source: "CIGR 2002, amplitude 0.43, minimum at 1.7 h (from memory)",
    computed: activityRatio(7.7, 0.43, 1.7),
    expected: 1,
    tolerance: digits(2),
  },
  {
    quantity: "Activity of pigs at their quietest hour",
    source: "CIGR 2002, amplitude 0.43, minimum at 1.7 h (from memory)",
    computed: activityRatio(1.7, 0.43, 1.7),
    expected: 0.57,
    tolerance: digits(2),
  },
  {
    quantity: "Activity of pigs twelve hours later",
    source: "as above",
    computed: activityRatio(13.7, 0.43, 1.7),
    expected: 1.43,
    tolerance: digits(2),
  },
];
