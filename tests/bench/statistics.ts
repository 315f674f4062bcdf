/** The value below which a share of the list lies. */
export function quantile(values: number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? Number.NaN;
}

export const median = (values: number[]) => quantile(values, 0.5);

/** Milliseconds of each of `runs` calls. */
export async function timings(runs: number, work: () => unknown): Promise<number[]> {
  const times: number[] = [];
  for (let index = 0; index < runs; index += 1) {
    const start = performance.now();
    await work();
    times.push(performance.now() - start);
  }
  return times;
}

/** Milliseconds of `runs` calls, `people` of them always under way. */
export async function timingsTogether(
  runs: number,
  people: number,
  work: () => Promise<unknown>,
): Promise<number[]> {
  const each = Math.ceil(runs / people);
  const lists = await Promise.all(Array.from({ length: people }, () => timings(each, work)));
  return lists.flat();
}
