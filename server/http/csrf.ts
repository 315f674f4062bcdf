import { csrfSync } from "csrf-sync";
import type { Request } from "express";

const { generateToken, csrfSynchronisedProtection } = csrfSync({
  getTokenFromRequest: (request) => request.headers["x-csrf-token"] as string | undefined,
});

/** Refuses every changing request that does not carry the token of its own session. */
export const csrfProtection = csrfSynchronisedProtection;

export function csrfTokenOf(request: Request): string {
  return generateToken(request);
}
