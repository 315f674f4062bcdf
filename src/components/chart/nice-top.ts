const stepsOfTen = [1, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10];

/** A round top of an axis, a little above the greatest value. */
export function niceTop(greatest: number): number {
  if (!(greatest > 0)) return 1;
  const wanted = greatest * 1.12;
  const power = 10 ** Math.floor(Math.log10(wanted));
  const step = stepsOfTen.find((candidate) => candidate * power >= wanted) ?? 10;
  return step * power;
}
