/**
 * The numbers that evaluation works with: a fraction as long as the value is known exactly, a double from then on. Each
 * operation says what stands in its way; rounding happens once, where a fraction meets a double or is handed out.
 */

import {
  addRationals,
  compareRationals,
  divideRationals,
  multiplyRationals,
  negateRational,
  ONE,
  type Rational,
  rational,
  subtractRationals,
  toDouble,
  ZERO,
} from '../algebra/index.ts';
import { fail, ok, type Problem, problem, type Result } from '../problem/index.ts';
import type { BinaryNode, BinaryOperator, CallNode, Value } from './expression.ts';
import { applyFunction } from './functions.ts';
import { print } from './print.ts';
import { onOneLine, quote } from './wording.ts';

/** A fraction, exact, or a double that counts as irrational. */
export type Quantity = Rational | number;

/**
 * Longest numerator or denominator that is kept, in bits: some 2,400 digits, beyond any double by far. Without an end a
 * short text (`9^9^9`, or parameters that square one another) would fill the memory.
 */
const MOST_BITS = 8192;
const LARGEST = 1n << BigInt(MOST_BITS);

/** The quantity as handed out; a zero is never negative. */
export function toValue(quantity: Quantity): Value {
  if (typeof quantity === 'number') return { exact: null, double: quantity === 0 ? 0 : quantity };
  return { exact: quantity, double: toDouble(quantity) };
}

/** The quantity behind a value. */
export function fromValue(value: Value): Quantity {
  return value.exact ?? value.double;
}

/** Whether it is zero: exactly, or the computed double. */
export function isZeroQuantity(quantity: Quantity): boolean {
  return typeof quantity === 'number' ? quantity === 0 : quantity.n === 0n;
}

/** The nearest double. */
export function doubleOf(quantity: Quantity): number {
  return typeof quantity === 'number' ? quantity : toDouble(quantity);
}

/** −a. */
export function negate(a: Quantity): Quantity {
  return typeof a === 'number' ? -a : negateRational(a);
}

/** a ∘ b; `node` is named where the operation is refused. */
export function combineQuantities(
  operator: BinaryOperator,
  node: BinaryNode,
  a: Quantity,
  b: Quantity,
): Result<Quantity> {
  switch (operator) {
    case '+':
      return kept(
        node,
        both(a, b, addRationals, (x, y) => x + y),
      );
    case '-':
      return kept(
        node,
        both(a, b, subtractRationals, (x, y) => x - y),
      );
    case '*':
      return kept(
        node,
        both(a, b, multiplyRationals, (x, y) => x * y),
      );
    case '/':
      if (isZeroQuantity(b)) return fail(divisionByZero(node));
      return kept(
        node,
        both(a, b, divideRationals, (x, y) => x / y),
      );
    case '^':
      return raise(node, a, b);
    default:
      return operator satisfies never;
  }
}

type Both<T> = (a: T, b: T) => T;

function both(a: Quantity, b: Quantity, exact: Both<Rational>, double: Both<number>): Quantity {
  if (typeof a !== 'number' && typeof b !== 'number') return exact(a, b);
  return double(doubleOf(a), doubleOf(b));
}

/** A refusal where a fraction has grown beyond what is kept. */
function kept(node: BinaryNode, quantity: Quantity): Result<Quantity> {
  return typeof quantity === 'number' || isKept(quantity) ? ok(quantity) : fail(tooLong(node));
}

/** Whether numerator and denominator are short enough to be kept. */
export function isKept({ n, d }: Rational): boolean {
  return n < LARGEST && -n < LARGEST && d < LARGEST;
}

/** The problem of a fraction that has grown beyond what is kept. */
export function tooLong(node: BinaryNode): Problem {
  const advice = node.operator === '^' ? 'Use a smaller exponent.' : 'Round the numbers in it.';
  const message = `The exact value of ${quote(print(node))} has more than ${MOST_BITS} binary digits. ${advice}`;
  return problem('bad-expression', message);
}

/** The problem of a division, or a negative power, that meets a zero. */
export function divisionByZero(node: BinaryNode): Problem {
  const by = node.operator === '/' ? node.right : node.left;
  const what = by.kind === 'number' ? '' : `: ${onOneLine(print(by))} is 0`;
  return problem('division-by-zero', `${quote(print(node))} divides by zero${what}. Change a value in it.`);
}

function raise(node: BinaryNode, base: Quantity, exponent: Quantity): Result<Quantity> {
  if (isZeroQuantity(base) && doubleOf(exponent) < 0) return fail(divisionByZero(node));
  if (typeof base !== 'number' && typeof exponent !== 'number' && exponent.d === 1n) {
    const power = wholePower(base, exponent.n);
    return power === null ? fail(tooLong(node)) : kept(node, power);
  }
  const [x, y] = [doubleOf(base), doubleOf(exponent)];
  return ok(Number.isNaN(x) ? x : x ** y);
}

/** The base to a whole exponent, the base not zero where that is negative; null where the result is certainly too long. */
function wholePower(base: Rational, exponent: bigint): Rational | null {
  if (exponent === 0n) return ONE;
  if (base.n === 0n) return ZERO;
  const isUnit = base.d === 1n && (base.n === 1n || base.n === -1n);
  if (isUnit) return exponent % 2n === 0n ? ONE : base;
  const size = exponent < 0n ? -exponent : exponent;
  // A whole number of k bits is 2^(k − 1) at the least, so that its power has more than (k − 1) · size bits.
  const bits = Math.max(bitLength(base.n), bitLength(base.d)) - 1;
  if (size > BigInt(MOST_BITS) || bits * Number(size) > MOST_BITS) return null;
  const power = { n: base.n ** size, d: base.d ** size };
  return exponent > 0n ? power : rational(power.d, power.n);
}

const bitLength = (n: bigint) => (n < 0n ? -n : n).toString(2).length;

/**
 * A function of its arguments. `abs`, `min` and `max` of fractions stay exact, so does the `sqrt` of a fraction whose
 * numerator and denominator are squares; everything else is a double.
 */
export function callFunction(node: CallNode, values: readonly Quantity[]): Quantity {
  const exact = exactCall(node, values);
  return exact ?? applyFunction(node.function, values.map(doubleOf));
}

function exactCall(node: CallNode, values: readonly Quantity[]): Rational | null {
  const fractions = values.filter(value => typeof value !== 'number');
  const [first] = fractions;
  if (first === undefined || fractions.length < values.length) return null;
  switch (node.function) {
    case 'abs':
      return first.n < 0n ? negateRational(first) : first;
    case 'min':
      return fractions.reduce((least, value) => (compareRationals(value, least) < 0 ? value : least));
    case 'max':
      return fractions.reduce((most, value) => (compareRationals(value, most) > 0 ? value : most));
    case 'sqrt':
      return squareRoot(first);
    default:
      return null;
  }
}

function squareRoot({ n, d }: Rational): Rational | null {
  const [top, bottom] = [wholeSquareRoot(n), wholeSquareRoot(d)];
  return top === null || bottom === null ? null : { n: top, d: bottom };
}

/** The root of a square, null for any other whole number. Newton's iteration from above. */
function wholeSquareRoot(n: bigint): bigint | null {
  if (n < 0n) return null;
  if (n < 2n) return n;
  let root = 1n << BigInt(Math.ceil(bitLength(n) / 2));
  for (let next = (root + n / root) >> 1n; next < root; next = (root + n / root) >> 1n) root = next;
  return root * root === n ? root : null;
}
