import { type Actor, hasRole } from "./actor.ts";

export interface CooperativeTarget {
  id: string;
}

const isMember = (actor: Actor, target: CooperativeTarget) =>
  actor.memberships.some((entry) => entry.cooperativeId === target.id);

export const cooperativePolicy = {
  read: isMember,
  readSites: (actor: Actor, target: CooperativeTarget) => hasRole(actor, target.id, "manager"),
  readPeople: (actor: Actor, target: CooperativeTarget) =>
    hasRole(actor, target.id, "manager") || hasRole(actor, target.id, "advisor"),
  managePeople: (actor: Actor, target: CooperativeTarget) => hasRole(actor, target.id, "manager"),
  addFarm: (actor: Actor, target: CooperativeTarget) => hasRole(actor, target.id, "advisor"),
};
