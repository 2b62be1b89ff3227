import { expect, test } from 'vitest';
import { flatten, OPEN, signalCount } from '../../../../src/compile/flatten/index.ts';
import { draw, gain, group, input, integrator, output, sheet, sum } from '../../../arbitraries/draw.ts';

const winding = group('winding', sheet([input('v'), integrator('i'), output('t')], ['v -> i', 'i -> t']));
const drive = group('drive', sheet([input('a'), input('b'), winding, output('w')], ['b -> winding', 'winding -> w']));

test('blocks of a group stand where the group stands, named by their path', () => {
  const { blocks } = flatten(draw([input('u'), drive, output('y')], []));
  expect(blocks.map(({ path }) => path)).toEqual([
    'u',
    'drive.a',
    'drive.b',
    'drive.winding.v',
    'drive.winding.i',
    'drive.winding.t',
    'drive.w',
    'y',
  ]);
});

test('names follow the names of blocks and groups, paths their ids', () => {
  const named = { ...group('g', sheet([{ ...integrator('x'), name: 'speed' }], [])), name: 'motor' };
  const [flat] = flatten(draw([named], [])).blocks;
  expect(flat).toMatchObject({ path: 'g.x', name: 'motor.speed', role: 'inner' });
});

test('input and output blocks are external on the top sheet and boundaries inside', () => {
  const { blocks } = flatten(draw([input('u'), drive, output('y')], []));
  expect(blocks.filter(({ role }) => role === 'external').map(({ path }) => path)).toEqual(['u', 'y']);
  expect(blocks.filter(({ role }) => role === 'boundary')).toHaveLength(5);
});

test('a wire to a group reaches the input block at that place, a wire from it comes from its output block', () => {
  const { blocks, source, inputStart, signalStart } = flatten(
    draw([input('u'), drive, output('y')], ['u -> drive:1', 'drive -> y']),
  );
  const at = (path: string) => blocks.findIndex(block => block.path === path);
  expect(source[inputStart[at('drive.b')] ?? -1]).toBe(signalStart[at('u')]);
  expect(source[inputStart[at('drive.a')] ?? -1]).toBe(OPEN);
  expect(source[inputStart[at('y')] ?? -1]).toBe(signalStart[at('drive.w')]);
  expect(source[inputStart[at('drive.winding.v')] ?? -1]).toBe(signalStart[at('drive.b')]);
});

test('every output port is one signal', () => {
  const plant = { id: 'p', kind: 'state-model', A: [], B: [], C: [], D: [['1'], ['2']] } as const;
  expect(signalCount(flatten(draw([input('u'), plant, sum('s', '+-'), gain('k', '2'), output('y')], [])))).toBe(5);
});

test('an empty sheet has no blocks, ports or signals', () => {
  expect(flatten(draw([], []))).toMatchObject({ blocks: [], source: new Int32Array(0) });
});

test('a wire to a port that is not there is a bug and throws', () => {
  expect(() => flatten(draw([input('u'), gain('k', '1')], ['u -> k:1']))).toThrow(
    'a wire to k, port 1, which is not there',
  );
  expect(() => flatten(draw([input('u')], ['u -> k']))).toThrow('a wire to k, port 0, which is not there');
});
