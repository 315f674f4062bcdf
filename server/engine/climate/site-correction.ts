import { EngineInputError, requireInRange } from "../errors.ts";

/** Fall of temperature with height, K/m. Source [LAPSE]. */
export const LAPSE_RATE_KM = 0.0065;

/** Surroundings of a house, as far as wind is concerned. */
export type Shelter = "open" | "normal" | "sheltered";

/** Share of the open-field wind that reaches a house. Source [SPREADPRACTICE]. */
const SHELTER_WIND_SHARE: Record<Shelter, number> = { open: 1, normal: 0.85, sheltered: 0.65 };

/** Roughness length of open grass, m, and the height stations measure wind at. Source [ROUGHNESS]. */
const GRASS_ROUGHNESS_M = 0.03;
const STATION_WIND_HEIGHT_M = 10;

export interface SiteCorrection {
  /** Site minus station, m; 0 where the station's height is unknown. */
  heightDifferenceM: number;
  /** Added to all mean temperatures, K. */
  meanK: number;
  /** Added to the design nights, K. Never positive: cold air collects low. */
  designK: number;
  /** Why, one short sentence each. */
  reasons: string[];
}

/**
 * How much warmer or colder a site is than its station, with the reasons in words.
 * Shape: site height m (−430 to 9000), station height m or null, K of frost hollow (0 to 15) → corrections in K.
 * A higher site is colder by 0.65 K per 100 m in all figures; a lower one is warmer in the means only.
 * Throws EngineInputError outside the ranges. Source [LAPSE] for height, [HOCEVAR1971] for why hollows are told by the person.
 */
export function siteCorrection(
  elevationM: number,
  stationElevationM: number | null,
  frostHollowK: number,
): SiteCorrection {
  requireInRange("elevationM", elevationM, -430, 9000, "m");
  requireInRange("frostHollowK", frostHollowK, 0, 15, "K");
  const reasons: string[] = [];
  if (stationElevationM === null)
    reasons.push("The station's height is not known, so no correction for height is made.");
  const heightDifferenceM = stationElevationM === null ? 0 : elevationM - stationElevationM;
  const meanK = -LAPSE_RATE_KM * heightDifferenceM;
  const designFromHeightK = Math.min(0, meanK);
  if (Math.abs(heightDifferenceM) >= 10) {
    const size = `${Math.abs(Math.round(heightDifferenceM))} m ${heightDifferenceM > 0 ? "higher" : "lower"}`;
    reasons.push(
      heightDifferenceM > 0
        ? `The site lies ${size} than the station: ${Math.abs(meanK).toFixed(1)} K colder.`
        : `The site lies ${size} than the station: ${meanK.toFixed(1)} K warmer on average. The cold nights are left as they are, because cold air collects low.`,
    );
  }
  if (frostHollowK > 0)
    reasons.push(
      `The site is a frost hollow: ${frostHollowK.toFixed(1)} K colder on clear nights, as told in the survey.`,
    );
  if (reasons.length === 0) reasons.push("The site lies at the station's height: no correction.");
  return { heightDifferenceM, meanK, designK: designFromHeightK - frostHollowK, reasons };
}

/**
 * Wind at eave height from the wind measured 10 m above open grass.
 * Shape: m/s (0 to 60), m (0.5 to 30), shelter → m/s. Throws EngineInputError outside. Source [ROUGHNESS], shares [SPREADPRACTICE].
 */
export function windAtEaveMS(stationWindMS: number, eaveHeightM: number, shelter: Shelter): number {
  requireInRange("stationWindMS", stationWindMS, 0, 60, "m/s");
  requireInRange("eaveHeightM", eaveHeightM, 0.5, 30, "m");
  const share = SHELTER_WIND_SHARE[shelter];
  if (share === undefined)
    throw new EngineInputError({
      quantity: "shelter",
      value: Number.NaN,
      reason: "inconsistent",
      note: "Not a known shelter.",
    });
  const profile =
    Math.log(eaveHeightM / GRASS_ROUGHNESS_M) / Math.log(STATION_WIND_HEIGHT_M / GRASS_ROUGHNESS_M);
  return stationWindMS * share * Math.min(1.2, profile);
}
