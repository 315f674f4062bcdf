import { type Frame, roofAt } from "./frame.ts";
import { arrowWidth, headLength, LEAST_DRAWN_W, type Place } from "./heat-arrow.tsx";
import type { HeatLayout } from "./heat-layout.ts";
import type { FlowsW, HeatPath } from "./heat-paths.ts";
import type { SectionShape } from "./section-shape.ts";

export interface PlacedArrow {
  path: HeatPath;
  from: Place;
  to: Place;
  tip: Place;
  width: number;
}

export interface ArrowPlan {
  arrows: PlacedArrow[];
  heater: { x: number; width: number; height: number };
  vent: { x: number; y: number; height: number };
}

/** A heater box at the left with its arrow up; stock low at the right of the middle; lamps from above. */
function insideArrows(shape: SectionShape, frame: Frame, flows: FlowsW, widthPerW: number) {
  const half = shape.drawnWidthM / 2;
  const heaterX = frame.x(-half * 0.6);
  const heaterW = arrowWidth(flows.heater, widthPerW);
  const roofPx = frame.groundY - frame.y(roofAt(shape.outline, -half * 0.6).point.y);
  const ceilingPx = shape.type === "atticBarn" ? shape.sideM * frame.scale : roofPx;
  const boxHeight = Math.max(12, Math.min(32, ceilingPx * 0.32));
  const boxWidth = Math.max(54, heaterW + 10);
  const rise = (room: number, width: number) => Math.max(4, Math.min(58, room - headLength(width) - 8));
  const arrows: Omit<PlacedArrow, "tip">[] = [
    {
      path: "heater",
      width: heaterW,
      from: { x: heaterX, y: frame.groundY - boxHeight },
      to: { x: heaterX, y: frame.groundY - boxHeight - rise(ceilingPx - boxHeight, heaterW) },
    },
  ];
  const stockW = arrowWidth(flows.stock, widthPerW);
  const stockX = frame.x(half * 0.55);
  const stockFoot = frame.groundY - 4;
  arrows.push({
    path: "stock",
    width: stockW,
    from: { x: stockX, y: stockFoot },
    to: { x: stockX, y: stockFoot - rise(ceilingPx * 0.7, stockW) },
  });
  const lampsX = frame.x(half * 0.26);
  const lampRoof =
    shape.type === "atticBarn" ? frame.y(shape.sideM) : frame.y(roofAt(shape.outline, half * 0.26).point.y);
  arrows.push({
    path: "lights",
    width: arrowWidth(flows.lights, widthPerW),
    from: { x: lampsX, y: lampRoof + 18 },
    to: { x: lampsX, y: lampRoof + 32 },
  });
  return { arrows, heater: { x: heaterX, width: boxWidth, height: boxHeight } };
}

/** Sky up from the ridge, cover along the right roof's normal, air through the right wall, ground down at right. */
function outsideArrows(
  shape: SectionShape,
  frame: Frame,
  flows: FlowsW,
  widthPerW: number,
  layout: HeatLayout,
) {
  const half = shape.drawnWidthM / 2;
  const several = shape.drawnSpans > 1;
  const ridge = roofAt(shape.outline, shape.type === "monoPitch" ? -half * 0.35 : several ? 0.001 : 0);
  const skyX = frame.x(ridge.point.x);
  const skyY = frame.y(ridge.point.y);
  const skyWidth = arrowWidth(flows.sky, widthPerW);
  const skyTop = Math.max(headLength(skyWidth) + 8, skyY - layout.skyLength);
  const roof = roofAt(shape.outline, half * (several ? 0.8 : 0.6));
  const coverWidth = arrowWidth(flows.cover, widthPerW);
  const start = 10;
  const coverAlong = (distance: number): Place => ({
    x: frame.x(roof.point.x) + roof.out.x * distance,
    y: frame.y(roof.point.y) - roof.out.y * distance,
  });
  const airWidth = arrowWidth(flows.air, widthPerW);
  const rightWallM = shape.outline.at(-2)?.y ?? shape.sideM;
  const ventRoom = Math.max(12, rightWallM * frame.scale);
  const airY = frame.groundY - Math.max(ventRoom * 0.45, airWidth / 2 + 12);
  const wallX = frame.x(wallAt(shape, (frame.groundY - airY) / frame.scale));
  const groundX = frame.x(half * 0.78);
  const arrows: Omit<PlacedArrow, "tip">[] = [
    { path: "sky", width: skyWidth, from: { x: skyX, y: skyY + 10 }, to: { x: skyX, y: skyTop } },
    { path: "cover", width: coverWidth, from: coverAlong(-start), to: coverAlong(layout.coverLength) },
    {
      path: "air",
      width: airWidth,
      from: { x: wallX - 24, y: airY },
      to: { x: wallX + layout.airLength, y: airY },
    },
    {
      path: "ground",
      width: arrowWidth(flows.ground, widthPerW),
      from: { x: groundX, y: frame.groundY - 8 },
      to: { x: groundX, y: frame.groundY + 24 },
    },
  ];
  return { arrows, vent: { x: wallX, y: airY, height: Math.max(22, airWidth + 8) } };
}

/** Distance of the right wall from the middle at a height: an arch leans inwards. */
function wallAt(shape: SectionShape, heightM: number): number {
  for (let i = shape.outline.length - 1; i > 0; i--) {
    const a = shape.outline[i];
    const b = shape.outline[i - 1];
    if (!a || !b) continue;
    if (heightM >= a.y && heightM <= b.y && b.y > a.y) {
      return a.x + ((b.x - a.x) * (heightM - a.y)) / (b.y - a.y);
    }
  }
  return shape.drawnWidthM / 2;
}

/** All arrows of one balance. A path under 0.05 kW is left out of the drawing; the table still names it. */
export function placeArrows(
  shape: SectionShape,
  frame: Frame,
  flows: FlowsW,
  widthPerW: number,
  layout: HeatLayout,
): ArrowPlan {
  const inside = insideArrows(shape, frame, flows, widthPerW);
  const outside = outsideArrows(shape, frame, flows, widthPerW, layout);
  const arrows = [...outside.arrows, ...inside.arrows]
    .filter((arrow) => flows[arrow.path] >= LEAST_DRAWN_W)
    .map((arrow) => {
      const length = Math.hypot(arrow.to.x - arrow.from.x, arrow.to.y - arrow.from.y) || 1;
      const head = headLength(arrow.width) / length;
      return {
        ...arrow,
        tip: {
          x: arrow.to.x + (arrow.to.x - arrow.from.x) * head,
          y: arrow.to.y + (arrow.to.y - arrow.from.y) * head,
        },
      };
    });
  return { arrows, heater: inside.heater, vent: outside.vent };
}
