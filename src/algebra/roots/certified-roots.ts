/**
 * The roots of an exact polynomial: each part the nearest double, each multiplicity exact, each real root and each root on the
 * imaginary axis known as such. Square-free factors give the multiplicities, discs that are proved to hold one root each
 * give the values. Poles, zeros and stability stand on it.
 */

import { exponentOf } from '../integer.ts';
import { exactQuotient, type IntegerPolynomial, primitiveOf, primitivePart } from '../integer-polynomial.ts';
import type { Polynomial } from '../polynomial.ts';
import { integerGcd } from '../polynomial-gcd.ts';
import { compareRationals, rational } from '../rational.ts';
import { rationalFromDouble, toDouble } from '../rational-double.ts';
import { coprimeFactors, integerSquareFreeFactors } from '../square-free.ts';
import { approximateRoots } from './approximate-roots.ts';
import { isolated } from './root-isolation.ts';
import { type RoundedRoot, roundedRoots, roundedSquareRoots } from './root-rounding.ts';
import { sharpenedUntil } from './root-sharpening.ts';
import type { Site } from './root-sites.ts';
import { startingPoints } from './root-starts.ts';
import { subjectOf } from './root-steps.ts';

/** A root; a complex pair is two of them. */
export interface CertifiedRoot {
  /** The nearest double of the real part; 0 exactly where the root is on the imaginary axis. */
  readonly re: number;
  /** The nearest double of the imaginary part; 0 exactly where the root is real, the conjugate's with the other sign. */
  readonly im: number;
  readonly multiplicity: number;
  /** Bound on the distance from re + i·im to the root: half a unit in the last place of each part, 0 where it is known to be exact. */
  readonly radius: number;
}

/**
 * The roots of p by real part descending, then by imaginary part descending; none for a constant or zero.
 *
 * Throws where `findCertifiedRoots` has no answer, which no polynomial from a drawing has been seen to bring about.
 */
export function certifiedRoots(p: Polynomial): CertifiedRoot[] {
  const roots = findCertifiedRoots([p]);
  if (roots === null) throw new RangeError('roots that are not separated within 8192 bits');
  return roots;
}

/**
 * The roots of the product of the factors, found factor by factor, in the order of `certifiedRoots`; null where the iteration
 * did not converge: roots nearer to each other than 2⁻⁹⁰⁰ of their magnitude, or too ill-conditioned for 8,192 bits. A part is
 * the nearest double unless it lies within 2⁻³⁰⁰ of itself from the middle between two doubles, when it may be either. Parts
 * that are not zero never become zero.
 *
 * Square-free factors by Yun (1976), starts by Bini (1996), steps by Ehrlich (1967) and Aberth (1973), discs n |f / f′| pairwise
 * disjoint (B. T. Smith 1970, J. ACM 17), precision raised as needed as in Bini & Fiorentino (2000, Numer. Algorithms 23).
 */
export function findCertifiedRoots(factors: readonly Polynomial[]): CertifiedRoot[] | null {
  let atZero = 0;
  const squareFree = factors.flatMap(factor => {
    const f = primitiveOf(factor);
    const last = f.findLastIndex(coefficient => coefficient !== 0n);
    atZero += last < 0 ? 0 : f.length - 1 - last;
    return integerSquareFreeFactors(f.slice(0, last + 1));
  });
  const roots: CertifiedRoot[] = atZero > 0 ? [{ re: 0, im: 0, multiplicity: atZero, radius: 0 }] : [];
  for (const { factor, multiplicity } of coprimeFactors(squareFree)) {
    const found = simpleRoots(factor);
    if (found === null) return null;
    for (const root of found) roots.push({ re: root.re, im: root.im, multiplicity, radius: halfUnits(root) });
  }
  return roots.sort((a, b) => b.re - a.re || b.im - a.im);
}

/** The roots of a square-free f with f(0) ≠ 0. */
function simpleRoots(f: IntegerPolynomial): RoundedRoot[] | null {
  if (f.length === 2) return [rationalRoot(f[0]!, f[1]!)];
  const [inSquare, rest] = splitBySymmetry(f);
  const onMirror = inSquare.length > 1 ? rootsBy(inSquare, roundedSquareRoots) : [];
  const others = rest.length === 2 ? simpleRoots(rest) : rest.length > 1 ? rootsBy(rest, roundedRoots) : [];
  return onMirror === null || others === null ? null : [...onMirror, ...others];
}

/** −b / a; one that is too small for a double is kept off zero. */
function rationalRoot(a: bigint, b: bigint): RoundedRoot {
  const value = rational(-b, a);
  const nearest = toDouble(value);
  const isExact = Number.isFinite(nearest) && compareRationals(rationalFromDouble(nearest), value) === 0;
  const re = nearest === 0 ? (value.n > 0n ? Number.MIN_VALUE : -Number.MIN_VALUE) : nearest;
  return { re, im: 0, isExact };
}

/**
 * f = a(s²) b(s) with every pair of roots ±z in a, so that b has no root on the imaginary axis: a is the gcd of the even and
 * the odd part of f as polynomials in s².
 */
function splitBySymmetry(f: IntegerPolynomial): readonly [IntegerPolynomial, IntegerPolynomial] {
  const even = f.filter((_, j) => (f.length - 1 - j) % 2 === 0);
  const odd = f.filter((_, j) => (f.length - 1 - j) % 2 === 1);
  const firstEven = even.findIndex(coefficient => coefficient !== 0n);
  const firstOdd = odd.findIndex(coefficient => coefficient !== 0n);
  const common = integerGcd(
    primitivePart(even.slice(firstEven)),
    firstOdd < 0 ? [] : primitivePart(odd.slice(firstOdd)),
  );
  if (common.length === 1) return [common, f];
  const inSquare = common.flatMap((coefficient, j) => (j === 0 ? [coefficient] : [0n, coefficient]));
  const rest = exactQuotient(f, inSquare);
  if (rest === null) throw new Error('a symmetric factor that does not divide');
  return [common, rest];
}

function rootsBy(f: IntegerPolynomial, rounded: (site: Site) => RoundedRoot[] | null): RoundedRoot[] | null {
  const subject = subjectOf(f);
  const sites = isolated(subject, approximateRoots(f, startingPoints(f)));
  return sites === null ? null : sharpenedUntil(subject, sites, rounded);
}

/** Half a unit in the last place of both parts together, upwards. */
function halfUnits({ re, im, isExact = false }: RoundedRoot): number {
  if (isExact) return 0;
  return Math.hypot(halfUnit(re), halfUnit(im)) * (1 + 2 ** -50);
}

/** Half the spacing of doubles at x: 2⁻⁵³ of the power of two below |x|, half the least subnormal at the least. */
function halfUnit(x: number): number {
  if (!Number.isFinite(x)) return Number.POSITIVE_INFINITY;
  return x === 0 ? 0 : Math.max(2 ** (exponentOf(x) - 53), 2 ** -1074);
}
