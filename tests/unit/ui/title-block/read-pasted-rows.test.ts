import { describe, expect, test } from 'vitest';
import { emptyDiagram } from '../../../../src/diagram/index.ts';
import {
  editsOfRows,
  isTable,
  pastedSentence,
  readPastedRows,
} from '../../../../src/ui/title-block/read-pasted-rows.ts';

describe('pasted rows', () => {
  test('have name, value, unit and note in columns, with a head row passed over', () => {
    expect(readPastedRows('Name\tValue\tUnit\tNote\r\nJ\t0.8\tkg*m^2\tdrum\r\nb\t1/2\r\n')).toEqual({
      ok: true,
      rows: [
        { row: 2, name: 'J', value: '0.8', unit: 'kg*m^2', note: 'drum' },
        { row: 3, name: 'b', value: '1/2', unit: '', note: '' },
      ],
    });
  });

  test('with commas keep empty cells and quoted ones', () => {
    expect(readPastedRows('k,atan2(1; 2),,x')).toMatchObject({ ok: false });
    expect(readPastedRows('k,"max(1, 2)",,"a ""hard"" spring, new"')).toEqual({
      ok: true,
      rows: [{ row: 1, name: 'k', value: 'max(1, 2)', unit: '', note: 'a "hard" spring, new' }],
    });
  });

  test('are refused by number and name', () => {
    const message = (text: string) => {
      const read = readPastedRows(text);
      return read.ok ? '' : read.message;
    };
    expect(message('K\t1\n2b\t3')).toBe(
      'Row 2, 2b: A parameter’s name begins with a letter and has letters, digits and underscores only. Nothing was pasted.',
    );
    expect(message('K\t1\nK\t2')).toBe('Row 2, K: Row 1 has this name too. Nothing was pasted.');
    expect(message('K\t')).toBe(
      'Row 1, K: It has no value. Write name, value, unit and note in columns. Nothing was pasted.',
    );
    expect(message('K\t2 k')).toBe('Row 1, K: "2 k" is not an expression. Write 2*k. Nothing was pasted.');
    expect(message('\n')).toBe('There are no parameters to paste.');
  });

  test('become edits that add and change, and a sentence', () => {
    const diagram = { ...emptyDiagram(), parameters: [{ name: 'K', value: '1', unit: 'm', note: 'n' }] };
    const read = readPastedRows('K\t2\nT\t3\ts');
    const edits = read.ok ? editsOfRows(diagram, read.rows) : [];
    expect(edits).toEqual([
      { kind: 'setParameter', name: 'K', value: '2' },
      { kind: 'addParameter', parameter: { name: 'T', value: '3', unit: 's' } },
    ]);
    expect(pastedSentence(edits)).toBe('1 parameter added, 1 updated.');
    expect(pastedSentence(edits.slice(0, 1))).toBe('1 parameter updated.');
    expect(pastedSentence(edits.slice(1))).toBe('1 parameter added.');
  });
});

test('one cell is no table', () => {
  expect(isTable('0.5\n')).toBe(false);
  expect(isTable('K\t0.5')).toBe(true);
  expect(isTable('a,1\nb,2')).toBe(true);
});
