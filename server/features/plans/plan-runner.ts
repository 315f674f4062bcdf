import type { Transaction } from "sequelize";
import { countAnswers } from "../../contracts/answered.ts";
import type { PlanChoices } from "../../contracts/plans.ts";
import { siValue } from "../../contracts/quantity.ts";
import type { Survey } from "../../contracts/survey.ts";
import { EngineInputError } from "../../engine/errors.ts";
import type { HousePlanInput } from "../../engine/plan/house-input.ts";
import { planHouse } from "../../engine/plan/plan-house.ts";
import type { PlanResult } from "../../engine/plan/plan-types.ts";
import { cannotCalculate } from "../../errors.ts";
import type { Building } from "../../models/building.ts";
import { ClimateStation } from "../../models/climate-station.ts";
import type { StoredPlanSummary } from "../../models/plan.ts";
import { stationOf, TOO_FAR_KM } from "../climate/station-choice.ts";
import { houseInputOf } from "./survey-to-house.ts";

export interface WorkedOut {
  engineInput: HousePlanInput;
  result: PlanResult;
}

/** Gathers what a plan needs, asks the engine once, and turns a refusal of the engine into words. */
export async function workOut(
  building: Building,
  survey: Survey,
  choices: PlanChoices,
  transaction?: Transaction,
): Promise<WorkedOut> {
  const { latitudeDeg, longitudeDeg } = building;
  const site = { latitudeDeg, longitudeDeg, elevationM: siValue(survey.elevation) };
  const choice = await stationOf(site, building.stationId);
  if (choice.distanceKm > TOO_FAR_KM && !building.stationChosen) {
    throw cannotCalculate(
      `The nearest climate station, ${choice.name}, is ${Math.round(choice.distanceKm)} km away. Please choose a station yourself if its weather fits this place.`,
      { stationId: "Choose a climate station." },
    );
  }
  const station = await ClimateStation.findByPk(choice.id, { transaction });
  if (station === null)
    throw cannotCalculate("The climate station of this building is gone. Please choose another one.");
  const engineInput = houseInputOf({
    survey,
    latitudeDeg,
    longitudeDeg,
    climate: station.record.climate,
    choices,
  });
  try {
    return { engineInput, result: planHouse(engineInput) };
  } catch (error) {
    if (error instanceof EngineInputError)
      throw cannotCalculate(`The plan could not be worked out. ${error.message}`);
    throw error;
  }
}

/** The figures lists need. */
export function summaryOfResult(result: PlanResult, survey: Survey, building: Building): StoredPlanSummary {
  const { sizing, annual } = result;
  const { latitudeDeg, longitudeDeg } = building;
  const worst = result.months[sizing.onceInYearsMonth - 1];
  const { known, questions } = countAnswers(survey);
  return {
    requiredW: sizing.onceInYearsRequiredW,
    installedW: sizing.installedW,
    shortW: Math.max(0, sizing.onceInYearsRequiredW - sizing.installedW),
    verdict: sizing.verdictOnceInYears,
    verdictEveryday: sizing.verdictEveryday,
    onceInYearsDesignC: worst?.climate.onceInYearsDesignC ?? 0,
    settlesAtC: sizing.settlesAtOnceInYearsC,
    setpointC: worst?.setpointNightC ?? 0,
    hoursToCriticalLow: sizing.hoursToCriticalLow,
    hoursToCriticalHigh: sizing.hoursToCriticalHigh,
    heaterKwh: annual.heaterKwh,
    heaterKwhM2: annual.heaterKwhM2,
    knownFrac: questions === 0 ? 0 : known / questions,
    place: { latitudeDeg, longitudeDeg, stationId: result.station.id },
  };
}
