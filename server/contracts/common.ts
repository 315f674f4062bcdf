import { z } from "zod";

/** The one body of every error answer. `fields` maps a contract path to a sentence a person can act on. */
export interface ErrorBody {
  error: { code: ErrorCode; message: string; fields: Record<string, string> };
}

export type ErrorCode =
  | "invalid_input"
  | "not_signed_in"
  | "forbidden"
  | "not_found"
  | "stale"
  | "conflict"
  | "too_large"
  | "too_many_requests"
  | "bad_json"
  | "bad_csrf"
  | "cannot_calculate"
  | "internal_error";

export const idSchema = z.uuid();
export const idParams = z.object({ id: idSchema });

export const latitudeSchema = z
  .number("Latitude must be a number.")
  .min(-90, "Latitude must lie between -90° and 90°. Latitude and longitude may be swapped.")
  .max(90, "Latitude must lie between -90° and 90°. Latitude and longitude may be swapped.");
export const longitudeSchema = z
  .number("Longitude must be a number.")
  .min(-180, "Longitude must lie between -180° and 180°.")
  .max(180, "Longitude must lie between -180° and 180°.");

export const positionSchema = z.strictObject({ latitudeDeg: latitudeSchema, longitudeDeg: longitudeSchema });
export type Position = z.infer<typeof positionSchema>;

/** A name a person gives to a thing. */
export function nameSchema(label: string, max = 80) {
  return z
    .string(`${label} is missing.`)
    .trim()
    .min(1, `${label} is missing.`)
    .max(max, `${label} may have at most ${max} letters.`);
}

/** Lists are sent whole under one key, so that more can be added beside it. */
export interface ListOf<T> {
  items: T[];
}
