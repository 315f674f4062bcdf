import type { RequestHandler } from "express";
import { rateLimit } from "express-rate-limit";
import helmet from "helmet";
import type { Config } from "../config.ts";
import { AppError } from "../errors.ts";

/**
 * Strict headers. Inline styles are needed by the map and chart libraries; scripts come from this address only.
 * Over plain http (local use) nothing is upgraded to https.
 */
export function securityHeaders(config: Config): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'none'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", "data:", "blob:"],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        manifestSrc: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        baseUri: ["'none'"],
        objectSrc: ["'none'"],
        upgradeInsecureRequests: config.production ? [] : null,
      },
    },
    strictTransportSecurity: config.production ? { maxAge: 15_552_000 } : false,
    referrerPolicy: { policy: "same-origin" },
  });
}

/** Counts requests by signed-in person, or by address where nobody is signed in. */
export function requestLimit(config: Config): RequestHandler {
  return rateLimit({
    windowMs: 60_000,
    limit: config.rateLimitPerMinute,
    standardHeaders: "draft-8",
    legacyHeaders: false,
    keyGenerator: (request) => request.session?.personId ?? `ip:${request.ip ?? "unknown"}`,
    validate: { keyGeneratorIpFallback: false },
    handler: (_request, _response, next) =>
      next(
        new AppError("too_many_requests", 429, "Too many requests in a short time. Please wait a minute."),
      ),
  });
}
