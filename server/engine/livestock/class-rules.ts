import type { AnimalClass, AnimalState, ClassTrust, SplitGroup } from "./animal-types.ts";

/** One line of the table of classes. */
export interface ClassRule {
  split: SplitGroup;
  trust: ClassTrust;
  minKg: number;
  maxKg: number;
  /** Most a day such an animal gains, or lays, kg: catches grams typed as kilograms. */
  maxGainKgDay: number;
  totalW(state: AnimalState): number;
}

const pregnancyCattle = (days = 0) => 1.6e-5 * days ** 3;

/** The growth term carries no factor of 13.3: that one belongs to calves, and would turn 0.5 kW into 2 kW. */
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

function breedingPigW({ massKg }: AnimalState, gain: number, pregnantDays: number): number {
  return 4.85 * massKg ** 0.75 + 8e-5 * pregnantDays ** 3 + 76 * gain;
}

/** Heat of a body that only lives: W for each kg to the power of 0.75. */
const metabolic = (perKg075W: number) => (state: AnimalState) => perKg075W * state.massKg ** 0.75;

/** Every class. Source [CIGR2002]; rows marked typical from memory, assumed rows borrow a relative's formula. */
export const classRules: Record<AnimalClass, ClassRule> = {
  calf: {
    split: "cattle",
    trust: "published",
    minKg: 25,
    maxKg: 300,
    maxGainKgDay: 2,
    totalW: ({ massKg, gainKgDay = 0.5 }) =>
      6.44 * massKg ** 0.7 + (13.3 * gainKgDay * (6.28 + 0.0188 * massKg)) / (1 - 0.3 * gainKgDay),
  },
  beef: {
    split: "cattle",
    trust: "published",
    minKg: 80,
    maxKg: 1200,
    maxGainKgDay: 2,
    totalW: (state) => beefW(state, state.gainKgDay ?? 1, state.feedEnergyMjKg ?? 11),
  },
  heifer: {
    split: "cattle",
    trust: "published",
    minKg: 100,
    maxKg: 900,
    maxGainKgDay: 2,
    totalW: (state) =>
      beefW(state, state.gainKgDay ?? 0.6, state.feedEnergyMjKg ?? 10) + pregnancyCattle(state.pregnantDays),
  },
  dairyCow: {
    split: "cattle",
    trust: "published",
    minKg: 300,
    maxKg: 1000,
    maxGainKgDay: 2,
    totalW: ({ massKg, milkKgDay = 25, pregnantDays = 160 }) =>
      5.6 * massKg ** 0.75 + 22 * milkKgDay + pregnancyCattle(pregnantDays),
  },
  piglet: {
    split: "pigs",
    trust: "published",
    minKg: 1,
    maxKg: 30,
    maxGainKgDay: 2,
    totalW: ({ massKg, feedLevel = 2.8 }) => growingPigW(7.4 * massKg ** 0.66, massKg, feedLevel),
  },
  fatteningPig: {
    split: "pigs",
    trust: "published",
    minKg: 15,
    maxKg: 180,
    maxGainKgDay: 2,
    totalW: ({ massKg, feedLevel = typicalFeedLevel(massKg) }) =>
      growingPigW(5.09 * massKg ** 0.75, massKg, feedLevel),
  },
  drySow: {
    split: "pigs",
    trust: "published",
    minKg: 100,
    maxKg: 400,
    maxGainKgDay: 2,
    totalW: (state) => breedingPigW(state, state.gainKgDay ?? 0.18, state.pregnantDays ?? 60),
  },
  gilt: {
    split: "pigs",
    trust: "published",
    minKg: 60,
    maxKg: 250,
    maxGainKgDay: 2,
    totalW: (state) => breedingPigW(state, state.gainKgDay ?? 0.62, state.pregnantDays ?? 0),
  },
  boar: {
    split: "pigs",
    trust: "published",
    minKg: 80,
    maxKg: 450,
    maxGainKgDay: 2,
    totalW: (state) => breedingPigW(state, state.gainKgDay ?? 0, 0),
  },
  nursingSow: {
    split: "pigs",
    trust: "published",
    minKg: 100,
    maxKg: 400,
    maxGainKgDay: 2,
    totalW: ({ massKg, milkKgDay = 6 }) => 4.85 * massKg ** 0.75 + 28 * milkKgDay,
  },
  broiler: {
    split: "broilers",
    trust: "published",
    minKg: 0.03,
    maxKg: 8,
    maxGainKgDay: 0.2,
    totalW: metabolic(10.62),
  },
  layerCage: {
    split: "layers",
    trust: "published",
    minKg: 0.3,
    maxKg: 4,
    maxGainKgDay: 0.1,
    totalW: ({ massKg, gainKgDay = 0.05 }) => 6.28 * massKg ** 0.75 + 25 * gainKgDay,
  },
  layerFloor: {
    split: "layers",
    trust: "published",
    minKg: 0.3,
    maxKg: 4,
    maxGainKgDay: 0.1,
    totalW: ({ massKg, gainKgDay = 0.05 }) => 6.8 * massKg ** 0.75 + 25 * gainKgDay,
  },
  turkey: {
    split: "broilers",
    trust: "published",
    minKg: 0.03,
    maxKg: 30,
    maxGainKgDay: 0.4,
    totalW: ({ massKg }) => 9.86 * massKg ** 0.77,
  },
  duck: {
    split: "broilers",
    trust: "assumed",
    minKg: 0.04,
    maxKg: 6,
    maxGainKgDay: 0.2,
    totalW: metabolic(10.62),
  },
  goose: {
    split: "broilers",
    trust: "assumed",
    minKg: 0.07,
    maxKg: 12,
    maxGainKgDay: 0.3,
    totalW: metabolic(10.62),
  },
  horse: {
    split: "cattle",
    trust: "typical",
    minKg: 80,
    maxKg: 1200,
    maxGainKgDay: 2,
    totalW: metabolic(6.1),
  },
  ewe: {
    split: "cattle",
    trust: "typical",
    minKg: 20,
    maxKg: 160,
    maxGainKgDay: 0.6,
    totalW: ({ massKg, milkKgDay = 1, pregnantDays = 0 }) =>
      6.4 * massKg ** 0.75 + 33 * milkKgDay + 2.4e-5 * pregnantDays ** 3,
  },
  lamb: {
    split: "cattle",
    trust: "typical",
    minKg: 2,
    maxKg: 60,
    maxGainKgDay: 0.6,
    totalW: ({ massKg, gainKgDay = 0.25 }) => 6.4 * massKg ** 0.75 + 145 * gainKgDay,
  },
  goatDry: {
    split: "cattle",
    trust: "typical",
    minKg: 3,
    maxKg: 130,
    maxGainKgDay: 0.4,
    totalW: metabolic(6.3),
  },
  goatMilking: {
    split: "cattle",
    trust: "typical",
    minKg: 25,
    maxKg: 130,
    maxGainKgDay: 0.4,
    totalW: ({ massKg, milkKgDay = 2.5 }) => 5.5 * massKg ** 0.75 + 13 * milkKgDay,
  },
  rabbit: {
    split: "cattle",
    trust: "assumed",
    minKg: 0.1,
    maxKg: 8,
    maxGainKgDay: 0.1,
    totalW: metabolic(6.5),
  },
};
