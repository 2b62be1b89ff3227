import { describe, expect, test } from 'vitest';
import { createSymbolicField, type RationalFunction } from '../../../src/algebra/symbolic/index.ts';
import { writtenPolynomial } from '../../../src/deliver/index.ts';
import { evaluateIn, parseExpression } from '../../../src/expression/index.ts';
import { valueOf } from '../results.ts';

const field = createSymbolicField();

/** The polynomial whose coefficients are those texts, highest power first. */
function written(...coefficients: readonly string[]) {
  const functions = coefficients.map((text): RationalFunction => {
    const value = evaluateIn(valueOf(parseExpression(text)), field, name => field.variable(name));
    if (value === null) throw new Error(`${text} is no rational function`);
    return value;
  });
  return writtenPolynomial(
    functions.map(({ numerator }) => numerator),
    ['J', 'R', 'K'],
  );
}

describe('a polynomial in s with symbols for coefficients', () => {
  test.each([
    [['J', '1', '0'], 'J*s^2 + s'],
    [['1', 'J + R', '-K'], 's^2 + (J + R)*s - K'],
    [['-J', '-(R + K)', '2*R'], '-J*s^2 - (R + K)*s + 2*R'],
    [['J*R + J*K', '3'], 'J*(R + K)*s + 3'],
    [['R - K'], 'R - K'],
    [['0'], '0'],
    [[], '0'],
  ])('%j reads %s', (coefficients, text) => {
    expect(written(...coefficients).text).toBe(text);
  });

  test('reads back as the same polynomial', () => {
    const { text } = written('J*R', '-(R + K)', '1');
    const value = evaluateIn(valueOf(parseExpression(text.replaceAll('s', 'z'))), field, name => field.variable(name));
    const direct = evaluateIn(valueOf(parseExpression('J*R*z^2 - (R + K)*z + 1')), field, name => field.variable(name));
    expect(value).toEqual(direct);
  });

  test('stands in LaTeX and MathML with the same signs and brackets', () => {
    const { latex, mathml, terms } = written('J', '-(R + K)');
    expect(latex).toBe('J \\, s - \\left(R + K\\right)');
    expect(mathml).toContain('<mo>−</mo><mrow><mo>(</mo>');
    expect(terms).toHaveLength(2);
  });
});
