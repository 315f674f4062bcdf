import { ClimateStation } from "../../models/climate-station.ts";
import { readStations } from "./read-stations.ts";

/** Fills the climate stations; re-runnable, rows that are there are brought up to date. */
export async function seedReferenceData(): Promise<void> {
  await ClimateStation.bulkCreate(readStations(), {
    updateOnDuplicate: [
      "name",
      "country",
      "latitudeDeg",
      "longitudeDeg",
      "elevationM",
      "record",
      "updatedAt",
    ],
  });
}
