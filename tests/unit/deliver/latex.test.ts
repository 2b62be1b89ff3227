/** The equations in LaTeX, whole: what is typeset is what is asserted. */

import { expect, test } from 'vitest';
import { derivationOf, EMPTY, type HandModel, MOTOR, STATIC } from './derivations.ts';
import { textIn } from './written.ts';

const CAUTION = `% Linear model, only as good as the drawing: verify on the machine within its limits, keep independent
% protection in place, follow local codes and the functional-safety standards that apply (IEC 61508,
% ISO 13849, IEC 61511), and leave the sign-off to licensed practice.
`;

/** One heater with a lag: dT/dt = -T/8 + 1.5e-7 q, started at 20. */
const HEATER: HandModel = {
  title: 'Heater % 2',
  states: ['omega_n'],
  inputs: ['q'],
  outputs: ['T'],
  A: [['-1/8']],
  B: [['3/20000000']],
  C: [['1']],
  D: [['0']],
  initialState: [20],
};

test('the equations with names, fractions and the initial state, the caution before them', () => {
  expect(textIn('latex', derivationOf(HEATER), 'fractions')).toBe(`% Heater % 2
${CAUTION}\\[
\\frac{\\mathrm{d}}{\\mathrm{d}t}
\\left[\\begin{array}{c}
  \\omega_{\\mathrm{n}} \\\\
\\end{array}\\right]
=
\\left[\\begin{array}{r}
  -\\frac{1}{8} \\\\
\\end{array}\\right]
\\left[\\begin{array}{c}
  \\omega_{\\mathrm{n}} \\\\
\\end{array}\\right]
+
\\left[\\begin{array}{r}
  \\frac{3}{20000000} \\\\
\\end{array}\\right]
\\left[\\begin{array}{c}
  q \\\\
\\end{array}\\right]
\\]
\\[
\\left[\\begin{array}{c}
  T \\\\
\\end{array}\\right]
=
\\left[\\begin{array}{r}
  1 \\\\
\\end{array}\\right]
\\left[\\begin{array}{c}
  \\omega_{\\mathrm{n}} \\\\
\\end{array}\\right]
+
\\left[\\begin{array}{r}
  0 \\\\
\\end{array}\\right]
\\left[\\begin{array}{c}
  q \\\\
\\end{array}\\right]
\\]
\\[
\\left[\\begin{array}{c}
  \\omega_{\\mathrm{n}} \\\\
\\end{array}\\right]_{t=0}
=
\\left[\\begin{array}{c}
  20 \\\\
\\end{array}\\right]
\\]
`);
});

test('decimals have their powers of ten written out', () => {
  const text = textIn('latex', derivationOf(HEATER), 'decimals');
  expect(text).toContain('  -0.125 \\\\');
  expect(text).toContain('  1.5 \\cdot 10^{-7} \\\\');
});

test('rows and columns stand as in the matrix', () => {
  const text = textIn('latex', derivationOf(MOTOR), 'fractions');
  expect(text).toContain(`\\left[\\begin{array}{rrr}
  -400 & -\\frac{50}{3} & 0 \\\\
  200 & -\\frac{2}{5} & 0 \\\\
  0 & 1 & 0 \\\\
\\end{array}\\right]`);
});

test('a model without a state has only its outputs, an output without anything is zero', () => {
  expect(textIn('latex', derivationOf(STATIC))).not.toContain('\\mathrm{d}t');
  const alone = { ...STATIC, inputs: [], D: [[]] };
  expect(textIn('latex', derivationOf(alone))).toContain('=\n0\n\\]');
  expect(textIn('latex', derivationOf(EMPTY))).toBe(CAUTION);
});

test('nothing of a name or a title gets out of its place', () => {
  const name = '}\\input{x}%$\n&';
  const text = textIn('latex', derivationOf({ ...STATIC, title: 'a\n\\input{x}', outputs: [name] }));
  for (const line of text.split('\n')) expect(line.startsWith('%') || !line.includes('\\input')).toBe(true);
  expect(text).toContain('\\mathrm{\\}\\textbackslash{}input\\{x\\}\\%\\$ \\&}');
});
