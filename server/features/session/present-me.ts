import { Op, type Transaction } from "sequelize";
import type { MeView, Role } from "../../contracts/people.ts";
import { notSignedIn } from "../../errors.ts";
import { Building } from "../../models/building.ts";
import { Cooperative } from "../../models/cooperative.ts";
import { Person } from "../../models/person.ts";
import { Plan } from "../../models/plan.ts";
import type { Actor } from "../../policies/actor.ts";

const roleOrder: Role[] = ["advisor", "manager", "farmer"];

/** How many plans wait for this person: an adviser's answer to a question, or a farmer's decision. */
async function countWaiting(actor: Actor, transaction?: Transaction): Promise<number> {
  const count = async (role: "advisor" | "farmer", status: "asked" | "sent") => {
    const farmIds = actor.farms.filter((farm) => farm.role === role).map((farm) => farm.farmId);
    if (farmIds.length === 0) return 0;
    const buildings = await Building.findAll({ where: { farmId: farmIds }, attributes: ["id"], transaction });
    return Plan.count({
      where: { buildingId: { [Op.in]: buildings.map(({ id }) => id) }, status },
      transaction,
    });
  };
  const [asked, sent] = await Promise.all([count("advisor", "asked"), count("farmer", "sent")]);
  return asked + sent;
}

function activeMembership(person: Person, actor: Actor) {
  const chosen = actor.memberships.find(
    (entry) => entry.cooperativeId === person.activeCooperativeId && entry.role === person.activeRole,
  );
  const first = roleOrder.map((role) => actor.memberships.find((entry) => entry.role === role)).find(Boolean);
  return chosen ?? first ?? null;
}

/** The signed-in person as the browser needs it. */
export async function presentMe(actor: Actor, csrfToken: string, transaction?: Transaction): Promise<MeView> {
  const person = await Person.findByPk(actor.personId, { transaction });
  if (person === null) throw notSignedIn();
  const ids = [...new Set(actor.memberships.map((entry) => entry.cooperativeId))];
  const cooperatives = await Cooperative.findAll({ where: { id: ids }, transaction });
  const nameOf = new Map(cooperatives.map((entry) => [entry.id, entry.name]));
  const active = activeMembership(person, actor);
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    units: person.units,
    theme: person.theme,
    memberships: actor.memberships.map((entry) => ({
      ...entry,
      cooperativeName: nameOf.get(entry.cooperativeId) ?? "",
    })),
    activeRole: active?.role ?? null,
    activeCooperativeId: active?.cooperativeId ?? null,
    csrfToken,
    openReviews: await countWaiting(actor, transaction),
  };
}
