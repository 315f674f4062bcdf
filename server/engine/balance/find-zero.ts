/**
 * Zero of a continuous rising function between two points that enclose it: false position, where an end that stays put
 * twice has its value halved (the Illinois rule). When the ends do not enclose a zero the nearer end is given back.
 * Shape: function, low, high, tolerance in x → x. Source [DOWELL1971].
 */
export function findZero(rising: (x: number) => number, low: number, high: number, tolerance = 1e-8): number {
  let [a, b] = [low, high];
  let fa = rising(a);
  if (fa >= 0) return a;
  let fb = rising(b);
  if (fb <= 0) return b;
  let lastSide = 0;
  let x = a;
  for (let step = 0; step < 200; step++) {
    const before = x;
    x = b - (fb * (b - a)) / (fb - fa);
    const fx = rising(x);
    if (fx === 0 || (step > 0 && Math.abs(x - before) < tolerance)) return x;
    if (fx > 0) {
      b = x;
      fb = fx;
      if (lastSide === 1) fa /= 2;
      lastSide = 1;
    } else {
      a = x;
      fa = fx;
      if (lastSide === -1) fb /= 2;
      lastSide = -1;
    }
  }
  return x;
}
