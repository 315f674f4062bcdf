import type { ShapeType } from "../../server/contracts/buildings.ts";
import { cutAfterSpans, type OutlinePoint, outlineBox } from "./outline-points.ts";

export type OutlineStatus = "short" | "tight" | "holds" | "unfinished";

interface BuildingOutlineProps {
  shapeType: ShapeType;
  /** Across-section polyline in metres, ground at 0, from left foot to right foot. */
  outline: OutlinePoint[];
  /** Box in CSS pixels the outline is fitted into, both directions at one scale. */
  size: { width: number; height: number };
  /** Short of heat is drawn in red lead, unfinished with dashes; the words beside it must say the same. */
  status?: OutlineStatus;
  /** Spoken name. Left out where the building's name stands beside the drawing. */
  label?: string;
}

const MOST_SPANS_DRAWN = 3;
const EDGE_PX = 1.7;

/** A building by its own cross-section, small: list mark, map label, table row, page head. */
export function BuildingOutline({ shapeType, outline, size, status, label }: BuildingOutlineProps) {
  const many = shapeType === "multiSpan" || shapeType === "venlo";
  const { points, cut, gutterXs } = many
    ? cutAfterSpans(outline, MOST_SPANS_DRAWN)
    : { points: outline, cut: false, gutterXs: [] };
  const box = outlineBox(points);
  const scale = Math.min((size.width - 3) / box.widthM, (size.height - 3) / box.heightM);
  const x = (m: number) => (size.width / 2 + (m - box.middleM) * scale).toFixed(1);
  const y = (m: number) => (size.height - 2 - m * scale).toFixed(1);
  const line = points.map((p, i) => `${i === 0 ? "M" : "L"}${x(p.x)} ${y(p.y)}`).join("");
  const drawable = points.length > 2 && Number.isFinite(scale) && scale > 0;
  const first = points[0];
  const last = points.at(-1);
  const gutterM = points[1]?.y ?? 0;
  return (
    <svg
      width={size.width}
      height={size.height}
      viewBox={`0 0 ${size.width} ${size.height}`}
      className={status === "short" ? "text-redlead" : undefined}
      style={{ flex: "none" }}
      role={label ? "img" : "presentation"}
      aria-label={label}
      aria-hidden={label === undefined}
    >
      {drawable && first && last ? (
        <g
          fill="none"
          stroke="currentColor"
          strokeWidth={EDGE_PX}
          strokeLinejoin="round"
          strokeDasharray={status === "unfinished" ? "3 2.5" : undefined}
        >
          <path d={`${line}${cut ? "" : "Z"}`} />
          {cut ? (
            <>
              <path d={`M${x(first.x)} ${y(0)}H${x(last.x)}`} />
              <path d={`M${x(last.x)} ${y(gutterM)}V${y(0)}`} strokeDasharray="2 2" />
            </>
          ) : null}
          {gutterXs.map((gutterX) => (
            <path key={gutterX} d={`M${x(gutterX)} ${y(gutterM)}V${y(0)}`} strokeWidth={1} />
          ))}
          {shapeType === "atticBarn" ? (
            <path d={`M${x(first.x)} ${y(gutterM)}H${x(last.x)}`} strokeWidth={1.2} />
          ) : null}
        </g>
      ) : null}
    </svg>
  );
}
