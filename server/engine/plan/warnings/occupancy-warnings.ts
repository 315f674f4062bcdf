import { type AnimalClass, animalClasses, massRangeKg } from "../../livestock/animal-classes.ts";
import { designSetpointC } from "../night-balances.ts";
import type { PlanWarning } from "../plan-types.ts";
import { type WarningContext, warning } from "./warning-context.ts";

/** Temperatures wanted for each class, °C, wider than any schedule. Source [CONFUSIONS]. */
const WANTED_C: Record<AnimalClass, readonly [number, number]> = {
  calf: [-5, 20],
  beef: [-15, 20],
  heifer: [-15, 20],
  dairyCow: [-15, 20],
  piglet: [18, 36],
  fatteningPig: [8, 28],
  drySow: [8, 26],
  gilt: [8, 26],
  boar: [8, 26],
  nursingSow: [14, 28],
  broiler: [16, 36],
  layerCage: [10, 27],
  layerFloor: [10, 27],
  turkey: [12, 38],
  duck: [8, 36],
  goose: [5, 36],
  horse: [-15, 20],
  ewe: [-15, 20],
  lamb: [-10, 25],
  goatDry: [-10, 20],
  goatMilking: [-5, 20],
  rabbit: [5, 25],
};
/** Young birds are this small while a house is this warm. Source [CONFUSIONS]. */
const BROODING_FROM_C = 29;
const BROODING_MASS_KG: Partial<Record<AnimalClass, number>> = { broiler: 0.5, turkey: 0.8 };
const CROP_WARMEST_NIGHT_C = 30;

/** Calendars, masses and temperatures that do not fit each other. Shape: context → warnings. Source [CONFUSIONS]. */
export function occupancyWarnings(context: WarningContext): PlanWarning[] {
  return [
    ...calendarWarnings(context),
    ...stockWarnings(context),
    ...temperatureWarnings(context),
    ...screenWarnings(context),
  ];
}

const SOUTH_WINTER = [6, 7, 8];
const NORTH_WINTER = [12, 1, 2];

function calendarWarnings({ model, months }: WarningContext): PlanWarning[] {
  const { input } = model;
  const south = input.site.latitudeDeg < -15;
  const north = input.site.latitudeDeg > 15;
  if (!south && !north) return [];
  const usedIn = (list: number[]) => list.every((month) => input.months[month - 1]?.occupied);
  const ownWinter = south ? SOUTH_WINTER : NORTH_WINTER;
  const otherWinter = south ? NORTH_WINTER : SOUTH_WINTER;
  const asleep = ownWinter.every((month) => !input.months[month - 1]?.occupied);
  if (!usedIn(otherWinter) || !asleep || months.every((month) => month.occupied)) return [];
  return [
    warning(
      "caution",
      "calendarHemisphere",
      south
        ? "The calendar looks like one for the northern half of the world: the house is empty from June to August, the cold months here."
        : "The calendar looks like one for the southern half of the world: the house is empty from December to February, the cold months here.",
      "Check the months in use, and the latitude's sign.",
      "months",
    ),
  ];
}

function stockWarnings({ model, months }: WarningContext): PlanWarning[] {
  const { input } = model;
  const { stock } = input;
  const animal = animalClasses.find((known) => known === stock?.classId);
  if (!stock || !animal) return [];
  const found: PlanWarning[] = [];
  const used = input.months.filter((use) => use.occupied && use.headCount > 0);
  const range = massRangeKg(animal);
  const outside = used.find((use) => use.massKg < range.minKg || use.massKg > range.maxKg);
  if (outside)
    found.push(
      warning(
        "caution",
        "massOutOfRange",
        `An animal of ${outside.massKg} kg is outside what is known for ${stock.name.toLowerCase()}: ${range.minKg} to ${range.maxKg} kg.`,
        "Check the mass and its unit. The nearest end of the range is used.",
        "months",
      ),
    );
  const youngKg = BROODING_MASS_KG[animal];
  const grownInWarmth =
    youngKg !== undefined &&
    used.some((use) => designSetpointC(model, use) >= BROODING_FROM_C && use.massKg > youngKg);
  const masses = new Set(used.map((use) => use.massKg));
  const grownAllYear =
    youngKg !== undefined && masses.size === 1 && used.some((use) => use.massKg > 2 * youngKg);
  if (grownInWarmth || grownAllYear)
    found.push(
      warning(
        "caution",
        "grownStockAtPlacement",
        "The stock is entered at a grown mass, whose heat hides what the house needs when the young are placed.",
        "Enter the mass of each month, and the mass at placement in the coldest month of placing.",
        "months",
      ),
    );
  if (used.length === 0 && months.some((month) => month.occupied))
    found.push(
      warning(
        "caution",
        "noAnimals",
        "The house is in use but no month has animals.",
        "Enter the numbers month by month; without them ventilation and animal heat are left out.",
        "months",
      ),
    );
  return found;
}

function temperatureWarnings({ model }: WarningContext): PlanWarning[] {
  const { input } = model;
  const found: PlanWarning[] = [];
  const setpoints = input.months.filter((use) => use.occupied).map((use) => designSetpointC(model, use));
  if (setpoints.some((setpointC) => setpointC < input.criticalTempC))
    found.push(
      warning(
        "caution",
        "criticalAboveSetpoint",
        "In some month the critical temperature lies above the wanted one.",
        "One of the two is wrong; the critical temperature is where harm begins.",
        "criticalTemp",
      ),
    );
  const animal = animalClasses.find((known) => known === input.stock?.classId);
  const band = input.stock && animal ? WANTED_C[animal] : ([-5, CROP_WARMEST_NIGHT_C] as const);
  const name = input.stock?.name ?? input.crop?.name ?? "this use";
  if (setpoints.some((setpointC) => setpointC < band[0] || setpointC > band[1]))
    found.push(
      warning(
        "caution",
        "setpointUnusual",
        `A wanted temperature is outside what is usual for ${name.toLowerCase()}.`,
        "Check the number and whether it was typed in °C or °F.",
        "months",
      ),
    );
  return found;
}

function screenWarnings({ model, months, sizing }: WarningContext): PlanWarning[] {
  const { screen } = model.input;
  if (!screen) return [];
  const found: PlanWarning[] = [];
  const short = (state: "snowOnRoof" | "screensOpen") =>
    months.some((month) => {
      const balance = month.onceInYears[state];
      return balance !== undefined && balance.requiredHeatW > sizing.installedW;
    });
  if (sizing.installedW > 0 && screen.opensForSnow && short("snowOnRoof"))
    found.push(
      warning(
        "caution",
        "snowOpensScreen",
        "The screen opens for snow, and then the fitted heat does not hold the house.",
        "Count on the larger need of a snow night, or plan how the roof is cleared.",
        "screen.opensForSnow",
      ),
    );
  if (sizing.installedW > 0 && sizing.verdictOnceInYears === "holds" && short("screensOpen"))
    found.push(
      warning(
        "note",
        "screenCarriesTheNight",
        "The house holds the coldest night only while the screen is shut.",
        "Keep spares for the screen's drive and know how to shut it by hand.",
        "screen.screen",
      ),
    );
  return found;
}
