import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';
import { rational } from '../../../../src/algebra/index.ts';
import { Polynomial } from '../../../../src/ui/figures/index.ts';
import { markupText } from '../../../../src/ui/figures/markup.ts';
import { polynomialRow, quotientRow } from '../../../../src/ui/figures/polynomial-markup.ts';
import { hasRoundedTerm, polynomialTerms } from '../../../../src/ui/figures/polynomial-terms.ts';
import {
  polynomialLatex,
  polynomialWords,
  quotientLatex,
  quotientWords,
} from '../../../../src/ui/figures/polynomial-text.ts';
import { polynomialEms } from '../../../../src/ui/figures/polynomial-width.ts';

const third = rational(1n, 3n);
const minusOne = rational(-1n);

describe('the terms of a polynomial', () => {
  test('leave out zeros and coefficients of one', () => {
    expect(polynomialLatex(polynomialTerms([1, 0, -1, 24, 1], 'decimals'), 's')).toBe('s^{4} - s^{2} + 24 s + 1');
  });

  test('begin with a sign only where it is negative', () => {
    expect(polynomialLatex(polynomialTerms([-1, 0], 'decimals'), 's')).toBe('-s');
    expect(polynomialLatex(polynomialTerms([-2.5, 3], 'decimals'), 'z')).toBe('-2.5 z + 3');
  });

  test('of the zero polynomial are one zero', () => {
    expect(polynomialLatex(polynomialTerms([], 'fractions'), 's')).toBe('0');
    expect(polynomialLatex(polynomialTerms([0, 0], 'fractions'), 's')).toBe('0');
  });

  test('are fractions or rounded decimals as asked', () => {
    const fractions = polynomialTerms([third, minusOne], 'fractions');
    const decimals = polynomialTerms([third, minusOne], 'decimals');
    expect(polynomialLatex(fractions, 's')).toBe('\\frac{1}{3} s - 1');
    expect(polynomialLatex(decimals, 's')).toBe('0.333333 s - 1');
    expect([hasRoundedTerm(fractions), hasRoundedTerm(decimals)]).toEqual([false, true]);
  });

  test('with ten digits over or under the bar are decimals even among fractions', () => {
    const nine = polynomialTerms([rational(999_999_999n, 2n)], 'fractions');
    const ten = polynomialTerms([rational(9_999_999_999n, 2n)], 'fractions');
    expect(nine[0]?.magnitude.kind).toBe('fraction');
    expect(ten[0]?.magnitude.kind).toBe('figure');
  });

  test('a coefficient that only rounds to one is still written', () => {
    expect(polynomialLatex(polynomialTerms([1 + 2 ** -40, 0], 'decimals'), 's')).toBe('1.00000 s');
  });
});

describe('a polynomial in words', () => {
  test('says signs, powers and fractions', () => {
    const terms = polynomialTerms([1, 24, rational(-5n, 16n), 3, 0], 'fractions');
    expect(polynomialWords(terms, 's')).toBe('s to the 4 plus 24 s cubed minus 5 over 16 s squared plus 3 s');
  });

  test('says powers of ten', () => {
    expect(polynomialWords(polynomialTerms([-1.2e-6], 'decimals'), 's')).toBe('minus 1.2 times 10 to the minus 6');
  });

  test('parts numerator and denominator by pauses', () => {
    const [top, bottom] = [polynomialTerms([37.5, 30], 'decimals'), polynomialTerms([1, 0, 1], 'decimals')];
    expect(quotientWords(top, bottom, 's')).toBe('37.5 s plus 30, over, s squared plus 1');
    expect(quotientWords(top, polynomialTerms([1], 'decimals'), 's')).toBe('37.5 s plus 30');
  });
});

describe('a polynomial as MathML', () => {
  test('is made of numbers, identifiers and operators', () => {
    expect(markupText(polynomialRow(polynomialTerms([2, 0, -0.5], 'decimals'), 's'))).toBe(
      '<mrow><mrow><mn>2</mn><mspace width="0.167em"/><msup><mi>s</mi><mn>2</mn></msup></mrow>' +
        '<mrow><mo form="infix">−</mo><mn>0.5</mn></mrow></mrow>',
    );
  });

  test('raises a power of ten', () => {
    expect(markupText(polynomialRow(polynomialTerms([2e-9], 'decimals'), 's'))).toContain(
      '<mn>2</mn><mo>×</mo><msup><mn>10</mn><mrow><mo form="prefix">−</mo><mn>9</mn></mrow></msup>',
    );
  });

  test('over one has no bar', () => {
    const one = polynomialTerms([rational(1n)], 'fractions');
    expect(quotientRow(polynomialTerms([3], 'decimals'), one, 's').tag).toBe('mrow');
    expect(quotientRow(polynomialTerms([3], 'decimals'), polynomialTerms([1, 0], 'decimals'), 's').tag).toBe('mfrac');
    expect(quotientLatex(polynomialTerms([3], 'decimals'), one, 's')).toBe('3');
  });
});

describe('a polynomial on the screen', () => {
  test('breaks between terms and is read out as a whole', () => {
    const html = renderToStaticMarkup(createElement(Polynomial, { coefficients: [1, 2, 3], notation: 'decimals' }));
    expect(html).toContain('role="math" aria-label="s squared plus 2 s plus 3"');
    expect(html.match(/<math aria-hidden="true">/g)).toHaveLength(3);
  });

  test('is the wider the more it holds', () => {
    const widths = [[1], [1, 2], [1, 2, 3], [1, 2, 3e9]].map(list => polynomialEms(polynomialTerms(list, 'decimals')));
    expect(widths).toEqual([...widths].sort((a, b) => a - b));
    expect(new Set(widths).size).toBe(4);
  });
});
