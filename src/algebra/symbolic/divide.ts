/**
 * Exact quotients: a / b where b divides a over the integers, and the proof that it does not where it does not. What
 * Bareiss elimination, reduction to lowest terms and factoring for print lean on.
 */

import { alignTo, degreesOver, unionOfVariables } from './alignment.ts';
import { type Effort, wordsOf } from './effort.ts';
import { degreesOfSum, gatherProducts, type SignedProduct, sumOfProducts, variablesOfProducts } from './multiply.ts';
import {
  degreesOf,
  dividePolynomialByInteger,
  equalPolynomials,
  isConstantPolynomial,
  isOnePolynomial,
  isZeroPolynomial,
  ONE_POLYNOMIAL,
  type SymbolicPolynomial,
  withoutUnusedVariables,
  ZERO_POLYNOMIAL,
} from './polynomial.ts';
import { type Packing, packingFor, packTerms, unpackKey } from './term-keys.ts';
import { TermTable } from './term-table.ts';

/**
 * a / b.
 *
 * @returns null where b, which is not zero, does not divide a with whole coefficients.
 */
export function exactQuotient(a: SymbolicPolynomial, b: SymbolicPolynomial, effort: Effort): SymbolicPolynomial | null {
  if (isOnePolynomial(b)) return a;
  if (isZeroPolynomial(a)) return ZERO_POLYNOMIAL;
  if (isZeroPolynomial(b)) throw new RangeError('a polynomial divided by zero');
  if (isConstantPolynomial(b)) return quotientByInteger(a, b.coefficients[0]!, effort);
  const divisor = divisorDegrees(b, a.variables);
  if (divisor === null) return null;
  const degrees = degreesOf(a);
  if (degrees.some((degree, v) => degree < divisor[v]!)) return null;
  if (b.coefficients.length === 1) return quotientByTerm(a, b, effort);
  if (!hasDividingEnds(a, b)) return null;
  if (equalPolynomials(a, b)) return ONE_POLYNOMIAL;
  const room = degrees.map((degree, v) => degree - divisor[v]!);
  return quotientByTable(a, b, degrees, room, effort);
}

/** a / b where b is known to divide a; that it does not is a bug. */
export function knownQuotient(a: SymbolicPolynomial, b: SymbolicPolynomial, effort: Effort): SymbolicPolynomial {
  return known(exactQuotient(a, b, effort));
}

function known(quotient: SymbolicPolynomial | null): SymbolicPolynomial {
  if (quotient === null) throw new Error('a polynomial division that was to be exact leaves a remainder');
  return quotient;
}

/** Degrees of b over the variables of a, null where b has a variable that a lacks. */
function divisorDegrees(b: SymbolicPolynomial, variables: readonly string[]): number[] | null {
  const own = degreesOf(b);
  const degrees = new Array<number>(variables.length).fill(0);
  for (let v = 0, column = 0; v < own.length; v++, column++) {
    while (column < variables.length && variables[column] !== b.variables[v]) column++;
    if (column === variables.length) return null;
    degrees[column] = own[v]!;
  }
  return degrees;
}

function quotientByInteger(a: SymbolicPolynomial, divisor: bigint, effort: Effort): SymbolicPolynomial | null {
  effort.spend(a.coefficients.length * wordsOf(a.coefficients));
  if (a.coefficients.some(coefficient => coefficient % divisor !== 0n)) return null;
  return dividePolynomialByInteger(a, divisor);
}

function quotientByTerm(a: SymbolicPolynomial, term: SymbolicPolynomial, effort: Effort): SymbolicPolynomial | null {
  const divisor = term.coefficients[0]!;
  const n = a.variables.length;
  const shift = alignTo(term, a.variables).exponents;
  effort.spend(a.coefficients.length * wordsOf(a.coefficients));
  const exponents = a.exponents.map((exponent, k) => exponent - shift[k % n]!);
  if (exponents.some(exponent => exponent < 0)) return null;
  if (divisor !== 1n && a.coefficients.some(coefficient => coefficient % divisor !== 0n)) return null;
  const { coefficients } = dividePolynomialByInteger(a, divisor);
  return withoutUnusedVariables(a.variables, exponents, coefficients);
}

/** Whether the first and the last term of b divide those of a: products of first terms are first, of last terms last. */
function hasDividingEnds(a: SymbolicPolynomial, b: SymbolicPolynomial): boolean {
  const n = a.variables.length;
  const divisor = alignTo(b, a.variables).exponents;
  const ends = [
    [0, 0],
    [a.coefficients.length - 1, b.coefficients.length - 1],
  ] as const;
  return ends.every(([t, u]) => {
    if (a.coefficients[t]! % b.coefficients[u]! !== 0n) return false;
    for (let v = 0; v < n; v++) if (a.exponents[t * n + v]! < divisor[u * n + v]!) return false;
    return true;
  });
}

/** Long division of packed terms; `degrees` are those of a, `room` those that the quotient has in each variable. */
function quotientByTable(
  a: SymbolicPolynomial,
  b: SymbolicPolynomial,
  degrees: readonly number[],
  room: readonly number[],
  effort: Effort,
): SymbolicPolynomial | null {
  const packing = packingFor(degrees);
  const keys = packTerms(a.exponents, a.coefficients.length, packing);
  const remainder = new TermTable(packing.words, 2 * a.coefficients.length);
  a.coefficients.forEach((coefficient, t) => {
    remainder.add(keys, t * packing.words, coefficient);
  });
  const entries = a.coefficients.map((_, t) => t);
  return divideTable(remainder, entries, b, a.variables, packing, room, effort);
}

/**
 * (Σ ± left · right) / divisor where the quotient is known to be exact, as in fraction-free elimination: the sum stays
 * packed on its way into the division.
 */
export function knownQuotientOfSum(
  products: readonly SignedProduct[],
  divisor: SymbolicPolynomial,
  effort: Effort,
): SymbolicPolynomial {
  if (divisor.coefficients.length === 1) return knownQuotient(sumOfProducts(products, effort), divisor, effort);
  const variables = unionOfVariables(variablesOfProducts(products), divisor.variables);
  const degrees = degreesOfSum(products, variables);
  const packing = packingFor(degrees);
  const remainder = gatherProducts(products, variables, packing, effort);
  const own = degreesOver(divisor, variables);
  const room = degrees.map((degree, v) => Math.max(0, degree - own[v]!));
  return known(divideTable(remainder, remainder.descendingEntries(), divisor, variables, packing, room, effort));
}

/**
 * Long division in descending order, the remainder in a table beside a heap of its entries (Johnson, SIGSAM Bull. 8, 1974,
 * keeps the products in the heap instead). A quotient's term beyond `room` proves that b does not divide; within it no
 * packed exponent carries into the next.
 *
 * @param entries  those of `remainder`, descending; both are used up.
 */
function divideTable(
  remainder: TermTable,
  entries: number[],
  b: SymbolicPolynomial,
  variables: readonly string[],
  packing: Packing,
  room: readonly number[],
  effort: Effort,
): SymbolicPolynomial | null {
  const width = packing.words;
  const divisorKeys = packTerms(alignTo(b, variables).exponents, b.coefficients.length, packing);
  const lead = b.coefficients[0]!;
  const cost = b.coefficients.length * width * wordsOf(b.coefficients);
  const quotientKey = new Array<number>(width).fill(0);
  const key = new Array<number>(width).fill(0);
  const exponents: number[] = [];
  const coefficients: bigint[] = [];
  while (entries.length > 0) {
    const entry = takeLargest(entries, remainder);
    const coefficient = remainder.sums[entry]!;
    if (coefficient === 0n) continue;
    for (let w = 0; w < width; w++) quotientKey[w] = remainder.keys[entry * width + w]! - divisorKeys[w]!;
    if (coefficient % lead !== 0n || quotientKey.some(word => word < 0)) return null;
    unpackKey(quotientKey, 0, packing, exponents);
    const start = exponents.length - room.length;
    for (let v = 0; v < room.length; v++) if (exponents[start + v]! > room[v]!) return null;
    const factor = coefficient / lead;
    coefficients.push(factor);
    effort.spend(cost * wordsOf([factor]));
    effort.holdTerms(coefficients.length);
    for (let j = 1; j < b.coefficients.length; j++) {
      for (let w = 0; w < width; w++) key[w] = quotientKey[w]! + divisorKeys[j * width + w]!;
      if (remainder.add(key, 0, -factor * b.coefficients[j]!)) {
        insertEntry(entries, remainder.sums.length - 1, remainder);
      }
    }
  }
  return withoutUnusedVariables(variables, exponents, coefficients);
}

/** Removes the entry of largest key from a binary heap (Williams 1964), where no parent is below its children. */
function takeLargest(heap: number[], table: TermTable): number {
  const largest = heap[0]!;
  const last = heap.pop()!;
  const length = heap.length;
  if (length === 0) return largest;
  let hole = 0;
  while (true) {
    let child = 2 * hole + 1;
    if (child >= length) break;
    if (child + 1 < length && table.compare(heap[child + 1]!, heap[child]!) > 0) child++;
    if (table.compare(heap[child]!, last) <= 0) break;
    heap[hole] = heap[child]!;
    hole = child;
  }
  heap[hole] = last;
  return largest;
}

function insertEntry(heap: number[], entry: number, table: TermTable): void {
  let hole = heap.length;
  heap.push(entry);
  while (hole > 0) {
    const parent = (hole - 1) >> 1;
    if (table.compare(heap[parent]!, entry) >= 0) break;
    heap[hole] = heap[parent]!;
    hole = parent;
  }
  heap[hole] = entry;
}
