/**
 * One step of the refinement: the Newton correction at a site with a bound on its error, the disc that it proves to hold a
 * root, and the point to go to with a bound on what is left. Isolation and sharpening are loops around it.
 */

import { bitLength } from '../integer.ts';
import type { IntegerPolynomial } from '../integer-polynomial.ts';
import { evaluateAtComplex, evaluateAtReal, type FixedValue, fixedCoefficients } from './fixed-point.ts';
import { fromFixed, LEAST_RADIUS, type Site, toFixed, type View } from './root-sites.ts';

/** Relative room for the rounding of the handful of double operations in a bound. */
const UP = 1 + 2 ** -40;

/** f / f′ at a site, in units of its 2^exponent. */
export interface Newton {
  /** In fixed point, to the site's bits. */
  readonly x: bigint;
  readonly y: bigint;
  /** The same in doubles. */
  readonly re: number;
  readonly im: number;
  /** Bound on the distance from (x, y) to the true quotient; Infinity where the slope is lost in rounding. */
  readonly error: number;
  /** Whether the value is lost in rounding, so that only more bits lead on. */
  readonly isHidden: boolean;
}

/** The polynomial with its fixed-point coefficients, kept for each exponent and number of bits that is met. */
export interface Subject {
  readonly degree: number;
  coefficients(exponent: number, bits: number): readonly bigint[];
}

export function subjectOf(f: IntegerPolynomial): Subject {
  const known = new Map<string, readonly bigint[]>();
  return {
    degree: f.length - 1,
    coefficients(exponent, bits) {
      const key = `${exponent} ${bits}`;
      const kept = known.get(key);
      if (kept !== undefined) return kept;
      const made = fixedCoefficients(f, exponent, bits);
      known.set(key, made);
      return made;
    },
  };
}

/** The Newton correction at a site whose modulus is at most one. O(degree) products of `bits` bits. */
export function newtonAt(subject: Subject, site: Site): Newton {
  const coefficients = subject.coefficients(site.exponent, site.bits);
  const value =
    site.kind === 'real'
      ? evaluateAtReal(coefficients, site.x, site.bits)
      : evaluateAtComplex(coefficients, site.x, site.y, site.bits);
  return quotient(value, site.bits);
}

/**
 * The quotient of value and slope. Bounds are formed in units of the slope's own length, since value, slope and unit may all
 * lie below the range of doubles while their quotients do not.
 */
function quotient(value: FixedValue, bits: number): Newton {
  const { re, im, slopeRe, slopeIm, error, slopeError } = value;
  const slopeBits = Math.max(bitLength(slopeRe), bitLength(slopeIm));
  const unit = Math.max(2 ** -slopeBits, LEAST_RADIUS);
  const slope = Math.hypot(fromFixed(slopeRe, slopeBits), fromFixed(slopeIm, slopeBits));
  const slopeLeft = slope * (1 - 2 ** -40) - slopeError * unit;
  const isLong = bitLength(re) > 100 || bitLength(im) > 100;
  const isHidden = slopeLeft <= 0 || (!isLong && Math.hypot(Number(re), Number(im)) <= 4 * error);
  if (slopeLeft <= 0) return { x: 0n, y: 0n, re: 0, im: 0, error: Number.POSITIVE_INFINITY, isHidden };
  const [x, y] = divided(value, BigInt(bits));
  const [doubleX, doubleY] = [fromFixed(x, bits), fromFixed(y, bits)];
  const length = Math.hypot(doubleX, doubleY);
  // |Ñ − N| ≤ (e + |Ñ| e′) / (|f′| − e′), and two units for the division.
  const valueError = error * unit + length * slopeError * unit;
  const quotientError = (valueError / slopeLeft + Math.max(2 * 2 ** -bits, LEAST_RADIUS)) * UP;
  return { x, y, re: doubleX, im: doubleY, error: quotientError, isHidden };
}

/** value / slope in fixed point, each part within one unit. */
function divided({ re, im, slopeRe, slopeIm }: FixedValue, bits: bigint): [bigint, bigint] {
  if (im === 0n && slopeIm === 0n) return [(re << bits) / slopeRe, 0n];
  const square = slopeRe * slopeRe + slopeIm * slopeIm;
  return [((re * slopeRe + im * slopeIm) << bits) / square, ((im * slopeRe - re * slopeIm) << bits) / square];
}

/** Radius n |f / f′| of a disc around the site that holds a root (Laguerre; Henrici 1974, section 6.4), rounding included. */
export function discRadius(newton: Newton, degree: number): number {
  return Math.max(degree * (Math.hypot(newton.re, newton.im) + newton.error) * UP, LEAST_RADIUS);
}

/**
 * The site after a step of third order, N / (1 − N S) with S the sum over the other roots (Ehrlich 1967, Aberth 1973), and a
 * bound on its distance to the root: the same expression with the true N and S is the exact distance, so what is left is
 * their errors through its derivatives. Infinity where the view is too blurred to say.
 */
export function stepped(site: Site, newton: Newton, view: View): Site {
  const { re, im } = newton;
  // N S / (1 − N S)
  const productRe = re * view.re - im * view.im;
  const productIm = re * view.im + im * view.re;
  const square = (1 - productRe) ** 2 + productIm ** 2;
  const isUsable = square > 2 ** -20 && Number.isFinite(square);
  const gainRe = isUsable ? (productRe * (1 - productRe) - productIm * productIm) / square : 0;
  const gainIm = isUsable ? productIm / square : 0;
  const moreRe = re * gainRe - im * gainIm;
  const moreIm = re * gainIm + im * gainRe;
  const x = site.x - newton.x - toFixed(moreRe, site.bits);
  const y = site.kind === 'real' ? 0n : site.y - newton.y - toFixed(moreIm, site.bits);
  return { ...site, x, y, radius: radiusAfter(newton, view, Math.hypot(moreRe, moreIm), site.bits) };
}

function radiusAfter(newton: Newton, view: View, more: number, bits: number): number {
  const length = Math.hypot(newton.re, newton.im) + newton.error;
  const sum = Math.hypot(view.re, view.im) + view.error;
  if (!(length * sum < 0.25)) return Number.POSITIVE_INFINITY;
  const shrink = (1 - length * sum) ** 2;
  const left = (newton.error + length * (length * view.error)) / shrink; // length² may underflow
  const roundoff = more * 2 ** -44 + Math.max(4 * 2 ** -bits, LEAST_RADIUS);
  return Math.max((left + roundoff) * UP, LEAST_RADIUS);
}
