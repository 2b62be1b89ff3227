/** What an export format is, and what it is given to write. */

import type { Rational } from '../algebra/index.ts';
import type { Derivation } from '../compile/index.ts';
import type { Diagram } from '../diagram/index.ts';

/**
 * How matrix entries are written: in the parameters where the formulas are of a length to be read, as reduced fractions where
 * the model is exact, or as the nearest doubles.
 */
export type Notation = 'symbols' | 'fractions' | 'decimals';

/** A drawing and what `compile` made of it. */
export interface Derived {
  readonly diagram: Diagram;
  readonly derivation: Derivation;
  /** Whether symbols write derived parameters out; otherwise they keep their names. */
  readonly expanded?: boolean;
  /** Where the model is the minimal one: the states of the drawing's model, and z = `change` · x. */
  readonly minimal?: { readonly of: readonly string[]; readonly change: readonly (readonly Rational[])[] };
}

/** What a format of scope `model` writes from. */
export interface ModelContext extends Derived {
  readonly notation: Notation;
}

interface FormatBase {
  /** As the command line names it. */
  readonly id: string;
  /** As the screen names it. */
  readonly label: string;
  /** Of its files, without the first point: `csv`, `model.json`. */
  readonly extension: string;
  readonly mime: string;
  /** Whether it writes bytes that are no text. */
  readonly isBinary: boolean;
}

/** A file about the model; there is none without a model. */
export interface ModelFormat extends FormatBase {
  readonly scope: 'model';
  readonly write: (context: ModelContext) => string | Uint8Array<ArrayBuffer>;
}

/** A file about the drawing; there is one whether the drawing has a model or not. */
export interface DrawingFormat extends FormatBase {
  readonly scope: 'drawing';
  readonly write: (diagram: Diagram) => string | Uint8Array<ArrayBuffer>;
}

export type Format = ModelFormat | DrawingFormat;
