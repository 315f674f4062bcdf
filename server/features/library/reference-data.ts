import { readFileSync } from "node:fs";
import { join } from "node:path";
import { z } from "zod";

/** The reference tables of data/, checked once when the server starts; a broken row stops it with the row's name. */
const fraction = z.number().min(0).max(1);
const entry = { id: z.string(), name: z.string(), group: z.string(), source: z.string().min(3) };

const layer = z.object({
  name: z.string(),
  thicknessMm: z.number().nullable(),
  resistanceM2KW: z.number().min(0),
  solarTransmittance: fraction,
  solarReflectance: fraction,
  emissivityIn: fraction,
  emissivityOut: fraction,
  longwaveTransmittance: fraction,
});

const cover = z.object({
  ...entry,
  usedFor: z.array(z.enum(["greenhouse", "barn"])),
  parts: z.array(z.enum(["roof", "sides", "ends", "ceiling", "kneewall"])),
  layers: z.array(layer).min(1),
  gaps: z.array(z.object({ kind: z.literal("still"), thicknessM: z.number().positive() })),
  publishedUValueWM2K: z.number().positive().nullable(),
});

const screen = z.object({
  ...entry,
  emissivityIn: fraction,
  emissivityOut: fraction,
  longwaveTransmittance: fraction,
  solarTransmittance: fraction,
  savingFrac: fraction,
});

const crop = z.object({
  ...entry,
  nightC: z.number(),
  dayC: z.number(),
  ventC: z.number(),
  criticalC: z.number(),
  sensibleShareFrac: fraction,
  humidityFrac: fraction,
});

const animal = z.object({
  ...entry,
  classId: z.string(),
  typicalMassKg: z.number().positive(),
  typicalSetpointC: z.number(),
  criticalC: z.number(),
  humidityLimitFrac: fraction,
  carbonDioxideLimitPpm: z.number(),
  perHeadM3H: z.number().positive(),
  perHeadPerKg075M3H: z.number().positive().nullable(),
});

const heaterType = z.object({
  ...entry,
  efficiencyFrac: z.number().min(0.3).max(1.1),
  vented: z.boolean(),
  burnsFuel: z.boolean(),
  fuels: z.array(z.string()).min(1),
});

const fuel = z.object({
  ...entry,
  unit: z.string(),
  kwhGrossPerUnit: z.number().positive(),
  carbonDioxideKgPerKwh: z.number().min(0),
  biogenic: z.boolean(),
});

const leakage = z.object({ ...entry, airChangesPerHour: z.number().positive() });
const floorEdge = z.object({ ...entry, lossWMK: z.number().positive() });

const dataFolder = join(import.meta.dirname, "../../../data");

function table<T extends { id: string }>(file: string, row: z.ZodType<T>): Map<string, T> {
  const parsed = z.array(row).safeParse(JSON.parse(readFileSync(join(dataFolder, file), "utf8")));
  if (!parsed.success) throw new Error(`data/${file} is broken: ${z.prettifyError(parsed.error)}`);
  return new Map(parsed.data.map((entryRow) => [entryRow.id, entryRow]));
}

export const referenceData = {
  covers: table("covers.json", cover),
  screens: table("screens.json", screen),
  crops: table("crops.json", crop),
  animals: table("livestock.json", animal),
  leakage: table("leakage.json", leakage),
  floorEdges: table("floor-edges.json", floorEdge),
  heaterTypes: table("heater-types.json", heaterType),
  fuels: table("fuels.json", fuel),
};

export type CoverRow = z.infer<typeof cover>;
export type ScreenRow = z.infer<typeof screen>;
export type CropRow = z.infer<typeof crop>;
export type AnimalRow = z.infer<typeof animal>;
export type HeaterTypeRow = z.infer<typeof heaterType>;
export type FuelRow = z.infer<typeof fuel>;

/** A row that must exist, because every reference was checked when it was stored. */
export function rowOf<T>(rows: Map<string, T>, id: string): T {
  const row = rows.get(id);
  if (row === undefined) throw new Error(`"${id}" is not in the reference tables`);
  return row;
}
