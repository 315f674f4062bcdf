import { Op, type Transaction } from "sequelize";
import type { PlanSummary } from "../../contracts/buildings.ts";
import type { Building } from "../../models/building.ts";
import { Plan } from "../../models/plan.ts";

/** Everything of a plan but its large frozen documents. */
export const planListAttributes = { exclude: ["survey", "engineInput", "result"] };

type PlannedBuilding = Pick<Building, "version" | "latitudeDeg" | "longitudeDeg" | "stationId">;

/** True when survey, place or weather station were changed after the plan was worked out. */
export function isOutdated({ surveyVersion, summary: { place } }: Plan, building: PlannedBuilding): boolean {
  const stationChanged = building.stationId !== null && building.stationId !== place.stationId;
  const moved = building.latitudeDeg !== place.latitudeDeg || building.longitudeDeg !== place.longitudeDeg;
  return surveyVersion !== building.version || stationChanged || moved;
}

export function summaryOf(plan: Plan, building: PlannedBuilding): PlanSummary {
  const { place: _place, ...figures } = plan.summary;
  return {
    id: plan.id,
    number: plan.number,
    status: plan.status,
    createdAt: plan.createdAt.toISOString(),
    outdated: isOutdated(plan, building),
    ...figures,
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
