import { describe, expect, test } from 'vitest';
import { deriveModel, type ModelMemory, newModelMemory } from '../../../src/compile/index.ts';
import type { Diagram } from '../../../src/diagram/index.ts';
import { draw, gain, input, integrator, output, sum } from '../../arbitraries/draw.ts';

/** Two algebraic loops of two signals each, both fed by u: one with the gain a, one with 1/2; the first feeds x and y. */
function twoLoops(a: string): Diagram {
  const blocks = [
    input('u'),
    sum('e', '+-'),
    gain('g', 'a'),
    sum('f', '+-'),
    gain('h', '1/2'),
    integrator('x'),
    integrator('z'),
    output('y'),
  ];
  const wires = ['u -> e', 'e -> g', 'g -> e:1', 'u -> f', 'f -> h', 'h -> f:1', 'g -> x', 'h -> z', 'x -> y'];
  return { ...draw(blocks, wires), parameters: [{ name: 'a', value: a }] };
}

/** Rows that have been made out so far: a signal's each time it was resolved. */
const rowsMade = (memory: ModelMemory) => memory.exact.kept?.resolved.rows ?? Number.NaN;

describe('a derivation after a change', () => {
  test('makes out again what the change reaches and nothing else', () => {
    const memory = newModelMemory();
    deriveModel(twoLoops('3'), { memory });
    const before = rowsMade(memory);
    const again = deriveModel(twoLoops('4'), { memory });
    // The two signals of the loop through a; not u, f, h, x or z.
    expect(rowsMade(memory) - before).toBe(2);
    expect(again).toStrictEqual(deriveModel(twoLoops('4')));
  });

  test('makes nothing out where nothing has changed', () => {
    const memory = newModelMemory();
    deriveModel(twoLoops('3'), { memory });
    const before = rowsMade(memory);
    deriveModel(structuredClone(twoLoops('3')), { memory });
    expect(rowsMade(memory)).toBe(before);
  });

  test('goes on after a drawing without a solution', () => {
    const memory = newModelMemory();
    deriveModel(twoLoops('3'), { memory });
    expect(deriveModel(twoLoops('-1'), { memory }).ok).toBe(false);
    expect(deriveModel(twoLoops('5'), { memory })).toStrictEqual(deriveModel(twoLoops('5')));
  });

  test('begins afresh now and then, so that rows out of date do not gather', () => {
    const memory = newModelMemory();
    for (let a = 1; a <= 100; a++) deriveModel(twoLoops(String(a)), { memory });
    // Without that 7 signals and two more rows a change: 205.
    expect(rowsMade(memory)).toBeLessThan(70);
  });
});
