import { forbidden, notFound } from "../errors.ts";
import type { Actor } from "./actor.ts";

/** Rules of one kind of thing: pure functions of the person and a loaded row. `read` decides whether it is visible at all. */
export type Policy<T> = { read(actor: Actor, target: T): boolean } & Record<
  string,
  (actor: Actor, target: T) => boolean
>;

/** 404 for missing and hidden alike; 403 for visible but refused. Narrows the row to non-null. */
export function authorize<T, P extends Policy<T>>(
  actor: Actor,
  policy: P,
  action: keyof P & string,
  target: T | null,
  what = "That record",
): asserts target is T {
  if (target === null || !policy.read(actor, target)) throw notFound(what);
  if (!policy[action]?.(actor, target)) throw forbidden();
}
