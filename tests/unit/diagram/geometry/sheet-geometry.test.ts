import { describe, expect, test } from 'vitest';
import { type PortPlace, sheetGeometry } from '../../../../src/diagram/geometry/index.ts';
import type { Block, Sheet, Wire } from '../../../../src/diagram/types.ts';

const wire = (from: string, to: string, port = 0): Wire => ({ from: [from, 0], to: [to, port] });

function inputsOf(sheet: Sheet, id: string): readonly PortPlace[] {
  return sheetGeometry(sheet).get(id)?.inputs ?? [];
}

function sidesOf(blocks: readonly Block[], wires: readonly Wire[]): readonly string[] {
  return inputsOf({ blocks, wires }, 'e').map(({ side }) => side);
}

const at = (x: number, y: number) => ({ at: [x, y] as const });
const sum = (signs: string, rest: Partial<Block> = {}): Block =>
  ({ id: 'e', kind: 'summer', signs, ...at(200, 200), ...rest }) as Block;
const gain = (id: string, x: number, y: number): Block => ({ id, kind: 'gain', gain: '2', ...at(x, y) });

describe('the inputs of a summing point', () => {
  test('stand left, then bottom, then top where nothing is joined', () => {
    expect(sidesOf([sum('+--')], [])).toEqual(['left', 'bottom', 'top']);
  });

  test('turn to the top for what comes from above', () => {
    expect(sidesOf([sum('++'), gain('a', 100, 100)], [wire('a', 'e', 1)])).toEqual(['left', 'top']);
  });

  test('turn to the bottom for what comes from below', () => {
    expect(sidesOf([sum('+-'), gain('a', 300, 300)], [wire('a', 'e', 1)])).toEqual(['left', 'bottom']);
  });

  test('take a feedback of their own height at the bottom and a feedforward on top', () => {
    expect(sidesOf([sum('+-'), gain('a', 300, 200)], [wire('a', 'e', 1)])).toEqual(['left', 'bottom']);
    expect(sidesOf([sum('+-'), gain('a', 100, 200)], [wire('a', 'e', 1)])).toEqual(['left', 'top']);
  });

  test('never share a side: of two from below the second has the bottom', () => {
    const blocks = [sum('+--'), gain('a', 300, 300), gain('b', 300, 400)];
    expect(sidesOf(blocks, [wire('a', 'e', 1), wire('b', 'e', 2)])).toEqual(['left', 'bottom', 'top']);
  });

  test('give the bottom to what comes from below rather than to a level feedback', () => {
    const blocks = [sum('+--'), gain('a', 300, 200), gain('b', 300, 400)];
    expect(sidesOf(blocks, [wire('a', 'e', 1), wire('b', 'e', 2)])).toEqual(['left', 'top', 'bottom']);
  });

  test('change hands when the summing point is mirrored', () => {
    expect(sidesOf([sum('+-', { mirrored: true })], [])).toEqual(['right', 'bottom']);
  });

  test('stand one under the other, a square apart, where there are more than three', () => {
    const places = inputsOf({ blocks: [sum('+-+-+')], wires: [] }, 'e');
    expect(places.map(({ x, y, side }) => [x, y, side])).toEqual([-40, -20, 0, 20, 40].map(y => [-14, y, 'left']));
  });

  test('do not depend on the order of the wires', () => {
    const blocks = [sum('+--'), gain('a', 300, 300), gain('b', 300, 100)];
    const wires = [wire('a', 'e', 1), wire('b', 'e', 2)];
    expect(sidesOf(blocks, wires.toReversed())).toEqual(sidesOf(blocks, wires));
  });
});

describe('the ports of a rectangle', () => {
  test.each([1, 2, 3, 4, 5, 8])('lie on the grid and symmetrical for %i inputs', count => {
    const row = Array.from({ length: count }, () => '1');
    const block: Block = { id: 'm', kind: 'state-model', A: [['1']], B: [row], C: [['1']], D: [row], ...at(0, 0) };
    const heights = inputsOf({ blocks: [block], wires: [] }, 'm').map(({ y }) => y);
    expect(heights.every(y => y % 20 === 0)).toBe(true);
    expect(heights.toReversed().map(y => 0 - y)).toEqual(heights);
    expect(new Set(heights).size).toBe(count);
  });

  test('change sides when the block is mirrored', () => {
    const geometry = sheetGeometry({ blocks: [{ ...gain('a', 0, 0), mirrored: true }], wires: [] }).get('a');
    expect(geometry?.inputs).toEqual([{ x: 30, y: 0, side: 'right' }]);
    expect(geometry?.outputs).toEqual([{ x: -30, y: 0, side: 'left' }]);
  });
});

describe('an input', () => {
  const disturbance: Block = { id: 'v', kind: 'input', ...at(200, 100) };

  test('that stands straight above its summing point enters it straight, its name beside it', () => {
    const geometry = sheetGeometry({ blocks: [disturbance, sum('++')], wires: [wire('v', 'e', 1)] }).get('v');
    expect(geometry?.outputs).toEqual([{ x: 0, y: 4, side: 'bottom' }]);
    expect(geometry?.labels[0]?.text.anchor).toBe('start');
  });

  test('that feeds anything else as well leaves to the right, its name before it', () => {
    const blocks = [disturbance, sum('++'), gain('k', 400, 100)];
    const geometry = sheetGeometry({ blocks, wires: [wire('v', 'e', 1), wire('v', 'k')] }).get('v');
    expect(geometry?.outputs).toEqual([{ x: 4, y: 0, side: 'right' }]);
    expect(geometry?.labels[0]?.text.anchor).toBe('end');
  });
});
