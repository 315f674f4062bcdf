import type { Quantity } from "../../server/contracts/quantity.ts";
import { fromSi, toSi, type UnitId, units } from "../../server/engine/units.ts";

/*
 * The contract's own helpers come with the validation library. These two read a quantity without it,
 * so that pages which only show a survey stay small.
 */

/** The typed number, NaN while it is not one. */
export function typedValue(quantity: Quantity): number {
  const typed = quantity.typed.trim().replace("\u2212", "-");
  return typed === "" ? Number.NaN : Number(typed);
}

/** The quantity in the SI unit of its kind. */
export function quantitySi(quantity: Quantity): number {
  return toSi(typedValue(quantity), quantity.unit);
}

/** The same quantity typed in another unit of its kind, to four digits. */
export function inUnit(quantity: Quantity, unit: UnitId): Quantity {
  if (units[unit].kind !== units[quantity.unit].kind || unit === quantity.unit) return { ...quantity, unit };
  const value = fromSi(quantitySi(quantity), unit);
  if (!Number.isFinite(value)) return { ...quantity, unit };
  return { ...quantity, typed: String(Number(value.toPrecision(4))), unit };
}
