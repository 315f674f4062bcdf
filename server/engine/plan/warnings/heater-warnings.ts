import { altitudeFactor } from "../../heaters/delivered-output.ts";
import { combustionProducts } from "../../heaters/unvented.ts";
import { totalOutputW } from "../../sizing/installed-units.ts";
import type { HeaterInput } from "../house-input.ts";
import type { PlanWarning } from "../plan-types.ts";
import { type WarningContext, warning } from "./warning-context.ts";

const KBTUH_W = 293.07107;
/** Inputs heaters are commonly sold by, kBtu/h. Source [CONFUSIONS]. */
const SOLD_INPUTS_KBTUH = [75, 100, 125, 150, 175, 200, 225, 250, 300, 350, 400];
/** A plate this near to a sold input is taken for one. */
const NEAR_FRAC = 0.004;
/** Twice the need on the rare night is more than any margin. Source [CONFUSIONS]. */
const OVERSIZED = 2;

/** Plates misread, thin air, size, one single heater, burners without a flue. Shape: context → warnings. Source [CONFUSIONS], [NFPA54]. */
export function heaterWarnings(context: WarningContext): PlanWarning[] {
  const { model, sizing } = context;
  const { input } = model;
  const found: PlanWarning[] = [];
  input.heaters.forEach((heater, index) => {
    if (looksLikeInput(heater))
      found.push(
        warning(
          "caution",
          "inputTakenForOutput",
          `${heater.label}: the rating given as output is a size heaters are sold by input.`,
          `Look at the plate. If it names the input, the heater gives ${Math.round(heater.efficiencyFrac * 100)} % of it.`,
          `heaters.${index}.basis`,
        ),
      );
  });
  const factor = altitudeFactor(input.site.elevationM);
  if (factor < 1 && input.heaters.some((heater) => heater.burnsFuel))
    found.push(
      warning(
        "note",
        "thinAir",
        `At this height burners give about ${Math.round((1 - factor) * 100)} % less than their plates say; that is counted.`,
        "Ask the supplier whether the burners were set for the height.",
        "elevation",
      ),
    );
  found.push(...sizeWarnings(context), ...fluelessWarnings(context));
  if (sizing.installedW > 0 && input.heaters.some((heater) => heater.burnsFuel))
    found.push(
      warning(
        "note",
        "gasSafety",
        "Burners make carbon monoxide when they lack air or care.",
        "Fit an alarm, follow the local code, and have gas and flue work done by licensed people.",
      ),
    );
  return found;
}

function sizeWarnings({ model, sizing, units }: WarningContext): PlanWarning[] {
  const found: PlanWarning[] = [];
  const installedW = totalOutputW(units);
  const count = units.reduce((sum, unit) => sum + unit.count, 0);
  if (installedW > OVERSIZED * sizing.onceInYearsRequiredW && sizing.onceInYearsRequiredW > 0)
    found.push(
      warning(
        "caution",
        "oversized",
        `The fitted heat is ${(installedW / sizing.onceInYearsRequiredW).toFixed(1)} times what the coldest night asks for.`,
        "Check ratings and areas. Large heaters run in short bursts and let the temperature swing.",
        "heaters",
      ),
    );
  if (
    count === 1 &&
    sizing.largestUnitOutSettlesAtC < model.input.criticalTempC &&
    sizing.noHeaterReason === null
  )
    found.push(
      warning(
        "caution",
        "singleHeater",
        "One heater carries the whole house, and without it the critical temperature is passed.",
        "Share the heat between two, or keep a spare and an alarm that somebody answers.",
        "heaters",
      ),
    );
  return found;
}

function fluelessWarnings({ model, sizing }: WarningContext): PlanWarning[] {
  const flueless = model.input.heaters.filter((heater) => heater.burnsFuel && !heater.vented);
  const first = flueless[0];
  if (first === undefined) return [];
  const neededKw = Math.min(sizing.onceInYearsRequiredW, sizing.installedW) / 1000;
  const products = Object.entries(combustionProducts).find(([fuelId]) => fuelId === first.fuelId)?.[1];
  const waterKgH = products ? (neededKw / products.sensibleFrac) * products.waterKgKwh : 0;
  const amount =
    waterKgH >= 0.5 ? ` On the coldest night that is about ${Math.round(waterKgH)} kg of water an hour.` : "";
  const greenhouse = model.input.kind === "greenhouse";
  return [
    warning(
      "caution",
      "noFlue",
      `Burners without a flue leave their water and gases in the house.${amount}`,
      greenhouse
        ? "Their water must leave with the air, and traces of ethylene harm crops. Vented heaters avoid both."
        : "The air they need is not in the ventilation counted here. Check carbon dioxide and carbon monoxide while they run.",
      "heaters",
    ),
  ];
}

function looksLikeInput(heater: HeaterInput): boolean {
  if (heater.basis !== "output" || !heater.burnsFuel) return false;
  return [heater.ratedW, heater.ratedW / heater.count].some((ratedW) =>
    SOLD_INPUTS_KBTUH.some((size) => Math.abs(ratedW / (size * KBTUH_W) - 1) < NEAR_FRAC),
  );
}
