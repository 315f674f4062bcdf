import type { Request, RequestHandler, Response } from "express";
import { type Sequelize, Transaction } from "sequelize";
import type { z } from "zod";
import type { Config } from "../config.ts";
import { invalid, notSignedIn } from "../errors.ts";
import type { Mail } from "../features/mail/mailer.ts";
import { loadActor } from "../features/session/load-actor.ts";
import { csrfTokenOf } from "./csrf.ts";
import type { Route } from "./route.ts";

/**
 * Each read sees what others have kept by then. Under the database's own default a read after waiting for a lock would still see
 * the rows of the moment the transaction began.
 */
const ISOLATION = Transaction.ISOLATION_LEVELS.READ_COMMITTED;

export interface Services {
  sequelize: Sequelize;
  config: Config;
  mailer: Mail;
}

/** All problems at once, each under the path the form knows it by. */
export function fieldsOf(error: z.ZodError): Record<string, string> {
  const fields: Record<string, string> = {};
  for (const issue of error.issues) {
    const path = issue.path.filter(
      (part, index) => !(index === 0 && ["body", "query", "params"].includes(String(part))),
    );
    fields[path.join(".") || "form"] ??= sentence(issue);
  }
  return fields;
}

function sentence(issue: z.core.$ZodIssue): string {
  if (issue.code === "unrecognized_keys") return `Not known here: ${issue.keys.join(", ")}.`;
  if (issue.code === "invalid_format" && issue.format === "uuid") return "That address is not complete.";
  return issue.message;
}

/** Identifiers that cannot exist answer 404 like any other that is not there. */
function parse(route: Route, request: Request): unknown {
  const parsed = route.schema.safeParse({ params: request.params, query: request.query, body: request.body });
  if (parsed.success) return parsed.data;
  throw invalid(fieldsOf(parsed.error));
}

/**
 * Session, input, one transaction, controller, answer, in this order; an error rolls everything back.
 * Letters are handed over only after the transaction has been kept.
 */
export function handle(route: Route, services: Services): RequestHandler {
  return async (request: Request, response: Response) => {
    const personId = request.session?.personId;
    const actor = personId === undefined ? null : await loadActor(personId);
    if (actor === null) throw notSignedIn();
    const input = parse(route, request);
    const outgoing = services.mailer.open();
    const answer = await services.sequelize.transaction({ isolationLevel: ISOLATION }, (transaction) =>
      route.run({
        input,
        actor,
        transaction,
        config: services.config,
        mailer: outgoing,
        csrfToken: () => csrfTokenOf(request),
      }),
    );
    outgoing.deliver();
    if (route.status === 204) response.status(204).end();
    else response.status(route.status).json(answer);
  };
}
