import { describe, expect, test } from 'vitest';
import type { StateModelBlock } from '../../../../src/diagram/index.ts';
import { problemsOf, valueOf } from '../../results.ts';
import { contribution } from './contributions.ts';

const quotient = (numerator: string, denominator: string) =>
  ({ id: 'g', kind: 'transfer-function', numerator, denominator }) as const;

test('a gain is its factor', () => {
  expect(valueOf(contribution({ id: 'k', kind: 'gain', gain: '2*a' }, { a: '0.35' })).D).toEqual([['7/10']]);
});

test('a summing point takes its signs from the first input on', () => {
  expect(valueOf(contribution({ id: 'e', kind: 'summer', signs: '+-+' })).D).toEqual([['1', '-1', '1']]);
});

test('an integrator has one state of its own name, at rest unless told otherwise', () => {
  const value = valueOf(contribution({ id: 'x', kind: 'integrator' }));
  expect(value).toMatchObject({ states: [''], initial: [0], A: [['0']], B: [['1']], C: [['1']], D: [['0']] });
  expect(valueOf(contribution({ id: 'x', kind: 'integrator', initial: 'a/4' }, { a: '3' })).initial).toEqual([0.75]);
});

test('a differentiator passes the derivative of its input and has no state', () => {
  const value = valueOf(contribution({ id: 'd', kind: 'differentiator' }));
  expect(value).toMatchObject({ states: [], D: [['0']], derivatives: ['1'], derivativeSuffixes: [''] });
});

describe('a transfer function', () => {
  test('is realized in controller companion form, divided by the leading coefficient', () => {
    expect(valueOf(contribution(quotient('6*s + 4', '2*s^3 + 8*s^2 + 10*s + 3')))).toMatchObject({
      states: ['_1', '_2', '_3'],
      A: [
        ['0', '1', '0'],
        ['0', '0', '1'],
        ['-3/2', '-5', '-4'],
      ],
      B: [['0'], ['0'], ['1']],
      C: [['2', '3', '0']],
      D: [['0']],
      derivatives: [],
      lowered: [],
    });
  });

  test('of equal degrees has direct feedthrough: (s + 3)/(s + 1) = 1 + 2/(s + 1)', () => {
    expect(valueOf(contribution(quotient('s + 3', 's + 1')))).toMatchObject({
      states: ['_1'],
      A: [['-1']],
      C: [['2']],
      D: [['1']],
    });
  });

  test('keeps factors common to numerator and denominator', () => {
    expect(valueOf(contribution(quotient('s + 1', '(s + 1)*(s + 2)'))).A).toEqual([
      ['0', '1'],
      ['-2', '-3'],
    ]);
  });

  test('of order zero is a gain without states', () => {
    expect(valueOf(contribution(quotient('3', '4')))).toMatchObject({ states: [], A: [], D: [['3/4']] });
  });

  test('with numerator zero keeps its states', () => {
    expect(valueOf(contribution(quotient('0', 's + 1')))).toMatchObject({ states: ['_1'], C: [['0']], D: [['0']] });
  });

  test('that is improper passes derivatives: (s³ + 2)/(s + 1) = s² − s + 1 + 1/(s + 1)', () => {
    expect(valueOf(contribution(quotient('s^3 + 2', 's + 1')))).toMatchObject({
      states: ['_1'],
      C: [['1']],
      D: [['1']],
      derivatives: ['-1', '1'],
      derivativeSuffixes: ['_2', '_3'],
    });
  });

  test('whose leading coefficient comes out as zero is of lower order, and says so', () => {
    const value = valueOf(contribution(quotient('a*s + 1', 'a*s^2 + 2*s + 1'), { a: '0' }));
    expect(value).toMatchObject({ states: ['_1'], A: [['-1/2']], C: [['1/2']] });
    expect(value.lowered).toEqual([
      'the numerator’s leading coefficient comes out as zero, so its order is 0, not 1.',
      'the denominator’s leading coefficient comes out as zero, so its order is 1, not 2.',
    ]);
    expect(valueOf(contribution(quotient('a*s', 's + 1'), { a: '0' })).lowered).toEqual([
      'the numerator’s leading coefficient comes out as zero, so it is zero.',
    ]);
  });

  test('with denominator zero is refused', () => {
    expect(problemsOf(contribution(quotient('1', 'a*s'), { a: '0' }))).toEqual([
      'division-by-zero: its denominator a*s is zero. Give it another value.',
    ]);
  });

  test('reports the faults of both polynomials', () => {
    expect(problemsOf(contribution(quotient('p', 'q')))).toHaveLength(2);
  });
});

describe('a dead time', () => {
  const delay = (order?: number) =>
    ({ id: 'd', kind: 'delay', time: 'T', ...(order === undefined ? {} : { order }) }) as const;

  /** Golub & Van Loan, Matrix Computations, section 11.3.1 (from memory), lists the [2/2] approximant of exp(z): (12 + 6z + z²)/(12 − 6z + z²). */
  test('is its second-order Padé approximant where no order is given', () => {
    const value = valueOf(contribution(delay(), { T: '1' }));
    expect(value).toMatchObject({
      states: ['_1', '_2'],
      A: [
        ['0', '1'],
        ['-12', '-6'],
      ],
      C: [['0', '-12']],
      D: [['1']],
    });
  });

  test('of order one is (2 − sT)/(2 + sT)', () => {
    expect(valueOf(contribution(delay(1), { T: '4' }))).toMatchObject({ A: [['-1/2']], C: [['1']], D: [['-1']] });
  });

  test('of zero seconds is unity without states', () => {
    expect(valueOf(contribution(delay(), { T: '0' }))).toMatchObject({ states: [], D: [['1']] });
  });

  test('of negative time is refused', () => {
    expect(problemsOf(contribution(delay(), { T: '-1' }))).toEqual([
      'bad-value: its time T is negative. Give zero or more seconds.',
    ]);
  });
});

describe('a limiter', () => {
  test('is unity in the linear model', () => {
    expect(valueOf(contribution({ id: 'l', kind: 'limiter', lower: '-1', upper: '2' })).D).toEqual([['1']]);
  });

  test('whose limits are the wrong way round is refused', () => {
    expect(problemsOf(contribution({ id: 'l', kind: 'limiter', lower: '2', upper: 'a' }, { a: '-1' }))).toEqual([
      'bad-value: its lower limit 2 is above its upper limit a. Exchange them.',
    ]);
  });
});

describe('a state model', () => {
  const model: StateModelBlock = {
    id: 'p',
    kind: 'state-model',
    A: [
      ['0', '1'],
      ['-k', '0'],
    ],
    B: [['0'], ['1']],
    C: [['1', '0']],
    D: [['1/2']],
    initial: ['1', '-k'],
  };

  test('is its own matrices, states numbered', () => {
    expect(valueOf(contribution(model, { k: '4' }))).toMatchObject({
      states: ['_1', '_2'],
      initial: [1, -4],
      A: [
        ['0', '1'],
        ['-4', '0'],
      ],
      D: [['1/2']],
    });
  });

  test('without states is its D', () => {
    const D = [['1', '2']];
    expect(valueOf(contribution({ id: 'p', kind: 'state-model', A: [], B: [], C: [[]], D })).D).toEqual(D);
  });

  test('whose matrices do not fit together is refused', () => {
    expect(problemsOf(contribution({ ...model, C: [['1']] }, { k: '1' }))).toEqual([
      'bad-value: C is to have 1 rows of 2. Make its shape fit the other matrices.',
    ]);
    expect(problemsOf(contribution({ ...model, initial: ['0'] }, { k: '1' }))).toEqual([
      'bad-value: it has 2 states but 1 initial values. Give one for each state.',
    ]);
  });
});
