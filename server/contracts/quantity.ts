import { z } from "zod";
import { fromSi, toSi, type UnitId, type UnitKind, units } from "../engine/units.ts";

/** Where an answer came from. The browser draws one mark for each. */
export const origins = ["measured", "plate", "bill", "default", "guess"] as const;
export const originSchema = z.enum(origins);
export type Origin = z.infer<typeof originSchema>;

/** A number as it was typed, with its unit and where it came from. The SI value is worked out, never stored beside it. */
export interface Quantity {
  typed: string;
  unit: UnitId;
  origin: Origin;
}

/** The answer to a question with a list of choices. */
export interface Choice<T extends string> {
  value: T;
  origin: Origin;
}

const numeric = /^[-−]?\d{1,9}(?:\.\d{1,6})?$/;
const unitIds = Object.keys(units) as [UnitId, ...UnitId[]];

export interface QuantityRange {
  /** What the person calls it, for the message: "Ridge height". */
  label: string;
  kind: UnitKind;
  /** Lowest and highest accepted value in the SI unit of the kind. */
  min: number;
  max: number;
  whole?: boolean;
}

/** The typed number as a JavaScript number, in the unit it was typed in. */
export function typedNumber(quantity: Quantity): number {
  return Number(quantity.typed.replace("−", "-"));
}

/** The quantity in the SI unit of its kind. */
export function siValue(quantity: Quantity): number {
  return toSi(typedNumber(quantity), quantity.unit);
}

/** A quantity as the product itself would type it. */
export function defaultQuantity(value: number, unit: UnitId, origin: Origin = "default"): Quantity {
  return { typed: String(value), unit, origin };
}

function rounded(value: number): string {
  return String(Number(value.toPrecision(4)));
}

function withUnit(value: string, unit: UnitId): string {
  const symbol = units[unit].symbol;
  return symbol === "" ? value : `${value} ${symbol}`;
}

/** What is wrong with a typed quantity, in a sentence with field, value and accepted range; null when it is fine. */
export function quantityProblem(quantity: Quantity, range: QuantityRange): string | null {
  if (!numeric.test(quantity.typed)) {
    return `${range.label} must be a number with a point before the decimals. You typed "${quantity.typed}".`;
  }
  if (units[quantity.unit].kind !== range.kind) {
    return `${range.label} cannot be given in ${units[quantity.unit].symbol || quantity.unit}.`;
  }
  const value = siValue(quantity);
  const slack = 1e-9 * Math.max(1, Math.abs(value));
  if (value < range.min - slack || value > range.max + slack) {
    const low = withUnit(rounded(fromSi(range.min, quantity.unit)), quantity.unit);
    const high = withUnit(rounded(fromSi(range.max, quantity.unit)), quantity.unit);
    return `${range.label} must lie between ${low} and ${high}. You typed ${withUnit(quantity.typed, quantity.unit)}.`;
  }
  if (range.whole && !Number.isInteger(value)) {
    return `${range.label} must be a whole number. You typed ${quantity.typed}.`;
  }
  return null;
}

/** A zod schema for one quantity; its only message is the sentence of {@link quantityProblem}. */
export function quantity(range: QuantityRange) {
  return z
    .strictObject({ typed: z.string().trim().min(1).max(20), unit: z.enum(unitIds), origin: originSchema })
    .superRefine((value, context) => {
      const problem = quantityProblem(value, range);
      if (problem !== null) context.addIssue({ code: "custom", message: problem });
    });
}

/** A zod schema for one answer out of a list. */
export function choice<const T extends readonly [string, ...string[]]>(values: T) {
  return z.strictObject({ value: z.enum(values), origin: originSchema });
}

/** A zod schema for an answer that names a row of a reference list. */
export function reference(label: string) {
  return z.strictObject({
    value: z.string().regex(/^[a-z0-9-]{1,60}$/, `${label} is not a known entry.`),
    origin: originSchema,
  });
}
