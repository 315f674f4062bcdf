import type { Transaction } from "sequelize";
import type { FarmPersonView, FarmView } from "../../contracts/farms.ts";
import { Building } from "../../models/building.ts";
import type { Farm } from "../../models/farm.ts";
import { FarmPerson } from "../../models/farm-person.ts";
import { Person } from "../../models/person.ts";
import type { Actor } from "../../policies/actor.ts";
import { farmPolicy } from "../../policies/farm-policy.ts";

async function peopleByFarm(
  farmIds: string[],
  transaction?: Transaction,
): Promise<Map<string, FarmPersonView[]>> {
  const links = await FarmPerson.findAll({ where: { farmId: farmIds }, transaction });
  const people = await Person.findAll({ where: { id: links.map((link) => link.personId) }, transaction });
  const byId = new Map(people.map((person) => [person.id, person]));
  const result = new Map<string, FarmPersonView[]>();
  for (const link of links) {
    const person = byId.get(link.personId);
    if (person === undefined) continue;
    const list = result.get(link.farmId) ?? [];
    result.set(link.farmId, [
      ...list,
      { id: person.id, name: person.name, email: person.email, role: link.role },
    ]);
  }
  return result;
}

/** Farms as their people see them, with what each of them may do. */
export async function presentFarms(
  farms: Farm[],
  actor: Actor,
  transaction?: Transaction,
): Promise<FarmView[]> {
  const ids = farms.map((farm) => farm.id);
  const people = await peopleByFarm(ids, transaction);
  const buildings = await Building.findAll({ where: { farmId: ids }, attributes: ["farmId"], transaction });
  return farms.map((farm) => ({
    id: farm.id,
    cooperativeId: farm.cooperativeId,
    name: farm.name,
    place: farm.place,
    latitudeDeg: farm.latitudeDeg,
    longitudeDeg: farm.longitudeDeg,
    sharedWithManager: farm.sharedWithManager,
    people: people.get(farm.id) ?? [],
    buildingCount: buildings.filter((building) => building.farmId === farm.id).length,
    can: {
      update: farmPolicy.update(actor, farm),
      addBuilding: farmPolicy.addBuilding(actor, farm),
      assign: farmPolicy.assign(actor, farm),
      share: farmPolicy.share(actor, farm),
      delete: farmPolicy.delete(actor, farm),
    },
  }));
}

export async function presentFarm(farm: Farm, actor: Actor, transaction?: Transaction): Promise<FarmView> {
  const [view] = await presentFarms([farm], actor, transaction);
  if (view === undefined) throw new Error("a farm was presented and is not there");
  return view;
}
