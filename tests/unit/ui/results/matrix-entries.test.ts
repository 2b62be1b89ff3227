import { describe, expect, test } from 'vitest';
import { entriesOf, whyNoFractions } from '../../../../src/ui/results/matrix-entries.ts';
import { winch, writtenModel } from './system-matrix-fixture.ts';

describe('entries of the system matrix', () => {
  test('are those of A, B, C and D in their four parts', () => {
    const at = entriesOf(winch, 'fractions');
    expect([at(0, 1), at(1, 5), at(4, 1), at(4, 5)].map(entry => entry.text)).toEqual(['−5/16', '12', '1', '1/3']);
  });

  test('that are zero say so', () => {
    expect(entriesOf(winch, 'fractions')(0, 2)).toEqual({ text: '0', isZero: true, isRounded: false, whole: null });
  });

  test('as decimals are marked where digits were lost, with the fraction behind', () => {
    const at = entriesOf(winch, 'decimals');
    expect(at(4, 5)).toEqual({ text: '0.333333', isZero: false, isRounded: true, whole: '1/3' });
    expect(at(0, 1)).toEqual({ text: '−0.3125', isZero: false, isRounded: false, whole: null });
  });

  test('too long for a fraction are decimals with as many digits as a double holds behind', () => {
    const long = writtenModel({ ...EMPTY, states: ['x'], A: [['12345678901/9876543210']] });
    expect(entriesOf(long, 'fractions')(0, 0)).toEqual({
      text: '1.25000',
      isZero: false,
      isRounded: true,
      // 1.24999998871062500014… to 30 digits by a general-purpose decimal arithmetic.
      whole: '1.2499999887106250',
    });
  });

  test('derived in floating point are decimals, and the reason is told', () => {
    const floating = { ...winch, rational: null };
    expect(entriesOf(floating, 'fractions')(0, 1).text).toBe('−0.3125');
    expect(whyNoFractions(floating)).toBe('Derived in floating point: decimals only.');
  });

  test('of a model with an irrational value are decimals, and the value is named', () => {
    const irrational = { ...winch, irrational: ['k = sqrt(2)'] };
    expect(entriesOf(irrational, 'fractions')(0, 1).text).toBe('−0.3125');
    expect(whyNoFractions(irrational)).toBe('Not rational: k = sqrt(2). Decimals only.');
    expect(whyNoFractions(winch)).toBeNull();
  });
});

const EMPTY = { states: [], inputs: [], outputs: [], A: [], B: [[]], C: [], D: [] } as const;
