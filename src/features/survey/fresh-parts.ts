import type { LibraryEntry, LibraryView } from "../../../server/contracts/library.ts";
import type { Choice, Quantity } from "../../../server/contracts/quantity.ts";
import type { Survey, SurveyHeater, SurveyMonth } from "../../../server/contracts/survey.ts";
import { displayUnit, fromSi, type UnitKind, type UnitSystem } from "../../../server/engine/units.ts";

/** A typical value in the person's own unit. */
export function typicalQuantity(siValue: number, kind: UnitKind, system: UnitSystem): Quantity {
  const unit = displayUnit(kind, system);
  return { typed: String(Number(fromSi(siValue, unit).toPrecision(3))), unit, origin: "default" };
}

function firstOf(entries: LibraryEntry[]): Choice<string> {
  return { value: entries[0]?.id ?? "none", origin: "default" };
}

export function freshScreen(library: LibraryView, system: UnitSystem): NonNullable<Survey["screen"]> {
  return {
    screen: firstOf(library.screens),
    coverage: { typed: "100", unit: "percent", origin: "default" },
    edgeGap: typicalQuantity(0.02, "smallLength", system),
    opensForSnow: { value: "yes", origin: "default" },
  };
}

export function freshKneewall(
  library: LibraryView,
  system: UnitSystem,
): NonNullable<Survey["covers"]["kneewall"]> {
  const offered = library.covers.filter((cover) => cover.parts.includes("kneewall"));
  return { cover: firstOf(offered), uValue: null, height: typicalQuantity(0.6, "length", system) };
}

export function freshCeiling(library: LibraryView): NonNullable<Survey["covers"]["ceiling"]> {
  return { cover: firstOf(library.covers.filter((cover) => cover.parts.includes("ceiling"))), uValue: null };
}

export function freshHeater(library: LibraryView, fuel: string, row: number): SurveyHeater {
  const type = library.heaterTypes.find((entry) => entry.fuels.includes(fuel)) ?? library.heaterTypes[0];
  return {
    label: `Heater ${row}`,
    type: { value: type?.id ?? "none", origin: "default" },
    rating: { typed: "50", unit: "kW", origin: "default" },
    basis: { value: "output", origin: "default" },
    efficiency: {
      typed: String(Math.round((type?.efficiencyFrac ?? 0.8) * 100)),
      unit: "percent",
      origin: "default",
    },
    count: { typed: "1", unit: "each", origin: "default" },
    fuel: { value: fuel, origin: "default" },
  };
}

export type MonthColumn = "nightSetpoint" | "daySetpoint" | "headCount" | "mass";

/** Twelve months with one month's row, or one of its columns, copied to all. */
export function copyMonth(months: SurveyMonth[], from: number, columns: MonthColumn[]): SurveyMonth[] {
  const source = months[from];
  if (!source) return months;
  return months.map((month) => ({
    ...month,
    ...Object.fromEntries(columns.map((column) => [column, source[column]])),
  }));
}
