import { z } from "zod";
import { nearestStationsRequest, type StationView } from "../../contracts/climate.ts";
import { notFound } from "../../errors.ts";
import { type Call, route } from "../../http/route.ts";
import { ClimateStation } from "../../models/climate-station.ts";
import { stationsFor } from "./station-choice.ts";

const stationRequest = z.object({ params: z.object({ id: z.string().max(40) }) });
const OFFERED = 8;

async function listNearest({ input }: Call<typeof nearestStationsRequest>) {
  const { latitude, longitude, elevationM } = input.query;
  const site = { latitudeDeg: latitude, longitudeDeg: longitude, elevationM: elevationM ?? null };
  return { items: await stationsFor(site, OFFERED) };
}

async function readStation({ input, transaction }: Call<typeof stationRequest>): Promise<StationView> {
  const station = await ClimateStation.findByPk(input.params.id, { transaction });
  if (station === null) throw notFound("That station");
  const { climate, ...about } = station.record;
  const month = (values: number[] | null, index: number) => values?.[index] ?? null;
  return {
    id: station.id,
    name: station.name,
    country: station.country,
    latitudeDeg: station.latitudeDeg,
    longitudeDeg: station.longitudeDeg,
    elevationM: station.elevationM,
    distanceKm: 0,
    heightDifferenceM: 0,
    caution: null,
    kind: about.kind,
    source: about.source,
    period: about.period,
    licence: about.licence,
    note: about.note,
    designColdest996C: climate.design996C,
    designColdest99C: climate.design99C,
    meanYearlyColdestC: climate.yearlyColdest?.meanC ?? null,
    coldestReportedC: climate.yearlyColdest?.lowestC ?? null,
    winters: climate.yearlyColdest?.winters ?? null,
    months: climate.meanTempC.map((meanC, index) => ({
      month: index + 1,
      meanC,
      minC: month(climate.minTempC, index),
      maxC: month(climate.maxTempC, index),
      humidityFrac: month(climate.humidityFrac, index),
      windMS: month(climate.windMS, index),
      globalKwhM2Day: month(climate.globalKwhM2Day, index),
      globalEstimated: about.globalEstimated,
    })),
  };
}

export const climateRoutes = [
  route({
    method: "get",
    path: "/api/climate/stations",
    summary: "Climate stations near a place",
    schema: nearestStationsRequest,
    run: listNearest,
  }),
  route({
    method: "get",
    path: "/api/climate/stations/:id",
    summary: "One climate station with its normals",
    schema: stationRequest,
    run: readStation,
  }),
];
