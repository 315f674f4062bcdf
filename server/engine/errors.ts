/** Why an engine function refused an input. */
export type InputErrorReason = "notFinite" | "range" | "length" | "inconsistent";

/** What was wrong with one input of an engine function. */
export interface InputErrorDetail {
  /** Name of the argument, with its unit suffix, for example `airTempC`. */
  quantity: string;
  value: number;
  reason: InputErrorReason;
  /** Lowest and highest accepted value, where the reason is `range`. */
  min?: number;
  max?: number;
  /** Unit in words a person reads, for example `°C`. */
  unit?: string;
  /** Which entry, where the argument is a list. */
  index?: number;
  /** A sentence for what the numbers alone do not say. */
  note?: string;
}

/**
 * The one error the engine throws: an input outside the range a method is stated for.
 * It carries the quantity, its value and the accepted range so that a caller can build its own sentence.
 */
export class EngineInputError extends Error {
  readonly detail: InputErrorDetail;

  constructor(detail: InputErrorDetail) {
    super(describe(detail));
    this.name = "EngineInputError";
    this.detail = detail;
  }
}

/**
 * Returns `value` when it is a finite number between `min` and `max`; throws {@link EngineInputError} otherwise.
 *
 * @param quantity name of the argument with its unit suffix
 * @param unit unit as a person reads it
 */
export function requireInRange(
  quantity: string,
  value: number,
  min: number,
  max: number,
  unit = "",
  index?: number,
): number {
  if (!Number.isFinite(value))
    throw new EngineInputError({ quantity, value, reason: "notFinite", unit, index });
  if (value < min || value > max) {
    throw new EngineInputError({ quantity, value, reason: "range", min, max, unit, index });
  }
  return value;
}

function describe(detail: InputErrorDetail): string {
  const where = detail.index === undefined ? detail.quantity : `${detail.quantity}[${detail.index}]`;
  const unit = detail.unit ? ` ${detail.unit}` : "";
  const tail = detail.note ? ` ${detail.note}` : "";
  if (detail.reason === "range") {
    return `${where} is ${detail.value}${unit}; it must lie between ${detail.min}${unit} and ${detail.max}${unit}.${tail}`;
  }
  if (detail.reason === "notFinite") return `${where} is not a finite number (${detail.value}).${tail}`;
  return `${where} is ${detail.value}${unit}.${tail}`;
}
