import { z } from "zod";
import { idParams } from "../../contracts/common.ts";
import { invitePersonRequest, type PersonView, removePersonRequest } from "../../contracts/people.ts";
import { invalid, notFound } from "../../errors.ts";
import { type Call, route } from "../../http/route.ts";
import { Cooperative } from "../../models/cooperative.ts";
import { Farm } from "../../models/farm.ts";
import { FarmPerson } from "../../models/farm-person.ts";
import { Membership } from "../../models/membership.ts";
import { Person } from "../../models/person.ts";
import { cooperativePolicy } from "../../policies/cooperative-policy.ts";
import { authorize } from "../../policies/policy.ts";
import { invitationLetter } from "../mail/letters.ts";
import { findOrInvite } from "./find-or-invite.ts";

const listRequest = z.object({ params: idParams });

async function listPeople({ input, actor, transaction }: Call<typeof listRequest>) {
  const cooperative = await Cooperative.findByPk(input.params.id, { transaction });
  authorize(actor, cooperativePolicy, "readPeople", cooperative, "That co-operative");
  const memberships = await Membership.findAll({ where: { cooperativeId: cooperative.id }, transaction });
  const people = await Person.findAll({
    where: { id: memberships.map((entry) => entry.personId) },
    transaction,
  });
  const farms = await Farm.findAll({ where: { cooperativeId: cooperative.id }, transaction });
  const links = await FarmPerson.findAll({ where: { farmId: farms.map((farm) => farm.id) }, transaction });
  const farmName = new Map(farms.map((farm) => [farm.id, farm.name]));
  const items = people.map(
    (person): PersonView => ({
      id: person.id,
      name: person.name,
      email: person.email,
      roles: memberships.filter((entry) => entry.personId === person.id).map((entry) => entry.role),
      hasSignedIn: person.lastSeenAt !== null,
      farmNames: links
        .filter((link) => link.personId === person.id)
        .map((link) => farmName.get(link.farmId) ?? ""),
    }),
  );
  return { items: items.sort((a, b) => a.name.localeCompare(b.name)) };
}

async function invitePerson(call: Call<typeof invitePersonRequest>) {
  const { input, actor, transaction, mailer, config } = call;
  const cooperative = await Cooperative.findByPk(input.params.id, { transaction });
  authorize(actor, cooperativePolicy, "managePeople", cooperative, "That co-operative");
  const { person, isNew } = await findOrInvite({ ...input.body, cooperativeId: cooperative.id }, transaction);
  if (!isNew) throw invalid({ email: `${person.name} already has this role here.` });
  mailer.write(invitationLetter(person, cooperative.name, config.publicUrl));
  return listPeople({ ...call, input: { params: input.params } });
}

/** Takes a role away. Farms keep their history; the last manager cannot be removed. */
async function removePerson({ input, actor, transaction }: Call<typeof removePersonRequest>) {
  const { id, personId, role } = input.params;
  const cooperative = await Cooperative.findByPk(id, { transaction });
  authorize(actor, cooperativePolicy, "managePeople", cooperative, "That co-operative");
  const membership = await Membership.findOne({ where: { cooperativeId: id, personId, role }, transaction });
  if (membership === null) throw notFound("That membership");
  if (
    role === "manager" &&
    (await Membership.count({ where: { cooperativeId: id, role }, transaction })) === 1
  ) {
    throw invalid({ role: "The co-operative needs at least one manager." });
  }
  await membership.destroy({ transaction });
  if (role === "manager") return;
  const farms = await Farm.findAll({ where: { cooperativeId: id }, attributes: ["id"], transaction });
  await FarmPerson.destroy({ where: { personId, role, farmId: farms.map((farm) => farm.id) }, transaction });
}

export const peopleRoutes = [
  route({
    method: "get",
    path: "/api/cooperatives/:id/people",
    summary: "People of a co-operative",
    schema: listRequest,
    run: listPeople,
  }),
  route({
    method: "post",
    path: "/api/cooperatives/:id/people",
    summary: "Invite a person",
    status: 201,
    schema: invitePersonRequest,
    run: invitePerson,
  }),
  route({
    method: "delete",
    path: "/api/cooperatives/:id/people/:personId/:role",
    summary: "Take a role away",
    status: 204,
    schema: removePersonRequest,
    run: removePerson,
  }),
];
