/** Asks numpy and scipy, on one thread, for what the benchmarks compare with. */

import { execFileSync } from 'node:child_process';
import { join } from 'node:path';
import { toRows } from '../../src/algebra/index.ts';
import type { StateSpace } from '../../src/compile/index.ts';

/** Milliseconds and answers; `unit` is the time of the eigenvalues of a standard normal 200 × 200 matrix. */
interface Reference {
  readonly numpy: string;
  readonly kernel: string;
  readonly unit: number;
  readonly models: readonly {
    readonly eigenvalues: number;
    readonly step: number;
    readonly frequency: number;
    readonly poles: readonly (readonly [number, number])[];
    readonly y: readonly number[];
    readonly h: readonly (readonly [number, number])[];
  }[];
}

/** A and the columns and rows that numpy needs, as doubles. */
export function asDoubles({ numeric: { A, B, C } }: StateSpace, times: readonly number[], omega: readonly number[]) {
  const rows = (M: typeof A) => toRows(M, 0);
  return { A: rows(A), b: rows(B).flat(), c: rows(C).flat(), times, omega };
}

/** Times and solves the models by numeric_reference.py. */
export function reference(models: readonly ReturnType<typeof asDoubles>[]): Reference {
  const script = join(process.cwd(), 'tests', 'performance', 'numeric_reference.py');
  const answer = execFileSync('python3', [script], {
    input: JSON.stringify({ models }),
    encoding: 'utf8',
    env: { ...process.env, OPENBLAS_NUM_THREADS: '1' },
    maxBuffer: 1 << 28,
  });
  return JSON.parse(answer) as Reference; // our own script's answer
}
