import type { PlanWarning } from "../plan-types.ts";
import { type WarningContext, warning } from "./warning-context.ts";

/** From these on a station is far from the site, or at another height. Source [CONFUSIONS]. */
const FAR_KM = 60;
const VERY_FAR_KM = 200;
const OTHER_HEIGHT_M = 250;

/** A station that is far, high or thin on data. Shape: context → warnings. Source [CONFUSIONS]. */
export function climateWarnings({ model, climate }: WarningContext): PlanWarning[] {
  const { station } = climate;
  const found: PlanWarning[] = [];
  if (station.distanceKm > FAR_KM)
    found.push(
      warning(
        station.distanceKm > VERY_FAR_KM ? "caution" : "note",
        "stationFar",
        `The station ${station.name} lies ${Math.round(station.distanceKm)} km away.`,
        "Compare with a nearer one, or with what is known of cold nights on the place.",
        "station",
      ),
    );
  if (Math.abs(station.heightDifferenceM) > OTHER_HEIGHT_M)
    found.push(
      warning(
        "caution",
        "stationHeight",
        `The site lies ${Math.round(Math.abs(station.heightDifferenceM))} m ${station.heightDifferenceM > 0 ? "above" : "below"} the station.`,
        "Temperatures are corrected, but valleys and slopes go their own way. Choose a station at a like height where there is one.",
        "elevation",
      ),
    );
  const { design } = model.input.climate.flags;
  if (design === "T")
    found.push(
      warning(
        "note",
        "designFromTypicalYear",
        "The everyday design temperature comes from one typical year, which leaves out extremes.",
        "Many years would give a value 1 to 3 K lower; use the value of the local code where there is one.",
        "station",
      ),
    );
  if (climate.site.everyday.origin === "estimated" || climate.site.onceInYears.origin === "estimated")
    found.push(
      warning(
        "note",
        "designEstimated",
        "A design temperature is estimated, because the station reports none.",
        "Ask for the coldest nights of the last twenty winters.",
        "station",
      ),
    );
  const { origins } = climate.site.filled;
  const missing = [
    origins.humidity === "estimated" || origins.humidity === "typical" ? "humidity" : "",
    origins.wind === "typical" ? "wind" : "",
    origins.global === "estimated" ? "sun" : "",
  ].filter((name) => name.length > 0);
  if (missing.length > 0)
    found.push(
      warning(
        "note",
        "climateGaps",
        `The station does not report ${missing.join(", ").replace(/, ([^,]*)$/, " and $1")}; usual or estimated values stand in.`,
        "They matter for the year's energy more than for the design nights.",
        "station",
      ),
    );
  return found;
}
