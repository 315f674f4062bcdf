import type { HousePlanInput } from "../house-input.ts";
import type { InputOrigin, PlanAssumption } from "../plan-types.ts";

/** Origin of an answer: its own, else that of the group it belongs to, else a default. */
export function originOf(input: HousePlanInput, field: string): InputOrigin {
  const origins = input.origins;
  const own = origins[field];
  if (own) return own;
  const below = Object.keys(origins).find((path) => path.startsWith(`${field}.`));
  if (below) return origins[below] ?? "default";
  const parent = field.slice(0, field.lastIndexOf("."));
  return parent.length > 0 ? originOf(input, parent) : "default";
}

/** An assumption that rests on a survey answer. */
export function entry(
  input: HousePlanInput,
  field: string,
  label: string,
  value: number | string,
  unit: string,
  source: string,
): PlanAssumption {
  return { field, label, value, unit, origin: originOf(input, field), source };
}
