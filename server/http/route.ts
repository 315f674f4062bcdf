import type { Transaction } from "sequelize";
import type { z } from "zod";
import type { Config } from "../config.ts";
import type { Mailer } from "../features/mail/mailer.ts";
import type { Actor } from "../policies/actor.ts";

/** What every controller is given. It never sees the HTTP request or answer. */
export interface Call<S extends z.ZodType> {
  input: z.output<S>;
  actor: Actor;
  transaction: Transaction;
  config: Config;
  mailer: Mailer;
  /** The token the browser sends back with every change. */
  csrfToken(): string;
}

export type Method = "get" | "post" | "put" | "patch" | "delete";

/** One route: the router, the API description and the walk of the authorisation test are all made from this. */
export interface Route {
  method: Method;
  /** Express path, such as `/api/farms/:id`. */
  path: string;
  summary: string;
  /** Open routes answer without a session. */
  open: boolean;
  status: 200 | 201 | 204;
  schema: z.ZodType;
  run(call: Call<z.ZodType>): Promise<unknown>;
}

interface RouteDefinition<S extends z.ZodType> {
  method: Method;
  path: string;
  summary: string;
  status?: 200 | 201 | 204;
  schema: S;
  run(call: Call<S>): Promise<unknown>;
}

/** Declares a route for signed-in people; `run` gets the input in the type of its own schema. */
export function route<S extends z.ZodType>(definition: RouteDefinition<S>): Route {
  return { open: false, status: 200, ...definition, run: (call) => definition.run(call as Call<S>) };
}
