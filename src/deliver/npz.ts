/**
 * The model as a NumPy archive: arrays in the `.npy` format, version 1.0 (NumPy, format specification of `numpy.lib.format`),
 * in a zip. A, B, C, D are two-dimensional, x0 one-dimensional, all little-endian doubles in C order; states, inputs and
 * outputs are arrays of text, title and caution text without a dimension.
 */

import { zipped } from './archive.ts';
import { CAUTION } from './caution.ts';
import { numericRows } from './entries.ts';
import type { ModelContext } from './format.ts';

/** `\x93NUMPY` and version 1.0. */
const MAGIC = [0x93, 0x4e, 0x55, 0x4d, 0x50, 0x59, 1, 0];
/** The specification has the values start at a multiple of this. */
const ALIGNMENT = 64;

/** The archive. */
export function writeNpz({ derivation: { model } }: ModelContext) {
  const { states, inputs, outputs, initialState, title } = model;
  const rows = numericRows(model);
  const matrix = (name: string, values: readonly (readonly number[])[], columns: number) => ({
    name: `${name}.npy`,
    content: doubles(values.flat(), [values.length, columns]),
  });
  const names = (name: string, signals: readonly { readonly name: string }[]) => ({
    name: `${name}.npy`,
    content: texts(
      signals.map(signal => signal.name),
      [signals.length],
    ),
  });
  return zipped([
    matrix('A', rows.A, states.length),
    matrix('B', rows.B, inputs.length),
    matrix('C', rows.C, states.length),
    matrix('D', rows.D, inputs.length),
    { name: 'x0.npy', content: doubles(initialState, [states.length]) },
    names('states', states),
    names('inputs', inputs),
    names('outputs', outputs),
    { name: 'title.npy', content: texts([title], []) },
    { name: 'caution.npy', content: texts([CAUTION], []) },
  ]);
}

function doubles(values: readonly number[], shape: readonly number[]): Uint8Array {
  const view = new DataView(new ArrayBuffer(8 * values.length));
  values.forEach((value, i) => {
    view.setFloat64(8 * i, value, true);
  });
  return npy('<f8', shape, new Uint8Array(view.buffer));
}

/**
 * Text of one length for all, counted in code points, each a little-endian 32-bit word, zero behind the end. Half a
 * surrogate pair is no character and would not be read back; U+FFFD stands for it.
 */
function texts(values: readonly string[], shape: readonly number[]): Uint8Array {
  const characters = values.map(value => Array.from(value.replace(/\p{Surrogate}/gu, '\uFFFD')));
  const codes = characters.map(list => list.map(character => character.codePointAt(0) ?? 0));
  const length = Math.max(1, ...codes.map(code => code.length));
  const view = new DataView(new ArrayBuffer(4 * length * values.length));
  codes.forEach((code, i) => {
    code.forEach((point, k) => {
      view.setUint32(4 * (i * length + k), point, true);
    });
  });
  return npy(`<U${length}`, shape, new Uint8Array(view.buffer));
}

/** One array with its header: a Python dictionary, padded with spaces to the alignment and ended by a line break. */
function npy(type: string, shape: readonly number[], values: Uint8Array): Uint8Array {
  // A tuple of one keeps its comma.
  const tuple = shape.length === 1 ? `(${shape[0]},)` : `(${shape.join(', ')})`;
  const dictionary = `{'descr': '${type}', 'fortran_order': False, 'shape': ${tuple}, }`;
  const prefix = MAGIC.length + 2;
  const size = Math.ceil((prefix + dictionary.length + 1) / ALIGNMENT) * ALIGNMENT;
  const header = `${dictionary.padEnd(size - prefix - 1)}\n`;
  const bytes = new Uint8Array(size + values.length);
  bytes.set(MAGIC);
  new DataView(bytes.buffer).setUint16(MAGIC.length, header.length, true);
  bytes.set(
    Array.from(header, character => character.charCodeAt(0)),
    prefix,
  );
  bytes.set(values, size);
  return bytes;
}
