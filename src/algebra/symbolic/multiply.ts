/**
 * Products of polynomials, and sums of products in one pass: like terms are gathered under packed exponents and sorted
 * once. Sparse as in Johnson (SIGSAM Bull. 8, 1974) and Monagan & Pearce (J. Symb. Comput. 46, 2011), with a hash table in
 * place of their heap.
 */

import { subtractPolynomials } from './add.ts';
import { type AlignedTerms, alignTo, degreesOver, unionOfVariables } from './alignment.ts';
import { type Effort, EffortSpent, MAXIMUM_EXPONENT, wordsOf } from './effort.ts';
import {
  constantPolynomial,
  isConstantPolynomial,
  isZeroPolynomial,
  ONE_POLYNOMIAL,
  type SymbolicPolynomial,
  scalePolynomial,
  withoutUnusedVariables,
  ZERO_POLYNOMIAL,
} from './polynomial.ts';
import { type Packing, packingFor, packTerms, unpackKey } from './term-keys.ts';
import { TermTable } from './term-table.ts';

/** a · b. As many term operations as the product of the numbers of terms. */
export function multiplyPolynomials(a: SymbolicPolynomial, b: SymbolicPolynomial, effort: Effort): SymbolicPolynomial {
  if (isConstantPolynomial(a)) return multiplyByConstant(b, a, effort);
  if (isConstantPolynomial(b)) return multiplyByConstant(a, b, effort);
  const variables = unionOfVariables(a.variables, b.variables);
  if (a.coefficients.length === 1) return multiplyByTerm(b, a, variables, effort);
  if (b.coefficients.length === 1) return multiplyByTerm(a, b, variables, effort);
  return sumOverVariables([{ left: a, right: b, isNegative: false }], variables, effort);
}

/** a · b − c · d, without the two products on the way. */
export function differenceOfProducts(
  a: SymbolicPolynomial,
  b: SymbolicPolynomial,
  c: SymbolicPolynomial,
  d: SymbolicPolynomial,
  effort: Effort,
): SymbolicPolynomial {
  if (isZeroPolynomial(c) || isZeroPolynomial(d)) return multiplyPolynomials(a, b, effort);
  if (isConstantPolynomial(a) || isConstantPolynomial(b) || isConstantPolynomial(c) || isConstantPolynomial(d)) {
    return subtractPolynomials(multiplyPolynomials(a, b, effort), multiplyPolynomials(c, d, effort));
  }
  return sumOfProducts(
    [
      { left: a, right: b, isNegative: false },
      { left: c, right: d, isNegative: true },
    ],
    effort,
  );
}

/** One term of a sum of products. */
export interface SignedProduct {
  readonly left: SymbolicPolynomial;
  readonly right: SymbolicPolynomial;
  readonly isNegative: boolean;
}

/** Σ ± left · right, like terms gathered once over all the products. */
export function sumOfProducts(products: readonly SignedProduct[], effort: Effort): SymbolicPolynomial {
  return sumOverVariables(products, variablesOfProducts(products), effort);
}

/** p to a whole power of at least 0, by repeated squaring. */
export function powerOfPolynomial(p: SymbolicPolynomial, exponent: number, effort: Effort): SymbolicPolynomial {
  let result = ONE_POLYNOMIAL;
  let square = p;
  for (let rest = exponent; rest > 0; rest = Math.floor(rest / 2)) {
    if (rest % 2 === 1) result = multiplyPolynomials(result, square, effort);
    if (rest > 1) square = multiplyPolynomials(square, square, effort);
  }
  return result;
}

function multiplyByConstant(p: SymbolicPolynomial, constant: SymbolicPolynomial, effort: Effort): SymbolicPolynomial {
  const factor = constant.coefficients[0];
  if (factor === undefined || isZeroPolynomial(p)) return ZERO_POLYNOMIAL;
  effort.spend(p.coefficients.length * wordsOf(p.coefficients) * wordsOf(constant.coefficients));
  return isConstantPolynomial(p) ? constantPolynomial(p.coefficients[0]! * factor) : scalePolynomial(p, factor);
}

/** A product by one term keeps the order of terms. */
function multiplyByTerm(
  p: SymbolicPolynomial,
  term: SymbolicPolynomial,
  variables: readonly string[],
  effort: Effort,
): SymbolicPolynomial {
  effort.spend(p.coefficients.length * wordsOf(p.coefficients) * wordsOf(term.coefficients));
  const n = variables.length;
  const shift = alignTo(term, variables).exponents;
  const terms = alignTo(p, variables).exponents;
  const exponents = new Array<number>(terms.length);
  for (let k = 0, v = 0; k < terms.length; k++) {
    const exponent = terms[k]! + shift[v]!;
    if (exponent > MAXIMUM_EXPONENT) throw new EffortSpent('exponent');
    exponents[k] = exponent;
    if (++v === n) v = 0;
  }
  const factor = term.coefficients[0]!;
  return { variables, exponents, coefficients: scalePolynomial(p, factor).coefficients };
}

/** Σ ± left · right, all over `variables`. */
function sumOverVariables(
  products: readonly SignedProduct[],
  variables: readonly string[],
  effort: Effort,
): SymbolicPolynomial {
  const packing = packingFor(degreesOfSum(products, variables));
  const table = gatherProducts(products, variables, packing, effort);
  const exponents: number[] = [];
  const coefficients: bigint[] = [];
  for (const entry of table.descendingEntries()) {
    const sum = table.sums[entry]!;
    if (sum === 0n) continue;
    unpackKey(table.keys, entry * packing.words, packing, exponents);
    coefficients.push(sum);
  }
  effort.holdTerms(coefficients.length);
  return withoutUnusedVariables(variables, exponents, coefficients);
}

/** The names that occur in any factor, ascending. */
export function variablesOfProducts(products: readonly SignedProduct[]): readonly string[] {
  let variables: readonly string[] = [];
  for (const { left, right } of products) {
    variables = unionOfVariables(unionOfVariables(variables, left.variables), right.variables);
  }
  return variables;
}

/** Upper bounds of the degrees of Σ ± left · right; throws `EffortSpent` beyond the largest exponent. */
export function degreesOfSum(products: readonly SignedProduct[], variables: readonly string[]): number[] {
  const degrees = new Array<number>(variables.length).fill(0);
  for (const { left, right } of products) {
    const leftDegrees = degreesOver(left, variables);
    const rightDegrees = degreesOver(right, variables);
    for (let v = 0; v < degrees.length; v++) {
      degrees[v] = Math.max(degrees[v]!, leftDegrees[v]! + rightDegrees[v]!);
    }
  }
  if (degrees.some(degree => degree > MAXIMUM_EXPONENT)) throw new EffortSpent('exponent');
  return degrees;
}

/** The terms of Σ ± left · right by packed exponents. */
export function gatherProducts(
  products: readonly SignedProduct[],
  variables: readonly string[],
  packing: Packing,
  effort: Effort,
): TermTable {
  let expected = 0;
  for (const { left, right } of products) expected += left.coefficients.length + right.coefficients.length;
  const table = new TermTable(packing.words, 2 * expected);
  for (const { left, right, isNegative } of products) {
    const a = alignTo(left, variables);
    const b = alignTo(right, variables);
    const [short, long] = a.coefficients.length < b.coefficients.length ? [a, b] : [b, a];
    gatherProduct(short, long, isNegative, packing, table, effort);
  }
  return table;
}

function gatherProduct(
  short: AlignedTerms,
  long: AlignedTerms,
  isNegative: boolean,
  packing: Packing,
  table: TermTable,
  effort: Effort,
): void {
  const width = packing.words;
  const shortKeys = packTerms(short.exponents, short.coefficients.length, packing);
  const longKeys = packTerms(long.exponents, long.coefficients.length, packing);
  const cost = long.coefficients.length * width * wordsOf(short.coefficients) * wordsOf(long.coefficients);
  const key = new Array<number>(width).fill(0);
  for (let i = 0; i < short.coefficients.length; i++) {
    effort.spend(cost);
    const factor = isNegative ? -short.coefficients[i]! : short.coefficients[i]!;
    for (let j = 0; j < long.coefficients.length; j++) {
      for (let w = 0; w < width; w++) key[w] = shortKeys[i * width + w]! + longKeys[j * width + w]!;
      table.add(key, 0, factor * long.coefficients[j]!);
    }
    effort.holdGathered(table.sums.length);
  }
}
