import type { OutlinePoint } from "../outline-points.ts";
import { type Contents, ContentsDrawing } from "./contents.tsx";
import { type Frame, innerLine, polyline, px } from "./frame.ts";
import { hatch } from "./hatches.tsx";
import type { SectionShape } from "./section-shape.ts";

/** How the envelope is drawn. */
export interface Shell {
  /** True thickness of the cover, m; 0 for one thin skin. */
  thicknessM: number;
  /** Filled with insulation and therefore hatched, or two thin skins with a gap. */
  insulated: boolean;
  contents: Contents;
  /** Drawn as a dashed line at the eave; null where there is no screen. */
  screen: "shut" | "open" | null;
  snow?: boolean;
}

const INK = "var(--color-ink)";
const LEAST_GAP_PX = 4;

/** Ground line and earth, the full width of the drawing. */
function Ground({ frame }: { frame: Frame }) {
  return (
    <>
      <rect x="0" y={frame.groundY} width={frame.width} height="13" fill={hatch("earth")} />
      <path d={`M0 ${frame.groundY}H${frame.width}`} stroke={INK} strokeWidth="2" />
    </>
  );
}

function Footings({ xs, frame }: { xs: number[]; frame: Frame }) {
  const depth = Math.min(0.6 * frame.scale, 24);
  return xs.map((x) => (
    <path
      key={x}
      d={`M${px(frame.x(x) - 5)} ${frame.groundY}v${px(depth)}h10v${px(-depth)}`}
      fill="var(--color-sheet)"
      stroke={INK}
      strokeWidth="1.2"
    />
  ));
}

/** Insulated walls, a flat insulated ceiling, and the cold roof above it. */
function AtticShell({ shape, shell, frame }: { shape: SectionShape; shell: Shell; frame: Frame }) {
  const half = shape.drawnWidthM / 2;
  const wallM = Math.max(shell.thicknessM, LEAST_GAP_PX / frame.scale);
  const overhangM = Math.min(0.45, shape.drawnWidthM * 0.05);
  const slope = (shape.topM - shape.sideM) / half;
  const at = (x: number, y: number) => `${px(frame.x(x))} ${px(frame.y(y))}`;
  const ceilingM = wallM * 1.5;
  const walls =
    `M${at(-half, 0)}L${at(-half, shape.sideM)}L${at(-half + wallM, shape.sideM)}L${at(-half + wallM, 0)}Z` +
    `M${at(half, 0)}L${at(half, shape.sideM)}L${at(half - wallM, shape.sideM)}L${at(half - wallM, 0)}Z` +
    `M${at(-half, shape.sideM)}L${at(half, shape.sideM)}L${at(half, shape.sideM + ceilingM)}L${at(-half, shape.sideM + ceilingM)}Z`;
  const roof = `M${at(-half - overhangM, shape.sideM - slope * overhangM)}L${at(0, shape.topM)}L${at(half + overhangM, shape.sideM - slope * overhangM)}`;
  return (
    <>
      <path d={walls} fill={hatch("insulation")} stroke={INK} strokeWidth="1.2" />
      <path d={roof} fill="none" stroke={INK} strokeWidth="3" />
    </>
  );
}

function Skins({ shape, shell, frame }: { shape: SectionShape; shell: Shell; frame: Frame }) {
  if (shape.type === "atticBarn") return <AtticShell shape={shape} shell={shell} frame={frame} />;
  const outer = shape.outline;
  const gapM =
    shell.thicknessM > 0.002 ? Math.max(shell.thicknessM, LEAST_GAP_PX / frame.scale) : shell.thicknessM;
  const inner = innerLine(outer, gapM);
  if (shell.insulated) {
    const back = [...inner].reverse();
    return (
      <path
        d={`${polyline(outer, frame)}L${polyline(back, frame).slice(1)}Z`}
        fill={hatch("insulation")}
        stroke={INK}
        strokeWidth="1.4"
        strokeLinejoin="round"
      />
    );
  }
  return (
    <>
      <path d={polyline(outer, frame)} fill="none" stroke={INK} strokeWidth="2.4" strokeLinejoin="round" />
      {gapM > 0.002 ? (
        <path d={polyline(inner, frame)} fill="none" stroke={INK} strokeWidth="1.3" strokeLinejoin="round" />
      ) : null}
    </>
  );
}

/** Posts under the gutters, and a break line where spans are left out. */
function Spans({ shape, frame }: { shape: SectionShape; frame: Frame }) {
  const left = -shape.drawnWidthM / 2;
  const posts = Array.from({ length: shape.drawnSpans - 1 }, (_, i) => left + shape.spanWidthM * (i + 1));
  const broken = shape.drawnSpans < shape.spans;
  const breakX = frame.x(left + shape.spanWidthM * (shape.drawnSpans - 1)) + 14;
  const top = frame.y(shape.topM) - 12;
  const middle = (frame.y(shape.sideM) + frame.groundY) / 2;
  const line = (x: number) =>
    `M${px(x)} ${px(top)}V${px(middle - 12)}l-7 7l14 8l-7 7V${px(frame.groundY + 16)}`;
  return (
    <>
      {posts.map((x) => (
        <path
          key={x}
          d={`M${px(frame.x(x))} ${px(frame.y(shape.sideM))}V${frame.groundY}M${px(frame.x(x) - 6)} ${px(frame.y(shape.sideM) - 3)}q6 7 12 0`}
          fill="none"
          stroke={INK}
          strokeWidth="1.6"
        />
      ))}
      {broken ? (
        <>
          <path d={line(breakX)} fill="none" stroke="var(--color-sheet)" strokeWidth="10" />
          <path d={`${line(breakX - 4)}${line(breakX + 4)}`} fill="none" stroke={INK} strokeWidth="1.1" />
        </>
      ) : null}
    </>
  );
}

function Screen({ shape, frame, state }: { shape: SectionShape; frame: Frame; state: "shut" | "open" }) {
  const half = shape.drawnWidthM / 2;
  const heightM = shape.sideM > 1.5 ? shape.sideM - 0.2 : shape.topM * 0.62;
  const halfAt = widthAt(shape.outline, heightM, half);
  const y = px(frame.y(heightM));
  const look = { stroke: INK, strokeWidth: 1.6, strokeDasharray: "7 3", fill: "none" };
  if (state === "shut") return <path d={`M${px(frame.x(-halfAt))} ${y}H${px(frame.x(halfAt))}`} {...look} />;
  const bundle = Math.min(18, halfAt * frame.scale * 0.15);
  return (
    <path
      d={`M${px(frame.x(-halfAt))} ${y}h${px(bundle)}M${px(frame.x(halfAt))} ${y}h${px(-bundle)}`}
      {...look}
      strokeWidth={4}
      strokeDasharray="2 1.5"
    />
  );
}

/** Half the inside width of an outline at a height. */
function widthAt(points: OutlinePoint[], heightM: number, most: number): number {
  let half = most;
  for (let i = 1; i < points.length; i++) {
    const a = points[i - 1];
    const b = points[i];
    if (!a || !b || a.x > 0 || a.y === b.y) continue;
    if (heightM >= Math.min(a.y, b.y) && heightM <= Math.max(a.y, b.y)) {
      half = Math.abs(a.x + ((b.x - a.x) * (heightM - a.y)) / (b.y - a.y));
      break;
    }
  }
  return half;
}

/** A band of snow along the upper side of the roof. */
function Snow({ shape, frame }: { shape: SectionShape; frame: Frame }) {
  const roof = shape.outline.filter((p) => p.y >= shape.sideM && p.y > 0);
  if (roof.length < 2) return null;
  return (
    <path
      d={polyline(roof, frame)}
      transform="translate(0 -5)"
      fill="none"
      stroke="var(--color-rule-strong)"
      strokeWidth="5"
      strokeDasharray="1.5 4"
      strokeLinecap="round"
    />
  );
}

/** Ground, house, what stands in it, its skins and its screen: everything but numbers. */
export function SectionShell({ shape, shell, frame }: { shape: SectionShape; shell: Shell; frame: Frame }) {
  const half = shape.drawnWidthM / 2;
  return (
    <>
      <Ground frame={frame} />
      <path d={`${polyline(shape.outline, frame)}Z`} fill="var(--color-room)" />
      <ContentsDrawing shape={shape} frame={frame} contents={shell.contents} />
      <Skins shape={shape} shell={shell} frame={frame} />
      {shell.screen ? <Screen shape={shape} frame={frame} state={shell.screen} /> : null}
      {shell.snow ? <Snow shape={shape} frame={frame} /> : null}
      {shape.spans > 1 ? <Spans shape={shape} frame={frame} /> : null}
      <Footings xs={[-half, half]} frame={frame} />
    </>
  );
}
