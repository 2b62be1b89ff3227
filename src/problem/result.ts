/**
 * A value or the problems that stand in its way. A stage collects all its problems, then the next stage is not entered.
 */

import type { Problem } from './problem.ts';

/** `problems` is never empty. */
export type Result<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problems: readonly Problem[] };

/** A success. */
export function ok<T>(value: T): Result<T> {
  return { ok: true, value };
}

/** A refusal by one or more problems. */
export function fail(...problems: readonly [Problem, ...Problem[]]): Result<never> {
  return { ok: false, problems };
}

/** All values in order, or every problem of those that failed. */
export function combine<T>(results: readonly Result<T>[]): Result<T[]> {
  const values: T[] = [];
  const problems: Problem[] = [];
  for (const result of results) {
    if (result.ok) values.push(result.value);
    else problems.push(...result.problems);
  }
  return problems.length > 0 ? { ok: false, problems } : ok(values);
}
