import type { Sequelize, Transaction } from "sequelize";
import type { Footprint } from "../../contracts/buildings.ts";
import { defaultQuantity } from "../../contracts/quantity.ts";
import type { Survey } from "../../contracts/survey.ts";
import { houseGeometry } from "../../engine/geometry/house-geometry.ts";
import { defaultSurvey } from "../../features/buildings/default-survey.ts";
import { houseShapeOf } from "../../features/buildings/house-shape.ts";
import { surveyCoreOf, writeSurveyRows } from "../../features/buildings/survey-store.ts";
import { stationOf } from "../../features/climate/station-choice.ts";
import { summaryOfResult, workOut } from "../../features/plans/plan-runner.ts";
import { Building } from "../../models/building.ts";
import { Cooperative } from "../../models/cooperative.ts";
import { Farm } from "../../models/farm.ts";
import { FarmPerson } from "../../models/farm-person.ts";
import { Membership } from "../../models/membership.ts";
import { Person } from "../../models/person.ts";
import { Plan } from "../../models/plan.ts";
import { PlanMessage } from "../../models/plan-message.ts";
import { demoBarns } from "./barns.ts";
import { type DemoFarm, demoCooperative, demoFarms } from "./farms.ts";
import { demoGreenhouses } from "./greenhouses.ts";
import type { DemoHouse } from "./house-words.ts";
import { demoPeople } from "./people.ts";

const DAY_MS = 86_400_000;
const CHOICES = { returnPeriodYears: 20, everydayPercent: 99.6 } as const;

/** Fills the demonstration co-operative once; a second call finds it and does nothing. */
export async function seedDemo(sequelize: Sequelize): Promise<void> {
  if ((await Cooperative.findOne({ where: { name: demoCooperative.name } })) !== null) return;
  await sequelize.transaction(async (transaction) => {
    const cooperative = await Cooperative.create(demoCooperative, { transaction });
    const people = await seedPeople(cooperative.id, transaction);
    const farms = await seedFarms(cooperative.id, people, transaction);
    for (const house of [...demoGreenhouses, ...demoBarns])
      await seedHouse(house, farms, people, transaction);
  });
}

async function seedPeople(cooperativeId: string, transaction: Transaction): Promise<Map<string, Person>> {
  const people = new Map<string, Person>();
  for (const { key, name, email, units, roles } of demoPeople) {
    const person = await Person.create({ name, email, units }, { transaction });
    people.set(key, person);
    for (const role of roles)
      await Membership.create({ personId: person.id, cooperativeId, role }, { transaction });
  }
  return people;
}

interface SeededFarm {
  farm: Farm;
  words: DemoFarm;
}

async function seedFarms(
  cooperativeId: string,
  people: Map<string, Person>,
  transaction: Transaction,
): Promise<Map<string, SeededFarm>> {
  const farms = new Map<string, SeededFarm>();
  for (const words of demoFarms) {
    const { key, advisor, farmer, ...rest } = words;
    const farm = await Farm.create({ ...rest, cooperativeId }, { transaction });
    for (const [role, personKey] of [
      ["advisor", advisor],
      ["farmer", farmer],
    ] as const) {
      const personId = entry(people, personKey).id;
      await FarmPerson.create({ farmId: farm.id, personId, role }, { transaction });
    }
    farms.set(key, { farm, words });
  }
  return farms;
}

function entry<T>(map: Map<string, T>, key: string): T {
  const value = map.get(key);
  if (value === undefined) throw new Error(`the demonstration names "${key}" and does not have it`);
  return value;
}

/** A point so many metres east and north of a farm; a demo house stands within a kilometre. */
function placeOf({ latitudeDeg, longitudeDeg }: DemoFarm, house: DemoHouse) {
  const metresPerDegree = 111_195;
  return {
    latitudeDeg: Number((latitudeDeg + house.northM / metresPerDegree).toFixed(6)),
    longitudeDeg: Number(
      (longitudeDeg + house.eastM / (metresPerDegree * Math.cos((latitudeDeg * Math.PI) / 180))).toFixed(6),
    ),
  };
}

function surveyOf(house: DemoHouse, elevationM: number | null): Survey {
  const bearing = defaultQuantity(house.bearingDeg, "deg", "measured");
  const { widthM } = houseGeometry(houseShapeOf(house.shape), { ridgeBearingDeg: house.bearingDeg });
  const width = "width" in house.shape ? house.shape.width : defaultQuantity(widthM, "m", "measured");
  const footprint: Footprint = { length: house.shape.length, width, ridgeBearing: bearing };
  const typical = defaultSurvey({ kind: house.kind, shapeType: house.shape.type, footprint, elevationM });
  const survey = { ...typical, shape: house.shape };
  return { ...survey, ...house.answers(survey) };
}

async function seedHouse(
  house: DemoHouse,
  farms: Map<string, SeededFarm>,
  people: Map<string, Person>,
  transaction: Transaction,
): Promise<void> {
  const { farm, words } = entry(farms, house.farm);
  const place = placeOf(words, house);
  const station = await stationOf({ ...place, elevationM: null }, null);
  const survey = surveyOf(house, station.elevationM);
  const advisor = entry(people, words.advisor);
  const building = await Building.create(
    {
      farmId: farm.id,
      name: house.name,
      kind: house.kind,
      ...place,
      stationId: station.id,
      surveyCore: surveyCoreOf(survey),
      surveyedAt: new Date(),
      surveyedBy: advisor.id,
      version: 1,
    },
    { transaction },
  );
  await writeSurveyRows(building.id, survey, transaction);
  if (house.plan !== "none") {
    await seedPlan(house, building, survey, { advisor, farmer: entry(people, words.farmer) }, transaction);
  }
}

async function seedPlan(
  house: DemoHouse,
  building: Building,
  survey: Survey,
  people: { advisor: Person; farmer: Person },
  transaction: Transaction,
): Promise<void> {
  const { engineInput, result } = await workOut(building, survey, CHOICES, transaction);
  const decided = house.plan === "approved" || house.plan === "declined";
  const sent = house.plan !== "draft";
  const { options, noHeaterReason } = result.sizing;
  const proposed = options.find((option) => option.holdsOnceInYears) ?? options[0];
  const plan = await Plan.create(
    {
      buildingId: building.id,
      number: 1,
      status: house.plan === "none" ? "draft" : house.plan,
      surveyVersion: building.version,
      engineVersion: result.engineVersion,
      choices: CHOICES,
      survey,
      engineInput,
      result,
      summary: summaryOfResult(result, survey, building),
      proposedOptionId: sent ? (noHeaterReason === null ? (proposed?.id ?? null) : "none") : null,
      createdBy: people.advisor.id,
      sentAt: sent ? new Date(Date.now() - 3 * DAY_MS) : null,
      answeredAt: decided ? new Date(Date.now() - DAY_MS) : null,
      answeredBy: decided ? people.farmer.id : null,
    },
    { transaction },
  );
  const write = (
    author: Person,
    authorRole: "advisor" | "farmer",
    text: string,
    answer: "approve" | "ask" | "decline" | null,
  ) =>
    PlanMessage.create({ planId: plan.id, authorId: author.id, authorRole, text, answer }, { transaction });
  if (sent && house.advisorSays !== undefined)
    await write(people.advisor, "advisor", house.advisorSays, null);
  if (house.farmerSays !== undefined) {
    const answers = { approved: "approve", declined: "decline", asked: "ask" } as const;
    const answer = house.plan in answers ? answers[house.plan as keyof typeof answers] : null;
    await write(people.farmer, "farmer", house.farmerSays, answer);
  }
}
