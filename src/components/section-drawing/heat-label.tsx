import { px } from "./frame.ts";
import { PathMarkShape } from "./hatches.tsx";
import { type HeatPath, heatPaths } from "./heat-paths.ts";

/** About the width of text in the drawing's face, for the plate behind it. */
export function textWidth(words: string, fontSize: number): number {
  return words.length * fontSize * 0.56;
}

interface HeatLabelProps {
  path: HeatPath;
  heat: string;
  x: number;
  y: number;
  fontSize: number;
  named: boolean;
  anchor?: "start" | "end";
}

/** Mark, name and amount on a plate, so that a line may pass behind and the words stay readable. */
export function HeatLabel({ path, heat, x, y, fontSize, named, anchor = "start" }: HeatLabelProps) {
  const { name } = heatPaths[path];
  const large = named ? fontSize + 3 : fontSize + 1;
  const width = Math.max(named ? textWidth(name, fontSize) : 0, textWidth(heat, large)) + 28;
  const left = anchor === "end" ? x - width : x;
  const amountY = named ? y + 19 : y;
  return (
    <g>
      <rect
        x={px(left - 3)}
        y={px(y - 15)}
        width={px(width)}
        height={named ? 40 : 22}
        fill="var(--color-sheet)"
      />
      <PathMarkShape path={path} x={left} y={y - 12} size={15} />
      {named ? (
        <text x={px(left + 22)} y={px(y)} fontSize={fontSize} fill="var(--color-ink-2)">
          {name}
        </text>
      ) : null}
      <text
        x={px(left + (named ? 22 : 20))}
        y={px(amountY)}
        fontSize={large}
        fontWeight="700"
        fill="var(--color-ink)"
      >
        {heat}
      </text>
    </g>
  );
}

interface PlateProps {
  name: string;
  value: string;
  x: number;
  y: number;
  fontSize: number;
  anchor?: "start" | "end";
}

/** A temperature with the name of what has it. */
export function Plate({ name, value, x, y, fontSize, anchor = "start" }: PlateProps) {
  const width = Math.max(textWidth(name, fontSize), textWidth(value, fontSize + 1)) + 8;
  const left = anchor === "end" ? x - width + 4 : x - 4;
  return (
    <g>
      <rect
        x={px(left)}
        y={px(y - fontSize)}
        width={px(width)}
        height={fontSize * 2 + 9}
        fill="var(--color-sheet)"
      />
      <text x={px(x)} y={px(y)} fontSize={fontSize} fill="var(--color-ink-2)" textAnchor={anchor}>
        {name}
      </text>
      <text
        x={px(x)}
        y={px(y + fontSize + 3)}
        fontSize={fontSize + 1}
        fontWeight="650"
        fill="var(--color-ink)"
        textAnchor={anchor}
      >
        {value}
      </text>
    </g>
  );
}
