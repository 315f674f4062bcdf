import type { UnitSystem } from "../../../server/engine/units.ts";
import { counted, lengthText } from "../../lib/format.ts";
import { type Frame, frameFor, px, roofAt } from "./frame.ts";
import { ScaleBar } from "./scale-bar.tsx";
import type { SectionDimension, SectionShape } from "./section-shape.ts";
import { SectionShell, type Shell } from "./shell.tsx";

interface SectionSizesProps {
  shape: SectionShape;
  shell: Shell;
  system: UnitSystem;
  /** Path of the survey answer being edited; its dimension line is filled. */
  active: string | null;
  layout: "wide" | "phone";
}

const layouts = {
  wide: { width: 600, height: 380, widthShare: 0.56, heightShare: 0.56, centreShare: 0.5, groundShare: 0.73 },
  phone: {
    width: 390,
    height: 214,
    widthShare: 0.46,
    heightShare: 0.5,
    centreShare: 0.5,
    groundShare: 0.67,
  },
} as const;

interface LineProps {
  x1: number;
  y1: number;
  x2: number;
  y2: number;
  label: string;
  active: boolean;
  /** Width of the whole drawing: the label is kept inside it. */
  width: number;
}

/** A ticked dimension line with its label on a plate in the middle. */
function DimensionLine({ x1, y1, x2, y2, label, active, width }: LineProps) {
  const colour = active ? "var(--color-redlead)" : "var(--color-ink-2)";
  const plate = label.length * (active ? 8.4 : 7.5) + 12;
  const beside = x1 !== x2 && Math.abs(x2 - x1) < plate + 8;
  const wantedX = beside ? Math.max(x1, x2) + plate / 2 + 10 : (x1 + x2) / 2;
  const midX = Math.min(width - plate / 2 - 3, Math.max(plate / 2 + 3, wantedX));
  const midY = (y1 + y2) / 2;
  const tick = (x: number, y: number) => `M${px(x - 6)} ${px(y + 6)}L${px(x + 6)} ${px(y - 6)}`;
  return (
    <g>
      <path d={`M${px(x1)} ${px(y1)}L${px(x2)} ${px(y2)}`} stroke={colour} strokeWidth={active ? 2.6 : 1.1} />
      <path d={tick(x1, y1) + tick(x2, y2)} stroke={colour} strokeWidth={active ? 2.6 : 1.6} />
      <rect
        x={midX - plate / 2}
        y={midY - 13}
        width={plate}
        height="26"
        fill={active ? "var(--color-redlead)" : "var(--color-sheet)"}
      />
      <text
        x={midX}
        y={midY + 5}
        textAnchor="middle"
        fontSize={active ? 16 : 14.5}
        fontWeight={active ? 700 : 500}
        fill={active ? "var(--color-on-redlead)" : "var(--color-ink)"}
      >
        {label}
      </text>
    </g>
  );
}

function Dimension({
  dimension,
  frame,
  shape,
  label,
  active,
  phone,
}: {
  dimension: SectionDimension;
  frame: Frame;
  shape: SectionShape;
  label: string;
  active: boolean;
  phone: boolean;
}) {
  const half = shape.drawnWidthM / 2;
  const extension = { stroke: "var(--color-rule-strong)", strokeWidth: 1, fill: "none" };
  if (dimension.place === "bottom") {
    const y = frame.groundY + (phone ? 38 : 46);
    const from = frame.x(dimension.fromM);
    const to = frame.x(dimension.toM);
    return (
      <>
        <path
          d={`M${px(from)} ${frame.groundY + 26}V${y + 8}M${px(to)} ${frame.groundY + 26}V${y + 8}`}
          {...extension}
        />
        <DimensionLine width={frame.width} x1={from} y1={y} x2={to} y2={y} label={label} active={active} />
      </>
    );
  }
  const left = dimension.place === "left";
  const x = left ? frame.x(-half) - (phone ? 46 : 58) : frame.x(half) + (phone ? 50 : 62);
  const edge = left ? frame.x(-half) - 4 : frame.x(shape.type === "monoPitch" ? half : 0) + 4;
  const top = frame.y(dimension.toM);
  const foot = frame.y(dimension.fromM);
  return (
    <>
      <path d={`M${px(edge)} ${px(top)}H${px(left ? x - 8 : x + 8)}`} {...extension} />
      <DimensionLine width={frame.width} x1={x} y1={top} x2={x} y2={foot} label={label} active={active} />
    </>
  );
}

/** How far a curved roof bulges past the straight line, shown only while it is being edited. */
function RoofBow({ shape, frame, label }: { shape: SectionShape; frame: Frame; label: string }) {
  const half = shape.drawnWidthM / 2;
  const middle = { x: -half / 2, y: (shape.sideM + shape.topM) / 2 };
  const onRoof = roofAt(shape.outline, middle.x).point;
  return (
    <g>
      <path
        d={`M${px(frame.x(-half))} ${px(frame.y(shape.sideM))}L${px(frame.x(0))} ${px(frame.y(shape.topM))}`}
        stroke="var(--color-redlead)"
        strokeDasharray="6 4"
        strokeWidth="1.4"
      />
      <DimensionLine
        width={frame.width}
        x1={frame.x(middle.x)}
        y1={frame.y(middle.y)}
        x2={frame.x(onRoof.x)}
        y2={frame.y(onRoof.y)}
        label=""
        active
      />
      <rect x="12" y="10" width={label.length * 8.4 + 14} height="26" fill="var(--color-redlead)" />
      <text x="19" y="28" fontSize="16" fontWeight="700" fill="var(--color-on-redlead)">
        {label}
      </text>
    </g>
  );
}

/** The house with its sizes written on it. Redraws as the numbers are typed. */
export function SectionSizes({ shape, shell, system, active, layout }: SectionSizesProps) {
  const fit = layouts[layout];
  const frame = frameFor(shape, fit);
  const length = (metres: number) => lengthText(metres, system);
  const phone = layout === "phone";
  const spoken = [
    ...shape.dimensions.map((d) => `${d.name} ${length(d.valueM)}`),
    `length ${length(shape.lengthM)}`,
  ].join(", ");
  const broken = shape.drawnSpans < shape.spans;
  const lengthActive = active === "shape.length";
  const cornerX = fit.width - 14;
  const notes = [
    ...(shape.spans > 1
      ? [
          broken
            ? `${shape.drawnSpans} of ${shape.spans} spans drawn`
            : `${counted(shape.spans, "span")}, ${length(shape.widthM)} in all`,
        ]
      : []),
  ];
  return (
    <svg
      viewBox={`0 0 ${fit.width} ${fit.height}`}
      role="img"
      aria-label={`Section through the house. ${spoken}.`}
      className="block h-auto w-full"
    >
      <SectionShell shape={shape} shell={shell} frame={frame} />
      {shape.dimensions.map((dimension) => (
        <Dimension
          key={dimension.name}
          dimension={dimension}
          frame={frame}
          shape={shape}
          label={`${dimension.name} ${length(dimension.valueM)}`}
          active={dimension.path !== null && dimension.path === active}
          phone={phone}
        />
      ))}
      {active === "shape.roofBow" && shape.type === "gothicArch" ? (
        <RoofBow shape={shape} frame={frame} label="Roof bow" />
      ) : null}
      <ScaleBar frame={frame} system={system} x={14} y={fit.height - 14} />
      <text
        x={cornerX}
        y={fit.height - 13}
        textAnchor="end"
        fontSize={lengthActive ? 16 : 13}
        fontWeight={lengthActive ? 700 : 450}
        fill={lengthActive ? "var(--color-redlead)" : "var(--color-ink-2)"}
      >
        {`Length ${length(shape.lengthM)}`}
      </text>
      {notes.map((note) => (
        <text key={note} x={cornerX} y={22} textAnchor="end" fontSize="13" fill="var(--color-ink-2)">
          {note}
        </text>
      ))}
    </svg>
  );
}
