const GROUND_Y = 470;
const PX_PER_M = 15;

/*
 * The panel is a night whatever the theme, so its colours are fixed: sky, ink of the evening theme,
 * and the evening fill of heat that goes through covers.
 */
const LINE = "#eaf1ee";
const QUIET = "#b3c1bc";
const ROOM = "#1c2929";
const HEAT = "#4f93d0";

type Point = [xM: number, yM: number];

function path(points: Point[], leftPx: number): string {
  return points
    .map(
      ([x, y], index) =>
        `${index === 0 ? "M" : "L"}${(leftPx + x * PX_PER_M).toFixed(1)} ${(GROUND_Y - y * PX_PER_M).toFixed(1)}`,
    )
    .join("");
}

/** A part of a circle through both feet and the crown. */
function arch(widthM: number, riseM: number): Point[] {
  const half = 2 * Math.atan((2 * riseM) / widthM);
  const radius = widthM / 2 / Math.sin(half);
  return Array.from({ length: 25 }, (_, index): Point => {
    const angle = -half + (2 * half * index) / 24;
    return [widthM / 2 + radius * Math.sin(angle), riseM - radius + radius * Math.cos(angle)];
  });
}

const glass: Point[] = [
  [0, 0],
  [0, 4.5],
  [2, 5.3],
  [4, 4.5],
  [6, 5.3],
  [8, 4.5],
  [10, 5.3],
  [12, 4.5],
  [12, 0],
];
const barn: Point[] = [
  [0, 0],
  [0, 2.6],
  [6, 5],
  [12, 2.6],
  [12, 0],
];
const leanTo: Point[] = [
  [0, 0],
  [0, 2.2],
  [5, 3.6],
  [5, 0],
];

/** The width of an arrow says how much a square metre of such a house loses against the others; it is no figure. */
const houses = [
  { name: "Tunnel", left: 40, widthM: 9, topM: 3.8, points: arch(9, 3.6), arrowPx: 58 },
  { name: "Glass range", left: 236, widthM: 12, topM: 5.5, points: glass, arrowPx: 66 },
  { name: "Barn", left: 478, widthM: 12, topM: 5.2, points: barn, arrowPx: 20 },
  { name: "Lean-to", left: 720, widthM: 5, topM: 3.6, points: leanTo, arrowPx: 34 },
];

function arrow(middle: number, bottom: number, width: number): string {
  const half = width / 2;
  const head = half + 9;
  const rise = 26 + width * 0.7;
  const neck = bottom - rise;
  return `M${middle - half} ${bottom}V${neck}H${middle - head}L${middle} ${neck - head * 0.95}L${middle + head} ${neck}H${middle + half}V${bottom}Z`;
}

/** Fixed places, so that the sky is the same at every visit; none where the words stand on a wide screen. */
const stars = Array.from({ length: 260 }, (_, index) => ({
  x: ((index * 137.508) % 1300) - 220,
  y: ((index * index * 7.31) % 830) - 500,
  size: index % 9 === 0 ? 1.7 : 0.9,
})).filter((star) => star.y > -120 || star.x > 520);

const earth = Array.from({ length: 84 }, (_, index) => index * 20 - 400);

/** Houses of the trade to one scale under a clear sky: the night everything here is planned for. */
export function ColdNight() {
  return (
    <svg
      viewBox="0 0 860 540"
      preserveAspectRatio="xMidYMax meet"
      className="absolute inset-0 h-full w-full overflow-visible"
      aria-hidden="true"
    >
      <defs>
        <pattern
          id="night-heat"
          width="9"
          height="9"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width="9" height="9" fill={HEAT} />
          <rect width="1.8" height="9" fill="#101819" />
        </pattern>
      </defs>
      <g fill={LINE}>
        {stars.map((star) => (
          <circle key={`${star.x} ${star.y}`} cx={star.x} cy={star.y} r={star.size} opacity={0.75} />
        ))}
      </g>
      {houses.map((house) => (
        <path
          key={house.name}
          d={arrow(
            house.left + (house.widthM * PX_PER_M) / 2,
            GROUND_Y - house.topM * PX_PER_M - 8,
            house.arrowPx,
          )}
          fill="url(#night-heat)"
          stroke={LINE}
          strokeWidth={1.3}
        />
      ))}
      <g fill={ROOM} stroke={LINE} strokeWidth={2.4} strokeLinejoin="round">
        {houses.map((house) => (
          <path key={house.name} d={`${path(house.points, house.left)}Z`} />
        ))}
        <path
          d={path(
            [
              [0, 2.6],
              [12, 2.6],
            ],
            478,
          )}
          strokeWidth={1.4}
        />
        <path
          d={path(
            [
              [4, 0],
              [4, 4.5],
            ],
            236,
          )}
          strokeWidth={1.2}
        />
        <path
          d={path(
            [
              [8, 0],
              [8, 4.5],
            ],
            236,
          )}
          strokeWidth={1.2}
        />
      </g>
      <path d={`M-400 ${GROUND_Y}H1260`} stroke={LINE} strokeWidth={2.4} />
      <path
        d={earth.map((x) => `M${x + 12} ${GROUND_Y + 3}l-8 9`).join("")}
        stroke={QUIET}
        strokeWidth={1}
        opacity={0.6}
      />
      <g fill={QUIET} fontSize={17} textAnchor="middle">
        {houses.map((house) => (
          <text key={house.name} x={house.left + (house.widthM * PX_PER_M) / 2} y={GROUND_Y + 38}>
            {house.name}
          </text>
        ))}
      </g>
    </svg>
  );
}
