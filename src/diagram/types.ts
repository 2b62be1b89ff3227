/**
 * The document: plain immutable data, the same in memory, in a file and in a link (format.md, version 1). Every edit is a
 * pure function Diagram → Diagram that keeps the identity of what it did not change.
 */

import type { Requirement } from './requirements/index.ts';

/** Arithmetic as text, exact (format.md, Expressions). A JSON number in a file becomes its shortest decimal. */
export type Quantity = string;

/** Sheet units, x to the right, y downwards. */
export type Point = readonly [x: number, y: number];

interface BlockBase {
  /** `[A-Za-z][A-Za-z0-9_]*`, unique on its sheet. */
  readonly id: string;
  /** The block's centre. A block without it is placed when the drawing is opened. */
  readonly at?: Point;
  /** The signal or state name shown and exported; the id where absent. */
  readonly name?: string;
  /** The signal runs right to left. */
  readonly mirrored?: boolean;
  readonly note?: string;
}

export interface InputBlock extends BlockBase {
  readonly kind: 'input';
  readonly unit?: string;
}
export interface OutputBlock extends BlockBase {
  readonly kind: 'output';
  readonly unit?: string;
}
export interface GainBlock extends BlockBase {
  readonly kind: 'gain';
  readonly gain: Quantity;
}
export interface SummerBlock extends BlockBase {
  readonly kind: 'summer';
  /** A string of `+` and `-`, 1 to 16 long, one for each input port. */
  readonly signs: string;
}
export interface IntegratorBlock extends BlockBase {
  readonly kind: 'integrator';
  readonly initial?: Quantity;
  readonly unit?: string;
}
export interface TransferFunctionBlock extends BlockBase {
  readonly kind: 'transfer-function';
  /** Polynomials in s. */
  readonly numerator: Quantity;
  readonly denominator: Quantity;
}
export interface StateModelBlock extends BlockBase {
  readonly kind: 'state-model';
  /** Rows of expressions: A n × n, B n × m, C p × n, D p × m. */
  readonly A: readonly (readonly Quantity[])[];
  readonly B: readonly (readonly Quantity[])[];
  readonly C: readonly (readonly Quantity[])[];
  readonly D: readonly (readonly Quantity[])[];
  readonly initial?: readonly Quantity[];
}
export interface DelayBlock extends BlockBase {
  readonly kind: 'delay';
  /** Seconds. */
  readonly time: Quantity;
  /** Order of the Padé approximant, 1 to 10; 2 where absent. */
  readonly order?: number;
}
export interface DifferentiatorBlock extends BlockBase {
  readonly kind: 'differentiator';
}
export interface LimiterBlock extends BlockBase {
  readonly kind: 'limiter';
  readonly lower: Quantity;
  readonly upper: Quantity;
}
export interface GroupBlock extends BlockBase {
  readonly kind: 'group';
  readonly sheet: Sheet;
}

export type Block =
  | InputBlock
  | OutputBlock
  | GainBlock
  | SummerBlock
  | IntegratorBlock
  | TransferFunctionBlock
  | StateModelBlock
  | DelayBlock
  | DifferentiatorBlock
  | LimiterBlock
  | GroupBlock;

export type BlockKind = Block['kind'];

/** One end of a wire: block id and port, counted from 0. */
export type PortReference = readonly [block: string, port: number];

export interface Wire {
  readonly from: PortReference;
  readonly to: PortReference;
  /** The signal's name. */
  readonly name?: string;
  /** Bend points, in order from the output to the input. */
  readonly via?: readonly Point[];
}

/** What stands on a sheet for the reader alone: a text, or a frame around blocks with its title. */
export interface Annotation {
  /** As a block's id, unique among the sheet's annotations. */
  readonly id: string;
  readonly kind: 'text' | 'frame';
  /** The upper left corner. */
  readonly at: Point;
  /** Sheet units. A text is set in its width, and takes more height where it needs it. */
  readonly size: readonly [width: number, height: number];
  /** The text, or the title of the frame; may be empty. */
  readonly text: string;
}

/** Blocks and wires in document order: states, inputs and outputs take theirs from it. */
export interface Sheet {
  readonly blocks: readonly Block[];
  readonly wires: readonly Wire[];
  /** From the lowest to the uppermost, all behind wires and blocks. Absent where there is none. */
  readonly annotations?: readonly Annotation[];
}

export interface Parameter {
  readonly name: string;
  readonly value: Quantity;
  readonly unit?: string;
  /** A plus-or-minus amount: `"10 %"` or an absolute expression. */
  readonly tolerance?: string;
  readonly note?: string;
  /** Ends of the slider, as arithmetic without parameters; a range around the value where absent. */
  readonly range?: readonly [low: Quantity, high: Quantity];
}

/** Where a loop is opened to measure its margins: the wire of the top sheet that ends at an input port. */
export interface Cut {
  readonly to: PortReference;
  /** `cut 1`, by its place in the list, where absent. */
  readonly name?: string;
}

export interface Diagram extends Sheet {
  readonly format: 'poleward-diagram';
  readonly version: 1;
  readonly title: string;
  readonly notes?: string;
  /** Title block fields, free text. */
  readonly revision?: string;
  readonly date?: string;
  readonly author?: string;
  readonly parameters: readonly Parameter[];
  /** Absent where there is none. */
  readonly cuts?: readonly Cut[];
  /** What the loop has to do; absent where nothing is asked of it. */
  readonly requirements?: readonly Requirement[];
}
