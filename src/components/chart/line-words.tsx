interface LineWordsProps {
  viewBox?: unknown;
  label: string;
  colour: string;
  /** Middle of the words along the line, as a share of its length. */
  at: number;
}

/** Words standing on a level line, on a plate of the page's own colour. */
export function LineWords({ viewBox, label, colour, at }: LineWordsProps) {
  const line = viewBox as { x?: number; y?: number; width?: number } | undefined;
  if (line?.x === undefined || line.y === undefined || line.width === undefined) return null;
  const half = (label.length * 7.2) / 2 + 4;
  const x = Math.min(line.x + line.width - half, Math.max(line.x + half, line.x + line.width * at));
  return (
    <g>
      <rect
        x={x - half}
        y={line.y - 20}
        width={half * 2}
        height="17"
        fill="var(--color-limewash)"
        fillOpacity="0.85"
      />
      <text x={x} y={line.y - 7} textAnchor="middle" fontSize="13" fontWeight="650" fill={colour}>
        {label}
      </text>
    </g>
  );
}
