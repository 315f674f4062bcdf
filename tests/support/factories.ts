import type { Role } from "../../server/contracts/people.ts";
import { defaultQuantity } from "../../server/contracts/quantity.ts";
import { demoPeople } from "../../server/database/demo/people.ts";
import { Cooperative } from "../../server/models/cooperative.ts";
import { Farm } from "../../server/models/farm.ts";
import { FarmPerson } from "../../server/models/farm-person.ts";
import { Membership } from "../../server/models/membership.ts";
import { Person } from "../../server/models/person.ts";

/** Only people the sign-in stand-in knows can sign in; tests borrow their addresses by key. */
export function emailOf(key: string): string {
  const person = demoPeople.find((entry) => entry.key === key);
  if (person === undefined) throw new Error(`no demo person "${key}"`);
  return person.email;
}

export async function buildCooperative(name = "Test Co-operative"): Promise<Cooperative> {
  return Cooperative.create({ name, country: "IE" });
}

/** A person with roles in a co-operative; `key` borrows a demo person's address. */
export async function buildPerson(key: string, cooperative: Cooperative, roles: Role[]): Promise<Person> {
  const [person] = await Person.findOrCreate({
    where: { email: emailOf(key) },
    defaults: { email: emailOf(key), name: `Test ${key}` },
  });
  for (const role of roles) {
    await Membership.create({ personId: person.id, cooperativeId: cooperative.id, role });
  }
  return person;
}

interface FarmOptions {
  cooperative: Cooperative;
  advisor?: Person;
  farmer?: Person;
  name?: string;
  sharedWithManager?: boolean;
}

export async function buildFarm({
  cooperative,
  advisor,
  farmer,
  name = "Test farm",
  sharedWithManager = false,
}: FarmOptions) {
  const farm = await Farm.create({
    cooperativeId: cooperative.id,
    name,
    place: "Somewhere",
    latitudeDeg: 53.36,
    longitudeDeg: -7.48,
    sharedWithManager,
  });
  if (advisor) await FarmPerson.create({ farmId: farm.id, personId: advisor.id, role: "advisor" });
  if (farmer) await FarmPerson.create({ farmId: farm.id, personId: farmer.id, role: "farmer" });
  return farm;
}

/** Body of a request that pins a round-arch tunnel near {@link buildFarm}'s place. */
export const tunnelBody = {
  name: "Tunnel 1",
  kind: "greenhouse",
  shapeType: "roundArch",
  position: { latitudeDeg: 53.361, longitudeDeg: -7.481 },
  footprint: {
    length: defaultQuantity(96, "ft", "measured"),
    width: defaultQuantity(30, "ft", "measured"),
    ridgeBearing: defaultQuantity(85, "deg", "measured"),
  },
};
