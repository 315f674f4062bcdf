import { z } from "zod";
import { idParams } from "../../contracts/common.ts";
import type {
  answerPlanRequest,
  createPlanRequest,
  PlanAnswer,
  previewPlanRequest,
  sendPlanRequest,
  writeMessageRequest,
} from "../../contracts/plans.ts";
import { surveyProblems } from "../../contracts/survey-rules.ts";
import { conflict, invalid } from "../../errors.ts";
import type { Call } from "../../http/route.ts";
import { Plan } from "../../models/plan.ts";
import { PlanMessage } from "../../models/plan-message.ts";
import { worksAs } from "../../policies/actor.ts";
import { loadBuilding } from "../buildings/load-building.ts";
import { referenceProblems } from "../buildings/survey-references.ts";
import { loadSurvey } from "../buildings/survey-store.ts";
import { recordEvent } from "../events/record-event.ts";
import { answerLetter, messageLetter, planSentLetter } from "../mail/letters.ts";
import { contactsOf } from "./farm-contacts.ts";
import { isOutdated, planListAttributes, summaryOf } from "./latest-plans.ts";
import { loadPlan } from "./load-plan.ts";
import { summaryOfResult, workOut } from "./plan-runner.ts";
import { isAnswerable, presentPlan } from "./present-plan.ts";

export const planRequest = z.object({ params: idParams });

/** Works a plan out from the stored survey and keeps it with everything it rests on. */
export async function createPlan({ input, actor, transaction }: Call<typeof createPlanRequest>) {
  const { building, farm } = await loadBuilding(input.params.id, "plan", actor, transaction);
  // The lock makes two plans asked for at once take two numbers.
  await building.reload({ lock: true, transaction });
  const survey = await loadSurvey(building, transaction);
  const { engineInput, result } = await workOut(building, survey, input.body, transaction);
  const newest = await Plan.max<number | null, Plan>("number", {
    where: { buildingId: building.id },
    transaction,
  });
  const plan = await Plan.create(
    {
      buildingId: building.id,
      number: (newest ?? 0) + 1,
      surveyVersion: building.version,
      engineVersion: result.engineVersion,
      choices: input.body,
      survey,
      engineInput,
      result,
      summary: summaryOfResult(result, survey, building),
      createdBy: actor.personId,
    },
    { transaction },
  );
  await recordEvent(
    {
      farmId: farm.id,
      buildingId: building.id,
      personId: actor.personId,
      action: "plan worked out",
      detail: { number: plan.number },
    },
    transaction,
  );
  await plan.reload({ transaction });
  return presentPlan({ plan, building, farm }, actor, transaction);
}

/** Works out a survey that is still being typed; nothing is kept. */
export async function previewPlan({ input, actor, transaction }: Call<typeof previewPlanRequest>) {
  const { building } = await loadBuilding(input.params.id, "survey", actor, transaction);
  const { survey, choices } = input.body;
  const problems = { ...referenceProblems(survey, building.kind), ...surveyProblems(survey) };
  if (Object.keys(problems).length > 0) {
    throw invalid(
      Object.fromEntries(Object.entries(problems).map(([path, words]) => [`survey.${path}`, words])),
    );
  }
  return (await workOut(building, survey, choices, transaction)).result;
}

export async function listPlans({ input, actor, transaction }: Call<typeof planRequest>) {
  const { building, farm } = await loadBuilding(input.params.id, "read", actor, transaction);
  const plans = await Plan.findAll({
    where: { buildingId: building.id },
    attributes: planListAttributes,
    order: [["number", "DESC"]],
    transaction,
  });
  const visible = plans.filter((plan) => plan.status !== "draft" || worksAs(actor, farm.id, "advisor"));
  return { items: visible.map((plan) => summaryOf(plan, building)) };
}

export async function readPlan({ input, actor, transaction }: Call<typeof planRequest>) {
  return presentPlan(await loadPlan(input.params.id, "read", actor, transaction), actor, transaction);
}

export async function sendPlan({ input, actor, transaction, mailer, config }: Call<typeof sendPlanRequest>) {
  const loaded = await loadPlan(input.params.id, "send", actor, transaction);
  const { plan, building, farm } = loaded;
  await plan.reload({ lock: true, transaction });
  if (plan.status !== "draft") throw conflict("This plan was sent before.");
  if (isOutdated(plan, building)) {
    throw conflict(
      "Survey, place or weather station have changed since this plan was worked out. Work it out again first.",
    );
  }
  const blocking = plan.result.warnings.find((warning) => warning.severity === "block");
  if (blocking !== undefined) throw conflict(`${blocking.message} ${blocking.action}`);
  const { optionId, message } = input.body;
  const isNone = plan.result.sizing.noHeaterReason !== null && optionId === "none";
  if (!isNone && !plan.result.sizing.options.some((option) => option.id === optionId)) {
    throw invalid({ optionId: "Choose one of the ways to fit the house." });
  }
  const farmers = await contactsOf(farm.id, "farmer", transaction);
  if (farmers.length === 0)
    throw conflict("This farm has no farmer yet who could answer. Add one on the farm's page.");
  await plan.set({ status: "sent", sentAt: new Date(), proposedOptionId: optionId }).save({ transaction });
  if (message !== "") await addMessage(plan, actor.personId, "advisor", message, null, transaction);
  await recordEvent(
    {
      farmId: farm.id,
      buildingId: building.id,
      personId: actor.personId,
      action: "plan sent",
      detail: { number: plan.number, optionId },
    },
    transaction,
  );
  for (const farmer of farmers)
    mailer.write(planSentLetter(farmer, actor.name, building.name, linkTo(plan, config.publicUrl)));
  return presentPlan(loaded, actor, transaction);
}

const statusByAnswer = { approve: "approved", ask: "asked", decline: "declined" } as const;
const wordsByAnswer: Record<PlanAnswer, string> = {
  approve: "approved",
  ask: "a question",
  decline: "declined",
};

export async function answerPlan({
  input,
  actor,
  transaction,
  mailer,
  config,
}: Call<typeof answerPlanRequest>) {
  const loaded = await loadPlan(input.params.id, "answer", actor, transaction);
  const { plan, building, farm } = loaded;
  await plan.reload({ lock: true, transaction });
  if (!isAnswerable(plan))
    throw conflict("This plan can no longer be answered. Ask your adviser for a new one.");
  const { answer, message } = input.body;
  const decided = answer !== "ask";
  await plan
    .set({
      status: statusByAnswer[answer],
      answeredAt: decided ? new Date() : null,
      answeredBy: decided ? actor.personId : null,
    })
    .save({ transaction });
  const words = message === "" ? (answer === "approve" ? "Approved." : "Declined.") : message;
  await addMessage(plan, actor.personId, "farmer", words, answer, transaction);
  await recordEvent(
    {
      farmId: farm.id,
      buildingId: building.id,
      personId: actor.personId,
      action: `plan ${statusByAnswer[answer]}`,
      detail: { number: plan.number },
    },
    transaction,
  );
  for (const advisor of await contactsOf(farm.id, "advisor", transaction)) {
    mailer.write(
      answerLetter(advisor, actor.name, wordsByAnswer[answer], building.name, linkTo(plan, config.publicUrl)),
    );
  }
  return presentPlan(loaded, actor, transaction);
}

/** An adviser's message answers the farmer's question, so the plan waits for the farmer again. */
export async function writeMessage({
  input,
  actor,
  transaction,
  mailer,
  config,
}: Call<typeof writeMessageRequest>) {
  const loaded = await loadPlan(input.params.id, "write", actor, transaction);
  const { plan, building, farm } = loaded;
  await plan.reload({ lock: true, transaction });
  if (plan.status === "draft") throw conflict("Send the plan first.");
  const role = worksAs(actor, farm.id, "advisor") ? "advisor" : "farmer";
  await addMessage(plan, actor.personId, role, input.body.message, null, transaction);
  if (role === "advisor" && plan.status === "asked") await plan.set({ status: "sent" }).save({ transaction });
  for (const reader of await contactsOf(farm.id, role === "advisor" ? "farmer" : "advisor", transaction)) {
    mailer.write(messageLetter(reader, actor.name, building.name, linkTo(plan, config.publicUrl)));
  }
  return presentPlan(loaded, actor, transaction);
}

function linkTo(plan: Plan, publicUrl: string): string {
  return `${publicUrl}/plans/${plan.id}`;
}

async function addMessage(
  plan: Plan,
  authorId: string,
  authorRole: "advisor" | "farmer",
  text: string,
  answer: PlanAnswer | null,
  transaction: Call<z.ZodType>["transaction"],
): Promise<void> {
  await PlanMessage.create({ planId: plan.id, authorId, authorRole, text, answer }, { transaction });
}
