/**
 * Solves A x = b in place for the small systems of the cover balance; b becomes x, A is destroyed. Row pivoting.
 *
 * Shapes: A row after row in one list of n × n, b of n. Errors: a plain Error when A is singular.
 */
export function solveFlat(a: Float64Array, b: Float64Array, n: number): void {
  for (let column = 0; column < n; column += 1) {
    let best = column;
    for (let row = column + 1; row < n; row += 1) {
      if (Math.abs(a[row * n + column] as number) > Math.abs(a[best * n + column] as number)) best = row;
    }
    const lead = a[best * n + column] as number;
    if (Math.abs(lead) < 1e-14) throw new Error("singular system");
    if (best !== column) swapRows(a, b, n, best, column);
    for (let row = column + 1; row < n; row += 1) {
      const factor = (a[row * n + column] as number) / lead;
      if (factor === 0) continue;
      for (let k = column; k < n; k += 1) {
        a[row * n + k] = (a[row * n + k] as number) - factor * (a[column * n + k] as number);
      }
      b[row] = (b[row] as number) - factor * (b[column] as number);
    }
  }
  for (let row = n - 1; row >= 0; row -= 1) {
    let value = b[row] as number;
    for (let k = row + 1; k < n; k += 1) value -= (a[row * n + k] as number) * (b[k] as number);
    b[row] = value / (a[row * n + row] as number);
  }
}

function swapRows(a: Float64Array, b: Float64Array, n: number, one: number, other: number): void {
  for (let k = 0; k < n; k += 1) {
    const kept = a[one * n + k] as number;
    a[one * n + k] = a[other * n + k] as number;
    a[other * n + k] = kept;
  }
  const kept = b[one] as number;
  b[one] = b[other] as number;
  b[other] = kept;
}
