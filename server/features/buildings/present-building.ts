import type { Transaction } from "sequelize";
import { countAnswers } from "../../contracts/answered.ts";
import type { BuildingSummary, BuildingView } from "../../contracts/buildings.ts";
import { siValue } from "../../contracts/quantity.ts";
import type { Survey } from "../../contracts/survey.ts";
import { houseGeometry } from "../../engine/geometry/house-geometry.ts";
import { sectionOutline } from "../../engine/geometry/section.ts";
import type { Building } from "../../models/building.ts";
import type { Farm } from "../../models/farm.ts";
import type { Actor } from "../../policies/actor.ts";
import { buildingPolicy, farmPolicy } from "../../policies/farm-policy.ts";
import { stationOf } from "../climate/station-choice.ts";
import { latestPlans } from "../plans/latest-plans.ts";
import { houseShapeOf } from "./house-shape.ts";
import { loadSurveys } from "./survey-store.ts";

/** Ranges of many spans are drawn as three; the drawing says so. */
const DRAWN_SPANS = 3;

/** What follows from the survey's measures for lists and labels. */
export function describeShape(survey: Survey) {
  const shape = houseShapeOf(survey.shape);
  const ridgeBearingDeg = siValue(survey.ridgeBearing);
  const geometry = houseGeometry(shape, { ridgeBearingDeg });
  return {
    shapeType: survey.shape.type,
    ridgeBearingDeg,
    lengthM: geometry.lengthM,
    widthM: geometry.widthM,
    floorAreaM2: geometry.floorAreaM2,
    outline: sectionOutline(shape, DRAWN_SPANS),
  };
}

/** Buildings as lists and the map show them, in a handful of queries however many there are. */
export async function presentBuildings(
  buildings: Building[],
  farms: Map<string, Farm>,
  actor: Actor,
  transaction?: Transaction,
): Promise<BuildingSummary[]> {
  const surveys = await loadSurveys(buildings, transaction);
  const isAdvisor = (farmId: string) =>
    actor.farms.some((farm) => farm.farmId === farmId && farm.role === "advisor");
  const plans = await latestPlans(buildings, (building) => isAdvisor(building.farmId), transaction);
  return buildings.flatMap((building) => {
    const survey = surveys.get(building.id);
    const farm = farms.get(building.farmId);
    if (survey === undefined || farm === undefined) return [];
    const { answered, questions } = countAnswers(survey);
    return [
      {
        id: building.id,
        farmId: building.farmId,
        farmName: farm.name,
        name: building.name,
        kind: building.kind,
        latitudeDeg: building.latitudeDeg,
        longitudeDeg: building.longitudeDeg,
        ...describeShape(survey),
        answered,
        questions,
        plan: plans.get(building.id) ?? null,
      },
    ];
  });
}

export async function presentBuilding(
  building: Building,
  farm: Farm,
  actor: Actor,
  transaction?: Transaction,
): Promise<BuildingView> {
  const [summary] = await presentBuildings([building], new Map([[farm.id, farm]]), actor, transaction);
  if (summary === undefined) throw new Error("a building was presented and is not there");
  const site = {
    latitudeDeg: building.latitudeDeg,
    longitudeDeg: building.longitudeDeg,
    elevationM: siValue(building.surveyCore.elevation),
  };
  return {
    ...summary,
    station: await stationOf(site, building.stationId),
    stationChosen: building.stationChosen,
    can: {
      update: buildingPolicy.update(actor, farm),
      delete: buildingPolicy.delete(actor, farm),
      plan: buildingPolicy.plan(actor, farm),
      readSurvey: farmPolicy.readSurvey(actor, farm),
    },
  };
}
