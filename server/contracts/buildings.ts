import { z } from "zod";
import type { HoldVerdict } from "../engine/plan/plan-types.ts";
import { idSchema, nameSchema, positionSchema } from "./common.ts";
import { quantity } from "./quantity.ts";

export const buildingKinds = ["greenhouse", "barn"] as const;
export type BuildingKind = (typeof buildingKinds)[number];

export const shapeTypes = [
  "roundArch",
  "gothicArch",
  "gable",
  "multiSpan",
  "venlo",
  "monoPitch",
  "atticBarn",
] as const;
export type ShapeType = (typeof shapeTypes)[number];

/** Where the ground plan lies: the pin is its middle. */
export const footprintSchema = z.strictObject({
  length: quantity({ label: "Length", kind: "length", min: 2, max: 1000 }),
  width: quantity({ label: "Width", kind: "length", min: 2, max: 1000 }),
  ridgeBearing: quantity({ label: "Ridge bearing", kind: "angle", min: 0, max: 180 }),
});
export type Footprint = z.infer<typeof footprintSchema>;

export const createBuildingRequest = z.object({
  params: z.object({ id: idSchema }),
  body: z.strictObject({
    name: nameSchema("Building name"),
    kind: z.enum(buildingKinds),
    shapeType: z.enum(shapeTypes),
    position: positionSchema,
    footprint: footprintSchema,
    /** Set once the person has seen the warning that the pin is far from the farm's other buildings. */
    farFromFarmConfirmed: z.boolean().default(false),
  }),
});

export const updateBuildingRequest = z.object({
  params: z.object({ id: idSchema }),
  body: z.strictObject({
    name: nameSchema("Building name").optional(),
    position: positionSchema.optional(),
    stationId: z.string().max(40).nullable().optional(),
    farFromFarmConfirmed: z.boolean().optional(),
  }),
});

/** What lists, map labels and tables need of a building. */
export interface BuildingSummary {
  id: string;
  farmId: string;
  farmName: string;
  name: string;
  kind: BuildingKind;
  shapeType: ShapeType;
  latitudeDeg: number;
  longitudeDeg: number;
  ridgeBearingDeg: number;
  lengthM: number;
  widthM: number;
  floorAreaM2: number;
  /** Across-section polylines in metres, ground at 0, for drawing the building's own outline. */
  outline: { x: number; y: number }[];
  answered: number;
  questions: number;
  plan: PlanSummary | null;
}

export interface PlanSummary {
  id: string;
  number: number;
  status: PlanStatus;
  createdAt: string;
  /** True when the survey was changed after this plan was worked out. */
  outdated: boolean;
  requiredW: number;
  installedW: number;
  shortW: number;
  verdict: HoldVerdict;
  verdictEveryday: HoldVerdict;
  onceInYearsDesignC: number;
  settlesAtC: number;
  setpointC: number;
  hoursToCriticalLow: number | null;
  hoursToCriticalHigh: number | null;
  heaterKwh: number;
  heaterKwhM2: number;
  /** Share of the answers the plan rests on that are measured, plate or bill. */
  knownFrac: number;
}

export const planStatuses = ["draft", "sent", "asked", "approved", "declined"] as const;
export type PlanStatus = (typeof planStatuses)[number];

export interface BuildingView extends BuildingSummary {
  station: StationChoice;
  /** True when the station was chosen by a person and not by distance. */
  stationChosen: boolean;
  can: { update: boolean; delete: boolean; plan: boolean; readSurvey: boolean };
}

export interface StationChoice {
  id: string;
  name: string;
  country: string;
  distanceKm: number;
  elevationM: number | null;
  heightDifferenceM: number | null;
  /** A sentence when the station is far or much higher or lower. */
  caution: string | null;
}
