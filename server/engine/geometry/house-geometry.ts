import { requireInRange } from "../errors.ts";
import type { HouseShape } from "./house-shape.ts";
import { archHalfAngle, type SectionPoint, type SpanSection, spanSection } from "./section.ts";

export type SurfaceRole = "roof" | "sideWall" | "endWall" | "kneewall" | "ceiling";

/** A plane piece of the shell. */
export interface Surface {
  id: string;
  role: SurfaceRole;
  label: string;
  /** Along the slope, m². */
  areaM2: number;
  /** 0 lies flat facing up, 90 stands upright. */
  tiltDeg: number;
  /** Which way its outside looks, clockwise from true north; 0 to 360. */
  azimuthDeg: number;
  /** Share of its view that is sky. */
  skyViewFrac: number;
  /** `attic`: belongs to the cold space above a flat ceiling. */
  zone: "house" | "attic";
}

export interface HouseGeometry {
  floorAreaM2: number;
  /** Heated air; below the ceiling in a barn with an attic. */
  volumeM3: number;
  perimeterM: number;
  meanHeightM: number;
  eaveHeightM: number;
  ridgeHeightM: number;
  widthM: number;
  lengthM: number;
  /** All outer surfaces of the heated house, floor left out. */
  coverAreaM2: number;
  atticVolumeM3: number;
  surfaces: Surface[];
}

export interface SurfaceOverride {
  areaM2?: number;
  tiltDeg?: number;
  azimuthDeg?: number;
}

export interface GeometryOptions {
  /** True bearing of the ridge, 0 to 180. */
  ridgeBearingDeg: number;
  /** Lowest part of all walls, made otherwise; 0 where there is none. */
  kneewallHeightM?: number;
  overrides?: Record<string, SurfaceOverride>;
}

/** Share of the sky that the opposite slope of the next span hides from a roof inside a range. Mean of 0.8 to 0.9. */
const FACING_SLOPE_VIEW_FRAC = 0.85;

/** A curved roof side is given as this many facets. */
const FACETS_PER_SIDE = 4;

const degrees = (radians: number) => (radians * 180) / Math.PI;
const isotropicSkyView = (tiltDeg: number) => (1 + Math.cos((tiltDeg * Math.PI) / 180)) / 2;
const compass = (angle: number) => ((angle % 360) + 360) % 360;

/**
 * Surfaces, areas and volume of a house.
 *
 * Shapes: one {@link HouseShape}. Result: surfaces with area, tilt, azimuth and sky view; curved sides as four facets whose
 * areas add up to the exact arc.
 * Units: m, m², m³, degrees. The walls and roofs called "left" lie 90° anticlockwise from the ridge bearing.
 * Valid: lengths 0.5 to 2000 m, heights 0.1 to 100 m, ridge bearing 0 to 180°.
 * Errors: EngineInputError naming the measure and its range, for example a ridge below its eave.
 * Source: closed forms; sky view [ISO-VIEW].
 */
export function houseGeometry(shape: HouseShape, options: GeometryOptions): HouseGeometry {
  const { ridgeBearingDeg, kneewallHeightM = 0 } = options;
  requireInRange("ridgeBearingDeg", ridgeBearingDeg, 0, 180, "°");
  checkMeasures(shape);
  const section = spanSection(shape);
  const spans = "spanCount" in shape ? shape.spanCount : 1;
  const spanWidthM = "spanWidthM" in shape ? shape.spanWidthM : shape.widthM;
  const widthM = spans * spanWidthM;
  const lowestWall = Math.min(section.leftWallM, section.rightWallM);
  requireInRange("kneewallHeightM", kneewallHeightM, 0, Math.max(0, lowestWall), "m");
  const attic = shape.type === "atticBarn";
  const sectionAreaM2 = attic
    ? spanWidthM * shape.eaveHeightM
    : crossSectionAreaM2(shape, section, spanWidthM);
  const frame: Frame = {
    shape,
    section,
    spans,
    spanWidthM,
    widthM,
    attic,
    sectionAreaM2,
    kneewallHeightM,
    ridgeBearingDeg,
  };
  const surfaces = [...roofSurfaces(frame), ...wallSurfaces(frame), ...ceilingSurfaces(frame)]
    .filter((surface) => surface.areaM2 > 0)
    .map((surface) => overridden(surface, options.overrides?.[surface.id]));
  const floorAreaM2 = widthM * shape.lengthM;
  const volumeM3 = spans * sectionAreaM2 * shape.lengthM;
  const atticSectionM2 = attic ? crossSectionAreaM2(shape, section, spanWidthM) - sectionAreaM2 : 0;
  return {
    floorAreaM2,
    volumeM3,
    perimeterM: 2 * (widthM + shape.lengthM),
    meanHeightM: volumeM3 / floorAreaM2,
    eaveHeightM: lowestWall,
    ridgeHeightM: Math.max(...section.roof.map((point) => point.y)),
    widthM,
    lengthM: shape.lengthM,
    coverAreaM2: surfaces.filter(({ zone }) => zone === "house").reduce((sum, { areaM2 }) => sum + areaM2, 0),
    atticVolumeM3: atticSectionM2 * shape.lengthM,
    surfaces,
  };
}

interface Frame {
  shape: HouseShape;
  section: SpanSection;
  spans: number;
  spanWidthM: number;
  widthM: number;
  attic: boolean;
  sectionAreaM2: number;
  kneewallHeightM: number;
  ridgeBearingDeg: number;
}

function checkMeasures(shape: HouseShape): void {
  for (const [name, value] of Object.entries(shape)) {
    if (typeof value !== "number") continue;
    if (name === "lengthM" || name === "widthM" || name === "spanWidthM")
      requireInRange(name, value, 0.5, 2000, "m");
    else if (name === "spanCount") requireInRange(name, value, 1, 1000);
    else if (name === "roofSlopeDeg") requireInRange(name, value, 1, 75, "°");
    else requireInRange(name, value, 0, 100, "m");
  }
}

/** Exact area under the roof line of one span, curves included. */
function crossSectionAreaM2(shape: HouseShape, section: SpanSection, spanWidthM: number): number {
  const walls = ((section.leftWallM + section.rightWallM) / 2) * spanWidthM;
  switch (shape.type) {
    case "roundArch": {
      const half = archHalfAngle(shape.widthM, shape.riseM);
      const radius = shape.widthM / 2 / Math.sin(half);
      return walls + radius ** 2 * (half - Math.sin(half) * Math.cos(half));
    }
    case "gothicArch": {
      const chord = Math.hypot(shape.widthM / 2, shape.ridgeHeightM - shape.eaveHeightM);
      const triangle = ((shape.ridgeHeightM - shape.eaveHeightM) * shape.widthM) / 2;
      // Each side adds a parabola segment of two thirds of chord times bow.
      return walls + triangle + 2 * (2 / 3) * chord * shape.roofBowM;
    }
    case "monoPitch":
      return walls;
    default: {
      const ridge = Math.max(...section.roof.map((point) => point.y));
      return walls + ((ridge - section.leftWallM) * spanWidthM) / 2;
    }
  }
}

/** Exact length of one curved roof side, m; null where the roof is straight. */
function roofArcM(shape: HouseShape): number | null {
  if (shape.type === "roundArch") {
    const half = archHalfAngle(shape.widthM, shape.riseM);
    return (shape.widthM / 2 / Math.sin(half)) * half;
  }
  if (shape.type === "gothicArch") {
    const chord = Math.hypot(shape.widthM / 2, shape.ridgeHeightM - shape.eaveHeightM);
    return parabolaArcM(chord, shape.roofBowM);
  }
  return null;
}

/** Length of a parabola over `chordM` that rises `bowM` in its middle. */
function parabolaArcM(chordM: number, bowM: number): number {
  if (bowM === 0) return chordM;
  const slope = (4 * bowM) / chordM;
  return (chordM / 2) * (Math.sqrt(1 + slope ** 2) + Math.asinh(slope) / slope);
}

interface Facet {
  lengthM: number;
  tiltDeg: number;
  facesLeft: boolean;
}

/** Roof facets of one span: one per straight side, four per curved side scaled to the exact arc. */
function roofFacets(shape: HouseShape, section: SpanSection): Facet[] {
  const pieces = section.roof
    .slice(1)
    .map((point, index) => facetBetween(section.roof[index] as SectionPoint, point));
  const arc = roofArcM(shape);
  if (arc === null) return pieces;
  const perFacet = pieces.length / 2 / FACETS_PER_SIDE;
  const chordSum = pieces.reduce((sum, piece) => sum + piece.lengthM, 0) / 2;
  return Array.from({ length: 2 * FACETS_PER_SIDE }, (_, index) => {
    const group = pieces.slice(index * perFacet, (index + 1) * perFacet);
    const lengthM = group.reduce((sum, piece) => sum + piece.lengthM, 0);
    const tiltDeg = group.reduce((sum, piece) => sum + piece.tiltDeg * piece.lengthM, 0) / lengthM;
    return { lengthM: (lengthM * arc) / chordSum, tiltDeg, facesLeft: index < FACETS_PER_SIDE };
  });
}

function facetBetween(from: SectionPoint, to: SectionPoint): Facet {
  const across = to.x - from.x;
  const up = to.y - from.y;
  return {
    lengthM: Math.hypot(across, up),
    tiltDeg: Math.abs(degrees(Math.atan2(up, across))),
    facesLeft: up > 0,
  };
}

function roofSurfaces(frame: Frame): Surface[] {
  const { shape, section, spans, attic, ridgeBearingDeg } = frame;
  const facets = roofFacets(shape, section);
  const many = facets.length > 2;
  // Only the two outermost slopes of a range look at open sky; every other one faces its neighbour.
  const openShare = spans === 1 ? 1 : 1 / spans;
  const view = FACING_SLOPE_VIEW_FRAC + (1 - FACING_SLOPE_VIEW_FRAC) * openShare;
  return facets.map((facet, index) => {
    const side = facet.facesLeft ? "left" : "right";
    return {
      id: many ? `roof-${side}-${index + 1}` : `roof-${side}`,
      role: "roof",
      label: many ? `Roof, ${side} side, strip ${index + 1}` : `Roof, ${side} side`,
      areaM2: facet.lengthM * shape.lengthM * spans,
      tiltDeg: facet.tiltDeg,
      azimuthDeg: compass(ridgeBearingDeg + (facet.facesLeft ? -90 : 90)),
      skyViewFrac: isotropicSkyView(facet.tiltDeg) * (spans === 1 ? 1 : view),
      zone: attic ? "attic" : "house",
    };
  });
}

function upright(
  id: string,
  role: SurfaceRole,
  label: string,
  areaM2: number,
  azimuthDeg: number,
  zone: Surface["zone"],
): Surface {
  return { id, role, label, areaM2, tiltDeg: 90, azimuthDeg: compass(azimuthDeg), skyViewFrac: 0.5, zone };
}

function wallSurfaces(frame: Frame): Surface[] {
  const {
    shape,
    section,
    spans,
    attic,
    sectionAreaM2,
    spanWidthM,
    widthM,
    kneewallHeightM: knee,
    ridgeBearingDeg: bearing,
  } = frame;
  const endAreaM2 = spans * sectionAreaM2;
  const kneeSideM2 = knee * shape.lengthM;
  const kneeEndM2 = knee * widthM;
  const gableM2 = attic ? spans * (crossSectionAreaM2(shape, section, spanWidthM) - sectionAreaM2) : 0;
  return [
    upright(
      "side-left",
      "sideWall",
      "Side wall, left",
      section.leftWallM * shape.lengthM - kneeSideM2,
      bearing - 90,
      "house",
    ),
    upright(
      "side-right",
      "sideWall",
      "Side wall, right",
      section.rightWallM * shape.lengthM - kneeSideM2,
      bearing + 90,
      "house",
    ),
    upright("end-front", "endWall", "End wall, front", endAreaM2 - kneeEndM2, bearing, "house"),
    upright("end-back", "endWall", "End wall, back", endAreaM2 - kneeEndM2, bearing + 180, "house"),
    upright("knee-left", "kneewall", "Kneewall, left", kneeSideM2, bearing - 90, "house"),
    upright("knee-right", "kneewall", "Kneewall, right", kneeSideM2, bearing + 90, "house"),
    upright("knee-front", "kneewall", "Kneewall, front", kneeEndM2, bearing, "house"),
    upright("knee-back", "kneewall", "Kneewall, back", kneeEndM2, bearing + 180, "house"),
    upright("gable-front", "endWall", "Attic gable, front", gableM2, bearing, "attic"),
    upright("gable-back", "endWall", "Attic gable, back", gableM2, bearing + 180, "attic"),
  ];
}

function ceilingSurfaces({ shape, widthM, attic }: Frame): Surface[] {
  if (!attic) return [];
  return [
    {
      id: "ceiling",
      role: "ceiling",
      label: "Ceiling",
      areaM2: widthM * shape.lengthM,
      tiltDeg: 0,
      azimuthDeg: 0,
      skyViewFrac: 0,
      zone: "house",
    },
  ];
}

function overridden(surface: Surface, override: SurfaceOverride | undefined): Surface {
  if (override === undefined) return surface;
  const tiltDeg = override.tiltDeg ?? surface.tiltDeg;
  return {
    ...surface,
    areaM2: requireInRange(`${surface.id}.areaM2`, override.areaM2 ?? surface.areaM2, 0, 1e7, "m²"),
    tiltDeg: requireInRange(`${surface.id}.tiltDeg`, tiltDeg, 0, 180, "°"),
    azimuthDeg: compass(override.azimuthDeg ?? surface.azimuthDeg),
    skyViewFrac: override.tiltDeg === undefined ? surface.skyViewFrac : isotropicSkyView(tiltDeg),
  };
}
