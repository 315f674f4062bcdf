import { evaporationHeatKjKg } from "../air/moist-air.ts";
import { requireInRange } from "../errors.ts";
import { type AnimalClass, type AnimalState, splitGroup, totalHeatAt20W } from "./animal-classes.ts";
import { type HeatRule, unitHeatBy } from "./heat-rules.ts";

export interface StockHeat {
  totalW: number;
  sensibleW: number;
  latentW: number;
  /** Water given to the air, kg/h. */
  moistureKgH: number;
  /** Carbon dioxide given to the air, m³/h at about 20 °C. */
  carbonDioxideM3H: number;
}

export interface StockHeatInput extends AnimalState {
  animal: AnimalClass;
  headCount: number;
  houseTempC: number;
  /** m³/h for 1000 W of total heat, house level. */
  carbonDioxideM3HPerKw?: number;
  /** How heat is shared between air and water; the house-level rule of 2002 unless said. */
  heatRule?: HeatRule;
  /** Heat of today's breeds over that of the tables; 1 as published, measured up to 1.16 and more. */
  geneticsFactor?: number;
}

/** House level, manure included. Source [PEDERSEN2008]. */
export const CARBON_DIOXIDE_M3H_PER_KW = 0.185;

/**
 * Heat, water and carbon dioxide of a herd or flock at the temperature of its house.
 *
 * Units kg, °C → W, kg/h, m³/h. Valid 0 to 1 000 000 head, −40 to 45 °C; mass range by class. Sensible and latent add up to the total.
 * Errors EngineInputError. Source [CIGR2002], [PEDERSEN2008]; heat of newer breeds [BROWNBRANDL2014].
 */
export function animalHeat(input: StockHeatInput): StockHeat {
  const {
    animal,
    headCount,
    houseTempC,
    carbonDioxideM3HPerKw = CARBON_DIOXIDE_M3H_PER_KW,
    heatRule = "house2002",
    geneticsFactor = 1,
    ...state
  } = input;
  requireInRange("headCount", headCount, 0, 1_000_000);
  requireInRange("houseTempC", houseTempC, -40, 45, "°C");
  requireInRange("carbonDioxideM3HPerKw", carbonDioxideM3HPerKw, 0.1, 0.4, "m³/h");
  requireInRange("geneticsFactor", geneticsFactor, 0.5, 2);
  if (headCount === 0) return { totalW: 0, sensibleW: 0, latentW: 0, moistureKgH: 0, carbonDioxideM3H: 0 };
  const heatUnits = (headCount * geneticsFactor * totalHeatAt20W(animal, state)) / 1000;
  const unit = unitHeatBy(heatRule, splitGroup(animal), houseTempC);
  const latentW = heatUnits * unit.latentW;
  return {
    totalW: heatUnits * unit.totalW,
    sensibleW: heatUnits * unit.sensibleW,
    latentW,
    moistureKgH: (3.6 * latentW) / evaporationHeatKjKg(houseTempC),
    carbonDioxideM3H: (carbonDioxideM3HPerKw * heatUnits * unit.totalW) / 1000,
  };
}
