import { Op, type Transaction } from "sequelize";
import type { PlanSummary } from "../../contracts/buildings.ts";
import type { Building } from "../../models/building.ts";
import { Plan } from "../../models/plan.ts";

/** Everything of a plan but its large frozen documents. */
export const planListAttributes = { exclude: ["survey", "engineInput", "result"] };

export function summaryOf(plan: Plan, building: Pick<Building, "version">): PlanSummary {
  return {
    id: plan.id,
    number: plan.number,
    status: plan.status,
    createdAt: plan.createdAt.toISOString(),
    outdated: plan.surveyVersion !== building.version,
    ...plan.summary,
  };
}

/** The newest plan of each building; drafts count only for those who may see them. */
export async function latestPlans(
  buildings: Building[],
  seesDrafts: (building: Building) => boolean,
  transaction?: Transaction,
): Promise<Map<string, PlanSummary>> {
  const withDrafts = buildings.filter(seesDrafts).map(({ id }) => id);
  const plans = await Plan.findAll({
    where: {
      buildingId: buildings.map(({ id }) => id),
      [Op.or]: [{ status: { [Op.ne]: "draft" } }, { buildingId: withDrafts }],
    },
    attributes: planListAttributes,
    order: [["number", "ASC"]],
    transaction,
  });
  const byId = new Map(buildings.map((building) => [building.id, building]));
  return new Map(
    plans.flatMap((plan) => {
      const building = byId.get(plan.buildingId);
      return building === undefined ? [] : [[plan.buildingId, summaryOf(plan, building)] as const];
    }),
  );
}
