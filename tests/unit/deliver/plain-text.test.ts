/** The table for the clipboard, whole: what is seen is what is asserted. */

import { expect, test } from 'vitest';
import { derivationOf, EMPTY, MOTOR, STATIC } from './derivations.ts';
import { textIn } from './written.ts';

const CAUTION = `Linear model, only as good as the drawing: verify on the machine within its limits, keep independent
protection in place, follow local codes and the functional-safety standards that apply (IEC 61508,
ISO 13849, IEC 61511), and leave the sign-off to licensed practice.
`;

test('the motor as fractions, columns aligned, the initial state and the caution below', () => {
  expect(textIn('text', derivationOf(MOTOR), 'fractions')).toBe(`Permanent-magnet motor with position

               i  omega  theta  |   volts   load
d/dt i      -400  -50/3      0  |  1000/3      0
d/dt omega   200   -2/5      0  |       0  -4000
d/dt theta     0      1      0  |       0      0
------------------------------------------------
angle          0      0      1  |       0      0
speed          0      1      0  |       0      0

At time zero: i = 0, omega = 12.5, theta = 0

${CAUTION}`);
});

test('a model without a state has only its outputs, here as decimals and at rest', () => {
  expect(textIn('text', derivationOf(STATIC), 'decimals')).toBe(`Hand model

   |       u
------------
y  |  0.3125

${CAUTION}`);
});

test('fractions are decimals where an entry is irrational, and that is said', () => {
  const text = textIn('text', derivationOf({ ...STATIC, irrational: ['k = sqrt(2)'] }), 'fractions');
  expect(text).toContain('y  |  0.3125\n\nEntries are decimals. The model is not exact, see its warnings.\n');
});

test('an empty sheet leaves an empty table', () => {
  expect(textIn('text', derivationOf(EMPTY))).toBe(`  |\n---\n\n${CAUTION}`);
});

test('a name with a line break or an escape stays on its line', () => {
  const text = textIn('text', derivationOf({ ...STATIC, outputs: ['a\nb\u001b[2J'] }), 'fractions');
  expect(text).toContain('\na b [2J  |  5/16\n');
});
