import type { PlanAssumption } from "../../../server/engine/plan/plan-types.ts";
import { type UnitId, units } from "../../../server/engine/units.ts";
import type { Units } from "../../lib/units.ts";

function isUnit(key: string): key is UnitId {
  return Object.hasOwn(units, key);
}

/** The value of an assumption as the reader reads it. Numbers arrive in SI; the unit tells their kind. */
export function assumptionText(assumption: PlanAssumption, written: Units): string {
  const { value, unit } = assumption;
  if (typeof value === "string") return value;
  if (!isUnit(unit)) return String(value);
  return written.text(value, units[unit].kind);
}
