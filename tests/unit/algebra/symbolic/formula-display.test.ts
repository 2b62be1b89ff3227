import { describe, expect, test } from 'vitest';
import { formulaLatex, formulaMathML, formulaOf } from '../../../../src/algebra/symbolic/index.ts';
import { functionOf } from '../../../arbitraries/symbolic.ts';

const TIMES = '<mo>&#x2062;</mo>';
const MINUS = '<mo>&#x2212;</mo>';

describe('formulas in LaTeX', () => {
  test.each([
    ['-b/J', '-\\frac{b}{J}'],
    ['K/(1 + K*T)', '\\frac{K}{1 + K \\, T}'],
    ['g*(M + m)/(M*l)', '\\frac{g \\, \\left(M + m\\right)}{M \\, l}'],
    ['-(M + m)', '-\\left(M + m\\right)'],
    ['M - m', 'M - m'],
    ['a^2*tau_1', '{a}^{2} \\, \\mathrm{tau\\_1}'],
    ['1e-12*K', '10^{-12} \\, K'],
    ['4.7e-6*K', '4.7 \\cdot 10^{-6} \\, K'],
    ['1/(1 + K)^2', '\\frac{1}{{\\left(1 + K\\right)}^{2}}'],
    ['0', '0'],
    ['3', '3'],
  ])('%s is %s', (text, expected) => {
    expect(formulaLatex(formulaOf(functionOf(text)))).toBe(expected);
  });

  test('names come from the caller', () => {
    const formula = formulaOf(functionOf('omega/J'));
    expect(formulaLatex(formula, name => (name === 'omega' ? '\\omega' : name))).toBe('\\frac{\\omega}{J}');
  });
});

describe('formulas in MathML', () => {
  test.each([
    ['-b/J', `<mrow>${MINUS}<mfrac><mi>b</mi><mi>J</mi></mfrac></mrow>`],
    ['K/(1 + T)', '<mfrac><mi>K</mi><mrow><mn>1</mn><mo>+</mo><mi>T</mi></mrow></mfrac>'],
    ['2*K', `<mrow><mn>2</mn>${TIMES}<mi>K</mi></mrow>`],
    ['K^2', '<msup><mi>K</mi><mn>2</mn></msup>'],
    ['K - 1', `<mrow><mi>K</mi>${MINUS}<mn>1</mn></mrow>`],
    ['-(K + 1)', `<mrow>${MINUS}<mo>(</mo><mrow><mn>1</mn><mo>+</mo><mi>K</mi></mrow><mo>)</mo></mrow>`],
    [
      'J*(1 + K)',
      `<mrow><mi>J</mi>${TIMES}<mrow><mo>(</mo><mrow><mn>1</mn><mo>+</mo><mi>K</mi></mrow><mo>)</mo></mrow></mrow>`,
    ],
    ['1e-12*K', `<mrow><msup><mn>10</mn><mrow>${MINUS}<mn>12</mn></mrow></msup>${TIMES}<mi>K</mi></mrow>`],
    ['0', '<mn>0</mn>'],
  ])('%s', (text, expected) => {
    expect(formulaMathML(formulaOf(functionOf(text)))).toBe(expected);
  });

  test('names come from the caller, and a text of its own is escaped', () => {
    const formula = formulaOf(functionOf('omega'));
    expect(formulaMathML(formula, () => '<mi>ω</mi>')).toBe('<mi>ω</mi>');
    const odd = {
      ...formula,
      numerator: { ...formula.numerator, powers: [{ name: 'f(a<b & c>d)', exponent: 1 }] },
    };
    expect(formulaMathML(odd)).toBe('<mi>f(a&lt;b &amp; c&gt;d)</mi>');
  });
});
