import { z } from "zod";
import { idParams, idSchema } from "../../contracts/common.ts";
import type { assignAdvisorRequest, createFarmRequest, updateFarmRequest } from "../../contracts/farms.ts";
import { forbidden, invalid } from "../../errors.ts";
import type { Call } from "../../http/route.ts";
import { Cooperative } from "../../models/cooperative.ts";
import { Farm } from "../../models/farm.ts";
import { FarmPerson } from "../../models/farm-person.ts";
import { Membership } from "../../models/membership.ts";
import { cooperativePolicy } from "../../policies/cooperative-policy.ts";
import { farmPolicy } from "../../policies/farm-policy.ts";
import { authorize } from "../../policies/policy.ts";
import { recordEvent } from "../events/record-event.ts";
import { invitationLetter } from "../mail/letters.ts";
import { findOrInvite } from "../people/find-or-invite.ts";
import { presentFarm, presentFarms } from "./present-farm.ts";

export const farmRequest = z.object({ params: idParams });
export const unassignRequest = z.object({ params: z.object({ id: idSchema, personId: idSchema }) });

/** Own farms, and for a manager every farm of the co-operative. */
export async function listFarms({ actor, transaction }: Call<z.ZodObject>) {
  const managed = actor.memberships
    .filter((entry) => entry.role === "manager")
    .map((entry) => entry.cooperativeId);
  const own = await Farm.findAll({ where: { id: actor.farms.map((farm) => farm.farmId) }, transaction });
  const others = await Farm.findAll({ where: { cooperativeId: managed }, transaction });
  const farms = [...new Map([...own, ...others].map((farm) => [farm.id, farm])).values()];
  farms.sort((a, b) => a.name.localeCompare(b.name));
  return { items: await presentFarms(farms, actor, transaction) };
}

export async function createFarm({
  input,
  actor,
  transaction,
  mailer,
  config,
}: Call<typeof createFarmRequest>) {
  const { farmerEmail, farmerName, position, ...rest } = input.body;
  const cooperative = await Cooperative.findByPk(rest.cooperativeId, { transaction });
  authorize(actor, cooperativePolicy, "addFarm", cooperative, "That co-operative");
  if (farmerEmail !== null && farmerName === null)
    throw invalid({ farmerName: "The farmer's name is missing." });
  if (farmerEmail?.toLowerCase() === actor.email) {
    throw invalid({
      farmerEmail: "The farmer must be somebody else: who advises a farm does not answer for it.",
    });
  }
  const farm = await Farm.create({ ...rest, ...position }, { transaction });
  await FarmPerson.create({ farmId: farm.id, personId: actor.personId, role: "advisor" }, { transaction });
  if (farmerEmail !== null && farmerName !== null) {
    const invitation = {
      name: farmerName,
      email: farmerEmail,
      role: "farmer" as const,
      cooperativeId: farm.cooperativeId,
    };
    const { person, isNew } = await findOrInvite(invitation, transaction);
    await FarmPerson.create({ farmId: farm.id, personId: person.id, role: "farmer" }, { transaction });
    if (isNew) mailer.write(invitationLetter(person, cooperative.name, config.publicUrl));
  }
  await recordEvent({ farmId: farm.id, personId: actor.personId, action: "farm created" }, transaction);
  const extended = { ...actor, farms: [...actor.farms, { farmId: farm.id, role: "advisor" as const }] };
  return presentFarm(farm, extended, transaction);
}

export async function readFarm({ input, actor, transaction }: Call<typeof farmRequest>) {
  const farm = await Farm.findByPk(input.params.id, { transaction });
  authorize(actor, farmPolicy, "read", farm, "That farm");
  return presentFarm(farm, actor, transaction);
}

export async function updateFarm({ input, actor, transaction }: Call<typeof updateFarmRequest>) {
  const farm = await Farm.findByPk(input.params.id, { transaction });
  authorize(actor, farmPolicy, "update", farm, "That farm");
  const { position, sharedWithManager, ...names } = input.body;
  if (sharedWithManager !== undefined) {
    if (!farmPolicy.share(actor, farm))
      throw forbidden("Only the farmer decides what the co-operative may see.");
    farm.sharedWithManager = sharedWithManager;
  }
  await farm.set({ ...names, ...position }).save({ transaction });
  await recordEvent(
    { farmId: farm.id, personId: actor.personId, action: "farm changed", detail: input.body },
    transaction,
  );
  return presentFarm(farm, actor, transaction);
}

export async function deleteFarm({ input, actor, transaction }: Call<typeof farmRequest>) {
  const farm = await Farm.findByPk(input.params.id, { transaction });
  authorize(actor, farmPolicy, "delete", farm, "That farm");
  await farm.destroy({ transaction });
}

export async function assignAdvisor({ input, actor, transaction }: Call<typeof assignAdvisorRequest>) {
  const farm = await Farm.findByPk(input.params.id, { transaction });
  authorize(actor, farmPolicy, "assign", farm, "That farm");
  const { personId } = input.body;
  const key = { personId, cooperativeId: farm.cooperativeId, role: "advisor" as const };
  if ((await Membership.findOne({ where: key, transaction })) === null) {
    throw invalid({ personId: "This person is not an adviser of the co-operative." });
  }
  const link = { farmId: farm.id, personId, role: "advisor" as const };
  await FarmPerson.findOrCreate({ where: link, defaults: link, transaction });
  await recordEvent(
    { farmId: farm.id, personId: actor.personId, action: "adviser assigned", detail: { personId } },
    transaction,
  );
  return presentFarm(farm, actor, transaction);
}

export async function unassignAdvisor({ input, actor, transaction }: Call<typeof unassignRequest>) {
  const farm = await Farm.findByPk(input.params.id, { transaction });
  authorize(actor, farmPolicy, "assign", farm, "That farm");
  await FarmPerson.destroy({
    where: { farmId: farm.id, personId: input.params.personId, role: "advisor" },
    transaction,
  });
  await recordEvent(
    {
      farmId: farm.id,
      personId: actor.personId,
      action: "adviser released",
      detail: { personId: input.params.personId },
    },
    transaction,
  );
}
