import { FarmPerson } from "../../models/farm-person.ts";
import { Membership } from "../../models/membership.ts";
import { Person } from "../../models/person.ts";
import type { Actor } from "../../policies/actor.ts";

/** Loads a person with memberships and farms; null when the person is gone. */
export async function loadActor(personId: string): Promise<Actor | null> {
  const [person, memberships, farms] = await Promise.all([
    Person.findByPk(personId),
    Membership.findAll({ where: { personId } }),
    FarmPerson.findAll({ where: { personId } }),
  ]);
  if (person === null) return null;
  return {
    personId,
    name: person.name,
    email: person.email,
    memberships: memberships.map(({ cooperativeId, role }) => ({ cooperativeId, role })),
    farms: farms.map(({ farmId, role }) => ({ farmId, role })),
  };
}
