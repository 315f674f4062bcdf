import type { ErrorCode } from "./contracts/common.ts";

/** An error whose words may be shown to the person who caused it. */
export class AppError extends Error {
  readonly code: ErrorCode;
  readonly status: number;
  readonly fields: Record<string, string>;

  constructor(code: ErrorCode, status: number, message: string, fields: Record<string, string> = {}) {
    super(message);
    this.name = "AppError";
    this.code = code;
    this.status = status;
    this.fields = fields;
  }
}

export const notSignedIn = () => new AppError("not_signed_in", 401, "Please sign in first.");
export const forbidden = (message = "You may see this, but not change it.") =>
  new AppError("forbidden", 403, message);
export const notFound = (what: string) =>
  new AppError("not_found", 404, `${what} does not exist, or you may not see it.`);
export const stale = (message: string) => new AppError("stale", 409, message);
export const conflict = (message: string, fields: Record<string, string> = {}) =>
  new AppError("conflict", 409, message, fields);
export const invalid = (fields: Record<string, string>, message = "Some answers need another look.") =>
  new AppError("invalid_input", 422, message, fields);
export const cannotCalculate = (message: string, fields: Record<string, string> = {}) =>
  new AppError("cannot_calculate", 422, message, fields);
