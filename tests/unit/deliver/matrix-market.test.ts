/** The exchange files read back by the rules of the format, and by scipy where it is installed. */

import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { strFromU8, unzipSync } from 'fflate';
import { describe, expect, test } from 'vitest';
import { derivationOf, EMPTY, type HandModel, MOTOR, MOTOR_NUMBERS, STATIC } from './derivations.ts';
import { hasPython, python } from './python.ts';
import { bytesIn } from './written.ts';

const NAMES = ['A', 'B', 'C', 'D', 'x0'];

function filesOf(model: HandModel): Map<string, string> {
  const members = unzipSync(bytesIn('matrix-market', derivationOf(model)));
  return new Map(Object.entries(members).map(([name, bytes]) => [name, strFromU8(bytes)]));
}

/** Header, comments, size line, entries with row and column from 1: NISTIR 5935, coordinate format. */
function readMatrix(text: string): number[][] {
  const [header, ...lines] = text.split('\n');
  if (header !== '%%MatrixMarket matrix coordinate real general') throw new Error(`header ${header}`);
  if (lines.pop() !== '') throw new Error('the last line does not end');
  const [size = '', ...entries] = lines.filter(line => !line.startsWith('%'));
  const [rows = 0, columns = 0, count = 0] = size.split(' ').map(Number);
  if (entries.length !== count) throw new Error(`${entries.length} entries, announced ${count}`);
  const matrix = Array.from({ length: rows }, () => new Array<number>(columns).fill(0));
  for (const entry of entries) {
    const [i = 0, j = 0, value = Number.NaN] = entry.split(' ').map(Number);
    const row = matrix[i - 1];
    if (row === undefined || j < 1 || j > columns || row[j - 1] !== 0) throw new Error(`entry ${entry}`);
    row[j - 1] = value;
  }
  return matrix;
}

describe('the Matrix Market files', () => {
  test('hold A, B, C, D and the initial state', () => {
    const files = filesOf(MOTOR);
    expect([...files.keys()]).toEqual(NAMES.map(name => `${name}.mtx`));
    const read = Object.fromEntries([...files].map(([name, text]) => [name.slice(0, -4), readMatrix(text)]));
    expect(read).toEqual({ ...MOTOR_NUMBERS, x0: [[0], [12.5], [0]] });
  });

  test('name rows and columns in comments, and carry the caution', () => {
    const text = filesOf(MOTOR).get('B.mtx') ?? '';
    expect(text).toContain('\n% row 2: omega\n');
    expect(text).toContain('\n% column 1: volts\n');
    expect(text.replaceAll('\n% ', ' ')).toContain('verify on the machine within its limits');
  });

  test('keep to ASCII and to short lines, whatever the names are', () => {
    const name = `ω\n1 1 7\n${'long '.repeat(400)}${'x'.repeat(3000)}`;
    const files = filesOf({ ...STATIC, inputs: [name], title: name });
    for (const text of files.values()) {
      expect(text).toMatch(/^\p{ASCII}*$/u);
      expect(Math.max(...text.split('\n').map(line => line.length))).toBeLessThanOrEqual(1024);
    }
    expect(readMatrix(files.get('D.mtx') ?? '')).toEqual([[0.3125]]);
    expect(files.get('D.mtx')).toContain('% column 1: U+03C9 1 1 7');
  });

  test('say the sizes of matrices without an entry', () => {
    const sizes = (model: HandModel) =>
      NAMES.map(
        name =>
          filesOf(model)
            .get(`${name}.mtx`)
            ?.split('\n')
            .filter(line => !line.startsWith('%'))[0],
      );
    expect(sizes(EMPTY)).toEqual(['0 0 0', '0 0 0', '0 0 0', '0 0 0', '0 1 0']);
    expect(sizes(STATIC)).toEqual(['0 0 0', '0 1 0', '1 0 0', '1 1 1', '0 1 0']);
  });

  test('are the same bytes each time and in every time zone', () => {
    const zone = process.env['TZ'];
    const zones = ['UTC', 'Pacific/Auckland', 'America/Sao_Paulo'].map(name => {
      process.env['TZ'] = name;
      return bytesIn('matrix-market', derivationOf(MOTOR));
    });
    if (zone === undefined) delete process.env['TZ'];
    else process.env['TZ'] = zone;
    expect(zones[1]).toEqual(zones[0]);
    expect(zones[2]).toEqual(zones[0]);
  });
});

if (hasPython) {
  test('scipy reads the Matrix Market files as they were meant', () => {
    const folder = mkdtempSync(join(tmpdir(), 'poleward-'));
    try {
      for (const [name, text] of filesOf(MOTOR)) writeFileSync(join(folder, name), text);
      const program = `import json, sys, scipy.io
print(json.dumps({n: scipy.io.mmread(f'{sys.argv[1]}/{n}.mtx').toarray().tolist() for n in ${JSON.stringify(NAMES)}}))`;
      expect(python(program, folder)).toEqual({ ...MOTOR_NUMBERS, x0: [[0], [12.5], [0]] });
    } finally {
      rmSync(folder, { recursive: true });
    }
  });
}
