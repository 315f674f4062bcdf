import { readFileSync } from "node:fs";
import { join } from "node:path";
import { grossFactorFromNet } from "../../../server/engine/fuel/emissions.ts";
import type { FuelProperties } from "../../../server/engine/fuel/fuel-properties.ts";
import { type FuelUnit, kwhGrossPerUnit } from "../../../server/engine/fuel/fuel-units.ts";
import { woodValue } from "../../../server/engine/fuel/wood.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "Fuels";

type FuelRow = FuelProperties & { unit: string; kwhGrossPerUnit: number };
const table = JSON.parse(
  readFileSync(join(import.meta.dirname, "../../../data/fuels.json"), "utf8"),
) as FuelRow[];
const fuel = (id: string): FuelRow => table.find((row) => row.id === id) as FuelRow;

const EPA = "EPA GHG emission factors hub 2024";
const EPA_MEMORY = "EPA GHG emission factors hub (from memory)";

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

/** Fuel, unit, kWh gross and kg of carbon dioxide in one. */
const energies: [string, FuelUnit, number, number, string][] = [
  ["natural-gas", "m3", 10.62, 1.9225, EPA],
  ["natural-gas", "therm", 29.31, 5.306, "EIA, form 1605 coefficients"],
  ["lpg", "galUS", 26.67, 5.72, EPA_MEMORY],
  ["lpg", "L", 7.045, 1.511, "0.091 mmBtu/gal, by hand"],
  ["oil", "galUS", 40.44, 10.21, EPA_MEMORY],
  ["oil", "L", 10.68, 2.697, "0.138 mmBtu/gal, by hand"],
  ["kerosene", "galUS", 39.57, 10.15, EPA_MEMORY],
];

const moistures = [
  [0.1, 16.77, 4.66],
  [0.2, 14.63, 4.06],
  [0.3, 12.5, 3.47],
  [0.5, 8.23, 2.29],
] as const;

export const rows: CheckRow[] = [
  ...energies.flatMap(([id, unit, kwh, kg, source]) => {
    const properties = fuel(id);
    const energy = kwhGrossPerUnit(unit, properties);
    return [
      row(`${id}, kWh gross in a ${unit}`, source, energy, kwh, within(kwh, 0.005)),
      row(
        `${id}, carbon dioxide of a ${unit}, kg`,
        source,
        energy * properties.carbonDioxideKgPerKwh,
        kg,
        within(kg, 0.005),
      ),
    ];
  }),
  ...table
    .filter(({ unit }) => ["m³", "L", "kg"].includes(unit))
    .map((properties) =>
      row(
        `${properties.id}, kWh gross in its own unit, by properties and by table`,
        "both columns of the same table",
        kwhGrossPerUnit(properties.unit === "m³" ? "m3" : (properties.unit as FuelUnit), properties),
        properties.kwhGrossPerUnit,
        within(properties.kwhGrossPerUnit, 0.005),
      ),
    ),
  row(
    "Natural gas of 1026 Btu/scf, kWh in a m³",
    `${EPA}: 1026 Btu/scf`,
    (1026 * 0.000293071) / 0.3048 ** 3,
    fuel("natural-gas").kwhGrossPerM3 ?? Number.NaN,
    within(10.62, 0.001),
  ),
  row(
    "Natural gas, kg/kWh gross from 56.1 t/TJ net",
    "IPCC 2006 guidelines (from memory): 0.1818",
    grossFactorFromNet(56.1, 0.9),
    0.1818,
    within(0.1818, 0.005),
  ),
  row(
    "Natural gas, kg/kWh net from 56.1 t/TJ",
    "IPCC 2006 guidelines (from memory)",
    grossFactorFromNet(56.1, 1),
    0.20196,
    1e-5,
  ),
  row(
    "LPG, kg/kWh gross from 63.1 t/TJ net against the table",
    "IPCC 2006 guidelines (from memory) against EPA",
    grossFactorFromNet(63.1, 0.921),
    fuel("lpg").carbonDioxideKgPerKwh,
    within(0.2145, 0.03),
  ),
  row(
    "Wood residuals, carbon dioxide, kg/kWh",
    `${EPA}: 1640 kg and 17.48 mmBtu a short ton`,
    fuel("chips").carbonDioxideKgPerKwh,
    1640 / 5123,
    digits(4),
  ),
  row(
    "A short ton of 17.48 mmBtu, kWh",
    `${EPA}, wood residuals`,
    17.48 * kwhGrossPerUnit("MMBtu", fuel("chips")),
    5123,
    1,
  ),
  ...moistures.flatMap(([moisture, megajoule, kilowattHour]) => {
    const value = woodValue(moisture);
    const source = "18.9 (1 − M) − 2.443 M, by hand";
    return [
      row(
        `Wood of ${100 * moisture} % moisture, MJ/kg net`,
        source,
        value.netKwhKg * 3.6,
        megajoule,
        digits(2),
      ),
      row(
        `Wood of ${100 * moisture} % moisture, kWh/kg net`,
        source,
        value.netKwhKg,
        kilowattHour,
        digits(2),
      ),
    ];
  }),
];
