import { z } from "zod";
import { countAnswers } from "../../contracts/answered.ts";
import { idParams } from "../../contracts/common.ts";
import type { SiteRow, SitesView } from "../../contracts/sites.ts";
import { type Call, route } from "../../http/route.ts";
import { Building } from "../../models/building.ts";
import { ClimateStation } from "../../models/climate-station.ts";
import { Cooperative } from "../../models/cooperative.ts";
import { Farm } from "../../models/farm.ts";
import { FarmPerson } from "../../models/farm-person.ts";
import { Person } from "../../models/person.ts";
import { cooperativePolicy } from "../../policies/cooperative-policy.ts";
import { farmPolicy } from "../../policies/farm-policy.ts";
import { authorize } from "../../policies/policy.ts";
import { describeShape } from "../buildings/present-building.ts";
import { loadSurveys } from "../buildings/survey-store.ts";
import { latestPlans } from "../plans/latest-plans.ts";

const sitesRequest = z.object({ params: idParams });

/** Status and result of every house of the co-operative; no survey answer is among them. */
async function listSites({ input, actor, transaction }: Call<typeof sitesRequest>): Promise<SitesView> {
  const cooperative = await Cooperative.findByPk(input.params.id, { transaction });
  authorize(actor, cooperativePolicy, "readSites", cooperative, "That co-operative");
  const farms = await Farm.findAll({ where: { cooperativeId: cooperative.id }, transaction });
  const buildings = await Building.findAll({ where: { farmId: farms.map((farm) => farm.id) }, transaction });
  const [surveys, plans, links, stations] = await Promise.all([
    loadSurveys(buildings, transaction),
    latestPlans(buildings, () => false, transaction),
    FarmPerson.findAll({ where: { farmId: farms.map((farm) => farm.id) }, transaction }),
    ClimateStation.findAll({ attributes: ["id", "country"], transaction }),
  ]);
  const people = await Person.findAll({ where: { id: links.map((link) => link.personId) }, transaction });
  const nameOf = new Map(people.map((person) => [person.id, person.name]));
  const countryOf = new Map(stations.map((station) => [station.id, station.country]));
  const farmOf = new Map(farms.map((farm) => [farm.id, farm]));
  const personOn = (farmId: string, role: "advisor" | "farmer") => {
    const link = links.find((entry) => entry.farmId === farmId && entry.role === role);
    return link === undefined ? null : (nameOf.get(link.personId) ?? null);
  };
  const rows = buildings.flatMap((building): SiteRow[] => {
    const farm = farmOf.get(building.farmId);
    const survey = surveys.get(building.id);
    if (farm === undefined || survey === undefined) return [];
    const { shapeType, outline, floorAreaM2 } = describeShape(survey);
    const { answered, questions } = countAnswers(survey);
    return [
      {
        buildingId: building.id,
        buildingName: building.name,
        farmId: farm.id,
        farmName: farm.name,
        place: farm.place,
        country: countryOf.get(building.stationId ?? "") ?? cooperative.country,
        latitudeDeg: building.latitudeDeg,
        longitudeDeg: building.longitudeDeg,
        kind: building.kind,
        shapeType,
        outline,
        floorAreaM2,
        answered,
        questions,
        advisorName: personOn(farm.id, "advisor"),
        farmerName: personOn(farm.id, "farmer"),
        plan: plans.get(building.id) ?? null,
        canOpen: farmPolicy.readSurvey(actor, farm),
      },
    ];
  });
  return { cooperativeId: cooperative.id, cooperativeName: cooperative.name, rows };
}

export const siteRoutes = [
  route({
    method: "get",
    path: "/api/cooperatives/:id/sites",
    summary: "All houses of a co-operative with their verdicts",
    schema: sitesRequest,
    run: listSites,
  }),
];
