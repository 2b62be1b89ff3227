/**
 * What a user can cause, as a value. Every stage from text to files returns a `Result`; the screen, the command line and
 * the exit status all read the same `Problem`. Stands below every other folder and imports none.
 */

export { EXIT_STATUS, exitStatus } from './exit-status.ts';
export type { ErrorCode, Problem, Warning, WarningCode } from './problem.ts';
export { problem } from './problem.ts';
export type { Result } from './result.ts';
export { combine, fail, ok } from './result.ts';
