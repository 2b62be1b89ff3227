/** The table read back by a reader of RFC 4180 of its own. */

import { describe, expect, test } from 'vitest';
import { CAUTION, FORMATS } from '../../../src/deliver/index.ts';
import { derivationOf, EMPTY, type HandModel, MOTOR, MOTOR_NUMBERS, STATIC } from './derivations.ts';
import { readCsv } from './read-csv.ts';
import { textIn } from './written.ts';

const csvOf = (model: HandModel) => textIn('csv', derivationOf(model), 'decimals');

describe('the table of comma-separated values', () => {
  test('holds the system matrix, A and B over C and D, under its names', () => {
    const records = readCsv(csvOf(MOTOR));
    expect(records[0]).toEqual(['row', 'state i', 'state omega', 'state theta', 'input volts', 'input load']);
    expect(records.slice(1, 6).map(([name]) => name)).toEqual([
      'derivative of i',
      'derivative of omega',
      'derivative of theta',
      'output angle',
      'output speed',
    ]);
    const numbers = records.slice(1, 6).map(record => record.slice(1).map(Number));
    const { A, B, C, D } = MOTOR_NUMBERS;
    expect(numbers).toEqual([...A, ...C].map((row, i) => [...row, ...([...B, ...D][i] ?? [])]));
  });

  test('ends with the initial state, the title and the caution', () => {
    expect(readCsv(csvOf(MOTOR)).slice(6)).toEqual([
      ['initial state', '0', '12.5', '0', '', ''],
      ['title: Permanent-magnet motor with position', '', '', '', '', ''],
      [`caution: ${CAUTION}`, '', '', '', '', ''],
    ]);
  });

  test('ends each record in CRLF and gives each as many fields as the first', () => {
    for (const model of [MOTOR, EMPTY, STATIC]) {
      const text = csvOf(model);
      expect(text.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/);
      expect(text.endsWith('\r\n')).toBe(true);
      expect(new Set(readCsv(text).map(record => record.length)).size).toBe(1);
    }
  });

  test('quotes a name with a comma, a quote or a line break', () => {
    const name = 'left, "main"\nvalve';
    const model = { ...STATIC, states: [name], A: [['0']], B: [['1']], C: [['1']], D: [['0']] };
    expect(readCsv(csvOf(model))[0]?.[1]).toBe(`state ${name}`);
  });

  test('begins no cell as a formula begins, whatever the user wrote', () => {
    const names = ['=1+1', '+1', '-1', '@x', '\tx', '\rx'];
    const rows = names.map(() => names.map(() => '-1/2'));
    const model = {
      title: '=HYPERLINK("x")',
      states: names,
      inputs: names,
      outputs: names,
      A: rows,
      B: rows,
      C: rows,
      D: rows,
    };
    const cells = readCsv(csvOf(model)).flat();
    expect(cells.filter(cell => /^[=+\-@\t\r]/.test(cell) && Number.isNaN(Number(cell)))).toEqual([]);
  });

  test('keeps decimals where fractions are asked for, since a spreadsheet reads 1/2 as a date', () => {
    expect(textIn('csv', derivationOf(STATIC), 'fractions')).toBe(csvOf(STATIC));
    expect(readCsv(csvOf(STATIC))[1]).toEqual(['output y', '0.3125']);
  });
});

test('every format has an id, an extension and a label of its own', () => {
  for (const key of ['id', 'extension', 'label'] as const) {
    expect(new Set(FORMATS.map(format => format[key])).size).toBe(FORMATS.length);
  }
});
