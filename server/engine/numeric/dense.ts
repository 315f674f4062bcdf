/**
 * Solves A X = B by elimination with row pivoting; A and B are overwritten. For the small systems of this engine (up to about
 * 25 unknowns).
 *
 * Shapes: A n × n, B n × m as lists of rows; result X n × m (the rows of B).
 * Errors: a plain Error when A is singular, which no checked input of the engine can bring about.
 */
export function solveDense(a: Float64Array[], b: Float64Array[]): Float64Array[] {
  const n = a.length;
  for (let column = 0; column < n; column += 1) {
    pivot(a, b, column);
    const lead = a[column] as Float64Array;
    const leadRight = b[column] as Float64Array;
    for (let row = 0; row < n; row += 1) {
      if (row === column) continue;
      const line = a[row] as Float64Array;
      const factor = (line[column] as number) / (lead[column] as number);
      if (factor === 0) continue;
      for (let k = column; k < n; k += 1) line[k] = (line[k] as number) - factor * (lead[k] as number);
      const lineRight = b[row] as Float64Array;
      for (let k = 0; k < lineRight.length; k += 1) {
        lineRight[k] = (lineRight[k] as number) - factor * (leadRight[k] as number);
      }
    }
  }
  for (let row = 0; row < n; row += 1) {
    const scale = (a[row] as Float64Array)[row] as number;
    const line = b[row] as Float64Array;
    for (let k = 0; k < line.length; k += 1) line[k] = (line[k] as number) / scale;
  }
  return b;
}

function pivot(a: Float64Array[], b: Float64Array[], column: number): void {
  let best = column;
  for (let row = column + 1; row < a.length; row += 1) {
    if (Math.abs(a[row]?.[column] ?? 0) > Math.abs(a[best]?.[column] ?? 0)) best = row;
  }
  if (Math.abs(a[best]?.[column] ?? 0) < 1e-14) throw new Error("singular system");
  if (best === column) return;
  [a[column], a[best]] = [a[best] as Float64Array, a[column] as Float64Array];
  [b[column], b[best]] = [b[best] as Float64Array, b[column] as Float64Array];
}
