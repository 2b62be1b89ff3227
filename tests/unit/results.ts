/** Taking results apart in tests: the value or the problems, and a failure that shows which it was. */

import type { Result } from '../../src/problem/index.ts';

/** The value of a success; throws with the messages otherwise. */
export function valueOf<T>(result: Result<T>): T {
  if (result.ok) return result.value;
  throw new Error(result.problems.map(({ code, message }) => `${code}: ${message}`).join('\n'));
}

/** `code: message` of each problem; throws where there is none. */
export function problemsOf(result: Result<unknown>): string[] {
  if (result.ok) throw new Error('nothing was refused');
  return result.problems.map(({ code, message }) => `${code}: ${message}`);
}
