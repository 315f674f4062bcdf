import type { Transaction } from "sequelize";
import type { Role } from "../../contracts/people.ts";
import { Membership } from "../../models/membership.ts";
import { Person } from "../../models/person.ts";

interface Invitation {
  name: string;
  email: string;
  role: Role;
  cooperativeId: string;
}

/** The person with this e-mail address, added when new, with the role in the co-operative. `isNew` asks for a letter. */
export async function findOrInvite(invitation: Invitation, transaction: Transaction) {
  const email = invitation.email.toLowerCase();
  const [person] = await Person.findOrCreate({
    where: { email },
    defaults: { name: invitation.name, email },
    transaction,
  });
  const key = { personId: person.id, cooperativeId: invitation.cooperativeId, role: invitation.role };
  const [, isNew] = await Membership.findOrCreate({ where: key, defaults: key, transaction });
  return { person, isNew };
}
