/**
 * What one block contributes to the equations: its own small state-space model. Nothing here knows of wires; the law of a
 * kind turns a block's fields into this and is all there is to say about that kind.
 */

/** A state that a block brings. */
export interface ContributedState {
  /** What follows the block's name in the state's name: '' or `_1`, `_2` … */
  readonly suffix: string;
  readonly initial: number;
  readonly unit?: string;
}

/**
 * ẋ = A x + B u, y = C x + D u + derivatives[0] u̇ + derivatives[1] ü + …, with n states, m inputs and p outputs.
 */
export interface Contribution<T> {
  /** n long. */
  readonly states: readonly ContributedState[];
  /** n × n. */
  readonly A: readonly (readonly T[])[];
  /** n × m. */
  readonly B: readonly (readonly T[])[];
  /** p × n. */
  readonly C: readonly (readonly T[])[];
  /** p × m. */
  readonly D: readonly (readonly T[])[];
  /** Not empty only for a block of one input and one output; the last is not zero. */
  readonly derivatives: readonly T[];
  /** Names of the states that differentiations bring where they act as lags: suffixes, as many as `derivatives`. */
  readonly derivativeSuffixes: readonly string[];
  /** Leading coefficients that came out as zero, as sentences about the block without its name. */
  readonly lowered: readonly string[];
}

const NOTHING: readonly never[] = [];

/** A block without states: y = D u. */
export function memoryless<T>(D: readonly (readonly T[])[]): Contribution<T> {
  return {
    states: NOTHING,
    A: NOTHING,
    B: NOTHING,
    C: NOTHING,
    D,
    derivatives: NOTHING,
    derivativeSuffixes: NOTHING,
    lowered: NOTHING,
  };
}
