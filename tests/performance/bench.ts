/**
 * What a benchmark file holds. `tests/performance/NAME.bench.ts` exports one `Benchmark` as its default; `npm run bench`
 * warms it up, runs it and prints least, median and most milliseconds for every family and size.
 */

/** One family of inputs: at least five sizes, seeded, so that every run measures the same work. */
export interface Family {
  readonly name: string;
  readonly sizes: readonly number[];
  /** Makes the input of one size, unmeasured, and hands back the work to measure. */
  readonly prepare: (size: number) => (() => unknown) | Promise<() => unknown>;
}

export interface Benchmark {
  readonly title: string;
  /** What the reader has to know to trust the figures: what is compared, what is left out. */
  readonly note?: string;
  /** One of them degenerate: everything in one loop, all poles equal, or the like. */
  readonly families: readonly Family[];
  /** Lines below the table: what was measured beside time, digits that are right for instance. */
  readonly remarks?: () => readonly string[] | Promise<readonly string[]>;
}
