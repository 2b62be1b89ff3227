/**
 * Polynomials in many parameters with whole coefficients, as sorted lists of terms: the numerators and denominators of
 * every symbolic entry. Plain data that needs no ring beside it; equal polynomials have equal lists. Products, quotients
 * and divisors stand in the files beside.
 */

/**
 * Σ coefficients[t] · Π variables[v] ^ exponents[t · variables.length + v] over the terms t.
 *
 * `variables` are exactly those that occur, ascending by code unit: parameter names, or opaque atoms such as `sqrt(2)` whose
 * text is their name. No coefficient is zero; terms descend lexicographically by exponents, the first variable foremost.
 * The zero polynomial has no terms.
 */
export interface SymbolicPolynomial {
  readonly variables: readonly string[];
  readonly exponents: readonly number[];
  readonly coefficients: readonly bigint[];
}

const NO_VARIABLES: readonly string[] = [];

/** The polynomial without terms. */
export const ZERO_POLYNOMIAL: SymbolicPolynomial = { variables: NO_VARIABLES, exponents: [], coefficients: [] };
/** The number one. */
export const ONE_POLYNOMIAL: SymbolicPolynomial = { variables: NO_VARIABLES, exponents: [], coefficients: [1n] };

/** The whole number as a polynomial. */
export function constantPolynomial(value: bigint): SymbolicPolynomial {
  if (value === 0n) return ZERO_POLYNOMIAL;
  return value === 1n ? ONE_POLYNOMIAL : { variables: NO_VARIABLES, exponents: [], coefficients: [value] };
}

/** One parameter to the first power. */
export function variablePolynomial(name: string): SymbolicPolynomial {
  return { variables: [name], exponents: [1], coefficients: [1n] };
}

/** Whether p has no terms. */
export function isZeroPolynomial(p: SymbolicPolynomial): boolean {
  return p.coefficients.length === 0;
}

/** Whether p is the number one. */
export function isOnePolynomial(p: SymbolicPolynomial): boolean {
  return p.variables.length === 0 && p.coefficients.length === 1 && p.coefficients[0] === 1n;
}

/** Whether p is a number, zero included. */
export function isConstantPolynomial(p: SymbolicPolynomial): boolean {
  return p.variables.length === 0;
}

/** Whether two polynomials are the same, term by term. */
export function equalPolynomials(a: SymbolicPolynomial, b: SymbolicPolynomial): boolean {
  if (a === b) return true;
  if (a.coefficients.length !== b.coefficients.length || a.variables.length !== b.variables.length) return false;
  return (
    a.coefficients.every((coefficient, t) => coefficient === b.coefficients[t]) &&
    a.exponents.every((exponent, k) => exponent === b.exponents[k]) &&
    a.variables.every((name, v) => name === b.variables[v])
  );
}

/** −p. */
export function negatePolynomial(p: SymbolicPolynomial): SymbolicPolynomial {
  return { ...p, coefficients: p.coefficients.map(coefficient => -coefficient) };
}

/** p times a whole number. */
export function scalePolynomial(p: SymbolicPolynomial, factor: bigint): SymbolicPolynomial {
  if (factor === 1n) return p;
  if (factor === 0n) return ZERO_POLYNOMIAL;
  return { ...p, coefficients: p.coefficients.map(coefficient => coefficient * factor) };
}

/** p over a whole number that divides every coefficient. */
export function dividePolynomialByInteger(p: SymbolicPolynomial, divisor: bigint): SymbolicPolynomial {
  return divisor === 1n ? p : { ...p, coefficients: p.coefficients.map(coefficient => coefficient / divisor) };
}

/** Highest exponent of each variable, in the order of `variables`. */
export function degreesOf(p: SymbolicPolynomial): number[] {
  const n = p.variables.length;
  const degrees = new Array<number>(n).fill(0);
  for (let k = 0, v = 0; k < p.exponents.length; k++) {
    if (p.exponents[k]! > degrees[v]!) degrees[v] = p.exponents[k]!;
    if (++v === n) v = 0;
  }
  return degrees;
}

/** Sum of the exponents of term t. */
export function totalDegree(p: SymbolicPolynomial, t: number): number {
  const n = p.variables.length;
  let degree = 0;
  for (let k = t * n; k < (t + 1) * n; k++) degree += p.exponents[k]!;
  return degree;
}

/**
 * −1 where the leading term by ascending degree (of the terms of lowest total degree the lexicographically first) has a
 * negative coefficient, else 1; 1 for zero. The sign of a product is the product of the signs.
 */
export function signOf(p: SymbolicPolynomial): 1 | -1 {
  let lowest = Number.POSITIVE_INFINITY;
  let sign: 1 | -1 = 1;
  for (let t = 0; t < p.coefficients.length; t++) {
    const degree = totalDegree(p, t);
    if (degree >= lowest) continue;
    lowest = degree;
    sign = p.coefficients[t]! < 0n ? -1 : 1;
  }
  return sign;
}

/** The polynomial of sorted terms over `variables`, of which those that do not occur are left out. */
export function withoutUnusedVariables(
  variables: readonly string[],
  exponents: readonly number[],
  coefficients: readonly bigint[],
): SymbolicPolynomial {
  if (coefficients.length === 0) return ZERO_POLYNOMIAL;
  const n = variables.length;
  const isUsed = new Array<boolean>(n).fill(false);
  let unused = n;
  for (let k = 0, v = 0; k < exponents.length && unused > 0; k++) {
    if (exponents[k] !== 0 && !isUsed[v]) {
      isUsed[v] = true;
      unused--;
    }
    if (++v === n) v = 0;
  }
  if (unused === 0) return { variables, exponents, coefficients };
  const kept = variables.filter((_, v) => isUsed[v]);
  return {
    variables: kept.length === 0 ? NO_VARIABLES : kept,
    exponents: exponents.filter((_, k) => isUsed[k % n]),
    coefficients,
  };
}
