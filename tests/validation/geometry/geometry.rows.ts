import {
  type HouseGeometry,
  houseGeometry,
  type SurfaceRole,
} from "../../../server/engine/geometry/house-geometry.ts";
import { type CheckRow, digits, within } from "../record-check.ts";

export const topic = "Geometry";

const CLOSED = "closed form, by hand";
const FOOT = 0.3048;

function area(geometry: HouseGeometry, ...roles: SurfaceRole[]): number {
  return geometry.surfaces
    .filter((surface) => roles.includes(surface.role))
    .reduce((sum, surface) => sum + surface.areaM2, 0);
}

const gable = houseGeometry(
  { type: "gable", lengthM: 30, widthM: 10, eaveHeightM: 2.5, ridgeHeightM: 5 },
  { ridgeBearingDeg: 0 },
);
const venlo = houseGeometry(
  { type: "venlo", lengthM: 160, spanWidthM: 4, spanCount: 25, gutterHeightM: 6, roofSlopeDeg: 22.5 },
  { ridgeBearingDeg: 0 },
);
const tunnel = houseGeometry(
  { type: "roundArch", lengthM: 96 * FOOT, widthM: 30 * FOOT, riseM: 12 * FOOT, wallHeightM: 0 },
  { ridgeBearingDeg: 0 },
);
const range = houseGeometry(
  {
    type: "multiSpan",
    lengthM: 144 * FOOT,
    spanWidthM: 30 * FOOT,
    spanCount: 3,
    gutterHeightM: 12 * FOOT,
    ridgeHeightM: 19.5 * FOOT,
  },
  { ridgeBearingDeg: 0 },
);
const half = houseGeometry(
  { type: "roundArch", lengthM: 1, widthM: 2, riseM: 1, wallHeightM: 0 },
  { ridgeBearingDeg: 0 },
);
const gothic = houseGeometry(
  { type: "gothicArch", lengthM: 36, widthM: 9.6, eaveHeightM: 1.7, ridgeHeightM: 4.7, roofBowM: 0 },
  { ridgeBearingDeg: 0 },
);
const attic = houseGeometry(
  { type: "atticBarn", lengthM: 20, widthM: 10, eaveHeightM: 2.6, ridgeHeightM: 5.6 },
  { ridgeBearingDeg: 0 },
);
const lean = houseGeometry(
  { type: "monoPitch", lengthM: 12, widthM: 4, lowEaveM: 2, highEaveM: 5 },
  { ridgeBearingDeg: 90 },
);

export const rows: CheckRow[] = [
  {
    quantity: "Gable 30 × 10 m, roof, m²",
    source: CLOSED,
    computed: area(gable, "roof"),
    expected: 335.41,
    tolerance: digits(2),
  },
  {
    quantity: "Gable 30 × 10 m, walls and ends, m²",
    source: CLOSED,
    computed: area(gable, "sideWall", "endWall"),
    expected: 225,
    tolerance: digits(2),
  },
  {
    quantity: "Gable 30 × 10 m, cover, m²",
    source: CLOSED,
    computed: gable.coverAreaM2,
    expected: 560.41,
    tolerance: digits(2),
  },
  {
    quantity: "Gable 30 × 10 m, air, m³",
    source: CLOSED,
    computed: gable.volumeM3,
    expected: 1125,
    tolerance: digits(2),
  },
  {
    quantity: "Glass range of 25 spans, roof, m²",
    source: CLOSED,
    computed: area(venlo, "roof"),
    expected: 17_318,
    tolerance: 1,
  },
  {
    quantity: "Glass range of 25 spans, walls, m²",
    source: CLOSED,
    computed: area(venlo, "sideWall", "endWall"),
    expected: 3203,
    tolerance: 1,
  },
  {
    quantity: "Glass range of 25 spans, air, m³",
    source: CLOSED,
    computed: venlo.volumeM3,
    expected: 102_600,
    tolerance: within(102_600, 0.001),
  },
  {
    quantity: "Round tunnel, cover, ft²",
    source: CLOSED,
    computed: area(tunnel, "roof") / FOOT ** 2,
    expected: 3984,
    tolerance: 1,
  },
  {
    quantity: "Round tunnel, both ends, ft²",
    source: CLOSED,
    computed: area(tunnel, "endWall") / FOOT ** 2,
    expected: 537,
    tolerance: 1,
  },
  {
    quantity: "Round tunnel, air, ft³",
    source: CLOSED,
    computed: tunnel.volumeM3 / FOOT ** 3,
    expected: 25_764,
    tolerance: 1,
  },
  {
    quantity: "Three-bay range, roof, ft²",
    source: CLOSED,
    computed: area(range, "roof") / FOOT ** 2,
    expected: 14_490,
    tolerance: 1,
  },
  {
    quantity: "Three-bay range, walls, ft²",
    source: CLOSED,
    computed: area(range, "sideWall", "endWall") / FOOT ** 2,
    expected: 6291,
    tolerance: 1,
  },
  {
    quantity: "Half circle of radius 1, arc, m",
    source: "π",
    computed: area(half, "roof"),
    expected: Math.PI,
    tolerance: 1e-9,
  },
  {
    quantity: "Half circle of radius 1, air, m³",
    source: "π / 2",
    computed: half.volumeM3,
    expected: Math.PI / 2,
    tolerance: 1e-9,
  },
  {
    quantity: "Gothic arch without bow, roof, m²",
    source: "two rectangles",
    computed: area(gothic, "roof"),
    expected: 2 * 36 * Math.hypot(4.8, 3),
    tolerance: 1e-9,
  },
  {
    quantity: "Barn with attic, heated air, m³",
    source: CLOSED,
    computed: attic.volumeM3,
    expected: 520,
    tolerance: 1e-9,
  },
  {
    quantity: "Barn with attic, attic air, m³",
    source: CLOSED,
    computed: attic.atticVolumeM3,
    expected: 300,
    tolerance: 1e-9,
  },
  {
    quantity: "Lean-to of 4 × 12 m, roof, m²",
    source: "3-4-5 triangle",
    computed: area(lean, "roof"),
    expected: 60,
    tolerance: 1e-9,
  },
];
