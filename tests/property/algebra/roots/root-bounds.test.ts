/** The inequalities that a certificate rests on, each against exact arithmetic. */

import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { bitLength } from '../../../../src/algebra/integer.ts';
import type { IntegerPolynomial } from '../../../../src/algebra/integer-polynomial.ts';
import {
  evaluateAtComplex,
  evaluateAtReal,
  type FixedValue,
  fixedCoefficients,
} from '../../../../src/algebra/roots/fixed-point.ts';
import { type Site, views } from '../../../../src/algebra/roots/root-sites.ts';
import { discRadius, newtonAt, stepped, subjectOf } from '../../../../src/algebra/roots/root-steps.ts';
import { SEED } from '../../../arbitraries/rationals.ts';

/** Numbers of this many bits more than the values under test stand for exact ones. */
const EXTRA = 400;

interface Complex {
  readonly re: bigint;
  readonly im: bigint;
}

/** f and f′ at (x + iy)/2^bits with exact coefficients in the scale of `fixedCoefficients`, times 2^(bits + EXTRA). */
function exactValue(f: IntegerPolynomial, exponent: number, x: bigint, y: bigint, bits: number): [Complex, Complex] {
  const n = f.length - 1;
  const top = Math.max(...f.map((c, j) => (c === 0n ? -Infinity : bitLength(c) + exponent * (n - j))));
  const wide = bits + EXTRA;
  const scaled = f.map((c, j) => {
    const shift = exponent * (n - j) - top + wide;
    return shift >= 0 ? c << BigInt(shift) : c >> BigInt(-shift);
  });
  const times = (a: Complex): Complex => ({
    re: (a.re * x - a.im * y) >> BigInt(bits),
    im: (a.re * y + a.im * x) >> BigInt(bits),
  });
  let [value, slope]: [Complex, Complex] = [
    { re: 0n, im: 0n },
    { re: 0n, im: 0n },
  ];
  for (const c of scaled) {
    const moved = times(slope);
    slope = { re: moved.re + value.re, im: moved.im + value.im };
    const next = times(value);
    value = { re: next.re + c, im: next.im };
  }
  return [value, slope];
}

function distance(re: bigint, im: bigint, exact: Complex): number {
  const unit = 2 ** -EXTRA;
  const part = (a: bigint, b: bigint): number => Number((a << BigInt(EXTRA)) - b) * unit;
  return Math.hypot(part(re, exact.re), part(im, exact.im));
}

const integerPolynomial = fc
  .array(
    fc
      .tuple(fc.bigInt({ min: -(2n ** 60n), max: 2n ** 60n }), fc.integer({ min: -58, max: 60 }))
      .map(([c, shift]) => (shift >= 0 ? c << BigInt(shift) : c >> BigInt(-shift))),
    { minLength: 2, maxLength: 14 },
  )
  .filter(f => f[0] !== 0n);

/** x + iy in the unit disc to `bits` bits. */
const point = fc
  .record({
    bits: fc.integer({ min: 40, max: 200 }),
    angle: fc.double({ min: 0, max: 6.28, noNaN: true }),
    modulus: fc.double({ min: 0, max: 1 - 2 ** -30, noNaN: true }),
    exponent: fc.integer({ min: -12, max: 12 }),
  })
  .map(({ bits, angle, modulus, exponent }) => {
    const fixed = (v: number): bigint => BigInt(Math.trunc(v * 2 ** 40)) << BigInt(bits - 40);
    return { bits, exponent, x: fixed(modulus * Math.cos(angle)), y: fixed(modulus * Math.sin(angle)) };
  });

describe('values in fixed point', () => {
  const keepsItsBounds = (found: FixedValue, [value, slope]: [Complex, Complex]): void => {
    expect(distance(found.re, found.im, value)).toBeLessThanOrEqual(found.error);
    expect(distance(found.slopeRe, found.slopeIm, slope)).toBeLessThanOrEqual(found.slopeError);
  };

  test('at a complex point value and slope are within their error bounds', () => {
    fc.assert(
      fc.property(integerPolynomial, point, (f, { bits, exponent, x, y }) => {
        const coefficients = fixedCoefficients(f, exponent, bits);
        keepsItsBounds(evaluateAtComplex(coefficients, x, y, bits), exactValue(f, exponent, x, y, bits));
      }),
      { seed: SEED, numRuns: 1000 },
    );
  });

  test('at a real point value and slope are within their error bounds', () => {
    fc.assert(
      fc.property(integerPolynomial, point, (f, { bits, exponent, x }) => {
        const coefficients = fixedCoefficients(f, exponent, bits);
        keepsItsBounds(evaluateAtReal(coefficients, x, bits), exactValue(f, exponent, x, 0n, bits));
      }),
      { seed: SEED, numRuns: 1000 },
    );
  });
});

describe('discs and steps', () => {
  const BITS = 120;
  const unit = 2 ** -40;
  const toBits = (v: number): bigint => BigInt(Math.round(v * 2 ** 50)) << BigInt(BITS - 50);

  /** Distinct dyadic real roots r_j / 64, the sites off them by up to 2^−20, in units of 2⁰. */
  const problem = fc.record({
    roots: fc.uniqueArray(
      fc.integer({ min: -60, max: 60 }).filter(r => r !== 0),
      { minLength: 1, maxLength: 7 },
    ),
    offsets: fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: 7, maxLength: 7 }),
    scale: fc.integer({ min: 8, max: 30 }),
  });

  test('a disc holds a root, and after the step the bound on what is left still holds it', () => {
    fc.assert(
      fc.property(problem, ({ roots, offsets, scale }) => {
        const f = roots.reduce<bigint[]>(
          (product, r) => product.concat(0n).map((c, j) => 64n * c - BigInt(r) * (product[j - 1] ?? 0n)),
          [1n],
        );
        const subject = subjectOf(f);
        const start = roots.map((r, j): Site => {
          const x = toBits(r / 64 + (offsets[j] ?? 0) * 2 ** -scale);
          return { kind: 'real', x, y: 0n, exponent: 0, bits: BITS, radius: 0 };
        });
        const newtons = start.map(site => newtonAt(subject, site));
        const sites = start.map((site, j) => ({
          ...site,
          radius: discRadius(newtons[j] ?? newtonAt(subject, site), roots.length),
        }));
        const off = (site: Site, r: number): number =>
          Math.abs(Number(site.x - (BigInt(r) << BigInt(BITS - 6)))) * 2 ** -BITS;
        const seen = views(sites);
        sites.forEach((site, j) => {
          // The nearest root to a site is its own as long as the offset is below half the least spacing.
          expect(off(site, roots[j] ?? 0)).toBeLessThanOrEqual(site.radius);
          const view = seen[j];
          const newton = newtons[j];
          if (view === undefined || newton === undefined) throw new Error('a site without its view');
          const next = stepped(site, newton, view);
          if (Number.isFinite(next.radius)) expect(off(next, roots[j] ?? 0)).toBeLessThanOrEqual(next.radius);
          if (scale > 20) expect(next.radius).toBeLessThan(unit);
        });
      }),
      { seed: SEED, numRuns: 500 },
    );
  });
});
