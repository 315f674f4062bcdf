import { Op } from "sequelize";
import type { z } from "zod";
import type { ReviewLine } from "../../contracts/plans.ts";
import type { Call } from "../../http/route.ts";
import { Building } from "../../models/building.ts";
import { Farm } from "../../models/farm.ts";
import { Plan } from "../../models/plan.ts";
import { PlanMessage } from "../../models/plan-message.ts";
import { worksAs } from "../../policies/actor.ts";
import { planListAttributes } from "./latest-plans.ts";

/** Plans that were sent on the farms of this person, those that wait for an answer first. */
export async function listReviews({
  actor,
  transaction,
}: Call<z.ZodObject>): Promise<{ items: ReviewLine[] }> {
  const farms = await Farm.findAll({ where: { id: actor.farms.map((farm) => farm.farmId) }, transaction });
  const buildings = await Building.findAll({ where: { farmId: farms.map((farm) => farm.id) }, transaction });
  const plans = await Plan.findAll({
    where: { buildingId: buildings.map((building) => building.id), status: { [Op.ne]: "draft" } },
    attributes: planListAttributes,
    transaction,
  });
  const messages = await PlanMessage.findAll({
    where: { planId: plans.map((plan) => plan.id) },
    order: [["createdAt", "ASC"]],
    transaction,
  });
  const buildingOf = new Map(buildings.map((building) => [building.id, building]));
  const farmOf = new Map(farms.map((farm) => [farm.id, farm]));
  const lastMessage = new Map(messages.map((message) => [message.planId, message]));
  const items = plans.flatMap((plan): ReviewLine[] => {
    const building = buildingOf.get(plan.buildingId);
    const farm = farmOf.get(building?.farmId ?? "");
    if (building === undefined || farm === undefined) return [];
    const last = lastMessage.get(plan.id);
    const waitsForFarmer = plan.status === "sent" && worksAs(actor, farm.id, "farmer");
    const waitsForAdvisor = plan.status === "asked" && worksAs(actor, farm.id, "advisor");
    return [
      {
        planId: plan.id,
        number: plan.number,
        status: plan.status,
        buildingId: building.id,
        buildingName: building.name,
        farmName: farm.name,
        waitsForMe: waitsForFarmer || waitsForAdvisor,
        lastMessage: last?.text ?? null,
        changedAt: (last?.createdAt ?? plan.updatedAt).toISOString(),
      },
    ];
  });
  items.sort((a, b) => Number(b.waitsForMe) - Number(a.waitsForMe) || b.changedAt.localeCompare(a.changedAt));
  return { items };
}
