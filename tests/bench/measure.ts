export interface Measured {
  name: string;
  runs: number;
  /** Milliseconds. */
  median: number;
  p95: number;
  slowest: number;
}

/** Runs `act` until `runs` timings are in hand, after a warm-up as long. Milliseconds by the monotonic clock. */
export async function measure(name: string, runs: number, act: () => unknown): Promise<Measured> {
  for (let warm = 0; warm < runs; warm += 1) await act();
  const times: number[] = [];
  for (let run = 0; run < runs; run += 1) {
    const start = performance.now();
    await act();
    times.push(performance.now() - start);
  }
  times.sort((a, b) => a - b);
  const at = (share: number) => times[Math.min(times.length - 1, Math.floor(times.length * share))] ?? NaN;
  return { name, runs, median: at(0.5), p95: at(0.95), slowest: at(1) };
}

/** A line a measurement, figures in columns. */
export function printTable(title: string, rows: readonly Measured[]): void {
  const width = Math.max(...rows.map(({ name }) => name.length));
  const ms = (value: number) => value.toFixed(2).padStart(9);
  console.log(`\n${title}`);
  console.log(`${'ms'.padEnd(width)}    median      95 %   slowest   runs`);
  for (const { name, runs, median, p95, slowest } of rows) {
    console.log(`${name.padEnd(width)} ${ms(median)} ${ms(p95)} ${ms(slowest)} ${String(runs).padStart(6)}`);
  }
}
