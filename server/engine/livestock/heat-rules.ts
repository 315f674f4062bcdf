import { requireInRange } from "../errors.ts";
import type { SplitGroup } from "./animal-types.ts";
import { type UnitHeat, unitHeat } from "./house-split.ts";

/**
 * Published ways to share heat between air and water.
 * house2002: whole house, with water from floor, litter and feed; the one for a heat balance.
 * animal2002: the animals alone on dry ground. rule1984: the older rule, one curve for all.
 */
export const heatRules = ["house2002", "animal2002", "rule1984"] as const;
export type HeatRule = (typeof heatRules)[number];

function splitOf(totalW: number, sensibleW: number): UnitHeat {
  const held = Math.min(totalW, Math.max(0, sensibleW));
  return { totalW, sensibleW: held, latentW: totalW - held };
}

/** Temperature above 0 °C: below it the square and fourth powers would bend the wrong way. */
const warm = (tempC: number) => Math.max(0, tempC);

/**
 * What 1000 W at 20 °C become at another temperature by a rule. Sensible and latent always come from the same rule, so that the
 * total closes.
 *
 * Units °C → W. Valid −40 to 45 °C, as {@link unitHeat}. Errors EngineInputError. Source [CIGR2002], [CIGR1984].
 */
export function unitHeatBy(rule: HeatRule, group: SplitGroup, houseTempC: number): UnitHeat {
  requireInRange("houseTempC", houseTempC, -40, 45, "°C");
  const house = unitHeat(group, houseTempC);
  if (rule === "house2002") return house;
  if (rule === "animal2002") return splitOf(house.totalW, 0.8 * house.totalW - 0.38 * warm(houseTempC) ** 2);
  const temp = Math.min(38, Math.max(-5, houseTempC));
  const totalW = 1000 * totalFactor1984(temp);
  return splitOf(totalW, totalW * sensibleShare1984(temp));
}

/** Total heat over its value at 20 °C by the older rule. Units °C → ratio. Valid −10 to 40 °C. Errors EngineInputError. Source [CIGR1984]. */
export function totalFactor1984(houseTempC: number): number {
  requireInRange("houseTempC", houseTempC, -10, 40, "°C");
  return 1 + 4e-5 * (20 - houseTempC) ** 3;
}

/** Share of the total that warms the air by the older rule. Units °C → 0 to 1. Valid −10 to 35 °C. Errors EngineInputError. Source [CIGR1984]. */
export function sensibleShare1984(houseTempC: number): number {
  requireInRange("houseTempC", houseTempC, -10, 40, "°C");
  return Math.max(0, 0.8 - 1.85e-7 * (houseTempC + 10) ** 4);
}

/** Carbon dioxide for 1000 W of total heat, m³/h at 20 °C, by what is counted. Source [PEDERSEN2008], [VERA2018]; animals alone and deep litter typical. */
export const carbonDioxideRates = {
  animalsAlone: 0.163,
  house: 0.185,
  dairySolidFloor: 0.18,
  dairyPartSlatted: 0.2,
  houseWithManureStore: 0.2035,
  deepLitter: 0.222,
} as const;
export type CarbonDioxideSource = keyof typeof carbonDioxideRates;
