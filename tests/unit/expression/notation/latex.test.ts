import { describe, expect, test } from 'vitest';
import { escapeLatex, nameToLatex, toLatex } from '../../../../src/expression/index.ts';

describe('LaTeX', () => {
  test.each([
    ['1/J', '\\frac{1}{J}'],
    ['-1/J', '-\\frac{1}{J}'],
    ['K_p*omega_n', 'K_{\\mathrm{p}} \\, \\omega_{\\mathrm{n}}'],
    ['J2^2', 'J_{2}^{2}'],
    ['2^-n', '2^{-n}'],
    ['(a/b)^2', '\\left(\\frac{a}{b}\\right)^{2}'],
    ['(a + b)*c', '\\left(a + b\\right) \\, c'],
    ['a/b*c', '\\frac{a}{b} \\, c'],
    ['(a + b)/(c*d)', '\\frac{a + b}{c \\, d}'],
    ['J*s^2 + b*s + 1', 'J \\, s^{2} + b \\, s + 1'],
    ['4.2e3*k', '4.2 \\cdot 10^{3} \\, k'],
    ['a*2', 'a \\cdot 2'],
    ['sqrt(2)*abs(x)', '\\sqrt{2} \\, \\left|x\\right|'],
    ['atan2(y, x)', '\\operatorname{atan2}\\left(y, x\\right)'],
    ['log10(x)', '\\log_{10}\\left(x\\right)'],
    ['Alpha + omicron', '\\mathrm{A} + o'],
    ['2 k & \\ {x}', '\\text{2 k \\& \\textbackslash{} \\{x\\}}'],
  ])('%s', (text, expected) => {
    expect(toLatex(text)).toBe(expected);
  });

  test('a name keeps its own characters and no command of another', () => {
    expect(nameToLatex('drive.omega_2')).toBe('\\mathrm{drive}.\\omega_{2}');
    expect(nameToLatex('line_speed_')).toBe('\\mathrm{line\\_speed\\_}');
    expect(nameToLatex('\\input{x}')).toBe('\\mathrm{\\textbackslash{}input\\{x\\}}');
    expect(escapeLatex('50 % of #1 ~ $x^2$\n')).toBe('50 \\% of \\#1 \\textasciitilde{} \\$x\\textasciicircum{}2\\$ ');
  });
});
