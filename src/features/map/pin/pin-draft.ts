import type { BuildingKind, ShapeType } from "../../../../server/contracts/buildings.ts";
import type { Position } from "../../../../server/contracts/common.ts";
import type { Quantity } from "../../../../server/contracts/quantity.ts";
import { fromSi, type UnitSystem } from "../../../../server/engine/units.ts";
import type { Footprint } from "../../../lib/footprint.ts";
import { quantitySi } from "../../../lib/quantity-value.ts";
import { shapesOf } from "./typical-outlines.ts";

/** A building before it is kept. Everything but the place has a usual value to start from. */
export interface PinDraft {
  farmId: string;
  name: string;
  kind: BuildingKind;
  shapeType: ShapeType;
  position: Position | null;
  length: Quantity;
  width: Quantity;
  ridgeBearing: Quantity;
}

/** Usual sizes of a first house, round in the reader's own units. Common practice, no source. */
export function emptyDraft(farmId: string, system: UnitSystem): PinDraft {
  const size = (metres: string, feet: string): Quantity =>
    system === "si"
      ? { typed: metres, unit: "m", origin: "default" }
      : { typed: feet, unit: "ft", origin: "default" };
  return {
    farmId,
    name: "",
    kind: "greenhouse",
    shapeType: "gothicArch",
    position: null,
    length: size("36", "96"),
    width: size("9", "30"),
    ridgeBearing: { typed: "0", unit: "deg", origin: "default" },
  };
}

/** A shape that the new kind does not come in gives way to the kind's most usual one. */
export function withKind(draft: PinDraft, kind: BuildingKind): PinDraft {
  const shapes = shapesOf[kind];
  const [usual = draft.shapeType] = shapes;
  return { ...draft, kind, shapeType: shapes.includes(draft.shapeType) ? draft.shapeType : usual };
}

/** The ground plan for the map; null while a number cannot be read. */
export function footprintOf(draft: PinDraft): Footprint | null {
  const lengthM = quantitySi(draft.length);
  const widthM = quantitySi(draft.width);
  const bearingDeg = quantitySi(draft.ridgeBearing);
  const readable = lengthM > 0 && widthM > 0 && Number.isFinite(bearingDeg);
  return readable && lengthM <= 2000 && widthM <= 2000 ? { lengthM, widthM, bearingDeg } : null;
}

/** A size drawn on the map, in the unit the field stands in. The map is a guess until somebody tapes it. */
export function drawn(like: Quantity, si: number): Quantity {
  const decimals = like.unit === "deg" ? 0 : 1;
  return { typed: fromSi(si, like.unit).toFixed(decimals), unit: like.unit, origin: "guess" };
}

export function withFootprint(draft: PinDraft, change: Partial<Footprint>): PinDraft {
  return {
    ...draft,
    length: change.lengthM === undefined ? draft.length : drawn(draft.length, change.lengthM),
    width: change.widthM === undefined ? draft.width : drawn(draft.width, change.widthM),
    ridgeBearing:
      change.bearingDeg === undefined ? draft.ridgeBearing : drawn(draft.ridgeBearing, change.bearingDeg),
  };
}
