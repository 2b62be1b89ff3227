import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';
import { rational } from '../../../../src/algebra/index.ts';
import { TransferFunction } from '../../../../src/ui/figures/index.ts';
import { transferFunctionView } from '../../../../src/ui/figures/transfer-function-view.ts';

const numerator = [rational(75n, 2n), rational(30n)];
const denominator = [rational(1n), rational(24n), rational(1n, 3n)];

describe('a transfer function', () => {
  test('is copied as LaTeX and as MathML in its namespace', () => {
    const view = transferFunctionView('G', numerator, denominator, 'fractions', 's');
    expect(view.latex).toBe('G(s) = \\frac{\\frac{75}{2} s + 30}{s^{2} + 24 s + \\frac{1}{3}}');
    expect(view.mathml).toMatch(/^<math xmlns="http:\/\/www.w3.org\/1998\/Math\/MathML" display="block"/);
    expect(view.mathml).toContain('<mfrac><mn>75</mn><mn>2</mn></mfrac>');
  });

  test('is written with ≈ where a coefficient is rounded, and only there', () => {
    expect(transferFunctionView('G', numerator, denominator, 'decimals', 's').latex).toContain('\\approx');
    expect(transferFunctionView('G', numerator, [rational(1n)], 'decimals', 's').latex).toBe('G(s) = 37.5 s + 30');
  });

  test('is read out in words', () => {
    const html = renderToStaticMarkup(
      createElement(TransferFunction, { numerator, denominator, notation: 'fractions' }),
    );
    expect(html).toContain('aria-label="G of s equals 75 over 2 s plus 30, over, s squared plus 24 s plus 1 over 3"');
    expect(html).toContain('>Copy</button>');
  });

  test('that is zero says so', () => {
    expect(transferFunctionView('G', [], [rational(1n)], 'fractions', 's').latex).toBe('G(s) = 0');
  });
});
