import type { UnitSystem } from "../../../server/engine/units.ts";
import { temperature } from "../../lib/format.ts";
import type { ArrowPlan, PlacedArrow } from "./arrow-places.ts";
import { type Frame, px, roofAt } from "./frame.ts";
import { HeatLabel, Plate } from "./heat-label.tsx";
import { type HeatLayout, spread } from "./heat-layout.ts";
import type { FlowsW, HeatPath } from "./heat-paths.ts";
import type { SectionShape } from "./section-shape.ts";
import type { SectionTemperatures } from "./spoken-flows.ts";

interface LabelsProps {
  plan: ArrowPlan;
  frame: Frame;
  layout: HeatLayout;
  flows: FlowsW;
  written: (heatW: number) => string;
}

/** Labels under the ground line, each joined to the foot of its arrow. */
export function GroundLabels({ plan, frame, layout, flows, written }: LabelsProps) {
  const order: HeatPath[] = ["heater", "lights", "stock", "ground"];
  const shown = order.flatMap((path) => plan.arrows.find((arrow) => arrow.path === path) ?? []);
  const y = frame.groundY + layout.slotDrop;
  const lefts = spread(
    shown.map((arrow) => arrow.from.x - 8),
    layout.slotWidth,
    10,
    layout.slotEnd,
  );
  return shown.map((arrow, i) => {
    const x = lefts[i] ?? 0;
    const foot = arrow.path === "ground" ? arrow.tip : { x: arrow.from.x, y: frame.groundY };
    const start = arrow.path === "lights" ? arrow.tip : foot;
    const joinX = x + 8;
    return (
      <g key={arrow.path}>
        <path
          d={`M${px(start.x)} ${px(start.y)}V${px(Math.max(start.y, frame.groundY + 16))}L${px(joinX)} ${px(y - 14)}`}
          fill="none"
          stroke="var(--color-ink)"
          strokeWidth="1"
        />
        <HeatLabel
          path={arrow.path}
          heat={written(flows[arrow.path])}
          x={x}
          y={y}
          fontSize={layout.fontSize}
          named={layout.named}
        />
      </g>
    );
  });
}

/** Cover and air at the right, with the temperatures of the roof's faces between them. */
export function SideLabels({
  plan,
  frame,
  layout,
  flows,
  written,
  shape,
  temperatures,
  system,
}: LabelsProps & { shape: SectionShape; temperatures: SectionTemperatures; system: UnitSystem }) {
  const cover = plan.arrows.find((arrow) => arrow.path === "cover");
  const air = plan.arrows.find((arrow) => arrow.path === "air");
  const skin = roofAt(shape.outline, (shape.drawnWidthM / 2) * 0.9).point;
  const skinAt = { x: frame.x(skin.x), y: frame.y(skin.y) };
  const faces = layout.named ? temperatures.faces : [];
  const entries = [
    ...(cover ? [{ id: "cover", y: cover.tip.y + 6 }] : []),
    ...[...faces].reverse().map((face, i) => ({ id: `face-${face.name}`, y: skinAt.y - 20 + i * 44 })),
    ...(air ? [{ id: "air", y: air.from.y + 2 }] : []),
  ];
  const gap = layout.named ? 46 : 28;
  const placed = spread(
    entries.map((entry) => entry.y),
    gap,
    layout.named ? 34 : 22,
    frame.groundY - (layout.named ? 30 : 10),
  );
  const yOf = (id: string) => placed[entries.findIndex((entry) => entry.id === id)] ?? 0;
  const arrowLabel = (arrow: PlacedArrow | undefined) =>
    arrow ? (
      <g>
        <path
          d={`M${px(arrow.tip.x + 3)} ${px(arrow.tip.y)}L${px(layout.labelX - 6)} ${px(yOf(arrow.path) - 4)}`}
          stroke="var(--color-rule-strong)"
          strokeWidth="1"
          strokeDasharray="2 3"
        />
        <HeatLabel
          path={arrow.path}
          heat={written(flows[arrow.path])}
          x={layout.labelX}
          y={yOf(arrow.path)}
          fontSize={layout.fontSize}
          named={layout.named}
        />
      </g>
    ) : null;
  return (
    <>
      {faces.map((face) => {
        const y = yOf(`face-${face.name}`);
        return (
          <g key={face.name}>
            <path
              d={`M${layout.labelX - 4} ${px(y)}H${layout.labelX - 26}L${px(skinAt.x)} ${px(skinAt.y)}`}
              fill="none"
              stroke="var(--color-ink)"
              strokeWidth="1"
            />
            <circle cx={px(skinAt.x)} cy={px(skinAt.y)} r="3" fill="var(--color-ink)" />
            <Plate
              name={face.name}
              value={temperature(face.tempC, system)}
              x={layout.labelX}
              y={y}
              fontSize={layout.fontSize}
            />
          </g>
        );
      })}
      {arrowLabel(cover)}
      {arrowLabel(air)}
    </>
  );
}
