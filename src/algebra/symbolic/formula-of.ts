/**
 * From a rational function to the formula that an engineer would write: `-b/J`, `K1*K2/(1 + K1*K2*K3)`, `g*(M + m)/(M*l)`.
 * Numerator and denominator are each tried expanded and factored, and what is shortest as text stands.
 */

import type { Rational } from '../rational.ts';
import { rational } from '../rational.ts';
import { Effort, type EffortLimits, withinEffort } from './effort.ts';
import { contentFactors, type Factors, factorsOf } from './factors.ts';
import {
  type Formula,
  isWrittenOne,
  loneSum,
  terminatingDecimal,
  WRITTEN_ONE,
  type WrittenNumber,
  type WrittenProduct,
} from './formula.ts';
import { formulaText } from './formula-text.ts';
import { negatePolynomial, type SymbolicPolynomial, signOf } from './polynomial.ts';
import { isZeroFunction, type RationalFunction } from './rational-function.ts';
import { declaredOrder, type NameOrder, negatedTerms, orderedPowers, writtenTerms } from './written-terms.ts';

/** How formulas are written. */
export interface FormulaOptions {
  /** The parameters as declared: their order in products and sums. Undeclared names come first. */
  readonly declared?: readonly string[];
  /** Polynomials that may divide numerators and denominators, such as the determinants of the loops. */
  readonly knownFactors?: readonly SymbolicPolynomial[];
  /**
   * For the search for factors; once it is spent, formulas stay expanded. Hand in one for all the entries of a model: the
   * default is a new one for each formula.
   */
  readonly effort?: Effort;
}

/** About a tenth of a second. */
const PRINT_LIMITS: EffortLimits = { maximumTerms: 20_000, maximumOperations: 300_000 };

/**
 * The formula of f; the same function gives the same formula. Products read number, parameters as declared, sums; sums by
 * degree, lowest first, a positive term in front. A minus in front of the whole moves into a difference where there is one.
 */
export function formulaOf(f: RationalFunction, options: FormulaOptions = {}): Formula {
  if (isZeroFunction(f)) return ZERO_FORMULA;
  const order = declaredOrder(options.declared ?? []);
  const effort = options.effort ?? new Effort(PRINT_LIMITS);
  const known = options.knownFactors ?? [];
  const denominators = splitsOf(f.denominator, known, effort);
  const candidates = splitsOf(f.numerator, known, effort).flatMap(above =>
    denominators.flatMap(below =>
      formulasFrom(above.factors, below.factors, order).map(({ formula, handicap }) => ({
        formula,
        handicap: handicap + above.handicap + below.handicap,
      })),
    ),
  );
  let best: Formula = ZERO_FORMULA;
  let fewest = Number.POSITIVE_INFINITY;
  for (const { formula, handicap } of candidates) {
    const length = formulaText(formula).length + handicap;
    if (length >= fewest) continue;
    best = formula;
    fewest = length;
  }
  return best;
}

const ONE_PRODUCT: WrittenProduct = { number: WRITTEN_ONE, powers: [], sums: [] };

const ZERO_FORMULA: Formula = {
  sign: 1,
  numerator: { ...ONE_PRODUCT, number: { integer: 0n, decimals: 0 } },
  denominator: ONE_PRODUCT,
};

/** A way to take a polynomial apart, and the characters that it has to save against the others. */
interface Split {
  readonly factors: Factors;
  readonly handicap: number;
}

/** Characters that brackets may cost before a product is multiplied out: `J*(1 + K)` stands for `J + J*K`. */
const FACTOR_BONUS = 2;

/** The ways to take a polynomial apart, the most factored first: what is tried first wins among equals. */
function splitsOf(p: SymbolicPolynomial, known: readonly SymbolicPolynomial[], effort: Effort): Split[] {
  const content = contentFactors(p);
  if (content.polynomials.length === 0) return [{ factors: content, handicap: 0 }];
  const factored = withinEffort(() => factorsOf(p, known, effort));
  const sign = signOf(p);
  const positive = sign < 0 ? negatePolynomial(p) : p;
  const whole: Factors = { sign, integer: 1n, monomial: [], polynomials: [{ polynomial: positive, multiplicity: 1 }] };
  const hasContent = content.integer !== 1n || content.monomial.length > 0;
  const found = factored.finished ? factored.value.polynomials : [];
  const isSplit = found.length > 1 || found.some(({ multiplicity }) => multiplicity > 1);
  const products = [...(factored.finished && isSplit ? [factored.value] : []), ...(hasContent ? [content] : [])];
  return [
    ...products.map(factors => ({ factors, handicap: 0 })),
    { factors: whole, handicap: products.length === 0 ? 0 : FACTOR_BONUS },
  ];
}

/** A formula and the characters that it has to save against the others to be chosen. */
interface Candidate {
  readonly formula: Formula;
  readonly handicap: number;
}

/** The formulas that one way of taking apart leads to: the number as a fraction, as a decimal, and spread over a lone sum. */
function formulasFrom(numerator: Factors, denominator: Factors, order: NameOrder): Candidate[] {
  const number = rational(numerator.integer, denominator.integer);
  const above = productOf(numerator, order);
  const below = productOf(denominator, order);
  const sign = numerator.sign * denominator.sign > 0 ? 1 : -1;
  const whole = (integer: bigint): WrittenNumber => ({ integer, decimals: 0 });
  const fraction = formulaWith(sign, above, below, whole(number.n), whole(number.d));
  const candidates: Candidate[] = [];
  const decimal = terminatingDecimal(number.n, number.d);
  if (number.d === 1n || decimal === null) candidates.push({ formula: fraction, handicap: 0 });
  else {
    const { fractionHandicap, decimalHandicap } = handicaps(number.d);
    candidates.push({ formula: fraction, handicap: fractionHandicap });
    candidates.push({ formula: formulaWith(sign, above, below, decimal, WRITTEN_ONE), handicap: decimalHandicap });
    const spread = spreadNumber(above, number);
    if (spread !== null) {
      candidates.push({ formula: formulaWith(sign, spread, below, WRITTEN_ONE, WRITTEN_ONE), handicap: 0 });
    }
  }
  candidates.push(...unitConstantCandidates(sign, above, below, number));
  return candidates;
}

/** The formula whose denominator, a lone sum, starts with 1, where the other numbers are decimals then; none or one. */
function unitConstantCandidates(
  sign: 1 | -1,
  above: WrittenProduct,
  below: WrittenProduct,
  number: Rational,
): Candidate[] {
  const unit = constantOf(below);
  if (unit <= 1n) return [];
  const spread = spreadNumber(below, rational(1n, unit));
  const scaled = rational(number.n, number.d * unit);
  const outside = terminatingDecimal(scaled.n, scaled.d);
  if (spread === null || outside === null) return [];
  return [{ formula: formulaWith(sign, above, spread, outside, WRITTEN_ONE), handicap: -UNIT_CONSTANT_BONUS }];
}

/** Characters that `K/(1 + 0.05*K)` may cost more than `20*K/(20 + K)`: a loop is read by its gain beside one. */
const UNIT_CONSTANT_BONUS = 3;

/** The whole constant in front of a lone sum; 0 where there is none. */
function constantOf(product: WrittenProduct): bigint {
  const front = loneSum(product)?.[0];
  return front !== undefined && front.sign > 0 && front.powers.length === 0 ? front.number.integer : 0n;
}

/**
 * A taste in characters where a number has both forms: halves, quarters and eighths stay fractions (`1/(2*pi)`), tenths and
 * less tend to decimals (`0.002 + 0.05*Kp`), thousandths and less all the more (`1e-12*C`).
 */
function handicaps(denominator: bigint): { readonly fractionHandicap: number; readonly decimalHandicap: number } {
  const isHalving = denominator === 2n || denominator === 4n || denominator === 8n;
  const fractionHandicap = denominator < 10n ? 0 : denominator < 1000n ? 1 : 3;
  return { fractionHandicap, decimalHandicap: isHalving ? 2 : 0 };
}

function productOf({ monomial, polynomials }: Factors, order: NameOrder): WrittenProduct {
  const sums = polynomials.map(({ polynomial, multiplicity }) => ({
    terms: writtenTerms(polynomial, order),
    exponent: multiplicity,
  }));
  return { number: WRITTEN_ONE, powers: orderedPowers(monomial, order), sums: sums.sort(byWriting) };
}

type WrittenFactor = WrittenProduct['sums'][number];

/** Shorter sums first, then by their text. */
function byWriting(a: WrittenFactor, b: WrittenFactor): number {
  if (a.terms.length !== b.terms.length) return a.terms.length - b.terms.length;
  const [left, right] = [textOfSum(a), textOfSum(b)];
  return left < right ? -1 : left > right ? 1 : 0;
}

function textOfSum({ terms }: WrittenFactor): string {
  const numerator = { ...ONE_PRODUCT, sums: [{ terms, exponent: 1 }] };
  return formulaText({ sign: 1, numerator, denominator: ONE_PRODUCT });
}

/** The terms of a lone sum times a number, as decimals; null where there is no lone sum or a term does not terminate. */
function spreadNumber(product: WrittenProduct, number: Rational): WrittenProduct | null {
  const sum = loneSum(product);
  if (sum === null) return null;
  const terms = [];
  for (const term of sum) {
    const scaled = rational(term.number.integer * number.n, number.d);
    const decimal = terminatingDecimal(scaled.n, scaled.d);
    if (decimal === null) return null;
    terms.push({ ...term, number: decimal });
  }
  return { ...product, sums: [{ terms, exponent: 1 }] };
}

/** Puts numbers and sign in place; a minus turns the first difference around. */
function formulaWith(
  sign: 1 | -1,
  above: WrittenProduct,
  below: WrittenProduct,
  aboveNumber: WrittenNumber,
  belowNumber: WrittenNumber,
): Formula {
  const numerator = isWrittenOne(aboveNumber) ? above : { ...above, number: aboveNumber };
  const denominator = isWrittenOne(belowNumber) ? below : { ...below, number: belowNumber };
  if (sign > 0) return { sign, numerator, denominator };
  const turned = turnedAround(numerator);
  return turned === null ? { sign, numerator, denominator } : { sign: 1, numerator: turned, denominator };
}

/** The negative of a product, made in its first difference; null where there is none. */
function turnedAround(product: WrittenProduct): WrittenProduct | null {
  const at = product.sums.findIndex(({ terms, exponent }) => exponent % 2 === 1 && terms.some(({ sign }) => sign < 0));
  if (at < 0) return null;
  return {
    ...product,
    sums: product.sums.map((factor, k) => (k === at ? { ...factor, terms: negatedTerms(factor.terms) } : factor)),
  };
}
