/**
 * Solves the drawing's raw equations directly: one row an unknown, y − Σ gain · y_source = what comes from outside. Nothing
 * is eliminated beforehand and no state is introduced.
 */

import { type BlockBehaviour, behaviour, type Setting } from './block-behaviour.ts';
import { type Complex, multiply, real, ZERO } from './complex.ts';
import type { RawBlock, RawDrawing } from './raw-drawing.ts';
import { type RawLaw, stateCount } from './raw-laws.ts';
import { type ComplexRow, copyRow, factorComplex, solveRefined } from './sparse-complex-lu.ts';

/** What a drawing is driven with: its external inputs, and initial or held values of its states. */
export interface Drive {
  readonly inputs: readonly number[];
  readonly states: readonly number[];
}

/** What it answers. */
export interface Answer {
  readonly drive: Drive;
  readonly states: readonly Complex[];
  readonly derivatives: readonly Complex[];
  /** Sizes of the terms that made the derivatives. */
  readonly sizes: readonly number[];
  readonly outputs: readonly Complex[];
}

/**
 * The answers to some drives; null where the drawing has none at this frequency.
 *
 * @param laws  The law of each block of the drawing, as it is or with its coefficients changed a little.
 */
export function solveDrawing(
  drawing: RawDrawing,
  setting: Setting,
  drives: readonly Drive[],
  laws: readonly RawLaw[],
): readonly Answer[] | null {
  const behaviours: BlockBehaviour[] = [];
  for (const law of laws) {
    const own = behaviour(law, setting);
    if (own === null) return null;
    behaviours.push(own);
  }
  const rows = writeRows(drawing, behaviours);
  const factors = factorComplex(rows.map(copyRow));
  if (factors === null) return null;
  return drives.map(drive => {
    const re = new Float64Array(drawing.unknowns);
    const im = new Float64Array(drawing.unknowns);
    drawing.inputs.forEach((unknown, j) => {
      re[unknown] = drive.inputs[j]!;
    });
    drawing.blocks.forEach((block, b) => {
      behaviours[b]!.fromStates(statesOf(block, drive)).forEach((value, o) => {
        re[block.firstUnknown + o] = value.re;
        im[block.firstUnknown + o] = value.im;
      });
    });
    const y = solveRefined(rows, factors, re, im);
    return readAnswer(drawing, behaviours, drive, unknown =>
      unknown < 0 ? ZERO : { re: y.re[unknown]!, im: y.im[unknown]! },
    );
  });
}

const NONE: readonly number[] = [];

function statesOf({ law, firstState }: RawBlock, { states }: Drive): readonly number[] {
  const count = stateCount(law);
  return count === 0 ? NONE : states.slice(firstState, firstState + count);
}

function writeRows({ unknowns, blocks }: RawDrawing, behaviours: readonly BlockBehaviour[]): readonly ComplexRow[] {
  const rows = Array.from({ length: unknowns }, (_, y): ComplexRow => ({ column: [y], re: [1], im: [0] }));
  blocks.forEach(({ firstUnknown, fedBy }, b) => {
    behaviours[b]!.gains.forEach((gains, o) => {
      const row = rows[firstUnknown + o]!;
      gains.forEach((gain, port) => {
        if (fedBy[port]! >= 0) addToRow(row, fedBy[port]!, multiply(real(-1), gain));
      });
    });
  });
  return rows;
}

function addToRow(row: ComplexRow, column: number, { re, im }: Complex): void {
  const at = row.column.indexOf(column);
  if (at >= 0) {
    row.re[at]! += re;
    row.im[at]! += im;
  } else if (re !== 0 || im !== 0) {
    row.column.push(column);
    row.re.push(re);
    row.im.push(im);
  }
}

function readAnswer(
  { blocks, outputs }: RawDrawing,
  behaviours: readonly BlockBehaviour[],
  drive: Drive,
  unknownAt: (unknown: number) => Complex,
): Answer {
  const states: Complex[] = [];
  const derivatives: Complex[] = [];
  const sizes: number[] = [];
  blocks.forEach((block, b) => {
    const values = statesOf(block, drive);
    if (values.length === 0) return;
    const { x, derivative, size } = behaviours[b]!.readStates(values, block.fedBy.map(unknownAt));
    states.push(...x);
    derivatives.push(...derivative);
    sizes.push(...size);
  });
  return { drive, states, derivatives, sizes, outputs: outputs.map(unknownAt) };
}
