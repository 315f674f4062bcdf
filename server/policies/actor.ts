import type { Role } from "../contracts/people.ts";

/** The signed-in person with everything a policy needs, loaded once per request. */
export interface Actor {
  personId: string;
  name: string;
  email: string;
  memberships: { cooperativeId: string; role: Role }[];
  /** Farms the person works on, and as what. */
  farms: { farmId: string; role: "advisor" | "farmer" }[];
}

export function worksOnFarm(actor: Actor, farmId: string): boolean {
  return actor.farms.some((farm) => farm.farmId === farmId);
}

export function worksAs(actor: Actor, farmId: string, role: "advisor" | "farmer"): boolean {
  return actor.farms.some((farm) => farm.farmId === farmId && farm.role === role);
}

export function hasRole(actor: Actor, cooperativeId: string, role: Role): boolean {
  return actor.memberships.some((entry) => entry.cooperativeId === cooperativeId && entry.role === role);
}
