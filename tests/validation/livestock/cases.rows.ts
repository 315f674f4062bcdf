import { readFileSync } from "node:fs";
import { join } from "node:path";
import { combustionYield, hydrocarbons } from "../../../server/engine/heaters/combustion.ts";
import { animalHeat } from "../../../server/engine/livestock/animal-heat.ts";
import { barnHeat } from "../../../server/engine/livestock/barn-heat.ts";
import { compareFlow } from "../../../server/engine/livestock/fans.ts";
import { minimumVentilation } from "../../../server/engine/livestock/minimum-ventilation.ts";
import type { SchedulePoint } from "../../../server/engine/livestock/schedule.ts";
import { stockNow } from "../../../server/engine/livestock/stock-entry.ts";
import { type CheckRow, within } from "../record-check.ts";

export const topic = "Barn cases by hand";

const CFM = 1.699011;
const BTUH = 0.29307107;
const BTUH_F = BTUH * 1.8;
/** 1.08 Btu/h for each cfm and °F, in Wh/(m³ K). */
const HAND_AIR = (1.08 * BTUH_F) / CFM;
const FARROWING = "farrowing room of 24 crates, worked by hand with 1.08 Btu/h per cfm and °F";
const NURSERY = "nursery room of 500 pigs, worked by hand with 0.33 Wh/(m³ K)";
const CALVES = "barn of 80 calves, worked by hand";
const BROILERS = "broiler house of 38 000 chicks, worked by hand with 0.33 Wh/(m³ K)";

const celsius = (fahrenheit: number) => (fahrenheit - 32) / 1.8;

/** Shell of 168 Btu/h·°F includes the leaks; sows 1000 and lamps 427 Btu/h each. */
const farrowing = (cfm: number, outdoorF: number) =>
  barnHeat({
    insideTempC: celsius(70),
    outdoorTempC: celsius(outdoorF),
    shellWK: 168 * BTUH_F,
    airM3H: cfm * CFM,
    airHeatWhM3K: HAND_AIR,
    stockSensibleW: 24 * 1000 * BTUH,
    otherGainsW: 24 * 125,
  });

const nursery = (outdoorTempC: number, recoveryFrac = 0) => {
  const airM3H = 500 * 3.4;
  const totalWK = 713;
  return barnHeat({
    insideTempC: 28,
    outdoorTempC,
    shellWK: totalWK - airM3H * 0.33,
    airM3H,
    airHeatWhM3K: 0.33,
    stockSensibleW: 6000,
    recoveryFrac,
  });
};

const calfWaterKgH = 80 * 0.035;
const calfAir = minimumVentilation({
  moistureKgH: calfWaterKgH,
  carbonDioxideM3H: 0,
  insideTempC: 0,
  humidityLimitFrac: 0.8,
  outdoorTempC: -5,
  outdoorHumidityFrac: 0.9,
  headCount: 80,
  perHeadM3H: 0,
});

const growth = (
  JSON.parse(readFileSync(join(import.meta.dirname, "../../../data/livestock.json"), "utf8")) as {
    id: string;
    growthDayKg?: { points: SchedulePoint[] };
  }[]
).find(({ id }) => id === "broiler")?.growthDayKg?.points;
const placed = stockNow({
  kind: "batch",
  placedCount: 38_000,
  curve: growth ?? [],
  placedAgeDays: 0,
  lengthDays: 42,
  lossFrac: 0,
  day: 0,
});
const chicks = animalHeat({ animal: "broiler", ...placed, houseTempC: 32 });

const row = (
  quantity: string,
  source: string,
  computed: number,
  expected: number,
  share: number,
): CheckRow => ({
  quantity,
  source,
  computed,
  expected,
  tolerance: within(expected, share),
});

export const rows: CheckRow[] = [
  row(
    "Farrowing, need at 480 cfm and −6 °F, Btu/h",
    FARROWING,
    farrowing(480, -6).heatNeededW / BTUH,
    17_900,
    0.05,
  ),
  row(
    "Farrowing, need at 480 cfm and −21 °F, Btu/h",
    FARROWING,
    farrowing(480, -21).heatNeededW / BTUH,
    28_200,
    0.05,
  ),
  row(
    "Farrowing, need at 1400 cfm and −6 °F, Btu/h",
    FARROWING,
    farrowing(1400, -6).heatNeededW / BTUH,
    93_400,
    0.05,
  ),
  row(
    "Farrowing, need at 1400 cfm and −21 °F, Btu/h",
    FARROWING,
    farrowing(1400, -21).heatNeededW / BTUH,
    118_600,
    0.05,
  ),
  row(
    "Farrowing, loss of the fan's excess, Btu/h·°F",
    FARROWING,
    compareFlow(1400 * CFM, 480 * CFM, HAND_AIR, 1).excessHeatW / BTUH_F,
    994,
    0.05,
  ),
  row("Nursery, need at −12 °C, kW", NURSERY, nursery(-12).heatNeededW / 1000, 22.5, 0.05),
  row("Nursery, need at −20 °C, kW", NURSERY, nursery(-20).heatNeededW / 1000, 28.2, 0.05),
  row(
    "Nursery, need with 40 % recovered at −12 °C, kW",
    NURSERY,
    nursery(-12, 0.4).heatNeededW / 1000,
    13.6,
    0.05,
  ),
  row("Broilers, ventilation, W/K", BROILERS, 38_000 * 0.16 * 0.33, 2006, 0.001),
  row(
    "Broilers, need at −5 °C, kW",
    BROILERS,
    barnHeat({
      insideTempC: 32,
      outdoorTempC: -5,
      shellWK: 880 + 538,
      airM3H: 38_000 * 0.16,
      airHeatWhM3K: 0.33,
      stockSensibleW: 0,
    }).heatNeededW / 1000,
    127,
    0.05,
  ),
  {
    quantity: "Broilers, heat on the day of placing, kW at most 15",
    source: BROILERS,
    computed: Math.max(0, chicks.sensibleW / 1000 - 15),
    expected: 0,
    tolerance: 0.01,
  },
  row("Calves, water, kg/h", CALVES, calfWaterKgH, 2.8, 1e-9),
  row(
    "Calves, air for it at 0 °C and 80 % inside, outside −5 °C and 90 %, m³/h",
    CALVES,
    calfAir.flowM3H,
    2800,
    0.05,
  ),
  row(
    "Turkey poults, water of 7 gal/h of propane, gal/h",
    "7 gal/h of 91 500 Btu, stoichiometry, by hand 5.7",
    (7 * 26.82 * combustionYield(hydrocarbons.propane).waterKgKwh) / 3.785,
    5.7,
    0.05,
  ),
];
