import { expect, test } from 'vitest';
import { emptyDiagram, type Sheet } from '../../../../src/diagram/index.ts';
import { readWiring, wiredBlock, wiringEdits } from '../../../../src/diagram/write-a-block/index.ts';

const SHEET: Sheet = {
  ...emptyDiagram(),
  blocks: [
    { id: 'r', kind: 'input' },
    { id: 'sum', kind: 'summer', signs: '+-', name: 'e' },
    { id: 'g', kind: 'gain', gain: '1' },
  ],
  wires: [{ from: ['r', 0], to: ['sum', 0] }],
};

test('@ and a name with an optional sign is a wire', () => {
  expect(readWiring('@sum')).toEqual({ to: 'sum', sign: null });
  expect(readWiring(' @ e - ')).toEqual({ to: 'e', sign: '-' });
  expect(readWiring('K')).toBeNull();
});

test('the block is found by its name, else by its id', () => {
  expect(wiredBlock(SHEET, { to: 'e', sign: null })?.id).toBe('sum');
  expect(wiredBlock(SHEET, { to: 'sum', sign: null })?.id).toBe('sum');
  expect(wiredBlock(SHEET, { to: 'x', sign: null })).toBeNull();
});

test('an open port with the sign is taken, one with another sign takes it on, else the summing point grows', () => {
  const [, sum, gain] = SHEET.blocks;
  if (sum === undefined || gain === undefined) throw new Error('no block');
  const connect = (port: number) => ({ kind: 'connect', from: ['g', 0], to: ['sum', port] });
  const signs = (value: string) => ({ kind: 'setField', id: 'sum', field: 'signs', value });
  expect(wiringEdits(SHEET, ['g', 0], sum, '-')).toEqual([connect(1)]);
  expect(wiringEdits(SHEET, ['g', 0], sum, null)).toEqual([connect(1)]);
  expect(wiringEdits(SHEET, ['g', 0], sum, '+')).toEqual([signs('++'), connect(1)]);
  const full: Sheet = { ...SHEET, wires: [...SHEET.wires, { from: ['g', 0], to: ['sum', 1] }] };
  expect(wiringEdits(full, ['g', 0], sum, '-')).toEqual([signs('+--'), connect(2)]);
  const taken: Sheet = { ...SHEET, wires: [{ from: ['r', 0], to: ['g', 0] }] };
  expect(wiringEdits(taken, ['sum', 0], gain, null)).toBeNull();
});
