import { z } from "zod";
import type { StationChoice } from "./buildings.ts";
import { latitudeSchema, longitudeSchema } from "./common.ts";

export const nearestStationsRequest = z.object({
  query: z.object({
    latitude: z.coerce.number().pipe(latitudeSchema),
    longitude: z.coerce.number().pipe(longitudeSchema),
    elevationM: z.coerce.number().min(-430).max(5000).optional(),
  }),
});

export interface StationMonth {
  month: number;
  meanC: number | null;
  minC: number | null;
  maxC: number | null;
  humidityFrac: number | null;
  windMS: number | null;
  globalKwhM2Day: number | null;
  globalEstimated: boolean;
}

export interface StationView extends StationChoice {
  latitudeDeg: number;
  longitudeDeg: number;
  kind: string;
  source: string;
  period: string;
  licence: string;
  note: string;
  designColdest996C: number | null;
  designColdest99C: number | null;
  meanYearlyColdestC: number | null;
  coldestReportedC: number | null;
  winters: number | null;
  months: StationMonth[];
}

/** Places for the map, from the bundled list of towns. */
export const placesRequest = z.object({
  query: z.object({
    south: z.coerce.number().pipe(latitudeSchema),
    west: z.coerce.number().min(-540).max(540),
    north: z.coerce.number().pipe(latitudeSchema),
    east: z.coerce.number().min(-540).max(540),
    zoom: z.coerce.number().min(0).max(22),
  }),
});

export const placeSearchRequest = z.object({ query: z.object({ text: z.string().trim().min(2).max(80) }) });

export interface PlaceView {
  name: string;
  country: string;
  population: number;
  latitudeDeg: number;
  longitudeDeg: number;
}
