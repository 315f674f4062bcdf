import { requireInRange } from "../errors.ts";
import type { UnitSystem } from "../units.ts";
import { equalUnits, type HeaterFamily, smallestUnit, type UnitSize, unitSizes } from "./unit-sizes.ts";

export interface ProposalInput {
  /** Heat to be delivered on the design night, W; 0 or less when the house holds without. */
  requiredW: number;
  /** Margin for pick-up after doors and wash-downs, 0.1 to 0.25 as a rule. */
  marginFrac: number;
  /** What the fitted heaters really give, one entry for each, W. */
  existingW: readonly number[];
  family: HeaterFamily;
  efficiencyFrac: number;
  units: UnitSystem;
  /** Share of the sea-level heat left at the site's height; 1 near the sea and for electric heat. */
  altitudeFactor?: number;
}

/** Ways of fitting a house; "none" stands for no heater at all. */
export type ProposalKind = "none" | "keep" | "add" | "replaceOne" | "shareTwo" | "several";

export interface Proposal {
  kind: ProposalKind;
  /** Units to buy, empty where nothing is. */
  buy: { count: number; size: UnitSize }[];
  keepsExisting: boolean;
  totalW: number;
  /** Total over need, less 1; negative is a shortfall. Null where nothing is needed. */
  spareFrac: number | null;
  /** What is left with the largest unit out, and its share of the need. */
  oneOutW: number;
  oneOutFrac: number | null;
  meetsNeed: boolean;
  meetsMargin: boolean;
}

/** Each of two units, so that one alone still gives most of the heat. Source [STAGING]. */
const SHARE_OF_TWO = 0.6;
/** With three and more units one out leaves two thirds and more by itself. */
const SEVERAL_FROM = 3;

/**
 * Sensible ways to fit a house, from nothing and keeping what is there to one, two and several new units in the sizes of a family.
 * Where no heat is needed the one answer is "none".
 *
 * Units W → W. Valid need −1e8 to 100 MW, margin 0 to 1, efficiency 0.1 to 1.1, altitude 0.2 to 1. Errors EngineInputError.
 * Source [SIZE-STEPS], [STAGING].
 */
export function proposeHeaters(input: ProposalInput): Proposal[] {
  const { requiredW, family, efficiencyFrac, units, existingW } = input;
  requireInRange("requiredW", requiredW, -1e8, 1e8, "W");
  const margin = requireInRange("marginFrac", input.marginFrac, 0, 1);
  const thin = requireInRange("altitudeFactor", input.altitudeFactor ?? 1, 0.2, 1);
  existingW.forEach((outputW, index) => {
    requireInRange("existingW", outputW, 0, 1e8, "W", index);
  });
  const have = existingW.reduce((sum, outputW) => sum + outputW, 0);
  const describe = (kind: ProposalKind, keeps: boolean, buy: Proposal["buy"] = []): Proposal =>
    judged(kind, requiredW, margin, keeps ? existingW : [], buy, thin, keeps && have > 0);
  if (requiredW <= 0) return [describe(have > 0 ? "keep" : "none", true)];
  // Sizes are sea-level outputs, so the need is raised to what has to stand on the plate.
  const targetW = (requiredW * (1 + margin)) / thin;
  const haveW = have / thin;
  const largestW = unitSizes(family, efficiencyFrac, units).at(-1)?.outputW ?? 0;
  const equal = (neededW: number, least: number) => {
    const { count, size } = equalUnits(family, neededW, efficiencyFrac, units, least);
    return [{ count, size }];
  };
  const proposals: Proposal[] = [];
  if (have > 0) proposals.push(describe("keep", true));
  if (have > 0 && haveW < targetW) proposals.push(describe("add", true, equal(targetW - haveW, 1)));
  if (targetW <= largestW)
    proposals.push(
      describe("replaceOne", false, [
        { count: 1, size: smallestUnit(family, targetW, efficiencyFrac, units) },
      ]),
    );
  if (SHARE_OF_TWO * targetW <= largestW)
    proposals.push(describe("shareTwo", false, equal(2 * SHARE_OF_TWO * targetW, 2)));
  proposals.push(describe("several", false, equal(targetW, SEVERAL_FROM)));
  return proposals;
}

function judged(
  kind: ProposalKind,
  requiredW: number,
  margin: number,
  kept: readonly number[],
  buy: Proposal["buy"],
  thin: number,
  keepsExisting: boolean,
): Proposal {
  const outputs = [
    ...kept,
    ...buy.flatMap(({ count, size }) => Array<number>(count).fill(size.outputW * thin)),
  ];
  const totalW = outputs.reduce((sum, outputW) => sum + outputW, 0);
  const oneOutW = totalW - Math.max(0, ...outputs);
  const needed = requiredW > 0;
  return {
    kind,
    buy,
    keepsExisting,
    totalW,
    spareFrac: needed ? totalW / requiredW - 1 : null,
    oneOutW,
    oneOutFrac: needed ? oneOutW / requiredW : null,
    meetsNeed: totalW >= requiredW - 1e-6,
    meetsMargin: totalW >= requiredW * (1 + margin) - 1e-6,
  };
}
