/**
 * Solves the drawing's raw equations directly: one row an unknown, y − Σ gain · y_source = what comes from outside. Nothing
 * is eliminated beforehand and no state is introduced.
 */

import { type BlockBehaviour, behaviour, type Setting } from './block-behaviour.ts';
import { type Complex, ZERO } from './complex.ts';
import { type ComplexSystem, type ComplexVector, SystemWriter } from './complex-system.ts';
import { factorComplex } from './factor-complex.ts';
import type { RawBlock, RawDrawing } from './raw-drawing.ts';
import { type RawLaw, stateCount } from './raw-laws.ts';
import { solveRefined } from './solve-complex.ts';

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
  const behaviours = behavioursOf(laws, setting);
  const system = behaviours === null ? null : writeSystem(drawing, laws, behaviours);
  const factors = system === null ? null : factorComplex(system);
  if (behaviours === null || system === null || factors === null) return null;
  return drives.map(drive => {
    const y = solveRefined(system, factors, rightSide(drawing, behaviours, drive));
    return readAnswer(drawing, behaviours, drive, unknown =>
      unknown < 0 ? ZERO : { re: y.re[unknown]!, im: y.im[unknown]! },
    );
  });
}

/** The behaviour of each block with states, null for the others; null in all where s is a pole of one. */
function behavioursOf(laws: readonly RawLaw[], setting: Setting): (BlockBehaviour | null)[] | null {
  const behaviours: (BlockBehaviour | null)[] = [];
  for (const law of laws) {
    const own = law.kind === 'static' ? null : behaviour(law, setting);
    if (own === null && law.kind !== 'static') return null;
    behaviours.push(own);
  }
  return behaviours;
}

/** One row an unknown, in their order; those of external inputs hold nothing else. */
function writeSystem(
  { unknowns, blocks }: RawDrawing,
  laws: readonly RawLaw[],
  behaviours: readonly (BlockBehaviour | null)[],
): ComplexSystem {
  const writer = new SystemWriter();
  let written = 0;
  const begin = () => writer.add(written, 1, 0);
  const end = () => {
    writer.endRow();
    written += 1;
  };
  const writeInputsUpTo = (unknown: number) => {
    while (written < unknown) {
      begin();
      end();
    }
  };
  blocks.forEach(({ firstUnknown, fedBy }, b) => {
    writeInputsUpTo(firstUnknown);
    const law = laws[b]!;
    const gains = law.kind === 'static' ? law.gains : behaviours[b]!.gains;
    for (const row of gains) {
      begin();
      row.forEach((gain, port) => {
        const source = fedBy[port]!;
        if (source < 0) return;
        if (typeof gain === 'number') writer.add(source, -gain, 0);
        else writer.add(source, -gain.re, -gain.im);
      });
      end();
    }
  });
  writeInputsUpTo(unknowns);
  return writer.finish();
}

function rightSide(
  { unknowns, inputs, blocks }: RawDrawing,
  behaviours: readonly (BlockBehaviour | null)[],
  drive: Drive,
): ComplexVector {
  const right = { re: new Float64Array(unknowns), im: new Float64Array(unknowns) };
  inputs.forEach((unknown, j) => {
    right.re[unknown] = drive.inputs[j]!;
  });
  blocks.forEach((block, b) => {
    behaviours[b]?.fromStates(statesOf(block, drive)).forEach((value, o) => {
      right.re[block.firstUnknown + o] = value.re;
      right.im[block.firstUnknown + o] = value.im;
    });
  });
  return right;
}

function statesOf({ law, firstState }: RawBlock, { states }: Drive): readonly number[] {
  return states.slice(firstState, firstState + stateCount(law));
}

function readAnswer(
  { blocks, outputs }: RawDrawing,
  behaviours: readonly (BlockBehaviour | null)[],
  drive: Drive,
  unknownAt: (unknown: number) => Complex,
): Answer {
  const states: Complex[] = [];
  const derivatives: Complex[] = [];
  const sizes: number[] = [];
  blocks.forEach((block, b) => {
    const own = behaviours[b];
    if (own === null || own === undefined) return;
    const { x, derivative, size } = own.readStates(statesOf(block, drive), block.fedBy.map(unknownAt));
    states.push(...x);
    derivatives.push(...derivative);
    sizes.push(...size);
  });
  return { drive, states, derivatives, sizes, outputs: outputs.map(unknownAt) };
}
