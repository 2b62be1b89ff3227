/**
 * Values of fields that a block's law refuses, as a user reads them: with the block's kind and name in front, through
 * groups, in fractions and in doubles alike, and with the block to mark on the sheet.
 */

import { describe, expect, test } from 'vitest';
import { compile } from '../../../src/compile/index.ts';
import type { Block } from '../../../src/diagram/index.ts';
import { draw, group, quotient, sheet } from '../../arbitraries/draw.ts';
import { problemsOf } from '../results.ts';

const REFUSED: readonly (readonly [Block, string, string])[] = [
  [
    { id: 'd', kind: 'delay', time: '-T' },
    'bad-value: Dead time ',
    'd: its time -T is negative. Give zero or more seconds.',
  ],
  [
    { id: 'l', kind: 'limiter', lower: 'T', upper: '-1' },
    'bad-value: Limiter ',
    'l: its lower limit T is above its upper limit -1. Exchange them.',
  ],
  [
    quotient('G', '1', '0*s'),
    'division-by-zero: Transfer function ',
    'G: its denominator 0*s is zero. Give it another value.',
  ],
];

describe.each(REFUSED)('%j', (block, kind, message) => {
  for (const field of ['rational', 'double'] as const) {
    test(`is refused on the sheet, in ${field}`, () => {
      const result = compile(draw([block], [], { T: '2' }), { field });
      expect(problemsOf(result)).toEqual([`${kind}${message}`]);
      expect(result).toMatchObject({ problems: [{ blocks: [block.id] }] });
    });

    test(`is refused inside a group by its path, in ${field}`, () => {
      const result = compile(draw([group('g', sheet([block], []))], [], { T: '2' }), { field });
      expect(problemsOf(result)).toEqual([`${kind}g.${message}`]);
      expect(result).toMatchObject({ problems: [{ blocks: [`g.${block.id}`] }] });
    });
  }
});

test('limits that are equal, and a dead time of zero, are taken', () => {
  const equal: Block = { id: 'l', kind: 'limiter', lower: '1', upper: '1' };
  const none: Block = { id: 'd', kind: 'delay', time: '0' };
  expect(compile(draw([equal, none], [])).ok).toBe(true);
});
