import { combustionYield, hydrocarbons } from "../../../server/engine/heaters/combustion.ts";
import { grossEfficiencyFrac } from "../../../server/engine/heaters/efficiency-basis.ts";
import { breakEvenCop, heatPumpCop } from "../../../server/engine/heaters/heat-pump.ts";
import { smallestUnit } from "../../../server/engine/heaters/unit-sizes.ts";
import { flameAirByGasM3HKw, unventedHouse } from "../../../server/engine/heaters/unvented-house.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "Burning and heat pumps";

const CHEMISTRY = "stoichiometry of complete combustion, by hand";
const LB_PER_1000_BTU = 2.20462 / 3.41214;

const methane = combustionYield(hydrocarbons.methane);
const propane = combustionYield(hydrocarbons.propane);
const kerosene = combustionYield(hydrocarbons.kerosene);
/** 20 000 chicks of 0.2 kg: animals' air 3687 m³/h, shell 24.5 kW, sensible 17.96 kW. */
const chicks = unventedHouse({
  lines: [{ rule: "carbonDioxide", baseM3H: 3687, perKwM3H: flameAirByGasM3HKw(0.117, 3000, 450) }],
  airHeatWhM3K: 41.09e3 / 3687 / 35,
  insideTempC: 30,
  outdoorTempC: -5,
  shellLessGainsW: 24_500 - 17_960,
  sensibleFrac: 0.9206,
});
const burntKw = chicks.holds ? chicks.burntW / 1000 : Number.NaN;

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

const lifts = [
  [25, 4.179, 5.479],
  [35, 3.347, 4.419],
  [45, 2.641, 3.506],
  [55, 2.061, 2.74],
] as const;

export const rows: CheckRow[] = [
  row("Methane, water, kg/kWh", CHEMISTRY, methane.waterKgKwh, 0.1457, within(0.1457, 0.005)),
  row(
    "Methane, carbon dioxide, kg/kWh",
    CHEMISTRY,
    methane.carbonDioxideKgKwh,
    0.1779,
    within(0.1779, 0.005),
  ),
  row(
    "Methane, carbon dioxide, m³/kWh",
    CHEMISTRY,
    methane.carbonDioxideM3Kwh,
    0.0973,
    within(0.0973, 0.005),
  ),
  row("Methane, net over gross", CHEMISTRY, methane.netOverGrossFrac, 0.901, digits(3)),
  row(
    "Methane, water for each net kWh, kg",
    CHEMISTRY,
    methane.waterKgKwh / methane.netOverGrossFrac,
    0.1617,
    within(0.1617, 0.005),
  ),
  row("Methane, water, lb/1000 Btu", CHEMISTRY, methane.waterKgKwh * LB_PER_1000_BTU, 0.094, digits(3)),
  row("Propane, water, kg/kWh", CHEMISTRY, propane.waterKgKwh, 0.1168, within(0.1168, 0.005)),
  row(
    "Propane, water, kg/kWh, as published",
    "Liang and Tabler 2009: 0.000078 lb/Btu",
    propane.waterKgKwh,
    0.1207,
    within(0.1207, 0.04),
  ),
  row(
    "Propane, carbon dioxide, kg/kWh",
    CHEMISTRY,
    propane.carbonDioxideKgKwh,
    0.2141,
    within(0.2141, 0.005),
  ),
  row("Propane, carbon dioxide, m³/kWh", CHEMISTRY, propane.carbonDioxideM3Kwh, 0.117, within(0.117, 0.005)),
  row("Propane, net over gross", CHEMISTRY, propane.netOverGrossFrac, 0.921, digits(3)),
  row("Propane, water, lb/1000 Btu", CHEMISTRY, propane.waterKgKwh * LB_PER_1000_BTU, 0.0755, digits(4)),
  row("Kerosene, water, kg/kWh", CHEMISTRY, kerosene.waterKgKwh, 0.104, within(0.104, 0.01)),
  row(
    "Kerosene, carbon dioxide, kg/kWh",
    CHEMISTRY,
    kerosene.carbonDioxideKgKwh,
    0.235,
    within(0.235, 0.005),
  ),
  row("Kerosene, net over gross", CHEMISTRY, kerosene.netOverGrossFrac, 0.93, digits(2)),
  row(
    "400 000 Btu/h of natural gas, water, US gal/h",
    "Bartok, unvented heaters: up to 5 gal/h; by hand 4.5",
    (400 * 0.29307107 * methane.waterKgKwh) / 3.785,
    4.5,
    digits(1),
  ),
  row(
    "Air for a kilowatt of propane at 3000 ppm, m³/h",
    CHEMISTRY,
    flameAirByGasM3HKw(0.117, 3000, 450),
    45.88,
    digits(2),
  ),
  row(
    "Flame's own air, heat for each heat burnt",
    "20 000 chicks at −5 °C, closed form by hand",
    chicks.feedback,
    0.5114,
    within(0.5114, 0.005),
  ),
  row(
    "Fuel burnt without flue, kW",
    "20 000 chicks at −5 °C, closed form by hand",
    burntKw,
    116.4,
    within(116.4, 0.005),
  ),
  row(
    "All their air, m³/h",
    "20 000 chicks at −5 °C, by hand",
    chicks.holds ? chicks.airM3H : Number.NaN,
    9027,
    within(9027, 0.005),
  ),
  row(
    "Water of their flames, kg/h",
    "20 000 chicks at −5 °C, by hand",
    burntKw * propane.waterKgKwh,
    13.6,
    digits(1),
  ),
  row(
    "More carbon dioxide at 14.5 m³/h for each kW, ppm",
    "2.5 cfm for 1000 Btu/h, propane at a steady flame, by hand",
    (propane.carbonDioxideM3Kwh / 14.5) * 1e6,
    8070,
    within(8070, 0.005),
  ),
  ...lifts.flatMap(([lift, air, ground]) => [
    row(`COP, air source, lift ${lift} K`, "Staffell et al. 2012", heatPumpCop("air", lift), air, digits(3)),
    row(
      `COP, ground source, lift ${lift} K`,
      "Staffell et al. 2012",
      heatPumpCop("ground", lift),
      ground,
      digits(3),
    ),
  ]),
  row(
    "Break-even COP at 0.16 and 0.055 with 85 %",
    "0.16/(0.055/0.85), by hand",
    breakEvenCop(0.16, 0.055, 0.85),
    2.47,
    digits(2),
  ),
  row(
    "95 % on net of natural gas, on gross, %",
    "0.95 × 0.901, by hand",
    100 * grossEfficiencyFrac(0.95, "net", 0.901),
    85.6,
    digits(1),
  ),
  row(
    "Two units at 60 % of 54.8 kW, plate, kBtu/h",
    "32.9 kW output, 140.2 kBtu/h input at 80 %, next step",
    smallestUnit("unitHeater", 0.6 * 1.15 * 47_630, 0.8, "us").plate,
    150,
    1e-9,
  ),
  row(
    "That unit's input, kW",
    "150 kBtu/h × 0.29307",
    smallestUnit("unitHeater", 0.6 * 1.15 * 47_630, 0.8, "us").outputW / 800,
    44,
    digits(1),
  ),
];
