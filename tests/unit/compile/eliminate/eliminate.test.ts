import { expect, test } from 'vitest';
import { type Rational, toFraction, toRows, ZERO } from '../../../../src/algebra/index.ts';
import { eliminate } from '../../../../src/compile/eliminate/index.ts';
import { cutMatrix, type Equations, writeEquations } from '../../../../src/compile/equations/index.ts';
import { flatten } from '../../../../src/compile/flatten/index.ts';
import { readContributions } from '../../../../src/compile/kinds/index.ts';
import { orderSignals } from '../../../../src/compile/loops/index.ts';
import { doubleArithmetic, numericReader, rationalArithmetic } from '../../../../src/compile/quantities/index.ts';
import type { Diagram } from '../../../../src/diagram/index.ts';
import { draw, gain, input, integrator, output, sum } from '../../../arbitraries/draw.ts';
import { valueOf } from '../../results.ts';

function equationsOf(diagram: Diagram): Equations<Rational> {
  const drawing = flatten(diagram);
  const { contributions } = valueOf(readContributions(drawing.blocks, numericReader(rationalArithmetic, new Map())));
  return writeEquations(rationalArithmetic, drawing, contributions);
}

/** Signals in order: u, s, a, b, x, spare, loose. */
const drawing = draw(
  [
    input('u'),
    sum('s', '+-'),
    gain('a', '2'),
    gain('b', '3'),
    integrator('x'),
    gain('spare', '5'),
    gain('loose', '1/2'),
    output('y'),
  ],
  ['u -> s', 's -> a', 'a -> b', 'b -> s:1', 'a -> x', 'x -> y', 'x -> spare', 'loose -> loose'],
);

test('signals are ordered behind what they depend on, loops by themselves', () => {
  const { components, isLoop, isNeeded } = orderSignals(equationsOf(drawing));
  const members = Array.from({ length: components.count }, (_, c) =>
    Array.from(components.member.slice(components.start[c], components.start[c + 1])),
  );
  expect(members).toEqual([[0], [1, 2, 3], [4], [5], [6]]);
  expect([...isLoop]).toEqual([0, 1, 0, 0, 1]);
  expect([...isNeeded]).toEqual([1, 1, 1, 0, 0]);
});

test('what a state is fed stands in states and inputs: s = u − 6 s, ẋ = 2 s', () => {
  const equations = equationsOf(drawing);
  const { reduced, loops } = eliminate(equations, orderSignals(equations), { measureLoops: true });
  if (reduced === null) throw new Error('no loop is singular');
  const rows = toRows(cutMatrix(reduced, [0, 1], 0, 2), ZERO).map(row => row.map(toFraction));
  expect(rows).toEqual([
    ['0', '2/7'],
    ['1', '0'],
  ]);
  expect(loops.map(({ signals, isSingular }) => [[...signals], isSingular])).toEqual([
    [[1, 2, 3], false],
    [[6], false],
  ]);
  expect(loops[0]?.distance).toBeCloseTo(7 / 18, 12); // |1 + 6| / (3 · 6)
});

test('distances are left out where nobody asks, but in doubles', () => {
  const exact = equationsOf(drawing);
  expect(eliminate(exact, orderSignals(exact), { measureLoops: false }).loops[0]?.distance).toBeNull();
  const flat = flatten(drawing);
  const { contributions } = valueOf(readContributions(flat.blocks, numericReader(doubleArithmetic, new Map())));
  const rounded = writeEquations(doubleArithmetic, flat, contributions);
  expect(eliminate(rounded, orderSignals(rounded), { measureLoops: false }).loops[0]?.distance).toBeCloseTo(7 / 18, 12);
});

test('with a singular loop there are no rows, and the other loops are looked at all the same', () => {
  const equations = equationsOf(
    draw(
      [sum('s', '++'), gain('k', '1'), sum('t', '++'), gain('l', '2'), sum('v', '++'), gain('m', '1')],
      ['s -> k', 'k -> s:1', 't -> l', 'l -> t:1', 'v -> m', 'm -> v:1'],
    ),
  );
  const { reduced, loops } = eliminate(equations, orderSignals(equations), { measureLoops: true });
  expect(reduced).toBeNull();
  expect(loops.map(({ isSingular }) => isSingular)).toEqual([true, false, true]);
});
