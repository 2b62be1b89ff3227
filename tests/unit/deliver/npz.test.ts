/** The archive read back by the rules of the `.npy` format, version 1.0, and by numpy where it is installed. */

import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { unzipSync } from 'fflate';
import { describe, expect, test } from 'vitest';
import { CAUTION } from '../../../src/deliver/index.ts';
import { derivationOf, EMPTY, type HandModel, MOTOR, MOTOR_NUMBERS, STATIC } from './derivations.ts';
import { hasPython, python } from './python.ts';
import { bytesIn } from './written.ts';

interface NpyArray {
  readonly type: string;
  readonly shape: readonly number[];
  readonly values: readonly (number | string)[];
}

function readNpy(bytes: Uint8Array): NpyArray {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.length);
  expect([...bytes.subarray(0, 8)]).toEqual([0x93, ...Buffer.from('NUMPY'), 1, 0]);
  const start = 10 + view.getUint16(8, true);
  expect(start % 64).toBe(0);
  const header = Buffer.from(bytes.subarray(10, start)).toString('latin1');
  const [, type = '', tuple = ''] =
    /^\{'descr': '([^']+)', 'fortran_order': False, 'shape': \(([\d, ]*)\), \} *\n$/.exec(header) ?? [];
  const shape = tuple
    .split(',')
    .filter(part => part.trim() !== '')
    .map(Number);
  const count = shape.reduce((product, length) => product * length, 1);
  const width = type.startsWith('<U') ? 4 * Number(type.slice(2)) : 8;
  expect(bytes.length).toBe(start + count * width);
  const item = (i: number) =>
    type === '<f8' ? view.getFloat64(start + 8 * i, true) : textAt(view, start + width * i, width / 4);
  return { type, shape, values: Array.from({ length: count }, (_, i) => item(i)) };
}

function textAt(view: DataView, start: number, length: number): string {
  const codes = Array.from({ length }, (_, k) => view.getUint32(start + 4 * k, true));
  return String.fromCodePoint(...codes).replace(/\0+$/, '');
}

function arraysOf(model: HandModel): Record<string, NpyArray> {
  const members = unzipSync(bytesIn('npz', derivationOf(model)));
  return Object.fromEntries(Object.entries(members).map(([name, bytes]) => [name.slice(0, -4), readNpy(bytes)]));
}

describe('the NumPy archive', () => {
  test('holds the matrices in C order', () => {
    const { A, B, C, D, x0 } = arraysOf(MOTOR);
    expect(A).toEqual({ type: '<f8', shape: [3, 3], values: MOTOR_NUMBERS.A.flat() });
    expect(B).toEqual({ type: '<f8', shape: [3, 2], values: MOTOR_NUMBERS.B.flat() });
    expect(C).toEqual({ type: '<f8', shape: [2, 3], values: MOTOR_NUMBERS.C.flat() });
    expect(D).toEqual({ type: '<f8', shape: [2, 2], values: MOTOR_NUMBERS.D.flat() });
    expect(x0).toEqual({ type: '<f8', shape: [3], values: [0, 12.5, 0] });
  });

  test('holds the names, the title and the caution as text', () => {
    const { states, inputs, outputs, title, caution } = arraysOf(MOTOR);
    expect(states).toEqual({ type: '<U5', shape: [3], values: ['i', 'omega', 'theta'] });
    expect(inputs?.values).toEqual(['volts', 'load']);
    expect(outputs?.values).toEqual(['angle', 'speed']);
    expect(title).toEqual({ type: `<U${MOTOR.title?.length}`, shape: [], values: [MOTOR.title] });
    expect(caution?.values).toEqual([CAUTION]);
  });

  test('counts characters beyond the basic plane as one, and puts U+FFFD for half a pair', () => {
    const { inputs, title } = arraysOf({ ...STATIC, inputs: ['𝜔1'], title: 'a\uD800b' });
    expect(inputs).toEqual({ type: '<U2', shape: [1], values: ['𝜔1'] });
    expect(title?.values).toEqual(['a\uFFFDb']);
  });

  test('keeps the shapes of matrices without an entry', () => {
    const shapes = (model: HandModel) => Object.values(arraysOf(model)).map(({ shape }) => shape);
    expect(shapes(EMPTY)).toEqual([[0, 0], [0, 0], [0, 0], [0, 0], [0], [0], [0], [0], [], []]);
    expect(shapes(STATIC).slice(0, 5)).toEqual([[0, 0], [0, 1], [1, 0], [1, 1], [0]]);
  });

  test('is the same bytes each time', () => {
    expect(bytesIn('npz', derivationOf(MOTOR))).toEqual(bytesIn('npz', derivationOf(MOTOR)));
  });
});

if (hasPython) {
  test('numpy reads the archive as it was meant', () => {
    const folder = mkdtempSync(join(tmpdir(), 'poleward-'));
    try {
      const path = join(folder, 'model.npz');
      writeFileSync(path, bytesIn('npz', derivationOf({ ...MOTOR, states: ['i', 'ω', 'theta'] })));
      const program = `import json, sys, numpy
found = numpy.load(sys.argv[1])
print(json.dumps({name: found[name].tolist() for name in found.files}))`;
      expect(python(program, path)).toEqual({
        ...MOTOR_NUMBERS,
        x0: [0, 12.5, 0],
        states: ['i', 'ω', 'theta'],
        inputs: ['volts', 'load'],
        outputs: ['angle', 'speed'],
        title: MOTOR.title,
        caution: CAUTION,
      });
      writeFileSync(path, bytesIn('npz', derivationOf(EMPTY)));
      const shapes = `import json, sys, numpy
found = numpy.load(sys.argv[1])
print(json.dumps({name: found[name].shape for name in found.files}))`;
      expect(python(shapes, path)).toMatchObject({ A: [0, 0], x0: [0], states: [0], title: [] });
    } finally {
      rmSync(folder, { recursive: true });
    }
  });
}
