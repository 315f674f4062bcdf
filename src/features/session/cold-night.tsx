const GROUND_Y = 300;
const PX_PER_M = 10;

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

const venlo: Point[] = [
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
  [5, 3.4],
  [5, 0],
];

const houses = [
  { name: "Tunnel", left: 20, width: 9, points: arch(9, 3.6) },
  { name: "Glass range", left: 145, width: 12, points: venlo },
  { name: "Barn", left: 300, width: 12, points: barn },
  { name: "Lean-to", left: 455, width: 5, points: leanTo },
];

/** Fixed places, so that the sky is the same at every visit. */
const stars = Array.from({ length: 90 }, (_, index) => ({
  x: (index * 137.508) % 540,
  y: (index * index * 7.31) % 215,
  size: index % 7 === 0 ? 1.5 : 0.8,
}));

/** Houses of the trade to one scale under a clear sky: the night everything here is planned for. */
export function ColdNight() {
  return (
    <svg viewBox="0 0 540 350" className="block h-auto w-full" aria-hidden="true">
      <g fill="#eaf1ee">
        {stars.map((star) => (
          <circle key={`${star.x} ${star.y}`} cx={star.x} cy={star.y} r={star.size} opacity={0.75} />
        ))}
      </g>
      <g fill="#1c2929" stroke="#eaf1ee" strokeWidth={2} strokeLinejoin="round">
        {houses.map((house) => (
          <path key={house.name} d={`${path(house.points, house.left)}Z`} />
        ))}
        <path d={`M300 ${GROUND_Y - 26}H420`} strokeWidth={1.3} />
      </g>
      <path d={`M0 ${GROUND_Y}H540`} stroke="#eaf1ee" strokeWidth={2} />
      <g fill="#b3c1bc" fontSize={14} textAnchor="middle">
        {houses.map((house) => (
          <text key={house.name} x={house.left + (house.width * PX_PER_M) / 2} y={GROUND_Y + 26}>
            {house.name}
          </text>
        ))}
      </g>
    </svg>
  );
}
