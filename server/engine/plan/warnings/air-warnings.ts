import { minimumVentilation } from "../../livestock/minimum-ventilation.ts";
import { houseAir, NIGHT_HUMIDITY_FRAC } from "../house-air.ts";
import { designSetpointC } from "../night-balances.ts";
import type { PlanWarning } from "../plan-types.ts";
import { type WarningContext, warning } from "./warning-context.ts";

/** A measured flow outside this band around the needed one is pointed out. Source [CONFUSIONS]. */
const TOO_LITTLE = 0.6;
const TOO_MUCH = 1.6;
/** Air changes of a house that make a careful reader ask. Source [CONFUSIONS]. */
const VERY_LEAKY_PER_HOUR = 6;

/** Ventilation that is blank, too small or too large, and leaks that look wrong. Shape: context → warnings. Source [CONFUSIONS]. */
export function airWarnings(context: WarningContext): PlanWarning[] {
  const { input } = context.model;
  const found: PlanWarning[] = [];
  if (input.leakageAirChangesPerHour > VERY_LEAKY_PER_HOUR)
    found.push(
      warning(
        "caution",
        "leakageHigh",
        `The house is said to change its air ${input.leakageAirChangesPerHour.toFixed(1)} times an hour by leaks alone.`,
        "Check the figure; old lapped glass in bad repair reaches 4.",
        "leakage.airChanges",
      ),
    );
  const worst = context.months[context.sizing.onceInYearsMonth - 1];
  const use = input.months[context.sizing.onceInYearsMonth - 1];
  const { stock } = input;
  if (stock?.ventilation.mode !== "typed" || !worst || !use || use.headCount === 0 || !use.occupied)
    return found;
  const typedM3H = stock.ventilation.flowM3H;
  if (typedM3H <= 0) {
    found.push(
      warning(
        "block",
        "ventilationZero",
        "Winter ventilation is zero with animals inside.",
        "Type the flow that was measured, or leave it to be worked out. Animals need air in every weather.",
        "use.winterVentilation",
      ),
    );
    return found;
  }
  const setpointC = designSetpointC(context.model, use);
  const heat = houseAir(context.model, use).stockAt(setpointC);
  const needed = minimumVentilation({
    moistureKgH: heat.moistureKgH,
    carbonDioxideM3H: heat.carbonDioxideM3H,
    insideTempC: setpointC,
    humidityLimitFrac: stock.humidityLimitFrac,
    outdoorTempC: worst.climate.everydayDesignC,
    outdoorHumidityFrac: NIGHT_HUMIDITY_FRAC,
    pressurePa: context.model.pressurePa,
    carbonDioxideLimitPpm: stock.carbonDioxideLimitPpm,
    headCount: use.headCount,
    perHeadM3H: 0,
  }).flowM3H;
  if (typedM3H < TOO_LITTLE * needed)
    found.push(
      warning(
        "caution",
        "ventilationLow",
        "The measured ventilation is much less than moisture and carbon dioxide ask for.",
        "Measure again; if it is right, the air is bad before the house is cold.",
        "use.winterVentilation",
      ),
    );
  if (typedM3H > TOO_MUCH * needed)
    found.push(
      warning(
        "caution",
        "ventilationHigh",
        `The measured ventilation is ${(typedM3H / needed).toFixed(1)} times what moisture and carbon dioxide ask for.`,
        "Look at the smallest fan and its lowest speed before buying insulation or a larger heater.",
        "use.winterVentilation",
      ),
    );
  return found;
}
