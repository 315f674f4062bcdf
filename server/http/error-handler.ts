import type { ErrorRequestHandler } from "express";
import type { Logger } from "pino";
import type { ErrorBody } from "../contracts/common.ts";
import { EngineInputError } from "../engine/errors.ts";
import { AppError } from "../errors.ts";

/** Turns what Express and its parsers throw into the product's own errors, by their stable `type` and `code`. */
function known(error: unknown): AppError | null {
  if (error instanceof AppError) return error;
  if (error instanceof EngineInputError) return new AppError("cannot_calculate", 422, error.message);
  const type = (error as { type?: string }).type;
  if (type === "entity.too.large")
    return new AppError("too_large", 413, "That is too large. At most 1 MB can be sent at once.");
  if (type === "entity.parse.failed") return new AppError("bad_json", 400, "The request is not valid JSON.");
  if (type === "encoding.unsupported" || type === "charset.unsupported") {
    return new AppError("bad_json", 415, "The request is written in an encoding that is not supported.");
  }
  if ((error as { code?: string }).code === "EBADCSRFTOKEN") {
    return new AppError("bad_csrf", 403, "This page is out of date. Please load it again.");
  }
  const { status } = error as { status?: number };
  if (status === 404) return new AppError("not_found", 404, "That address does not exist.");
  if (status !== undefined && status >= 400 && status < 500)
    return new AppError("bad_json", status, "The request could not be read.");
  if (error instanceof URIError) return new AppError("not_found", 404, "That address does not exist.");
  return null;
}

export function errorHandler(log: Logger): ErrorRequestHandler {
  return (error, request, response, next) => {
    if (response.headersSent) return next(error);
    const answer =
      known(error) ??
      new AppError("internal_error", 500, "Something went wrong on our side. Nothing was changed.");
    if (answer.status >= 500)
      log.error({ err: error, method: request.method, path: request.path }, "request failed");
    const body: ErrorBody = { error: { code: answer.code, message: answer.message, fields: answer.fields } };
    response.status(answer.status).json(body);
  };
}
