/**
 * Why an entry of A, B, C or D is what it is, as plain data for the screen: action paths and loops with their blocks and wires,
 * and the value as path products times cofactors over the loops' determinant, in numbers and in symbols.
 */

import type { Rational } from '../../algebra/index.ts';
import type { WireEnd } from './traced-parts.ts';

/** A place of the system matrix [A, B; C, D]: rows are the states, then the outputs; columns the states, then the inputs. */
export interface EntryPlace {
  readonly row: number;
  readonly column: number;
}

/** A number with the expression in the parameters that it comes of. */
export interface TracedValue {
  readonly exact: Rational;
  /** Null where it takes more effort than allowed, or is longer than a sentence can hold. */
  readonly symbols: string | null;
}

/** A block on a path, in the words of the screen. */
export interface TracedStep {
  /** `summing point`, `integrator`; empty for a gain, which is called by what is written in it. */
  readonly word: string;
  /** A name or an expression: `omega`, `1/J`; empty where the word says it all. */
  readonly math: string;
}

/** A path or a loop along the drawing. */
export interface TracedWalk {
  /** The blocks it passes, in order, without the boundaries of groups. */
  readonly steps: readonly TracedStep[];
  /** The same blocks as `outer.inner.id`. */
  readonly blocks: readonly string[];
  readonly wires: readonly WireEnd[];
  /** The product of its gains. */
  readonly product: TracedValue;
}

export interface TracedPath extends TracedWalk {
  /** The determinant of the loops that the path does not touch; 1 where it touches all. */
  readonly cofactor: TracedValue;
}

/** A row or column of the entry. */
export interface EntryEnd {
  readonly name: string;
  /** `outer.inner.id`. */
  readonly block: string;
  readonly kind: 'state' | 'derivative' | 'input' | 'output';
}

/** What stands in the drawing for the entry, whether it could be traced or not. */
interface Ends {
  readonly from: EntryEnd;
  readonly to: EntryEnd;
  /** Everything on a way from the one to the other, loops included, in document order. */
  readonly blocks: readonly string[];
  readonly wires: readonly WireEnd[];
}

/** An entry explained, or a sentence that says why not. */
export type Trace =
  | (Ends & {
      readonly outcome: 'traced';
      readonly value: TracedValue;
      /** None where the entry is zero for want of a path. */
      readonly paths: readonly TracedPath[];
      readonly loops: readonly TracedWalk[];
      /** 1 where there is no loop. */
      readonly determinant: TracedValue;
    })
  | (Ends & { readonly outcome: 'not-traced'; readonly reason: string });
