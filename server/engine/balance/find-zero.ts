export interface ZeroSearch {
  low: number;
  high: number;
  /** Where it is known already. */
  valueAtHigh?: number;
  /** A likely place of the zero; saves the walk from the ends. */
  guess?: number;
  /** In x. */
  tolerance?: number;
}

/**
 * Zero of a continuous rising function between two points that enclose it: false position, where an end that stays put
 * twice has its value halved (the Illinois rule). The low end is tried only when the guess lies above the zero's place.
 * When the ends do not enclose a zero the nearer end is given back. Shape: function, search → x. Source [DOWELL1971].
 */
export function findZero(rising: (x: number) => number, search: ZeroSearch): number {
  const { low, high, guess, tolerance = 1e-5 } = search;
  let b = high;
  let fb = search.valueAtHigh ?? rising(high);
  if (fb <= 0) return high;
  let a = low;
  let fa = Number.NaN;
  if (guess !== undefined && guess < high && guess > low) {
    const fGuess = rising(guess);
    if (fGuess <= 0) {
      a = guess;
      fa = fGuess;
    } else {
      // A straight line through both known points, drawn a little past its zero, nearly always lands below it.
      const line = guess - (1.05 * fGuess * (high - guess)) / Math.max(fb - fGuess, 1e-12 * fb);
      b = guess;
      fb = fGuess;
      if (line > low) {
        const fLine = rising(line);
        if (fLine <= 0) {
          a = line;
          fa = fLine;
        } else {
          b = line;
          fb = fLine;
        }
      }
    }
  }
  if (Number.isNaN(fa)) {
    fa = rising(low);
    if (fa >= 0) return low;
  }
  return falsePosition(rising, a, fa, b, fb, tolerance);
}

function falsePosition(
  rising: (x: number) => number,
  lowEnd: number,
  valueAtLow: number,
  highEnd: number,
  valueAtHigh: number,
  tolerance: number,
): number {
  let [a, fa, b, fb] = [lowEnd, valueAtLow, highEnd, valueAtHigh];
  let lastSide = 0;
  let x = a;
  for (let step = 0; step < 200; step++) {
    const before = x;
    x = b - (fb * (b - a)) / (fb - fa);
    // The next correction of a nearly straight function is far smaller than the last one.
    if (step > 0 && Math.abs(x - before) < tolerance) return x;
    const fx = rising(x);
    if (fx === 0) return x;
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
