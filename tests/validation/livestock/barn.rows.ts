import { readFileSync } from "node:fs";
import { join } from "node:path";
import { humidityRatio } from "../../../server/engine/air/moist-air.ts";
import { exhaustHeatWhM3K } from "../../../server/engine/air/ventilation-air.ts";
import { totalHeatAt20W } from "../../../server/engine/livestock/animal-classes.ts";
import { animalHeat } from "../../../server/engine/livestock/animal-heat.ts";
import { barnHeat } from "../../../server/engine/livestock/barn-heat.ts";
import { timerFlowM3H } from "../../../server/engine/livestock/fans.ts";
import { headRateM3H } from "../../../server/engine/livestock/head-rate.ts";
import { exchanger, frostLimitC } from "../../../server/engine/livestock/heat-recovery.ts";
import { leakAtPressure } from "../../../server/engine/livestock/leaks.ts";
import { balanceTempC } from "../../../server/engine/livestock/minimum-ventilation.ts";
import { massOnDayKg, type SchedulePoint, scheduleValue } from "../../../server/engine/livestock/schedule.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "Barns";

interface AnimalRow {
  id: string;
  growthDayKg?: { points: SchedulePoint[] };
  setpointDayC?: { points: SchedulePoint[] };
  lowerCriticalC?: { points: SchedulePoint[] };
}
const table = JSON.parse(
  readFileSync(join(import.meta.dirname, "../../../data/livestock.json"), "utf8"),
) as AnimalRow[];
const points = (id: string, of: "growthDayKg" | "setpointDayC" | "lowerCriticalC"): SchedulePoint[] =>
  table.find((row) => row.id === id)?.[of]?.points ?? [];

const WORKED = "CIGR 2002 formulas with psychrometric tables, worked by hand";
const CFM = 1.699011;
const BTUH = 0.29307107;

const pigs = animalHeat({
  animal: "fatteningPig",
  headCount: 1000,
  massKg: 60,
  feedLevel: 3,
  houseTempC: 18,
});
const chicks = animalHeat({ animal: "broiler", headCount: 20_000, massKg: 0.2, houseTempC: 30 });

function house(
  inside: [number, number],
  outside: [number, number],
  shellWK: number,
  airM3H: number,
  stockW: number,
) {
  const airHeatWhM3K = exhaustHeatWhM3K(inside[0], humidityRatio(...inside), humidityRatio(...outside));
  return barnHeat({
    insideTempC: inside[0],
    outdoorTempC: outside[0],
    shellWK,
    airM3H,
    airHeatWhM3K,
    stockSensibleW: stockW,
  });
}
const pigsByWater = house([18, 0.7], [-10, 0.9], 1200, 11_883, pigs.sensibleW);
const pigsByGas = house([18, 0.7], [-10, 0.9], 1200, 13_858, pigs.sensibleW);
const chicksByGas = house([30, 0.6], [-5, 0.85], 700, 3687, chicks.sensibleW);

/** 26 sows, 500 cfm, 30 °F: about 16,000 Btu/h of ventilation. */
const sows = barnHeat({
  insideTempC: 21,
  outdoorTempC: 21 - 30 / 1.8,
  shellWK: 1,
  airM3H: 500 * CFM,
  airHeatWhM3K: 0.335,
  stockSensibleW: 0,
});
const recovered = exchanger({
  flowM3H: 3600,
  shareFrac: 0.7,
  insideTempC: 28,
  outdoorTempC: -12,
  insideDewPointC: 20,
  airHeatWhM3K: (1.2 * 1006) / 3600,
});

const row = (
  quantity: string,
  source: string,
  computed: number,
  expected: number,
  tolerance: number,
): CheckRow => ({
  quantity,
  source,
  computed,
  expected,
  tolerance,
});

export const rows: CheckRow[] = [
  row("1000 pigs, ventilation by water, kW", WORKED, pigsByWater.ventilationW / 1000, 111.4, digits(1)),
  row("1000 pigs, envelope, kW", WORKED, pigsByWater.shellW / 1000, 33.6, digits(1)),
  row("1000 pigs, heat needed by water, kW", WORKED, pigsByWater.heatNeededW / 1000, 27.3, digits(1)),
  row(
    "1000 pigs, ventilation by carbon dioxide, kW",
    WORKED,
    pigsByGas.ventilationW / 1000,
    129.9,
    digits(1),
  ),
  row("1000 pigs, heat needed by carbon dioxide, kW", WORKED, pigsByGas.heatNeededW / 1000, 45.8, digits(1)),
  row("20 000 chicks, ventilation, kW", WORKED, chicksByGas.ventilationW / 1000, 41.09, digits(2)),
  row("20 000 chicks, envelope, kW", WORKED, chicksByGas.shellW / 1000, 24.5, digits(1)),
  row("20 000 chicks, heat needed, kW", WORKED, chicksByGas.heatNeededW / 1000, 47.6, digits(1)),
  row(
    "20 000 chicks, air by body mass, m³/h",
    "Charles 1981: 1.5e-4 m³/s for each kg^0.75, here 1 m³/s = 3600 m³/h",
    20_000 * headRateM3H({ kind: "metabolic", perKg075M3H: 1.5e-4 * 3600 }, 0.2),
    3230,
    1,
  ),
  row(
    "Farrowing room of 26 sows, 500 cfm at 30 °F, Btu/h",
    "Kansas Swine Day 1976: about 16,000",
    sows.ventilationW / BTUH,
    16_000,
    within(16_000, 0.03),
  ),
  row(
    "Two 36 in fans of 10 000 cfm, 30 s in 5 min, cfm",
    "Univ. Georgia poultry newsletter 2008 20(11): 2000 cfm mean",
    timerFlowM3H(20_000, 30, 300),
    2000,
    1e-9,
  ),
  row(
    "Their heat over 24 h at 70 °F, MBtu",
    "2000 × 1.08 × 70 × 24, same newsletter",
    (barnHeat({
      insideTempC: 21,
      outdoorTempC: 21 - 70 / 1.8,
      shellWK: 0.1,
      airM3H: 2000 * CFM,
      airHeatWhM3K: 0.335,
      stockSensibleW: 0,
    }).ventilationW /
      BTUH) *
      24e-6,
    3.63,
    within(3.63, 0.005),
  ),
  row("Leakage from 20 to 50 Pa", "(50/20)^0.65, by hand", leakAtPressure(1, 20, 50), 1.81, digits(2)),
  row(
    "Exchanger of 1 m³/s, 70 %, 40 K, kW",
    "1.2 × 1.006 × 40 × 0.7, by hand",
    recovered.recoveredW / 1000,
    33.8,
    digits(1),
  ),
  row(
    "Its propane saved in a day at 92 %, L",
    "Ontario, ventilation heat exchangers: more than 120 L a day for 1000 L/s",
    (recovered.recoveredW * 24) / 1000 / 0.92 / 7.08,
    124,
    1,
  ),
  row("Frost limit at 20 °C, 50 %, °C", "t − t/e, by hand", frostLimitC(20, 0.5), -20, digits(1)),
  row("Frost limit at 20 °C, 70 %, °C", "t − t/e, by hand", frostLimitC(20, 0.7), -8.6, digits(1)),
  row("Frost limit at 28 °C, 70 %, °C", "t − t/e, by hand", frostLimitC(28, 0.7), -12, digits(1)),
  row(
    "Chick on day 3, kg",
    "geometric mean of the straight line (0.115) and the even rate (0.085), growth tables (from memory)",
    massOnDayKg(points("broiler", "growthDayKg"), 3),
    0.099,
    digits(3),
  ),
  row(
    "Tom at 14.5 weeks, kg",
    "12 kg, farm food statistics for toms; planning curve from memory",
    massOnDayKg(points("turkey-grower", "growthDayKg"), 14.5 * 7),
    12,
    within(12, 0.07),
  ),
  row(
    "Broiler house on day 21, °C",
    "schedule of 60 to 70 % humidity (from memory)",
    scheduleValue(points("broiler", "setpointDayC"), 21),
    22,
    digits(1),
  ),
  row(
    "Calf of 20 days, lower critical, °C",
    "beef calf questions and answers 2013: 47.1 °F",
    scheduleValue(points("calf", "lowerCriticalC"), 20),
    (47.1 - 32) / 1.8,
    digits(1),
  ),
  row(
    "15 000 hens, balance temperature, °C",
    "6.2 W each, 0.45 m³/h at 0.33 Wh/(m³ K), 1036 W/K, 20 °C: by hand",
    balanceTempC(20, 15_000 * 6.2, 1036 + 15_000 * 0.45 * 0.33),
    -8.5,
    digits(1),
  ),
  row(
    "30 000 hens, balance temperature, °C",
    "same house, by hand −13.9",
    balanceTempC(20, 30_000 * 6.2, 1036 + 30_000 * 0.45 * 0.33),
    -13.9,
    digits(1),
  ),
  row(
    "Broiler of 2.2 kg, 38 000 of them, kW at 20 °C",
    "10.62 m^0.75 (CIGR 2002), by hand 730",
    38 * totalHeatAt20W("broiler", { massKg: 2.2 }),
    729,
    1,
  ),
];
