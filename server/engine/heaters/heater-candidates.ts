import { requireInRange } from "../errors.ts";
import type { HeaterUnit } from "../plan/sizing-types.ts";
import { nextStepW } from "./size-steps.ts";

/** A way of fitting the house, before it is judged. */
export interface HeaterCandidate {
  id: string;
  title: string;
  units: HeaterUnit[];
  totalW: number;
}

/** Of two units each gives this share of the target, so that one alone still gives most of the heat. Common practice: 60 to 67 %. */
const SHARE_OF_TWO = 0.6;

const total = (units: HeaterUnit[]) => units.reduce((sum, { outputW, count }) => sum + outputW * count, 0);
const fresh = (outputW: number, count = 1): HeaterUnit => ({
  outputW,
  count,
  existing: false,
  label: "New heater",
});

/** Target above which three units share the work in the proposals, W. */
const LARGE_HOUSE_W = 180_000;

/**
 * Sensible ways to reach a target output: keep what is there, add to it, two or three equal units, one large one.
 *
 * Units W. Valid target 0 to 100 MW. Options that are the same as another are left out.
 * Errors EngineInputError. Source [SIZE-STEPS]; sharing of the load is common practice, no source.
 */
export function heaterCandidates(targetW: number, existing: HeaterUnit[]): HeaterCandidate[] {
  requireInRange("targetW", targetW, 0, 1e8, "W");
  const have = total(existing);
  const candidates: HeaterCandidate[] = [];
  const offer = (id: string, title: string, units: HeaterUnit[]) =>
    candidates.push({ id, title, units, totalW: total(units) });
  if (have > 0) offer("keep", "Keep the heat as it is", existing);
  if (targetW <= 0) return candidates;
  if (have > 0 && have < targetW) {
    offer("add", "Keep it, add one heater", [...existing, fresh(nextStepW(targetW - have))]);
    const sharing = nextStepW(Math.max(targetW - have, SHARE_OF_TWO * targetW));
    if (sharing > nextStepW(targetW - have)) {
      offer("add-large", "Keep it, add a larger heater", [...existing, fresh(sharing)]);
    }
  }
  if (targetW > LARGE_HOUSE_W)
    offer("three", "Three equal new heaters", [fresh(nextStepW(targetW / 2.5), 3)]);
  offer("two", "Two equal new heaters", [fresh(nextStepW(SHARE_OF_TWO * targetW), 2)]);
  offer("one", "One new heater", [fresh(nextStepW(targetW))]);
  return candidates;
}

/** Output left when the largest single unit stands still, W. Errors none. */
export function withoutLargestW(units: HeaterUnit[]): number {
  const largest = Math.max(0, ...units.map((unit) => unit.outputW));
  return total(units) - largest;
}
