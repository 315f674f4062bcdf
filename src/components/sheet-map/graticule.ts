/** Steps between grid lines in degrees, from the whole world down to a yard. */
const STEPS_DEG = [90, 60, 30, 20, 10, 5, 2, 1, 0.5, 0.2, 0.1, 0.05, 0.02, 0.01, 0.005, 0.002, 0.001, 0.0005];

/** The finest step whose lines stay at least `leastPx` apart. */
export function graticuleStepDeg(pxPerDeg: number, leastPx: number): number {
  const fitting = STEPS_DEG.filter((step) => step * pxPerDeg >= leastPx);
  return fitting.at(-1) ?? STEPS_DEG[0] ?? 90;
}

/** Multiples of the step from `low` to `high`, both included. */
export function graticuleLinesDeg(low: number, high: number, step: number): number[] {
  const first = Math.ceil(low / step - 1e-9);
  const last = Math.floor(high / step + 1e-9);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, index) =>
    Number(((first + index) * step).toFixed(6)),
  );
}

/** Decimals that tell neighbouring lines apart. */
function decimalsOf(step: number): number {
  return Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
}

/** "52.35° N"; a negative longitude is written west. */
export function degreeLabel(valueDeg: number, axis: "latitude" | "longitude", stepDeg: number): string {
  const size = Math.abs(valueDeg).toFixed(decimalsOf(stepDeg));
  if (Number(size) === 0) return "0°";
  const sides = axis === "latitude" ? ["N", "S"] : ["E", "W"];
  return `${size}° ${valueDeg > 0 ? sides[0] : sides[1]}`;
}
