import { z } from "zod";
import { changePreferencesRequest } from "../../contracts/people.ts";
import { invalid, notSignedIn } from "../../errors.ts";
import { type Call, route } from "../../http/route.ts";
import { Person } from "../../models/person.ts";
import { presentMe } from "./present-me.ts";

const nothing = z.object({});

async function changePreferences({
  input,
  actor,
  transaction,
  csrfToken,
}: Call<typeof changePreferencesRequest>) {
  const person = await Person.findByPk(actor.personId, { transaction });
  if (person === null) throw notSignedIn();
  const { units, theme, activeRole, activeCooperativeId } = input.body;
  if (activeRole !== undefined || activeCooperativeId !== undefined) {
    const role = activeRole ?? person.activeRole;
    const cooperativeId = activeCooperativeId ?? person.activeCooperativeId;
    const held = actor.memberships.some(
      (entry) => entry.role === role && entry.cooperativeId === cooperativeId,
    );
    if (!held) throw invalid({ activeRole: "You do not have this role in this co-operative." });
    person.set({ activeRole: role, activeCooperativeId: cooperativeId });
  }
  await person.set({ units: units ?? person.units, theme: theme ?? person.theme }).save({ transaction });
  return presentMe(actor, csrfToken(), transaction);
}

export const sessionRoutes = [
  route({
    method: "get",
    path: "/api/me",
    summary: "The signed-in person, roles and preferences",
    schema: nothing,
    run: ({ actor, transaction, csrfToken }) => presentMe(actor, csrfToken(), transaction),
  }),
  route({
    method: "patch",
    path: "/api/me/preferences",
    summary: "Choose units, theme and the role to work under",
    schema: changePreferencesRequest,
    run: changePreferences,
  }),
];
