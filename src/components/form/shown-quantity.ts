import type { Quantity } from "../../../server/contracts/quantity.ts";
import { displayUnit, type UnitSystem, units } from "../../../server/engine/units.ts";
import { inUnit } from "../../lib/quantity-value.ts";

/**
 * A figure is shown as it was typed. Only a typical value, which nobody typed, is shown in the reader's own system,
 * and a share always in percent.
 */
export function shownQuantity(quantity: Quantity, system: UnitSystem): Quantity {
  const { kind } = units[quantity.unit];
  if (quantity.unit === "share") return inUnit(quantity, "percent");
  if (quantity.origin !== "default") return quantity;
  const own = displayUnit(kind, system);
  const isOther = units[quantity.unit].kind === kind && quantity.unit !== own;
  const sameSystem = displayUnit(kind, system === "si" ? "us" : "si") !== quantity.unit;
  return isOther && !sameSystem ? inUnit(quantity, own) : quantity;
}
