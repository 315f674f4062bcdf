import { requireInRange } from "../errors.ts";

export const animalClasses = [
  "calf",
  "beef",
  "heifer",
  "dairyCow",
  "piglet",
  "fatteningPig",
  "drySow",
  "nursingSow",
  "broiler",
  "layerCage",
  "layerFloor",
  "turkey",
  "horse",
  "ewe",
] as const;
export type AnimalClass = (typeof animalClasses)[number];

/** How the house shares heat between air and water; each class follows one of these. */
export type SplitGroup = "cattle" | "pigs" | "broilers" | "layers";

/** What a class needs beside its mass. Left out values are typical. */
export interface AnimalState {
  massKg: number;
  /** Milk, kg a day. */
  milkKgDay?: number;
  /** Gain, or egg mass for hens, kg a day. */
  gainKgDay?: number;
  /** Days pregnant. */
  pregnantDays?: number;
  /** Feed energy over maintenance. */
  feedLevel?: number;
  /** Energy of the feed, MJ/kg dry matter. */
  feedEnergyMjKg?: number;
}

interface ClassRule {
  split: SplitGroup;
  minKg: number;
  maxKg: number;
  /** Total heat at 20 °C, W. */
  totalW(state: AnimalState): number;
}

const pregnancyCattle = (days = 0) => 1.6e-5 * days ** 3;

function beefW(state: AnimalState, gain: number, energy: number): number {
  const { massKg } = state;
  return 7.64 * massKg ** 0.69 + (gain * (23 / energy - 1) * (57.27 + 0.302 * massKg)) / (1 - 0.171 * gain);
}

/** Pigs keep a share of the feed above maintenance as growth; the rest is heat. */
function growingPigW(maintenanceW: number, massKg: number, feedLevel: number): number {
  const kept = 0.47 + 0.003 * massKg;
  return maintenanceW + (1 - kept) * (feedLevel - 1) * maintenanceW;
}

/** Typical feed level of a fattening pig: 3.3 at 25 kg falling to 2.5 at 110 kg. From memory. */
function typicalFeedLevel(massKg: number): number {
  return Math.min(3.3, Math.max(2.5, 3.3 - ((massKg - 25) * 0.8) / 85));
}

const rules: Record<AnimalClass, ClassRule> = {
  calf: {
    split: "cattle",
    minKg: 25,
    maxKg: 300,
    totalW: ({ massKg, gainKgDay = 0.5 }) =>
      6.44 * massKg ** 0.7 + (13.3 * gainKgDay * (6.28 + 0.0188 * massKg)) / (1 - 0.3 * gainKgDay),
  },
  beef: {
    split: "cattle",
    minKg: 100,
    maxKg: 1200,
    totalW: (state) => beefW(state, state.gainKgDay ?? 1, state.feedEnergyMjKg ?? 11),
  },
  heifer: {
    split: "cattle",
    minKg: 100,
    maxKg: 900,
    totalW: (state) =>
      beefW(state, state.gainKgDay ?? 0.6, state.feedEnergyMjKg ?? 10) + pregnancyCattle(state.pregnantDays),
  },
  dairyCow: {
    split: "cattle",
    minKg: 300,
    maxKg: 1000,
    totalW: ({ massKg, milkKgDay = 25, pregnantDays = 160 }) =>
      5.6 * massKg ** 0.75 + 22 * milkKgDay + pregnancyCattle(pregnantDays),
  },
  piglet: {
    split: "pigs",
    minKg: 1,
    maxKg: 30,
    totalW: ({ massKg, feedLevel = 2.8 }) => growingPigW(7.4 * massKg ** 0.66, massKg, feedLevel),
  },
  fatteningPig: {
    split: "pigs",
    minKg: 15,
    maxKg: 180,
    totalW: ({ massKg, feedLevel = typicalFeedLevel(massKg) }) =>
      growingPigW(5.09 * massKg ** 0.75, massKg, feedLevel),
  },
  drySow: {
    split: "pigs",
    minKg: 100,
    maxKg: 400,
    totalW: ({ massKg, gainKgDay = 0.18, pregnantDays = 60 }) =>
      4.85 * massKg ** 0.75 + 8e-5 * pregnantDays ** 3 + 76 * gainKgDay,
  },
  nursingSow: {
    split: "pigs",
    minKg: 100,
    maxKg: 400,
    totalW: ({ massKg, milkKgDay = 6 }) => 4.85 * massKg ** 0.75 + 28 * milkKgDay,
  },
  broiler: { split: "broilers", minKg: 0.03, maxKg: 8, totalW: ({ massKg }) => 10.62 * massKg ** 0.75 },
  layerCage: {
    split: "layers",
    minKg: 0.3,
    maxKg: 4,
    totalW: ({ massKg, gainKgDay = 0.05 }) => 6.28 * massKg ** 0.75 + 25 * gainKgDay,
  },
  layerFloor: {
    split: "layers",
    minKg: 0.3,
    maxKg: 4,
    totalW: ({ massKg, gainKgDay = 0.05 }) => 6.8 * massKg ** 0.75 + 25 * gainKgDay,
  },
  turkey: { split: "broilers", minKg: 0.03, maxKg: 30, totalW: ({ massKg }) => 9.86 * massKg ** 0.77 },
  horse: { split: "cattle", minKg: 80, maxKg: 1200, totalW: ({ massKg }) => 6.1 * massKg ** 0.75 },
  ewe: {
    split: "cattle",
    minKg: 20,
    maxKg: 160,
    totalW: ({ massKg, milkKgDay = 1, pregnantDays = 0 }) =>
      6.4 * massKg ** 0.75 + 33 * milkKgDay + 2.4e-5 * pregnantDays ** 3,
  },
};

/**
 * Total heat of one animal at 20 °C, a mean over the day.
 *
 * Units kg, kg/day, days → W. Valid mass range by class; gain 0 to 2 kg/day, milk 0 to 60 kg/day, feed level 1 to 4. The litter is
 * part of a nursing sow. Horses and ewes are from memory with low confidence.
 * Errors EngineInputError naming the quantity and its range. Source [CIGR2002].
 */
export function totalHeatAt20W(animal: AnimalClass, state: AnimalState): number {
  const rule = rules[animal];
  requireInRange("massKg", state.massKg, rule.minKg, rule.maxKg, "kg");
  if (state.gainKgDay !== undefined) requireInRange("gainKgDay", state.gainKgDay, 0, 2, "kg/day");
  if (state.milkKgDay !== undefined) requireInRange("milkKgDay", state.milkKgDay, 0, 60, "kg/day");
  if (state.feedLevel !== undefined) requireInRange("feedLevel", state.feedLevel, 1, 4);
  if (state.pregnantDays !== undefined) requireInRange("pregnantDays", state.pregnantDays, 0, 400);
  return rule.totalW(state);
}

/** Range of masses a class is stated for, kg. */
export function massRangeKg(animal: AnimalClass): { minKg: number; maxKg: number } {
  const { minKg, maxKg } = rules[animal];
  return { minKg, maxKg };
}

/** Which house-level split of heat a class follows. Errors none. Source [CIGR2002]. */
export function splitGroup(animal: AnimalClass): SplitGroup {
  return rules[animal].split;
}
