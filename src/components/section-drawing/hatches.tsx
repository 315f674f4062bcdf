import "./hatches.css";
import { type HeatPath, heatPaths } from "./heat-paths.ts";

/** Fill of a path in any SVG of a page that also shows a {@link HatchSheet}. */
export function hatch(name: HeatPath | "short" | "earth" | "insulation" | "fitted"): string {
  return `url(#hatch-${name})`;
}

const light = "var(--color-path-hatch)";
const dark = "var(--color-path-hatch-dark)";

/**
 * The hatches, once per page. Colour alone never carries a meaning: printed grey, the hatch still tells the path.
 * The SVG has no size but is not hidden from layout, because a hidden pattern does not paint.
 */
export function HatchSheet() {
  return (
    <svg width="0" height="0" aria-hidden="true" className="absolute" focusable="false">
      <defs>
        <pattern
          id="hatch-cover"
          width="7"
          height="7"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(-45)"
        >
          <rect width="7" height="7" fill="var(--color-path-cover)" />
          <path d="M0 3.5H7" stroke={light} strokeWidth="1.4" />
        </pattern>
        <pattern id="hatch-sky" width="9" height="9" patternUnits="userSpaceOnUse">
          <rect width="9" height="9" fill="var(--color-path-sky)" />
          <circle cx="2.2" cy="2.2" r="1.15" fill={light} />
          <circle cx="6.7" cy="6.7" r="1.15" fill={light} />
        </pattern>
        <pattern id="hatch-air" width="12" height="7" patternUnits="userSpaceOnUse">
          <rect width="12" height="7" fill="var(--color-path-air)" />
          <path d="M0 3.5Q3 .5 6 3.5T12 3.5" stroke={light} strokeWidth="1.4" fill="none" />
        </pattern>
        <pattern id="hatch-ground" width="8" height="8" patternUnits="userSpaceOnUse">
          <rect width="8" height="8" fill="var(--color-path-ground)" />
          <path d="M0 0L8 8M8 0L0 8" stroke={light} strokeWidth="1.2" />
        </pattern>
        <pattern id="hatch-sun" width="6" height="6" patternUnits="userSpaceOnUse">
          <rect width="6" height="6" fill="var(--color-path-sun)" />
          <path d="M3 0V6" stroke={dark} strokeWidth="1.3" />
        </pattern>
        <pattern id="hatch-stock" width="10" height="7" patternUnits="userSpaceOnUse">
          <rect width="10" height="7" fill="var(--color-path-stock)" />
          <path d="M0 6L5 1.5L10 6" stroke={light} strokeWidth="1.4" fill="none" />
        </pattern>
        <pattern id="hatch-lights" width="9" height="9" patternUnits="userSpaceOnUse">
          <rect width="9" height="9" fill="var(--color-path-lights)" />
          <path d="M4.5 2V7M2 4.5H7" stroke={dark} strokeWidth="1.4" />
        </pattern>
        <pattern id="hatch-heater" width="8" height="8" patternUnits="userSpaceOnUse">
          <rect width="8" height="8" fill="var(--color-path-heater)" />
        </pattern>
        <pattern
          id="hatch-short"
          width="7"
          height="7"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width="7" height="7" fill="var(--color-redlead-tint)" />
          <path d="M0 3.5H7" stroke="var(--color-redlead)" strokeWidth="2" />
        </pattern>
        <pattern id="hatch-fitted" width="8" height="8" patternUnits="userSpaceOnUse">
          <rect width="8" height="8" fill="var(--color-trough)" />
        </pattern>
        <pattern id="hatch-earth" width="22" height="12" patternUnits="userSpaceOnUse">
          <path
            d="M1 11L9 3M5 11L11 5M13 1L19 7M16 1L21 6"
            stroke="var(--color-rule-strong)"
            strokeWidth="1"
            fill="none"
          />
        </pattern>
        <pattern
          id="hatch-insulation"
          width="8"
          height="8"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(60)"
        >
          <rect width="8" height="8" fill="var(--color-trough)" />
          <path d="M0 4H8" stroke="var(--color-ink-2)" strokeWidth=".9" />
        </pattern>
      </defs>
    </svg>
  );
}

interface PathMarkShapeProps {
  path: HeatPath;
  x: number;
  y: number;
  size: number;
}

/** Square: heat going out. Circle: heat coming in. Triangle: heat that is bought. */
export function PathMarkShape({ path, x, y, size }: PathMarkShapeProps) {
  const look = { fill: hatch(path), stroke: "var(--color-ink)", strokeWidth: 1.2 };
  const { direction } = heatPaths[path];
  if (direction === "out") return <rect x={x} y={y} width={size} height={size} {...look} />;
  if (direction === "in") return <circle cx={x + size / 2} cy={y + size / 2} r={size / 2} {...look} />;
  return <path d={`M${x + size / 2} ${y}L${x + size} ${y + size}H${x}Z`} strokeLinejoin="round" {...look} />;
}

/** The mark of a path in running text and tables. The name stands beside it, so it is silent. */
export function PathMark({ path, size = 18 }: { path: HeatPath; size?: number }) {
  return (
    <svg
      width={size + 2}
      height={size + 2}
      aria-hidden="true"
      focusable="false"
      className="inline-block flex-none align-[-4px]"
    >
      <PathMarkShape path={path} x={1} y={1} size={size} />
    </svg>
  );
}
