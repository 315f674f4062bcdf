import { type Frame, px } from "./frame.ts";
import type { SectionShape } from "./section-shape.ts";

/** What stands in the house: told apart by drawing, named in the spoken sentence. */
export type Contents = "crop" | "birds" | "pigs" | "cattle" | "empty";

const SMALLEST_SCALE = 7;

function repeat(from: number, to: number, step: number): number[] {
  const count = Math.max(0, Math.floor((to - from) / step + 1e-9) + 1);
  const spare = to - from - (count - 1) * step;
  return Array.from({ length: count }, (_, i) => from + spare / 2 + i * step);
}

function plant(frame: Frame, x: number, heightM: number): string {
  let line = `M${px(frame.x(x))} ${px(frame.y(0))}V${px(frame.y(heightM))}`;
  for (let y = 0.45; y < heightM; y += 0.42) {
    line += `M${px(frame.x(x - 0.27))} ${px(frame.y(y + 0.15))}`;
    line += `Q${px(frame.x(x))} ${px(frame.y(y - 0.1))} ${px(frame.x(x + 0.27))} ${px(frame.y(y + 0.15))}`;
  }
  return line;
}

/** A four-legged animal from the side, `bodyM` long. */
function beast(frame: Frame, x: number, bodyM: number): string {
  const k = bodyM;
  const at = (dx: number, y: number) => `${px(frame.x(x + dx * k))} ${px(frame.y(y * k))}`;
  return (
    `M${at(-0.5, 0.24)}Q${at(-0.47, 0.53)} ${at(0, 0.53)}T${at(0.57, 0.3)}L${at(0.53, 0.17)}L${at(-0.33, 0.17)}Z` +
    `M${at(-0.33, 0)}L${at(-0.33, 0.18)}M${at(0.27, 0)}L${at(0.27, 0.18)}`
  );
}

export function ContentsDrawing({
  shape,
  frame,
  contents,
}: {
  shape: SectionShape;
  frame: Frame;
  contents: Contents;
}) {
  if (contents === "empty" || frame.scale < SMALLEST_SCALE) return null;
  const half = shape.drawnWidthM / 2;
  const stroke = {
    fill: "none",
    stroke: "var(--color-rule-strong)",
    strokeWidth: 1.2,
    strokeLinecap: "round" as const,
  };
  if (contents === "birds") {
    const size = Math.max(2.2, frame.scale * 0.16);
    const step = Math.max(0.62, (size * 3.6) / frame.scale);
    return (
      <g {...stroke}>
        {repeat(-half + 0.7, half - 0.7, step).map((x) => (
          <g key={x}>
            <ellipse cx={frame.x(x)} cy={frame.groundY - size * 1.1} rx={size * 1.15} ry={size * 0.9} />
            <circle cx={frame.x(x) + size} cy={frame.groundY - size * 2} r={size * 0.5} />
          </g>
        ))}
      </g>
    );
  }
  if (contents === "crop") {
    const tallest = Math.min(2.6, Math.max(0.5, shape.sideM > 3 ? 2.6 : shape.topM * 0.4));
    const rows = repeat(-half + 1.1, half - 1.1, 1.35);
    return <path {...stroke} d={rows.map((x) => plant(frame, x, tallest)).join("")} />;
  }
  const bodyM = contents === "cattle" ? 2.1 : 1.5;
  const rows = repeat(-half + bodyM, half - bodyM, bodyM * 1.6);
  return <path {...stroke} d={rows.map((x) => beast(frame, x, bodyM)).join("")} />;
}
