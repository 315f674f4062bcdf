/**
 * Where a function that changes sign once between two ends crosses zero, by halving.
 *
 * Shape: function, two ends, width at which to stop → argument. The ends must lie on either side of zero; where they do not, the
 * end nearer to zero is returned. Errors none. Source: halving of intervals.
 */
export function bisect(value: (x: number) => number, low: number, high: number, width: number): number {
  const atLow = value(low);
  const atHigh = value(high);
  if (atLow === 0) return low;
  if (atLow > 0 === atHigh > 0) return Math.abs(atLow) < Math.abs(atHigh) ? low : high;
  const risesUp = atHigh > atLow;
  let left = low;
  let right = high;
  // 200 halvings are beyond the precision of any double, so the loop always ends.
  for (let step = 0; step < 200 && right - left > width; step += 1) {
    const middle = (left + right) / 2;
    if (value(middle) > 0 === risesUp) right = middle;
    else left = middle;
  }
  return (left + right) / 2;
}
