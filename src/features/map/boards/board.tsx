import type { ShapeType } from "../../../../server/contracts/buildings.ts";
import { BuildingOutline } from "../../../components/building-outline.tsx";
import type { OutlinePoint } from "../../../components/outline-points.ts";
import type { VerdictKind } from "../../../components/plan/verdict.ts";
import { VerdictMark } from "../../../components/plan/verdict-mark.tsx";

const WIDTH_PX = 52;
const FACE_PX = 38;
const HEIGHT_PX = 50;
const BOARD = `M1 1H${WIDTH_PX - 1}V${FACE_PX}H32L26 ${HEIGHT_PX - 1}L20 ${FACE_PX}H1Z`;

const looks: Record<VerdictKind, { face: string; edge: string; dash?: string }> = {
  short: { face: "var(--color-redlead-tint)", edge: "var(--color-redlead)" },
  tight: { face: "var(--color-straw-tint)", edge: "var(--color-ink)" },
  unfinished: { face: "var(--color-sheet)", edge: "var(--color-ink)", dash: "4 3" },
  holds: { face: "var(--color-sheet)", edge: "var(--color-ink)" },
  notApplicable: { face: "var(--color-sheet)", edge: "var(--color-ink)" },
};

interface BoardProps {
  kind: VerdictKind;
  chosen?: boolean;
  /** One building by its outline, or how many stand here. */
  face: { shapeType: ShapeType; outline: OutlinePoint[] } | { count: number };
}

/** A label as gardeners stick it into the ground: a board with a pointed foot on the spot. */
export function Board({ kind, chosen = false, face }: BoardProps) {
  const look = looks[kind];
  const many = "count" in face;
  return (
    <span
      className={`relative isolate block origin-bottom ${chosen ? "scale-140 text-sheet" : "text-ink"}`}
      style={{ width: WIDTH_PX, height: HEIGHT_PX }}
    >
      <svg
        width={WIDTH_PX}
        height={HEIGHT_PX}
        aria-hidden="true"
        className="absolute inset-0 overflow-visible"
      >
        {many ? (
          <path
            d={`M5 1V-3H${WIDTH_PX + 3}V${FACE_PX - 4}H${WIDTH_PX - 1}`}
            fill={look.face}
            stroke={look.edge}
            strokeWidth={1.6}
          />
        ) : null}
        <path
          d={BOARD}
          fill={chosen ? "var(--color-ink)" : look.face}
          stroke={chosen ? "var(--color-ink)" : look.edge}
          strokeWidth={1.9}
          strokeLinejoin="round"
          strokeDasharray={chosen ? undefined : look.dash}
        />
      </svg>
      <span className="absolute inset-x-0 top-0 z-[201] flex h-[38px] items-center justify-center">
        {many ? (
          <b className="text-lg">{face.count}</b>
        ) : (
          <BuildingOutline
            shapeType={face.shapeType}
            outline={face.outline}
            size={{ width: 40, height: 26 }}
            status={kind === "short" && !chosen ? "short" : "holds"}
          />
        )}
      </span>
      {kind === "holds" || kind === "notApplicable" ? null : (
        <span className="absolute -top-2.5 -right-2.5 z-[201] rounded-full bg-sheet text-ink">
          <VerdictMark kind={kind} size={20} />
        </span>
      )}
    </span>
  );
}
