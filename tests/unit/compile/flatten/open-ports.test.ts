import { expect, test } from 'vitest';
import { flatten, openPortWarnings } from '../../../../src/compile/flatten/index.ts';
import type { Diagram } from '../../../../src/diagram/index.ts';
import { draw, gain, group, input, output, sheet, sum } from '../../../arbitraries/draw.ts';

const warned = (diagram: Diagram) => openPortWarnings(flatten(diagram));

test('each open port of a summing point is told by its number', () => {
  expect(warned(draw([input('u'), sum('e', '++-')], ['u -> e:1']))).toEqual([
    {
      code: 'port-not-connected',
      blocks: ['e'],
      message:
        'Summing point e: nothing is wired to its input 1 of 3, which reads zero. Connect it unless zero is meant.',
    },
    {
      code: 'port-not-connected',
      blocks: ['e'],
      message:
        'Summing point e: nothing is wired to its input 3 of 3, which reads zero. Connect it unless zero is meant.',
    },
  ]);
});

test('a block of one input needs no number', () => {
  expect(warned(draw([output('y')], [])).map(({ message }) => message)).toEqual([
    'Output y: nothing is wired to its input, which reads zero. Connect it unless zero is meant.',
  ]);
});

test('an open port of a group is told by the input block behind it', () => {
  const inner = sheet([{ ...input('v'), name: 'voltage' }, gain('k', '2')], ['v -> k']);
  expect(warned(draw([{ ...group('g', inner), name: 'drive' }], []))).toEqual([
    {
      code: 'port-not-connected',
      blocks: ['g'],
      message: 'Group drive: nothing is wired to its input voltage, which reads zero. Connect it unless zero is meant.',
    },
  ]);
});

test('a block inside groups is told by its full name', () => {
  expect(warned(draw([group('g', sheet([gain('k', '2')], []))], []))[0]).toMatchObject({
    blocks: ['g.k'],
    message: 'Gain g.k: nothing is wired to its input, which reads zero. Connect it unless zero is meant.',
  });
});

test('an output port without a wire is no fault', () => {
  expect(warned(draw([input('u')], []))).toEqual([]);
});
