/**
 * Polynomials with exact coefficients as whole numbers over one denominator. Between two operations nothing is reduced:
 * the greatest common divisors of 200 coefficients at each of 200 factors would take minutes where this takes milliseconds.
 */

import { type Rational, rational } from '../algebra/index.ts';
import { fail, ok, type Result } from '../problem/index.ts';
import { divisionByZero, tooLong } from './arithmetic.ts';
import type { BinaryNode } from './expression.ts';
import type { PolynomialArithmetic } from './polynomial-reading.ts';

/** numerators / denominator in descending powers, zeros in front kept, never empty; the denominator is positive. */
export interface WholePolynomial {
  readonly numerators: readonly bigint[];
  readonly denominator: bigint;
}

/**
 * Longest numerator or denominator on the way, in bits: four times what one value may have, as a denominator in common is longer
 * than each alone.
 */
const LARGEST = 1n << 32_768n;

const ONE: WholePolynomial = { numerators: [1n], denominator: 1n };
const VARIABLE: WholePolynomial = { numerators: [1n, 0n], denominator: 1n };

/** The arithmetic of polynomials over the fractions, with the values of nodes without s asked of the caller. */
export function wholePolynomials(
  values: Pick<PolynomialArithmetic<Rational, never>, 'node' | 'exponent'>,
): PolynomialArithmetic<Rational, WholePolynomial> {
  return {
    one: ONE,
    variable: VARIABLE,
    constant: ({ n, d }) => ({ numerators: [n], denominator: d }),
    degree: ({ numerators }) => numerators.length - 1,
    add: (node, a, b) => kept(node, add(a, b)),
    multiply: (node, a, b) => kept(node, multiply(a, b)),
    divide: (node, a, by) => (by.n === 0n ? fail(divisionByZero(node)) : kept(node, divide(a, by))),
    negate: ({ numerators, denominator }) => ({ numerators: numerators.map(n => -n), denominator }),
    ...values,
  };
}

/** The coefficients in lowest terms. */
export function coefficientsOf({ numerators, denominator }: WholePolynomial): readonly Rational[] {
  return numerators.map(n => rational(n, denominator));
}

function kept(node: BinaryNode, a: WholePolynomial): Result<WholePolynomial> {
  const isShort = a.denominator < LARGEST && a.numerators.every(n => n < LARGEST && -n < LARGEST);
  return isShort ? ok(a) : fail(tooLong(node));
}

function add(a: WholePolynomial, b: WholePolynomial): WholePolynomial {
  const [x, y] = overOneDenominator(a, b);
  const [long, short] =
    x.numerators.length >= y.numerators.length ? [x.numerators, y.numerators] : [y.numerators, x.numerators];
  const shift = long.length - short.length;
  return { numerators: long.map((n, i) => n + (short[i - shift] ?? 0n)), denominator: x.denominator };
}

/** Both over their least common denominator. */
function overOneDenominator(a: WholePolynomial, b: WholePolynomial): readonly [WholePolynomial, WholePolynomial] {
  if (a.denominator === b.denominator) return [a, b];
  const { n, d } = rational(a.denominator, b.denominator); // a.denominator / b.denominator in lowest terms
  return [times(a, d), times(b, n)];
}

/** The same polynomial over a denominator `factor` times as long. */
function times({ numerators, denominator }: WholePolynomial, factor: bigint): WholePolynomial {
  return { numerators: numerators.map(n => n * factor), denominator: denominator * factor };
}

function multiply(a: WholePolynomial, b: WholePolynomial): WholePolynomial {
  const product = new Array<bigint>(a.numerators.length + b.numerators.length - 1).fill(0n);
  for (const [i, x] of a.numerators.entries()) {
    if (x === 0n) continue;
    for (const [j, y] of b.numerators.entries()) product[i + j] = (product[i + j] ?? 0n) + x * y;
  }
  return { numerators: product, denominator: a.denominator * b.denominator };
}

function divide({ numerators, denominator }: WholePolynomial, by: Rational): WholePolynomial {
  const [top, bottom] = by.n < 0n ? [-by.d, -by.n] : [by.d, by.n];
  return { numerators: numerators.map(n => n * top), denominator: denominator * bottom };
}
