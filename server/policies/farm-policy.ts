import { type Actor, hasRole, worksAs, worksOnFarm } from "./actor.ts";

export interface FarmTarget {
  id: string;
  cooperativeId: string;
  sharedWithManager: boolean;
}

const manages = (actor: Actor, farm: FarmTarget) => hasRole(actor, farm.cooperativeId, "manager");

/** The manager sees that a farm exists and assigns advisers; surveys and plans are opened by the farmer's choice only. */
export const farmPolicy = {
  read: (actor: Actor, farm: FarmTarget) => worksOnFarm(actor, farm.id) || manages(actor, farm),
  readSurvey: (actor: Actor, farm: FarmTarget) =>
    worksOnFarm(actor, farm.id) || (manages(actor, farm) && farm.sharedWithManager),
  update: (actor: Actor, farm: FarmTarget) => worksOnFarm(actor, farm.id),
  share: (actor: Actor, farm: FarmTarget) => worksAs(actor, farm.id, "farmer"),
  assign: (actor: Actor, farm: FarmTarget) => manages(actor, farm) || worksAs(actor, farm.id, "advisor"),
  addBuilding: (actor: Actor, farm: FarmTarget) => worksOnFarm(actor, farm.id),
  survey: (actor: Actor, farm: FarmTarget) => worksOnFarm(actor, farm.id),
  plan: (actor: Actor, farm: FarmTarget) => worksAs(actor, farm.id, "advisor"),
  answer: (actor: Actor, farm: FarmTarget) => worksAs(actor, farm.id, "farmer"),
  delete: (actor: Actor, farm: FarmTarget) => worksAs(actor, farm.id, "advisor"),
};

/** A building is visible to those who may open its survey; a manager without consent sees its row in the sites table only. */
export const buildingPolicy = {
  read: farmPolicy.readSurvey,
  update: farmPolicy.update,
  delete: farmPolicy.delete,
  survey: farmPolicy.survey,
  plan: farmPolicy.plan,
};

/** Drafts are the adviser's own; a plan is read by the others once it is sent. */
export interface PlanTarget extends FarmTarget {
  status: string;
}

export const planPolicy = {
  read: (actor: Actor, plan: PlanTarget) =>
    worksAs(actor, plan.id, "advisor") || (plan.status !== "draft" && farmPolicy.readSurvey(actor, plan)),
  send: farmPolicy.plan,
  answer: farmPolicy.answer,
  write: farmPolicy.update,
};
