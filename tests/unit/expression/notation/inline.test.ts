import { describe, expect, test } from 'vitest';
import { inlineMath, nameSpans, plainName, type Span } from '../../../../src/expression/index.ts';

/** Spans as one line: italics between strokes, `_` before what is lowered, `^` before what is raised. */
const marked = (spans: readonly Span[]): string =>
  spans
    .map(({ text, italic, script }) => {
      const mark = script === 'sub' ? '_' : script === 'sup' ? '^' : '';
      return mark + (italic ? `/${text}/` : text);
    })
    .join('|')
    .replaceAll('\u2009', '~');

describe('a name', () => {
  test.each([
    ['K_p', '/K/|_p'],
    ['J2', '/J/|_2'],
    ['omega', '/ω/'],
    ['Omega', '/Ω/'],
    ['omega_n', '/ω/|_n'],
    ['tau2', '/τ/|_2'],
    ['K_tau', '/K/|_τ'],
    ['x_m_2', '/x/|_m,2'],
    ['torque', 'torque'],
    ['wn', 'wn'],
    ['beta', '/β/'],
    ['betas', 'betas'],
    ['q_1', '/q/|_1'],
    ['drive.omega_m', 'drive|.|/ω/|_m'],
    ['K_', 'K_'],
    ['a1b2', 'a1b2'],
    ['line speed', 'line speed'],
    ['<b>', '<b>'],
  ])('%s is set as %s', (name, expected) => {
    expect(marked(nameSpans(name))).toBe(expected);
  });

  test.each([
    ['omega', 'ω'],
    ['omega_n', 'ω_n'],
    ['omega2', 'ω2'],
    ['omega_2', 'ω_2'],
    ['K_tau', 'K_τ'],
    ['K_p', 'K_p'],
    ['drive.omega', 'drive.ω'],
    ['x_tau_2', 'x_τ_2'],
    ['torque', 'torque'],
  ])('%s reads %s where only text can stand', (name, expected) => {
    expect(plainName(name)).toBe(expected);
  });
});

describe('an expression on one line', () => {
  test.each([
    ['1/J', '1/|/J/'],
    ['2*zeta*omega_n', '2~|/ζ/|~|/ω/|_n'],
    ['a*3', '/a/|·3'],
    ['2*3', '2·3'],
    ['2*wn', '2·wn'],
    ['k*x^2', '/k/|~|/x/|^2'],
    ['a^(b + 1)', '/a/|^/b/|^ + 1'],
    ['a^b^c', '/a/|^/b^c/'],
    ['T_1^K_2', '/T/|_1|^/K/|^_2'],
    ['2^-n', '2|^−|^/n/'],
    ['-(a + b)*c', '−(|/a/| + |/b/|)~|/c/'],
    ['a*-b', '/a/|~(−|/b/|)'],
    ['a - -b', '/a/| − (−|/b/|)'],
    ['a/-b', '/a/|/(−|/b/|)'],
    ['(-a)^2', '(−|/a/|)|^2'],
    ['a/(b*c)', '/a/|/(|/b/|~|/c/|)'],
    ['a/b*c', '(|/a/|/|/b/|)~|/c/'],
    ['4.2e3', '4.2·10|^3'],
    ['1e-3', '10|^−3'],
    ['1e+05', '10|^5'],
    ['.5', '0.5'],
    ['5.', '5'],
    ['sqrt(k)', '√|/k/'],
    ['sqrt(k/m)', '√(|/k/|/|/m/|)'],
    ['sqrt(k)^2', '(√|/k/|)|^2'],
    ['abs(x)', '||/x/||'],
    ['log10(x)', 'log|_10|(|/x/|)'],
    ['asin(x)', 'arcsin(|/x/|)'],
    ['min(a, b)', 'min(|/a/|, |/b/|)'],
    ['pi', '/π/'],
  ])('%s', (text, expected) => {
    expect(marked(inlineMath(text))).toBe(expected);
  });

  test('that is none stands as typed', () => {
    expect(inlineMath('2 k <')).toEqual([{ text: '2 k <', italic: false, script: 'normal' }]);
    expect(inlineMath('')).toEqual([{ text: '', italic: false, script: 'normal' }]);
  });
});
