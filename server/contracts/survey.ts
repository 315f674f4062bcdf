import { z } from "zod";
import { idSchema, nameSchema } from "./common.ts";
import { choice, quantity, reference } from "./quantity.ts";

const lengthOf = (label: string, min: number, max: number) => quantity({ label, kind: "length", min, max });
const houseLength = lengthOf("Length", 2, 1000);
const width = lengthOf("Width", 2, 200);
const spanWidth = lengthOf("Span width", 2, 30);
const spanCount = quantity({ label: "Number of spans", kind: "count", min: 1, max: 200, whole: true });
const eaveHeight = lengthOf("Eave height", 0.3, 15);
const ridgeHeight = lengthOf("Ridge height", 0.8, 25);
const gutterHeight = lengthOf("Gutter height", 1, 15);

export const shapeSchema = z.discriminatedUnion("type", [
  z.strictObject({
    type: z.literal("roundArch"),
    length: houseLength,
    width,
    rise: lengthOf("Arch rise", 0.5, 15),
    wallHeight: lengthOf("Upright wall height", 0, 6),
  }),
  z.strictObject({
    type: z.literal("gothicArch"),
    length: houseLength,
    width,
    eaveHeight,
    ridgeHeight,
    roofBow: lengthOf("Roof bow", 0, 3),
  }),
  z.strictObject({ type: z.literal("gable"), length: houseLength, width, eaveHeight, ridgeHeight }),
  z.strictObject({
    type: z.literal("multiSpan"),
    length: houseLength,
    spanWidth,
    spanCount,
    gutterHeight,
    ridgeHeight,
  }),
  z.strictObject({
    type: z.literal("venlo"),
    length: houseLength,
    spanWidth,
    spanCount,
    gutterHeight,
    roofSlope: quantity({ label: "Roof slope", kind: "angle", min: 5, max: 60 }),
  }),
  z.strictObject({
    type: z.literal("monoPitch"),
    length: houseLength,
    width,
    lowEave: lengthOf("Low eave height", 0.5, 15),
    highEave: lengthOf("High eave height", 0.8, 20),
  }),
  z.strictObject({ type: z.literal("atticBarn"), length: houseLength, width, eaveHeight, ridgeHeight }),
]);
export type SurveyShape = z.infer<typeof shapeSchema>;

const uValue = quantity({ label: "U-value", kind: "uValue", min: 0.08, max: 12 });

/** A cover is a row of the library; a typed U-value, when given, takes the place of the library's own layers. */
const coverSchema = z.strictObject({ cover: reference("Cover"), uValue: uValue.nullable() });
export type SurveyCover = z.infer<typeof coverSchema>;

const screenSchema = z.strictObject({
  screen: reference("Screen"),
  coverage: quantity({ label: "Share of the roof the screen covers", kind: "share", min: 0.1, max: 1 }),
  edgeGap: quantity({ label: "Gap at the screen's edge", kind: "smallLength", min: 0, max: 0.5 }),
  opensForSnow: choice(["yes", "no"]),
});

const monthSchema = z.strictObject({
  occupied: z.boolean(),
  nightSetpoint: quantity({ label: "Night temperature", kind: "temperature", min: -5, max: 40 }),
  daySetpoint: quantity({ label: "Day temperature", kind: "temperature", min: -5, max: 40 }),
  headCount: quantity({ label: "Number of animals", kind: "count", min: 0, max: 500_000, whole: true }),
  mass: quantity({ label: "Mass of one animal", kind: "mass", min: 0, max: 1200 }),
});

export const heaterBases = ["input", "output"] as const;

const heaterSchema = z.strictObject({
  label: nameSchema("Heater name", 60),
  type: reference("Heater type"),
  rating: quantity({ label: "Rated heat", kind: "power", min: 100, max: 20_000_000 }),
  basis: choice(heaterBases),
  efficiency: quantity({ label: "Efficiency", kind: "share", min: 0.3, max: 1.1 }),
  count: quantity({ label: "Number of equal heaters", kind: "count", min: 1, max: 100, whole: true }),
  fuel: reference("Fuel"),
});
export type SurveyHeater = z.infer<typeof heaterSchema>;

const greenhouseUse = z.strictObject({
  kind: z.literal("greenhouse"),
  crop: reference("Crop"),
  lamps: quantity({ label: "Lamp power per floor area", kind: "heatFlux", min: 0, max: 500 }),
  lampHours: quantity({ label: "Lamp hours a day", kind: "hours", min: 0, max: 24 }),
});

const barnUse = z.strictObject({
  kind: z.literal("barn"),
  animal: reference("Animal"),
  /** Null: worked out from moisture, carbon dioxide and the published rate. */
  winterVentilation: quantity({
    label: "Measured winter ventilation",
    kind: "airFlow",
    min: 0,
    max: 2_000_000,
  }).nullable(),
  humidityLimit: quantity({ label: "Highest humidity", kind: "share", min: 0.4, max: 0.95 }),
  heatRecovery: quantity({ label: "Heat recovered from the air", kind: "share", min: 0, max: 0.9 }),
});

export const surveySchema = z.strictObject({
  shape: shapeSchema,
  ridgeBearing: quantity({ label: "Ridge bearing", kind: "angle", min: 0, max: 180 }),
  elevation: quantity({ label: "Height above the sea", kind: "length", min: -430, max: 5000 }),
  shelter: choice(["open", "normal", "sheltered"]),
  frostHollow: quantity({
    label: "Frost hollow, degrees colder",
    kind: "temperatureDifference",
    min: 0,
    max: 10,
  }),
  covers: z.strictObject({
    roof: coverSchema,
    sides: coverSchema,
    ends: coverSchema,
    ceiling: coverSchema.nullable(),
    kneewall: z
      .strictObject({
        cover: reference("Cover"),
        uValue: uValue.nullable(),
        height: lengthOf("Kneewall height", 0.1, 3),
      })
      .nullable(),
  }),
  screen: screenSchema.nullable(),
  leakage: z.strictObject({
    class: reference("Tightness"),
    airChanges: quantity({ label: "Air changes", kind: "airChange", min: 0.05, max: 20 }).nullable(),
  }),
  floor: z.strictObject({
    edge: reference("Floor edge"),
    edgeLoss: quantity({ label: "Loss along the floor edge", kind: "linearLoss", min: 0, max: 5 }).nullable(),
  }),
  use: z.discriminatedUnion("kind", [greenhouseUse, barnUse]),
  criticalTemp: quantity({ label: "Critical temperature", kind: "temperature", min: -10, max: 35 }),
  months: z.array(monthSchema).length(12),
  heaters: z.array(heaterSchema).max(20, "At most 20 rows of heaters can be listed."),
  fuel: reference("Fuel"),
  fuelPrice: z
    .strictObject({
      amount: z.number().min(0).max(1000),
      currency: z.string().regex(/^[A-Z]{3}$/),
      per: z.string().max(12),
    })
    .nullable(),
});
export type Survey = z.infer<typeof surveySchema>;
export type SurveyMonth = Survey["months"][number];

export const saveSurveyRequest = z.object({
  params: z.object({ id: idSchema }),
  body: z.strictObject({
    /** The version the person started from; a save on an older one is refused and nothing is stored. */
    version: z.int().min(1),
    survey: surveySchema,
  }),
});

export interface SurveyView {
  buildingId: string;
  version: number;
  survey: Survey;
  answered: number;
  questions: number;
  savedAt: string;
  savedBy: string | null;
  can: { update: boolean };
}
