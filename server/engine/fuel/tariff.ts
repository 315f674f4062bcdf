import { EngineInputError, requireInRange } from "../errors.ts";

/** A price as a bill gives it, per unit of fuel, in blocks of the amount used in a period. */
export interface Tariff {
  /** For each period, whatever is used. */
  standingCharge: number;
  /** Rising upper ends of the amount in a period; the last one is open. */
  blocks: readonly { upTo: number | null; pricePerUnit: number }[];
  /** Taxes and levies per unit on top. */
  levyPerUnit?: number;
  /** Value added tax on everything, 0 where it is got back. */
  taxFrac?: number;
}

function check(tariff: Tariff): void {
  requireInRange("standingCharge", tariff.standingCharge, 0, 1e9);
  requireInRange("blocks", tariff.blocks.length, 1, 20);
  requireInRange("levyPerUnit", tariff.levyPerUnit ?? 0, -1e6, 1e6);
  requireInRange("taxFrac", tariff.taxFrac ?? 0, 0, 1);
  let below = 0;
  tariff.blocks.forEach(({ upTo, pricePerUnit }, index) => {
    requireInRange("pricePerUnit", pricePerUnit, 0, 1e6, "", index);
    const last = index === tariff.blocks.length - 1;
    if ((upTo === null) !== last || (upTo !== null && upTo <= below))
      throw new EngineInputError({
        quantity: "upTo",
        value: upTo ?? Number.NaN,
        reason: "inconsistent",
        index,
        note: "Blocks must rise, and only the last one is open.",
      });
    below = upTo ?? below;
  });
}

/** Cost of an amount used in one period. Units of the tariff → money. Valid 0 to 1e9. Errors EngineInputError. Source [TARIFF]. */
export function periodCost(tariff: Tariff, amount: number): number {
  check(tariff);
  requireInRange("amount", amount, 0, 1e9);
  let below = 0;
  let cost = tariff.standingCharge;
  for (const { upTo, pricePerUnit } of tariff.blocks) {
    const end = upTo ?? Number.POSITIVE_INFINITY;
    cost += Math.max(0, Math.min(amount, end) - below) * (pricePerUnit + (tariff.levyPerUnit ?? 0));
    below = end;
  }
  return cost * (1 + (tariff.taxFrac ?? 0));
}

/**
 * What a change of the amount is worth: the cost before less the cost after, standing charges left out by themselves. A saving is
 * worth its last units, never the mean price with its standing charge.
 *
 * Units of the tariff → money. Valid equal numbers of periods. Errors EngineInputError. Source [TARIFF].
 */
export function savingValue(tariff: Tariff, before: readonly number[], after: readonly number[]): number {
  requireInRange("after", after.length, before.length, before.length);
  return before.reduce(
    (sum, amount, period) => sum + periodCost(tariff, amount) - periodCost(tariff, after[period] ?? 0),
    0,
  );
}
