import type { PlanChoices } from "../../contracts/plans.ts";
import { type Origin, type Quantity, siValue } from "../../contracts/quantity.ts";
import type { Survey, SurveyCover, SurveyHeater } from "../../contracts/survey.ts";
import type { StationClimate } from "../../engine/climate/station-climate.ts";
import type { Assembly, HeaterInput, HousePlanInput, ScreenInput } from "../../engine/plan/house-input.ts";
import { houseShapeOf } from "../buildings/house-shape.ts";
import { stackOf, stackTransmittance } from "../library/cover-stack.ts";
import { referenceData, rowOf } from "../library/reference-data.ts";

export interface PlannedHouse {
  survey: Survey;
  latitudeDeg: number;
  longitudeDeg: number;
  climate: StationClimate;
  choices: PlanChoices;
}

/** Share of the sun left by frame, dirt and drops. From memory: whole houses pass 0.55 to 0.69 of the sun under clean covers of 0.8. */
const FRAME_AND_DIRT_FRAC = 0.8;
/** Seasonal efficiency the fuel need is told with while no heater is fitted. */
const FALLBACK_EFFICIENCY_FRAC = 0.8;

function assemblyOf({ cover, uValue }: SurveyCover): Assembly {
  const row = rowOf(referenceData.covers, cover.value);
  const solarTransmittance = stackTransmittance(row);
  if (uValue !== null)
    return { kind: "uValue", name: row.name, uValueWM2K: siValue(uValue), solarTransmittance };
  return { kind: "stack", name: row.name, stack: stackOf(row), solarTransmittance };
}

function screenOf(survey: Survey): ScreenInput | null {
  if (survey.screen === null) return null;
  const row = rowOf(referenceData.screens, survey.screen.screen.value);
  return {
    name: row.name,
    emissivityIn: row.emissivityIn,
    emissivityOut: row.emissivityOut,
    longwaveTransmittance: row.longwaveTransmittance,
    solarTransmittance: row.solarTransmittance,
    savingFrac: row.savingFrac,
    coverageFrac: siValue(survey.screen.coverage),
    edgeGapM: siValue(survey.screen.edgeGap),
    opensForSnow: survey.screen.opensForSnow.value === "yes",
  };
}

function heaterOf(heater: SurveyHeater): HeaterInput {
  const row = rowOf(referenceData.heaterTypes, heater.type.value);
  return {
    label: heater.label,
    typeId: row.id,
    ratedW: siValue(heater.rating),
    basis: heater.basis.value,
    efficiencyFrac: siValue(heater.efficiency),
    vented: row.vented,
    burnsFuel: row.burnsFuel,
    fuelId: heater.fuel.value,
    count: siValue(heater.count),
  };
}

function usesOf(survey: Survey): Pick<HousePlanInput, "crop" | "stock" | "lampsWM2" | "lampHoursPerDay"> {
  if (survey.use.kind === "greenhouse") {
    const row = rowOf(referenceData.crops, survey.use.crop.value);
    return {
      crop: { name: row.name, sensibleShareFrac: row.sensibleShareFrac, humidityFrac: row.humidityFrac },
      stock: null,
      lampsWM2: siValue(survey.use.lamps),
      lampHoursPerDay: siValue(survey.use.lampHours),
    };
  }
  const { animal, winterVentilation, humidityLimit, heatRecovery } = survey.use;
  const row = rowOf(referenceData.animals, animal.value);
  return {
    crop: null,
    stock: {
      classId: row.classId,
      name: row.name,
      ventilation:
        winterVentilation === null
          ? {
              mode: "balance",
              perHeadM3H: row.perHeadM3H,
              ...(row.perHeadPerKg075M3H === null ? {} : { perKg075M3H: row.perHeadPerKg075M3H }),
            }
          : { mode: "typed", flowM3H: siValue(winterVentilation) },
      humidityLimitFrac: siValue(humidityLimit),
      carbonDioxideLimitPpm: row.carbonDioxideLimitPpm,
      heatRecoveryFrac: siValue(heatRecovery),
    },
    lampsWM2: 0,
    lampHoursPerDay: 0,
  };
}

/** Origin of every answer by its dotted path. */
export function originsOf(node: unknown, path = ""): Record<string, Origin> {
  if (node === null || typeof node !== "object") return {};
  if ("origin" in node) return { [path]: (node as { origin: Origin }).origin };
  return Object.assign(
    {},
    ...Object.entries(node).map(([key, child]) => originsOf(child, path === "" ? key : `${path}.${key}`)),
  );
}

function overridden(own: Quantity | null, typical: number): number {
  return own === null ? typical : siValue(own);
}

/** A survey and its station as the engine takes them: typed units become SI, names become properties. */
export function houseInputOf({
  survey,
  latitudeDeg,
  longitudeDeg,
  climate,
  choices,
}: PlannedHouse): HousePlanInput {
  const { covers } = survey;
  const fuel = rowOf(referenceData.fuels, survey.fuel.value);
  return {
    kind: survey.use.kind,
    site: {
      latitudeDeg,
      longitudeDeg,
      elevationM: siValue(survey.elevation),
      shelter: survey.shelter.value,
      frostHollowK: siValue(survey.frostHollow),
    },
    climate,
    shape: houseShapeOf(survey.shape),
    ridgeBearingDeg: siValue(survey.ridgeBearing),
    covers: {
      roof: assemblyOf(covers.roof),
      sideWall: assemblyOf(covers.sides),
      endWall: assemblyOf(covers.ends),
      ...(covers.ceiling === null ? {} : { ceiling: assemblyOf(covers.ceiling) }),
      ...(covers.kneewall === null ? {} : { kneewall: assemblyOf(covers.kneewall) }),
    },
    kneewallHeightM: covers.kneewall === null ? 0 : siValue(covers.kneewall.height),
    screen: screenOf(survey),
    leakageAirChangesPerHour: overridden(
      survey.leakage.airChanges,
      rowOf(referenceData.leakage, survey.leakage.class.value).airChangesPerHour,
    ),
    floorEdgeLossWMK: overridden(
      survey.floor.edgeLoss,
      rowOf(referenceData.floorEdges, survey.floor.edge.value).lossWMK,
    ),
    frameAndDirtFrac: FRAME_AND_DIRT_FRAC,
    ...usesOf(survey),
    months: survey.months.map((month) => ({
      occupied: month.occupied,
      nightSetpointC: siValue(month.nightSetpoint),
      daySetpointC: siValue(month.daySetpoint),
      headCount: siValue(month.headCount),
      massKg: siValue(month.mass),
    })),
    criticalTempC: siValue(survey.criticalTemp),
    heaters: survey.heaters.map(heaterOf),
    fuel: {
      id: fuel.id,
      name: fuel.name,
      unit: fuel.unit,
      kwhGrossPerUnit: fuel.kwhGrossPerUnit,
      carbonDioxideKgPerKwh: fuel.carbonDioxideKgPerKwh,
    },
    fallbackEfficiencyFrac: FALLBACK_EFFICIENCY_FRAC,
    returnPeriodYears: choices.returnPeriodYears,
    everydayPercent: choices.everydayPercent,
    origins: originsOf(survey),
  };
}
