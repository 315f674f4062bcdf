/** Kinds of animals whose heat is known by a formula. */
export const animalClasses = [
  "calf",
  "beef",
  "heifer",
  "dairyCow",
  "piglet",
  "fatteningPig",
  "drySow",
  "gilt",
  "boar",
  "nursingSow",
  "broiler",
  "layerCage",
  "layerFloor",
  "turkey",
  "duck",
  "goose",
  "horse",
  "ewe",
  "lamb",
  "goatDry",
  "goatMilking",
  "rabbit",
] as const;
export type AnimalClass = (typeof animalClasses)[number];

/** How the house shares heat between air and water; each class follows one of these. */
export type SplitGroup = "cattle" | "pigs" | "broilers" | "layers";

/** How far the figures of a class can be trusted. */
export type ClassTrust =
  /** A formula of the published report. */
  | "published"
  /** A formula written down from memory, to be shown as typical. */
  | "typical"
  /** Another animal's formula used for want of its own. */
  | "assumed";

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
