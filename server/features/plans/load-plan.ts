import type { Transaction } from "sequelize";
import { Building } from "../../models/building.ts";
import { Farm } from "../../models/farm.ts";
import { Plan } from "../../models/plan.ts";
import type { Actor } from "../../policies/actor.ts";
import { planPolicy } from "../../policies/farm-policy.ts";
import { authorize } from "../../policies/policy.ts";

export interface LoadedPlan {
  plan: Plan;
  building: Building;
  farm: Farm;
}

/** Loads a plan with its building and farm and checks that the person may do `action` with it. */
export async function loadPlan(
  id: string,
  action: keyof typeof planPolicy,
  actor: Actor,
  transaction: Transaction,
): Promise<LoadedPlan> {
  const plan = await Plan.findByPk(id, { transaction });
  const building = plan === null ? null : await Building.findByPk(plan.buildingId, { transaction });
  const farm = building === null ? null : await Farm.findByPk(building.farmId, { transaction });
  const target = plan === null || farm === null ? null : planTarget(plan, farm);
  authorize(actor, planPolicy, action, target, "That plan");
  return { plan: plan as Plan, building: building as Building, farm: farm as Farm };
}

/** A plan as its policy sees it: its farm and whether it was sent. */
export function planTarget(plan: Plan, farm: Farm) {
  const { id, cooperativeId, sharedWithManager } = farm;
  return { id, cooperativeId, sharedWithManager, status: plan.status };
}
