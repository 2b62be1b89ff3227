import { describe, expect, test } from 'vitest';
import type { Sheet } from '../../../../src/diagram/index.ts';
import { findBlocks } from '../../../../src/ui/commands/find-blocks.ts';
import { statesOfBlock } from '../../../../src/ui/commands/states-of-block.ts';

const sheet: Sheet = {
  blocks: [
    { id: 'u', kind: 'input', note: 'from the bridge' },
    { id: 'lead', kind: 'gain', gain: 'K_p/2' },
    { id: 'k_loop', kind: 'gain', gain: '12' },
    { id: 'x', kind: 'integrator', name: 'omega' },
    { id: 'K_p', kind: 'transfer-function', numerator: '1', denominator: 'T*s + 1' },
    { id: 'y', kind: 'output' },
  ],
  wires: [
    { from: ['u', 0], to: ['lead', 0] },
    { from: ['lead', 0], to: ['k_loop', 0] },
    { from: ['k_loop', 0], to: ['x', 0] },
    { from: ['x', 0], to: ['K_p', 0] },
    { from: ['K_p', 0], to: ['y', 0] },
  ],
};

const ids = (text: string, values = new Map<string, string>()) =>
  findBlocks(sheet, text, values).map(({ block }) => block.id);

describe('finding a block', () => {
  test('by name, whatever the case, before what only uses the name', () => {
    expect(ids('OMEGA')).toEqual(['x']);
    expect(ids('K_p')).toEqual(['K_p', 'lead']);
  });

  test('by a parameter in its expressions, with what holds it', () => {
    expect(findBlocks(sheet, 'T', new Map()).map(({ because }) => because)[0]).toBe('denominator T*s + 1');
    expect(ids('T')[0]).toBe('K_p');
  });

  test('by its written or its worked-out value', () => {
    expect(ids('12')).toEqual(['k_loop']);
    expect(ids('-0.25', new Map([['lead', '−0.25']]))).toEqual(['lead']);
  });

  test('by kind and by note', () => {
    expect(ids('integrator')).toEqual(['x']);
    expect(ids('bridge')).toEqual(['u']);
  });

  test('finds nothing for a blank text', () => {
    expect(ids('  ')).toEqual([]);
  });
});

describe('the states a block takes part in', () => {
  test('are those that reach its input and those whose input it reaches, up to the next state', () => {
    expect(statesOfBlock(sheet, 'lead')).toEqual({ carries: [], drives: ['omega'] });
    expect(statesOfBlock(sheet, 'y')).toEqual({ carries: ['K_p'], drives: [] });
  });

  test('include its own, and end at the next one', () => {
    expect(statesOfBlock(sheet, 'x')).toEqual({ carries: ['omega'], drives: ['K_p'] });
  });

  test('are found in a loop without going round it for ever', () => {
    const loop: Sheet = {
      blocks: [
        { id: 'sum', kind: 'summer', signs: '+-' },
        { id: 'back', kind: 'gain', gain: '2' },
      ],
      wires: [
        { from: ['sum', 0], to: ['back', 0] },
        { from: ['back', 0], to: ['sum', 1] },
      ],
    };
    expect(statesOfBlock(loop, 'sum')).toEqual({ carries: [], drives: [] });
  });
});
