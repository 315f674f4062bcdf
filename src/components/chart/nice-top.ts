const stepsOfTen = [1, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10];

/** A round top of an axis, a little above the greatest value. */
export function niceTop(greatest: number): number {
  if (!(greatest > 0)) return 1;
  const wanted = greatest * 1.12;
  const power = 10 ** Math.floor(Math.log10(wanted));
  const step = stepsOfTen.find((candidate) => candidate * power >= wanted) ?? 10;
  return step * power;
}

const MOST_LINES = 8;

/** A round step that cuts a span into at most eight parts. */
export function axisStep(span: number): number {
  const wanted = Math.max(span, 1e-9) / MOST_LINES;
  const power = 10 ** Math.floor(Math.log10(wanted));
  return ([1, 2, 2.5, 5].find((candidate) => candidate * power >= wanted) ?? 10) * power;
}

/** Round values from `from` to `to`. */
export function axisTicks(from: number, to: number, step: number): number[] {
  const count = Math.round((to - from) / step);
  return Array.from({ length: count + 1 }, (_, i) => Math.round((from + i * step) / step) * step);
}
