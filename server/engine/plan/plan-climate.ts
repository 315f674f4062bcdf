import { DAYS_IN_MONTH } from "../climate/design-temperature.ts";
import { greatCircleKm } from "../climate/nearest-station.ts";
import { type SiteClimate, siteClimate } from "../climate/site-climate.ts";
import { windAtEaveMS } from "../climate/site-correction.ts";
import { cloudFromClearnessFrac } from "../envelope/sky.ts";
import { dailyExtraterrestrialKwhM2 } from "../solar/extraterrestrial.ts";
import { representativeDayOfYear } from "../solar/sun-position.ts";
import type { HouseModel } from "./house-model.ts";
import type { MonthClimate, PlanResult } from "./plan-types.ts";

/** More of the outside sun than this does not reach the ground in a monthly mean. Source [FAO56], upper end of clearness. */
const MOST_CLEARNESS = 0.8;

export interface PlanClimate {
  site: SiteClimate;
  months: MonthClimate[];
  /** Wind at the eave and cloud cover by month. */
  windMS: number[];
  cloudFrac: number[];
  soilTempC: number;
  station: PlanResult["station"];
}

/**
 * The climate a plan stands on: station normals brought to the site, design nights, wind at the eave, cloud.
 * Shape: model → climate. Throws EngineInputError for impossible station figures.
 * Source [ASHRAEF14], [LAPSE], [ROUGHNESS], soil as warm as the mean of the year.
 */
export function planClimate(model: HouseModel): PlanClimate {
  const { climate: station, site, everydayPercent, returnPeriodYears } = model.input;
  const outsideSun = representativeDayOfYear.map((day) => dailyExtraterrestrialKwhM2(site.latitudeDeg, day));
  const found = siteClimate(station, site, outsideSun, everydayPercent, returnPeriodYears);
  const eaveM = Math.min(30, Math.max(0.5, model.geometry.eaveHeightM || model.geometry.meanHeightM));
  const { filled } = found;
  const months = DAYS_IN_MONTH.map((_, m): MonthClimate => {
    const globalKwhM2Day = Math.min(filled.globalKwhM2Day[m] ?? 0, MOST_CLEARNESS * (outsideSun[m] ?? 0));
    return {
      month: m + 1,
      meanTempC: found.meanTempC[m] ?? 0,
      meanMinTempC: found.minTempC[m] ?? 0,
      meanMaxTempC: found.maxTempC[m] ?? 0,
      humidityFrac: filled.humidityFrac[m] ?? 0,
      windMS: filled.windMS[m] ?? 0,
      globalKwhM2Day,
      everydayDesignC: found.everydayDesignC[m] ?? 0,
      onceInYearsDesignC: found.onceInYearsDesignC[m] ?? 0,
      origins: {
        temperature: "read",
        humidity: filled.origins.humidity,
        wind: filled.origins.wind,
        global: filled.origins.global,
        everydayDesign: found.everyday.origin,
        onceInYearsDesign: found.onceInYears.origin,
      },
    };
  });
  return {
    site: found,
    months,
    windMS: months.map((month) => windAtEaveMS(month.windMS, eaveM, site.shelter)),
    cloudFrac: months.map((month, m) => {
      const outside = outsideSun[m] ?? 0;
      return outside > 0 ? cloudFromClearnessFrac(month.globalKwhM2Day / outside) : 0.7;
    }),
    soilTempC: found.meanTempC.reduce((sum, temp, m) => sum + temp * (DAYS_IN_MONTH[m] ?? 30), 0) / 365,
    station: {
      id: station.id,
      name: station.name,
      distanceKm: greatCircleKm(
        site.latitudeDeg,
        site.longitudeDeg,
        station.latitudeDeg,
        station.longitudeDeg,
      ),
      heightDifferenceM: found.correction.heightDifferenceM,
      siteCorrectionK: found.correction.designK,
      reasons: [...found.correction.reasons, found.everyday.how, found.onceInYears.how],
    },
  };
}
