import type { BuildingKind, Footprint, ShapeType } from "../../contracts/buildings.ts";
import { defaultQuantity, type Quantity, siValue } from "../../contracts/quantity.ts";
import type { Survey, SurveyMonth, SurveyShape } from "../../contracts/survey.ts";
import { fromSi, type UnitId, units } from "../../engine/units.ts";
import { referenceData, rowOf } from "../library/reference-data.ts";

export interface NewBuilding {
  kind: BuildingKind;
  shapeType: ShapeType;
  footprint: Footprint;
  /** Height of the climate station, until somebody knows better. */
  elevationM: number | null;
}

const assumed = <T extends string>(value: T) => ({ value, origin: "default" as const });

/** A typical length, written in the unit the person used for the ground plan. */
function lengthLike(like: Quantity, valueM: number): Quantity {
  const unit: UnitId = units[like.unit].kind === "length" ? like.unit : "m";
  return defaultQuantity(Number(fromSi(valueM, unit).toFixed(2)), unit);
}

function spans(footprint: Footprint, typicalM: number): { spanWidth: Quantity; spanCount: Quantity } {
  const widthM = siValue(footprint.width);
  const count = Math.max(1, Math.round(widthM / typicalM));
  return {
    spanWidth: lengthLike(footprint.width, widthM / count),
    spanCount: defaultQuantity(count, "each"),
  };
}

/** Typical heights for a house of this width. Common practice, no source; each is marked as a default. */
export function typicalShape(type: ShapeType, footprint: Footprint): SurveyShape {
  const { length, width } = footprint;
  const widthM = siValue(width);
  const metres = (value: number) => lengthLike(width, value);
  switch (type) {
    case "roundArch":
      return { type, length, width, rise: metres(Math.max(0.5, 0.38 * widthM)), wallHeight: metres(0) };
    case "gothicArch":
      return {
        type,
        length,
        width,
        eaveHeight: metres(1.7),
        ridgeHeight: metres(1.7 + 0.31 * widthM),
        roofBow: metres(Math.min(3, 0.05 * widthM)),
      };
    case "gable":
      return { type, length, width, eaveHeight: metres(2.5), ridgeHeight: metres(2.5 + 0.22 * widthM) };
    case "atticBarn":
      return { type, length, width, eaveHeight: metres(2.6), ridgeHeight: metres(2.6 + 0.2 * widthM) };
    case "multiSpan":
      return { type, length, ...spans(footprint, 8), gutterHeight: metres(3.5), ridgeHeight: metres(5.3) };
    case "venlo":
      return {
        type,
        length,
        ...spans(footprint, 4),
        gutterHeight: metres(5),
        roofSlope: defaultQuantity(22.5, "deg"),
      };
    case "monoPitch":
      return { type, length, width, lowEave: metres(2.2), highEave: metres(2.2 + 0.15 * widthM) };
  }
}

const coverOf = (cover: string) => ({ cover: assumed(cover), uValue: null });

function typicalCovers(kind: BuildingKind, type: ShapeType): Survey["covers"] {
  const ceiling = type === "atticBarn" ? coverOf("ceiling-r30") : null;
  if (kind === "barn") {
    const roof = type === "atticBarn" ? "steel-sheet" : "roof-foam-50";
    return {
      roof: coverOf(roof),
      sides: coverOf("stud-90"),
      ends: coverOf("stud-90"),
      ceiling,
      kneewall: null,
    };
  }
  const byShape: Partial<Record<ShapeType, [roof: string, walls: string]>> = {
    venlo: ["single-glass", "single-glass"],
    multiSpan: ["twin-wall-8", "twin-wall-8"],
    gable: ["twin-wall-8", "twin-wall-8"],
    monoPitch: ["twin-wall-8", "twin-wall-8"],
  };
  const [roof, walls] = byShape[type] ?? ["double-film-blown", "twin-wall-8"];
  return { roof: coverOf(roof), sides: coverOf(walls), ends: coverOf(walls), ceiling, kneewall: null };
}

function typicalMonths(nightC: number, dayC: number, headCount: number, massKg: number): SurveyMonth[] {
  return Array.from({ length: 12 }, () => ({
    occupied: true,
    nightSetpoint: defaultQuantity(nightC, "C"),
    daySetpoint: defaultQuantity(dayC, "C"),
    headCount: defaultQuantity(headCount, "each"),
    mass: defaultQuantity(massKg, "kg"),
  }));
}

function typicalUse(kind: BuildingKind): Pick<Survey, "use" | "criticalTemp" | "months"> {
  if (kind === "greenhouse") {
    const crop = rowOf(referenceData.crops, "cool-crops");
    return {
      use: {
        kind,
        crop: assumed(crop.id),
        lamps: defaultQuantity(0, "WM2"),
        lampHours: defaultQuantity(0, "h"),
      },
      criticalTemp: defaultQuantity(crop.criticalC, "C"),
      months: typicalMonths(crop.nightC, crop.dayC, 0, 0),
    };
  }
  const animal = rowOf(referenceData.animals, "nursery-pig");
  return {
    use: {
      kind,
      animal: assumed(animal.id),
      winterVentilation: null,
      humidityLimit: defaultQuantity(animal.humidityLimitFrac * 100, "percent"),
      heatRecovery: defaultQuantity(0, "percent"),
    },
    criticalTemp: defaultQuantity(animal.criticalC, "C"),
    // No animals until somebody says how many: heat nobody counted must not be planned with.
    months: typicalMonths(animal.typicalSetpointC, animal.typicalSetpointC, 0, animal.typicalMassKg),
  };
}

function typicalLeakage(kind: BuildingKind, type: ShapeType): string {
  if (kind === "barn") return "barn-average";
  if (type === "venlo") return "glass-sealed";
  return type === "roundArch" || type === "gothicArch" ? "film-new" : "sheet-new";
}

/** A whole survey of typical answers, each marked as a default, so that a plan is possible from the first minute. */
export function defaultSurvey({ kind, shapeType, footprint, elevationM }: NewBuilding): Survey {
  return {
    shape: typicalShape(shapeType, footprint),
    ridgeBearing: footprint.ridgeBearing,
    elevation: lengthLike(footprint.length, elevationM ?? 0),
    shelter: assumed("normal"),
    frostHollow: defaultQuantity(0, "K"),
    covers: typicalCovers(kind, shapeType),
    screen: null,
    leakage: { class: assumed(typicalLeakage(kind, shapeType)), airChanges: null },
    floor: { edge: assumed("bare"), edgeLoss: null },
    ...typicalUse(kind),
    heaters: [],
    fuel: assumed("lpg"),
    fuelPrice: null,
  };
}
