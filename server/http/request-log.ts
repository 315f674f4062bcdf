import type { RequestHandler } from "express";
import { type Logger, pino } from "pino";
import { pinoHttp } from "pino-http";
import type { Config } from "../config.ts";

export function createLog(config: Config): Logger {
  return pino({ level: config.logLevel });
}

/** One line per request, without cookies, tokens or query values: sign-in addresses carry secrets in them. */
export function requestLog(log: Logger): RequestHandler {
  return pinoHttp({
    logger: log,
    customLogLevel: (_request, response, error) => {
      if (error || response.statusCode >= 500) return "error";
      return response.statusCode >= 400 ? "warn" : "info";
    },
    serializers: {
      req: (request: { id: unknown; method: string; url: string }) => ({
        id: request.id,
        method: request.method,
        path: request.url.split("?")[0],
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
  });
}
