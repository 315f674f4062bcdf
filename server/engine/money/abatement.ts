import { requireInRange } from "../errors.ts";
import { capitalRecoveryFactor } from "./annuity.ts";
import type { YearlyRate } from "./rates.ts";

export interface AbatementInput {
  cost: number;
  /** Less the measure's own running cost. */
  yearlySaving: number;
  lifeYears: number;
  discount: YearlyRate;
  /** Carbon dioxide avoided each year, t. */
  avoidedTonnes: number;
}

export interface Abatement {
  /** Money for each tonne avoided; negative where the measure saves money. */
  costPerTonne: number;
  savesMoney: boolean;
  /** Negative costs must not be ranked: a larger abatement looks worse. Rank those by net present value. */
  mayBeRanked: boolean;
}

/**
 * Cost of avoiding a tonne of carbon dioxide.
 *
 * Units money, t/year → money/t. Valid avoided amount above 0. Errors EngineInputError. Source [DISCOUNTING].
 */
export function abatementCost(input: AbatementInput): Abatement {
  requireInRange("cost", input.cost, 0, 1e10);
  requireInRange("yearlySaving", input.yearlySaving, -1e10, 1e10);
  requireInRange("avoidedTonnes", input.avoidedTonnes, 1e-9, 1e9, "t");
  const yearly =
    input.cost * capitalRecoveryFactor(input.discount.perYear, input.lifeYears) - input.yearlySaving;
  const costPerTonne = yearly / input.avoidedTonnes;
  return { costPerTonne, savesMoney: costPerTonne < 0, mayBeRanked: costPerTonne >= 0 };
}
