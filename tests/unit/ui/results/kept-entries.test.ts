import { describe, expect, test } from 'vitest';
import { compile, type StateSpace } from '../../../../src/compile/index.ts';
import { rowEntries } from '../../../../src/ui/results/kept-entries.ts';
import { draw, gain, input, integrator, output, sum } from '../../../arbitraries/draw.ts';

/** ẋ = −a x + u, ż = x − z/3; y = x. */
function model(a: string): StateSpace {
  const blocks = [
    input('u'),
    sum('e', '+-'),
    integrator('x'),
    gain('g', 'a'),
    sum('f', '+-'),
    integrator('z'),
    gain('h', '1/3'),
    output('y'),
  ];
  const wires = ['u -> e', 'e -> x', 'x -> g', 'g -> e:1', 'x -> f', 'f -> z', 'z -> h', 'h -> f:1', 'x -> y'];
  const derived = compile(draw(blocks, wires, { a }));
  if (!derived.ok) throw new Error('the drawing has a model');
  return derived.value.model;
}

const texts = ({ rows }: ReturnType<typeof rowEntries>) =>
  rows.map((entryAt, row) => [0, 1, 2].map(column => entryAt(row, column).text));

describe('entries after a changed parameter', () => {
  test('are the former ones in rows that it leaves alone, and new ones in those that it changes', () => {
    const before = rowEntries(null, model('2'), 'fractions');
    const after = rowEntries(before, model('5/7'), 'fractions');
    expect(texts(after)).toEqual([
      ['−5/7', '0', '1'],
      ['1', '−1/3', '0'],
      ['1', '0', '0'],
    ]);
    expect(after.rows[0]).not.toBe(before.rows[0]);
    expect(after.rows[1]).toBe(before.rows[1]);
    expect(after.rows[2]).toBe(before.rows[2]);
  });

  test('are all new ones in another notation, and where a quantity is no longer rational', () => {
    const before = rowEntries(null, model('2'), 'fractions');
    expect(rowEntries(before, model('2'), 'decimals').rows[1]).not.toBe(before.rows[1]);
    expect(rowEntries(before, model('sqrt(2)'), 'fractions').rows[1]).not.toBe(before.rows[1]);
  });
});
