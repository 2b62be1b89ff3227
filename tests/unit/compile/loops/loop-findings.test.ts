import { expect, test } from 'vitest';
import { flatten } from '../../../../src/compile/flatten/index.ts';
import { listTitles, loopWithoutSolution, nearlySingularLoop } from '../../../../src/compile/loops/index.ts';
import { draw, gain, group, input, output, sheet, sum } from '../../../arbitraries/draw.ts';

const drawing = flatten(
  draw(
    [sum('node', '++'), gain('half_a', '1'), group('g', sheet([input('i'), gain('half_b', '1'), output('o')], []))],
    [],
  ),
);

test('a loop without solution is told with all its blocks and what to do', () => {
  expect(loopWithoutSolution(drawing, [0, 1, 3])).toEqual({
    code: 'loop-without-solution',
    blocks: ['node', 'half_a', 'g.half_b'],
    message:
      'The algebraic loop through summing point node, gain half_a and gain g.half_b has no unique solution. ' +
      'Change a gain or put an integrator in it.',
  });
});

test('blocks on the boundary of a group are told only where there are no others', () => {
  expect(listTitles(drawing, [1, 2, 3, 4])).toBe('gain half_a and gain g.half_b');
  expect(listTitles(drawing, [2, 4])).toBe('input g.i and output g.o');
});

test('a long loop names eight blocks and counts the others', () => {
  const long = flatten(
    draw(
      Array.from({ length: 12 }, (_, i) => gain(`k${i}`, '1')),
      [],
    ),
  );
  const blocks = Array.from({ length: 12 }, (_, i) => i);
  expect(listTitles(long, blocks)).toBe(
    'gain k0, gain k1, gain k2, gain k3, gain k4, gain k5, gain k6, gain k7 and 4 more blocks',
  );
  expect(loopWithoutSolution(long, blocks).blocks).toHaveLength(12);
  expect(listTitles(long, blocks.slice(0, 8))).toMatch(/gain k6 and gain k7$/);
});

test('a nearly singular loop is told with the change that its gains bear', () => {
  expect(nearlySingularLoop(drawing, [0, 1], 2.4e-10).message).toBe(
    'The algebraic loop through summing point node and gain half_a is nearly without a solution: ' +
      'changing its gains by 2e-10 of their values can take it away. Check the gains.',
  );
  expect(nearlySingularLoop(drawing, [0], 0).message).toContain('by less than 1e-15 of their values');
});
