import type { Transaction } from "sequelize";
import type { PlanMessageView, PlanView } from "../../contracts/plans.ts";
import { FarmPerson } from "../../models/farm-person.ts";
import { Person } from "../../models/person.ts";
import type { Plan } from "../../models/plan.ts";
import { PlanMessage } from "../../models/plan-message.ts";
import type { Actor } from "../../policies/actor.ts";
import { planPolicy } from "../../policies/farm-policy.ts";
import { presentBuildings } from "../buildings/present-building.ts";
import { isOutdated } from "./latest-plans.ts";
import { type LoadedPlan, planTarget } from "./load-plan.ts";

const DAY_MS = 86_400_000;
/** How long a farmer may change an answer. */
const CHANGE_DAYS = 7;

export function changeableUntil(plan: Plan): Date | null {
  return plan.answeredAt === null ? null : new Date(plan.answeredAt.getTime() + CHANGE_DAYS * DAY_MS);
}

/** May this plan be answered now: it was sent or asked about, or its answer is younger than a week. */
export function isAnswerable(plan: Plan, now = new Date()): boolean {
  if (plan.status === "sent" || plan.status === "asked") return true;
  const until = changeableUntil(plan);
  return plan.status !== "draft" && until !== null && now <= until;
}

async function presentMessages(
  plan: Plan,
  actor: Actor,
  transaction?: Transaction,
): Promise<PlanMessageView[]> {
  const messages = await PlanMessage.findAll({
    where: { planId: plan.id },
    order: [["createdAt", "ASC"]],
    transaction,
  });
  const authorIds = messages.flatMap((message) => message.authorId ?? []);
  const authors = await Person.findAll({ where: { id: authorIds }, transaction });
  const nameOf = new Map(authors.map((person) => [person.id, person.name]));
  return messages.map((message) => ({
    id: message.id,
    authorName: nameOf.get(message.authorId ?? "") ?? "Somebody who has left",
    authorRole: message.authorRole,
    mine: message.authorId === actor.personId,
    text: message.text,
    answer: message.answer,
    sentAt: message.createdAt.toISOString(),
  }));
}

/** Whoever made the plan, or the farm's adviser when that person has left. */
async function advisorOf(
  { plan, farm }: LoadedPlan,
  transaction?: Transaction,
): Promise<{ name: string; email: string }> {
  const link = await FarmPerson.findOne({ where: { farmId: farm.id, role: "advisor" }, transaction });
  const personId = plan.createdBy ?? link?.personId;
  const person = personId === undefined ? null : await Person.findByPk(personId, { transaction });
  return { name: person?.name ?? "the co-operative", email: person?.email ?? "" };
}

export async function presentPlan(
  loaded: LoadedPlan,
  actor: Actor,
  transaction?: Transaction,
): Promise<PlanView> {
  const { plan, building, farm } = loaded;
  const [summary] = await presentBuildings([building], new Map([[farm.id, farm]]), actor, transaction);
  if (summary === undefined) throw new Error("a plan was presented without its building");
  const answeredBy =
    plan.answeredBy === null ? null : await Person.findByPk(plan.answeredBy, { transaction });
  const advisor = await advisorOf(loaded, transaction);
  const target = planTarget(plan, farm);
  return {
    id: plan.id,
    number: plan.number,
    buildingId: building.id,
    building: summary,
    status: plan.status,
    createdAt: plan.createdAt.toISOString(),
    createdBy: advisor.name,
    sentAt: plan.sentAt?.toISOString() ?? null,
    answeredAt: plan.answeredAt?.toISOString() ?? null,
    answeredBy: answeredBy?.name ?? null,
    changeableUntil: changeableUntil(plan)?.toISOString() ?? null,
    outdated: isOutdated(plan, building),
    choices: plan.choices,
    proposedOptionId: plan.proposedOptionId,
    survey: plan.survey,
    result: plan.result,
    messages: await presentMessages(plan, actor, transaction),
    advisor,
    can: {
      send: planPolicy.send(actor, target) && plan.status === "draft",
      answer: planPolicy.answer(actor, target) && isAnswerable(plan),
      write: planPolicy.write(actor, target) && plan.status !== "draft",
    },
  };
}
