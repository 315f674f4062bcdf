import type { Transaction } from "sequelize";
import { FarmPerson } from "../../models/farm-person.ts";
import { Person } from "../../models/person.ts";

/** People of a farm in one role, for letters. */
export async function contactsOf(
  farmId: string,
  role: "advisor" | "farmer",
  transaction: Transaction,
): Promise<Person[]> {
  const links = await FarmPerson.findAll({ where: { farmId, role }, transaction });
  return Person.findAll({ where: { id: links.map((link) => link.personId) }, transaction });
}
