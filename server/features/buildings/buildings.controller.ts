import { z } from "zod";
import { countAnswers } from "../../contracts/answered.ts";
import type { createBuildingRequest, updateBuildingRequest } from "../../contracts/buildings.ts";
import { idParams } from "../../contracts/common.ts";
import { siValue } from "../../contracts/quantity.ts";
import type { SurveyView, saveSurveyRequest } from "../../contracts/survey.ts";
import { surveyProblems } from "../../contracts/survey-rules.ts";
import { invalid, stale } from "../../errors.ts";
import type { Call } from "../../http/route.ts";
import { Building } from "../../models/building.ts";
import { ClimateStation } from "../../models/climate-station.ts";
import { Farm } from "../../models/farm.ts";
import { Person } from "../../models/person.ts";
import { buildingPolicy, farmPolicy } from "../../policies/farm-policy.ts";
import { authorize } from "../../policies/policy.ts";
import { stationOf } from "../climate/station-choice.ts";
import { recordEvent } from "../events/record-event.ts";
import { defaultSurvey } from "./default-survey.ts";
import { loadBuilding } from "./load-building.ts";
import { checkPosition } from "./position-check.ts";
import { presentBuilding, presentBuildings } from "./present-building.ts";
import { referenceProblems } from "./survey-references.ts";
import { loadSurvey, surveyCoreOf, writeSurveyRows } from "./survey-store.ts";

export const buildingRequest = z.object({ params: idParams });

/** Every building whose survey the person may open. */
export async function listBuildings({ actor, transaction }: Call<z.ZodObject>) {
  const cooperativeIds = actor.memberships.map((entry) => entry.cooperativeId);
  const farms = await Farm.findAll({ where: { cooperativeId: cooperativeIds }, transaction });
  const open = new Map(
    farms.filter((farm) => farmPolicy.readSurvey(actor, farm)).map((farm) => [farm.id, farm]),
  );
  const buildings = await Building.findAll({
    where: { farmId: [...open.keys()] },
    order: [["name", "ASC"]],
    transaction,
  });
  return { items: await presentBuildings(buildings, open, actor, transaction) };
}

export async function createBuilding({ input, actor, transaction }: Call<typeof createBuildingRequest>) {
  const farm = await Farm.findByPk(input.params.id, { transaction });
  authorize(actor, farmPolicy, "addBuilding", farm, "That farm");
  const { name, kind, shapeType, position, footprint, farFromFarmConfirmed } = input.body;
  checkPosition(position, farm, farFromFarmConfirmed);
  if (kind === "greenhouse" && shapeType === "atticBarn") {
    throw invalid({ shapeType: "A greenhouse has no attic. Choose another shape." });
  }
  const station = await stationOf({ ...position, elevationM: null }, null);
  const survey = defaultSurvey({ kind, shapeType, footprint, elevationM: station.elevationM });
  const problems = surveyProblems(survey);
  if (Object.keys(problems).length > 0) throw invalid(problems);
  const building = await Building.create(
    {
      farmId: farm.id,
      name,
      kind,
      ...position,
      stationId: station.id,
      surveyCore: surveyCoreOf(survey),
      surveyedAt: new Date(),
      surveyedBy: actor.personId,
      version: 1,
    },
    { transaction },
  );
  await writeSurveyRows(building.id, survey, transaction);
  await recordEvent(
    { farmId: farm.id, buildingId: building.id, personId: actor.personId, action: "building pinned" },
    transaction,
  );
  return presentBuilding(building, farm, actor, transaction);
}

export async function readBuilding({ input, actor, transaction }: Call<typeof buildingRequest>) {
  const { building, farm } = await loadBuilding(input.params.id, "read", actor, transaction);
  return presentBuilding(building, farm, actor, transaction);
}

export async function updateBuilding({ input, actor, transaction }: Call<typeof updateBuildingRequest>) {
  const { building, farm } = await loadBuilding(input.params.id, "update", actor, transaction);
  const { name, position, stationId, farFromFarmConfirmed = false } = input.body;
  if (name !== undefined) building.name = name;
  if (position !== undefined) {
    checkPosition(position, farm, farFromFarmConfirmed);
    building.set(position);
  }
  if (stationId !== undefined) await chooseStation(building, stationId);
  else if (position !== undefined && !building.stationChosen) await chooseStation(building, null);
  await building.save({ transaction });
  await recordEvent(
    {
      farmId: farm.id,
      buildingId: building.id,
      personId: actor.personId,
      action: "building changed",
      detail: input.body,
    },
    transaction,
  );
  return presentBuilding(building, farm, actor, transaction);
}

/** `null` goes back to the nearest station. */
async function chooseStation(building: Building, stationId: string | null): Promise<void> {
  if (stationId !== null && (await ClimateStation.findByPk(stationId)) === null) {
    throw invalid({ stationId: "That station is not in the table." });
  }
  const site = {
    latitudeDeg: building.latitudeDeg,
    longitudeDeg: building.longitudeDeg,
    elevationM: siValue(building.surveyCore.elevation),
  };
  building.stationId = stationId ?? (await stationOf(site, null)).id;
  building.stationChosen = stationId !== null;
}

export async function deleteBuilding({ input, actor, transaction }: Call<typeof buildingRequest>) {
  const { building, farm } = await loadBuilding(input.params.id, "delete", actor, transaction);
  await building.destroy({ transaction });
  await recordEvent(
    {
      farmId: farm.id,
      personId: actor.personId,
      action: "building removed",
      detail: { name: building.name },
    },
    transaction,
  );
}

export async function readSurvey({
  input,
  actor,
  transaction,
}: Call<typeof buildingRequest>): Promise<SurveyView> {
  const { building, farm } = await loadBuilding(input.params.id, "read", actor, transaction);
  const survey = await loadSurvey(building, transaction);
  const author =
    building.surveyedBy === null ? null : await Person.findByPk(building.surveyedBy, { transaction });
  return {
    buildingId: building.id,
    version: building.version,
    survey,
    ...countAnswers(survey),
    savedAt: building.surveyedAt.toISOString(),
    savedBy: author?.name ?? null,
    can: { update: buildingPolicy.survey(actor, farm) },
  };
}

/** The row is locked first, so that of two saves on the same version only one is kept. */
export async function saveSurvey(call: Call<typeof saveSurveyRequest>): Promise<SurveyView> {
  const { input, actor, transaction } = call;
  const { building, farm } = await loadBuilding(input.params.id, "survey", actor, transaction);
  await building.reload({ lock: true, transaction });
  const { version, survey } = input.body;
  const problems = { ...referenceProblems(survey, building.kind), ...surveyProblems(survey) };
  if (Object.keys(problems).length > 0) throw invalid(problems);
  if (version !== building.version) {
    const author =
      building.surveyedBy === null ? null : await Person.findByPk(building.surveyedBy, { transaction });
    throw stale(
      `${author?.name ?? "Somebody"} saved this survey after you opened it, on ${building.surveyedAt.toISOString().slice(0, 16).replace("T", " at ")} UTC. Nothing of yours was stored yet.`,
    );
  }
  await building
    .set({
      surveyCore: surveyCoreOf(survey),
      version: version + 1,
      surveyedAt: new Date(),
      surveyedBy: actor.personId,
    })
    .save({ transaction });
  await writeSurveyRows(building.id, survey, transaction);
  const { answered, questions } = countAnswers(survey);
  await recordEvent(
    {
      farmId: farm.id,
      buildingId: building.id,
      personId: actor.personId,
      action: "survey saved",
      detail: { version: building.version, answered, questions },
    },
    transaction,
  );
  return readSurvey({ ...call, input: { params: input.params } });
}
