/** The one table from a problem's code to the exit status of the command line (format.md, Command line). */

import type { ErrorCode, Problem } from './problem.ts';

/** 2: the input cannot be used. 3: the diagram is read but has no state-space model. */
export const EXIT_STATUS: Readonly<Record<ErrorCode, 2 | 3>> = {
  'not-readable': 2,
  'not-writable': 2,
  'too-large': 2,
  'not-a-diagram': 2,
  'wrong-version': 2,
  'unknown-kind': 2,
  'duplicate-id': 2,
  'duplicate-name': 2,
  'missing-block': 2,
  'missing-port': 2,
  'port-taken': 2,
  'bad-value': 2,
  'bad-expression': 2,
  'unknown-parameter': 2,
  'cyclic-parameters': 2,
  'division-by-zero': 2,
  'bad-option': 2,
  'loop-without-solution': 3,
  'derivative-of-input': 3,
  'not-supported': 3,
};

/** The lowest status among the problems: an input that cannot be used outranks a model that does not exist. */
export function exitStatus(problems: readonly Problem[]): 2 | 3 {
  return problems.some(({ code }) => EXIT_STATUS[code] === 2) ? 2 : 3;
}
