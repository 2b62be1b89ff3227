/**
 * The stated effort of symbolic work. Polynomials in many parameters can outgrow any machine, so every routine of this
 * folder counts what it does and stops at a limit instead of hanging. The count is of term operations, not of time: the
 * same input stops at the same place everywhere.
 */

import { bitLength } from '../integer.ts';

/** What symbolic work may cost. */
export interface EffortLimits {
  /** Most terms that a polynomial may have; on its way a sum of products may hold twenty times as many. */
  readonly maximumTerms: number;
  /** Most products of two terms (of coefficients up to 63 bits; longer ones count by the product of their lengths). */
  readonly maximumOperations: number;
}

/**
 * The limits where none are given. 5,000 terms fill more than a hundred screen lines, so a longer formula tells nobody
 * anything. 3 million operations took half a second to three seconds of processor time (Node 20, 2 cores); a loop of 24
 * blocks and 48 wires with a gain each takes some 100,000.
 */
export const DEFAULT_LIMITS: EffortLimits = { maximumTerms: 5_000, maximumOperations: 3_000_000 };

/** Fraction-free elimination divides sums of products that are longer than their quotients by about the divisor's length. */
const GATHERING_ROOM = 20;

/**
 * Exponents beyond this are refused. No formula of a drawing comes near; it keeps packed exponents exact by a wide margin
 * and the value of a power at a number of 300 digits within some megabytes.
 */
export const MAXIMUM_EXPONENT = 10_000;

/** Which limit was met: of terms, of operations, or of the exponent of one parameter. */
export type EffortLimit = 'terms' | 'operations' | 'exponent';

/**
 * The one signal that symbolic work throws when its effort is spent. It is internal: a caller runs the work in
 * `withinEffort` and turns the answer into a message; it never reaches the screen.
 */
export class EffortSpent extends Error {
  readonly limit: EffortLimit;

  constructor(limit: EffortLimit) {
    super(`symbolic work stopped at its limit of ${limit}`);
    this.name = 'EffortSpent';
    this.limit = limit;
  }
}

/** A running count against limits; shared by all the work that is to stop together. */
export class Effort {
  readonly limits: EffortLimits;
  private operations = 0;

  constructor(limits: Partial<EffortLimits> = {}) {
    this.limits = { ...DEFAULT_LIMITS, ...limits };
  }

  /** Operations counted so far. */
  get spent(): number {
    return this.operations;
  }

  /** Counts operations; throws `EffortSpent` once the limit is passed, and on every later call. */
  spend(operations: number): void {
    this.operations += operations;
    if (this.operations > this.limits.maximumOperations) throw new EffortSpent('operations');
  }

  /** Throws `EffortSpent` for a sum of products that gathers more terms than it may on its way. */
  holdGathered(terms: number): void {
    if (terms > this.limits.maximumTerms * GATHERING_ROOM) throw new EffortSpent('terms');
  }

  /** Throws `EffortSpent` for a polynomial of more terms than allowed. */
  holdTerms(terms: number): void {
    if (terms > this.limits.maximumTerms) throw new EffortSpent('terms');
  }
}

/** What came of work under an effort: its value, or the limit at which it stopped. */
export type EffortOutcome<T> =
  | { readonly finished: true; readonly value: T }
  | { readonly finished: false; readonly limit: EffortLimit };

/** Runs symbolic work and catches the signal of spent effort, that one alone. */
export function withinEffort<T>(work: () => T): EffortOutcome<T> {
  try {
    return { finished: true, value: work() };
  } catch (signal) {
    if (signal instanceof EffortSpent) return { finished: false, limit: signal.limit };
    throw signal;
  }
}

const WORD = 1n << 63n;

/** Length of the longest coefficient in 64-bit words, at least 1: what one product with it counts. */
export function wordsOf(coefficients: readonly bigint[]): number {
  let words = 1;
  for (const coefficient of coefficients) {
    if (coefficient < WORD && coefficient > -WORD) continue;
    words = Math.max(words, Math.ceil(bitLength(coefficient) / 64));
  }
  return words;
}
