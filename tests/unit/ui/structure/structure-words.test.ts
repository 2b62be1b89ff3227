import { describe, expect, test } from 'vitest';
import type { StructuralMode, StructureReport } from '../../../../src/analysis/minimal/index.ts';
import { modeReason, modeText, structureSentence } from '../../../../src/ui/structure/structure-words.ts';

const report = (states: number, reached: number, seen: number, minimal: number): StructureReport => ({
  ...{ states, reached, seen, minimal, standsIn: false, modes: [], contributions: [] },
});

describe('the sentence about the structure', () => {
  test('says that a model is minimal', () => {
    expect(structureSentence(report(4, 4, 4, 4))).toBe(
      'The inputs reach every state (controllable) and the outputs tell all states apart (observable). The model is minimal: no fewer than 4 states will do.',
    );
  });

  test('says how many dimensions are reached, told apart and enough', () => {
    expect(structureSentence(report(3, 2, 2, 1))).toBe(
      'The inputs reach 2 of 3 dimensions (not controllable) and the outputs tell 2 of 3 dimensions apart (not observable). 1 state would do for the same transfer functions.',
    );
  });

  test('says that there is no state', () => {
    expect(structureSentence(report(0, 0, 0, 0))).toBe('The model has no states.');
  });
});

describe('a hidden mode', () => {
  const mode = (part: Partial<StructuralMode>): StructuralMode => ({
    ...{ re: -1, im: 0, multiplicity: 1, isUncontrollable: false, isUnobservable: false, states: [], isOwn: true },
    ...part,
  });

  test('is written as a pole, a pair as one, with its multiplicity', () => {
    expect(modeText(mode({}))).toBe('−1');
    expect(modeText(mode({ im: 2, multiplicity: 2 }))).toBe('−1 ± 2j, 2 times');
  });

  test('has its reason', () => {
    expect(modeReason(mode({ isUncontrollable: true }))).toBe('no input reaches it');
    expect(modeReason(mode({ isUnobservable: true }))).toBe('no output shows it');
    expect(modeReason(mode({ isUncontrollable: true, isUnobservable: true }))).toBe(
      'no input reaches it, no output shows it',
    );
    expect(modeReason(mode({}))).toBe('no input and output share it');
  });
});
