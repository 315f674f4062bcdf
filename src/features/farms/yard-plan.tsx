import type { BuildingSummary } from "../../../server/contracts/buildings.ts";
import { verdictKind } from "../../components/plan/verdict.ts";
import { VerdictMark } from "../../components/plan/verdict-mark.tsx";
import { scaleBar } from "../../components/sheet-map/scale-bar.ts";
import { corners, eastNorthM, fromMiddle, type GroundPoint } from "../../lib/footprint.ts";
import { number } from "../../lib/format.ts";
import type { Units } from "../../lib/units.ts";
import { PHONE, useMedia } from "../../lib/use-media.ts";

/** Drawn at the size it is shown in, so that its words keep theirs. */
const DESK = { width: 620, height: 330 };
const HAND = { width: 356, height: 230 };
const EDGE_PX = 40;
/** Kept free below the houses for the scale bar. */
const FOOT_PX = 34;
/** Houses farther apart than this are not one yard, and no drawing shows both. */
const YARD_M = 1500;

interface YardPlanProps {
  buildings: BuildingSummary[];
  units: Units;
}

interface Placed {
  building: BuildingSummary;
  plan: { x: number; y: number }[];
  ridge: { x: number; y: number }[];
}

/** Everything in metres east and north of the first house. */
function placed(buildings: BuildingSummary[], origin: GroundPoint): Placed[] {
  const metres = (point: GroundPoint) => {
    const { eastM, northM } = eastNorthM(origin, point);
    return { x: eastM, y: northM };
  };
  return buildings.map((building) => {
    const { lengthM, widthM, ridgeBearingDeg: bearingDeg } = building;
    return {
      building,
      plan: corners(building, { lengthM, widthM, bearingDeg }).map(metres),
      ridge: [-1, 1].map((end) => metres(fromMiddle(building, bearingDeg, (end * lengthM) / 2, 0))),
    };
  });
}

/** The houses of a farm on the ground, to one scale, north up. Left out where they do not make one yard. */
export function YardPlan({ buildings, units }: YardPlanProps) {
  const { width, height } = useMedia(PHONE) ? HAND : DESK;
  const [first] = buildings;
  if (first === undefined) return null;
  const houses = placed(buildings, first);
  const xs = houses.flatMap((house) => house.plan.map((point) => point.x));
  const ys = houses.flatMap((house) => house.plan.map((point) => point.y));
  const box = {
    west: Math.min(...xs),
    east: Math.max(...xs),
    south: Math.min(...ys),
    north: Math.max(...ys),
  };
  const spanM = { x: box.east - box.west, y: box.north - box.south };
  if (Math.max(spanM.x, spanM.y) > YARD_M) return null;
  const scale = Math.min((width - 2 * EDGE_PX) / spanM.x, (height - FOOT_PX - 2 * EDGE_PX) / spanM.y, 6);
  const middle = { x: (box.west + box.east) / 2, y: (box.south + box.north) / 2 };
  const x = (m: number) => width / 2 + (m - middle.x) * scale;
  const y = (m: number) => (height - FOOT_PX) / 2 - (m - middle.y) * scale;
  const path = (points: { x: number; y: number }[]) =>
    points
      .map((point, index) => `${index === 0 ? "M" : "L"}${x(point.x).toFixed(1)} ${y(point.y).toFixed(1)}`)
      .join("");
  const bar = scaleBar(1 / scale, 130, units.system);
  return (
    <section aria-labelledby="yard-plan">
      <h2 id="yard-plan" className="m-0 border-b-2 border-ink pb-1 font-sign text-lg font-bold">
        On the ground
      </h2>
      <svg
        viewBox={`0 0 ${width} ${height}`}
        role="img"
        aria-label={`Ground plan, north up: ${buildings.map((building) => `${building.name}, ridge at ${Math.round(building.ridgeBearingDeg)}°`).join("; ")}`}
        className="mt-3 block w-full border border-ink bg-map-land"
      >
        {houses.map(({ building, plan, ridge }) => {
          const kind = verdictKind(building.plan);
          const topX = x(
            plan.reduce((best, point) => (point.y > best.y ? point : best), plan[0] ?? { x: 0, y: 0 }).x,
          );
          const right = Math.max(...plan.map((point) => x(point.x)));
          const top = Math.min(...plan.map((point) => y(point.y)));
          const bottom = Math.max(...plan.map((point) => y(point.y)));
          const middleX = plan.reduce((sum, point) => sum + x(point.x), 0) / plan.length;
          const roomy = right - Math.min(...plan.map((point) => x(point.x))) > building.name.length * 9;
          return (
            <g key={building.id}>
              <path
                d={`${path(plan)}Z`}
                fill="var(--color-sheet)"
                stroke={kind === "short" ? "var(--color-redlead)" : "var(--color-ink)"}
                strokeWidth={2}
                strokeDasharray={kind === "unfinished" ? "6 4" : undefined}
              />
              <path d={path(ridge)} stroke="var(--color-ink)" strokeDasharray="7 3 2 3" fill="none" />
              <text
                x={middleX}
                y={roomy ? (top + bottom) / 2 + 5 : bottom + 19}
                textAnchor="middle"
                fontSize={15}
                fontWeight={700}
                fill="var(--color-ink)"
                stroke={roomy ? "var(--color-sheet)" : "var(--color-map-land)"}
                strokeWidth={4}
                paintOrder="stroke"
              >
                {building.name}
              </text>
              <g transform={`translate(${Math.min(topX - 4, width - 26)} ${Math.max(top - 14, 4)})`}>
                <VerdictMark kind={kind} size={20} />
              </g>
            </g>
          );
        })}
        <g transform={`translate(${width - 34} 24)`} fill="none" stroke="var(--color-ink)" strokeWidth={1.8}>
          <path d="M0 34V0M-6 10 0 0l6 10" />
          <text
            y={50}
            textAnchor="middle"
            fontSize={14}
            fontWeight={700}
            fill="var(--color-ink)"
            stroke="none"
          >
            N
          </text>
        </g>
        <g transform={`translate(20 ${height - 22})`}>
          <rect width={bar.widthPx} height={7} fill="var(--color-sheet)" stroke="var(--color-ink)" />
          <rect width={bar.widthPx / 2} height={7} fill="var(--color-ink)" />
          <text y={-6} x={bar.widthPx} fontSize={14} fill="var(--color-ink)">
            {`${number(bar.ticks[2])} ${bar.unit}`}
          </text>
        </g>
      </svg>
    </section>
  );
}
