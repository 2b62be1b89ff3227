import { expect, test } from 'vitest';
import { rational } from '../../../../src/algebra/index.ts';
import {
  doubleArithmetic,
  irrationalFindings,
  numericReader,
  rationalArithmetic,
} from '../../../../src/compile/quantities/index.ts';
import { evaluateParameters } from '../../../../src/expression/index.ts';
import { problemsOf, valueOf } from '../../results.ts';

const parameters = [
  { name: 'k', value: '1/3' },
  { name: 'r', value: 'sqrt(2)' },
  { name: 'twice', value: '2*r' },
  { name: 'zero', value: '0' },
];
const scope = valueOf(evaluateParameters(parameters));

test('a decimal is read exactly, by itself and inside an expression', () => {
  const reader = numericReader(rationalArithmetic, scope);
  expect(valueOf(reader.quantity('0.1'))).toEqual(rational(1n, 10n));
  expect(valueOf(reader.quantity('-2.5e-3'))).toEqual(rational(-1n, 400n));
  expect(valueOf(reader.quantity('k + 0.1'))).toEqual(rational(13n, 30n));
});

test('an irrational quantity stands in as the exact value of its double, and its text is kept once', () => {
  const reader = numericReader(rationalArithmetic, scope);
  const { n, d } = valueOf(reader.quantity('r'));
  expect(Number(n) / Number(d)).toBe(Math.SQRT2);
  expect(reader.takeIrrational()).toEqual(['r']);
  expect(reader.takeIrrational()).toEqual([]);
});

test('a double that only limits or starts something makes nothing irrational', () => {
  const reader = numericReader(rationalArithmetic, scope);
  expect(valueOf(reader.double('r'))).toBe(Math.SQRT2);
  expect(reader.takeIrrational()).toEqual([]);
});

test('a polynomial comes without leading zeros and with their number', () => {
  const reader = numericReader(doubleArithmetic, scope);
  expect(valueOf(reader.polynomial('zero*s^2 + 3*s + 1'))).toEqual({ coefficients: [3, 1], lowered: 1 });
  expect(valueOf(reader.polynomial('zero*s'))).toEqual({ coefficients: [], lowered: 1 });
  expect(valueOf(reader.polynomial('0'))).toEqual({ coefficients: [], lowered: 0 });
});

test('what the language does not know is refused, also where the fast reading of numbers could take it', () => {
  const reader = numericReader(rationalArithmetic, scope);
  for (const text of ['1e999', '0x10', '1_000', 'Infinity', ' ', '', '1..2']) {
    expect(reader.quantity(text).ok, text).toBe(false);
  }
  expect(problemsOf(reader.quantity('nothing'))).toEqual([
    'unknown-parameter: nothing is not a parameter. Add nothing to the parameters.',
  ]);
});

test('irrational parameters are named in document order with all blocks that use them, directly or not', () => {
  const findings = irrationalFindings(parameters, scope, [
    { path: 'b1', title: 'Gain b1', texts: ['twice + 1', 'twice'] },
    { path: 'b2', title: 'Gain b2', texts: ['r*k'] },
    { path: 'b3', title: 'Gain b3', texts: ['pi'] },
  ]);
  expect(findings).toEqual([
    {
      name: 'r = sqrt(2)',
      blocks: ['b1', 'b2'],
      message: 'Parameter r: sqrt(2) is irrational. The matrices hold its nearest double, and there are no exact ones.',
    },
    {
      name: 'twice = 2*r',
      blocks: ['b1'],
      message: 'Parameter twice: 2*r is irrational. The matrices hold its nearest double, and there are no exact ones.',
    },
    {
      name: 'b3: pi',
      blocks: ['b3'],
      message: 'Gain b3: pi is irrational. The matrices hold its nearest double, and there are no exact ones.',
    },
  ]);
});
