/** Generators of rationals: short ones as drawings hold, long ones as eliminations make, and lists of them. */

import fc from 'fast-check';
import { type Rational, rational } from '../../src/algebra/index.ts';

/** Pinned, so that a failure is the same everywhere. */
export const SEED = 20261201;

/** Whole numbers and short fractions, zero and ±1 often among them. */
export const shortRational: fc.Arbitrary<Rational> = fc.oneof(
  fc.constantFrom(rational(0n), rational(1n), rational(-1n)),
  fc.integer({ min: -1000, max: 1000 }).map(n => rational(BigInt(n))),
  fc
    .tuple(fc.integer({ min: -9999, max: 9999 }), fc.integer({ min: 1, max: 999 }))
    .map(([n, d]) => rational(BigInt(n), BigInt(d))),
);

/** Short ones, and fractions of up to 200 bits over 200 bits. */
export const anyRational: fc.Arbitrary<Rational> = fc.oneof(
  shortRational,
  fc
    .tuple(
      fc.bigInt({ min: -(2n ** 200n), max: 2n ** 200n }),
      fc.oneof(
        fc.bigInt({ min: 1n, max: 2n ** 200n }),
        fc.integer({ min: 0, max: 200 }).map(k => 2n ** BigInt(k)),
      ),
    )
    .map(([n, d]) => rational(n, d)),
);

export const nonzeroRational: fc.Arbitrary<Rational> = anyRational.filter(({ n }) => n !== 0n);
