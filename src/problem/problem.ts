/**
 * The codes of format.md and the shape of one problem. A code is never renamed: scripts outside the project read them.
 */

/** Codes that refuse the input or the model. */
export type ErrorCode =
  | 'not-readable'
  | 'not-writable'
  | 'too-large'
  | 'not-a-diagram'
  | 'wrong-version'
  | 'unknown-kind'
  | 'duplicate-id'
  | 'duplicate-name'
  | 'missing-block'
  | 'missing-port'
  | 'port-taken'
  | 'bad-value'
  | 'bad-expression'
  | 'unknown-parameter'
  | 'cyclic-parameters'
  | 'division-by-zero'
  | 'bad-option'
  | 'loop-without-solution'
  | 'derivative-of-input'
  | 'not-supported';

/** Codes of what is worth knowing about a model that stands. */
export type WarningCode =
  | 'port-not-connected'
  | 'irrational-value'
  | 'hidden-mode'
  | 'nearly-singular-loop'
  | 'order-lowered'
  | 'expression-undefined'
  | 'initial-state-lost';

/** One refusal, ready for the screen. */
export interface Problem {
  readonly code: ErrorCode;
  /** Ids of the blocks it concerns, in document order; a block inside groups as `outer.inner.id`. */
  readonly blocks: readonly string[];
  /** Name of the parameter it concerns, where it is one. */
  readonly parameter?: string;
  /** One sentence that names the block or parameter and says what is wrong, then what to do. */
  readonly message: string;
}

/** One warning of the model file. */
export interface Warning {
  readonly code: WarningCode;
  readonly blocks: readonly string[];
  readonly message: string;
}

/** A problem with its blocks or its parameter left out where it concerns none. */
export function problem(
  code: ErrorCode,
  message: string,
  concerns: { readonly blocks?: readonly string[]; readonly parameter?: string } = {},
): Problem {
  const base = { code, message, blocks: concerns.blocks ?? [] };
  return concerns.parameter === undefined ? base : { ...base, parameter: concerns.parameter };
}
