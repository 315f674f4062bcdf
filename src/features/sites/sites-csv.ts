import type { SiteRow } from "../../../server/contracts/sites.ts";
import { verdictWords } from "../../components/plan/verdict.ts";
import type { Units } from "../../lib/units.ts";
import { degreesBelow } from "./site-order.ts";

const cell = (value: string | number | null) => {
  const text = value === null ? "" : String(value);
  // A leading sign would let a spreadsheet take a name for a formula.
  const safe = /^[=+\-@\t\r]/.test(text) && typeof value === "string" ? `'${text}` : text;
  return /[",\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
};

/** One heading row with units, one row a house, figures that can be added again. */
export function sitesCsv(rows: SiteRow[], units: Units): string {
  const rounded = (value: number | null | undefined, decimals: number) =>
    value === null || value === undefined ? null : Number(value.toFixed(decimals));
  const heads = [
    "Building",
    "Farm",
    "Place",
    "Country",
    "Coldest night",
    `Short (${units.symbol("power")})`,
    `Needed (${units.symbol("power")})`,
    `Fitted (${units.symbol("power")})`,
    `Below set-point (${units.symbol("temperatureDifference")})`,
    "Hours to critical, least (h)",
    "Hours to critical, most (h)",
    `Heat a year (${units.symbol("energyPerArea")})`,
    `Floor (${units.symbol("area")})`,
    "Answered",
    "Questions",
  ];
  const lines = rows.map((row) => {
    const { plan } = row;
    const power = (watts: number | undefined) =>
      watts === undefined ? null : rounded(units.amount(watts, "power"), 1);
    const below = degreesBelow(row);
    return [
      row.buildingName,
      row.farmName,
      row.place,
      row.country,
      verdictWords(plan, units),
      power(plan?.shortW),
      power(plan?.requiredW),
      power(plan?.installedW),
      below === null ? null : rounded(units.amount(below, "temperatureDifference"), 1),
      rounded(plan?.hoursToCriticalLow, 1),
      rounded(plan?.hoursToCriticalHigh, 1),
      plan === null ? null : rounded(units.amount(plan.heaterKwhM2, "energyPerArea"), 0),
      rounded(units.amount(row.floorAreaM2, "area"), 0),
      row.answered,
      row.questions,
    ];
  });
  return [heads, ...lines].map((line) => line.map(cell).join(",")).join("\r\n");
}
