/** A curve through three points, for a quantity that bends only a little. */
export interface Parabola {
  a: number;
  b: number;
  c: number;
}

/** Curve a + b x + c x² through three points with different x. Source [LAGRANGE]. */
export function parabolaThrough(
  x: readonly [number, number, number],
  y: readonly [number, number, number],
): Parabola {
  const slope01 = (y[1] - y[0]) / (x[1] - x[0]);
  const slope12 = (y[2] - y[1]) / (x[2] - x[1]);
  const c = (slope12 - slope01) / (x[2] - x[0]);
  const b = slope01 - c * (x[0] + x[1]);
  return { a: y[0] - x[0] * (b + c * x[0]), b, c };
}

/** Value of the curve at x. Source [LAGRANGE]. */
export function parabolaAt(curve: Parabola, x: number): number {
  return curve.a + x * (curve.b + curve.c * x);
}
