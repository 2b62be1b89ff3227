/**
 * From discs to doubles: a part of a root is given as the nearest double once both ends of its interval round to the same
 * one. Also the square roots of discs, by which roots ±z of a polynomial in s² are found from those in s².
 */

import { bitLength } from '../integer.ts';
import { dyadicToDouble } from '../rational-double.ts';
import { fromFixed, type Site, toFixed } from './root-sites.ts';

/** A root whose parts are nearest doubles. */
export interface RoundedRoot {
  readonly re: number;
  readonly im: number;
  /** Where the parts are known to be the root itself. */
  readonly isExact?: boolean;
}

/** A box: x ± radius, y ± radius, in units of 2^unit. */
interface Box {
  readonly x: bigint;
  readonly y: bigint;
  readonly radius: bigint;
  readonly unit: number;
}

/** Radius in whole units, upwards. */
function radiusOf(site: Site): bigint {
  return toFixed(site.radius * (1 + 2 ** -40), site.bits) + 1n;
}

/** The root of a real site or the two of a pair, upper first; null where the disc is still too large to round. */
export function roundedRoots(site: Site): RoundedRoot[] | null {
  if (!Number.isFinite(site.radius)) return null;
  const box = { x: site.x, y: site.y, radius: radiusOf(site), unit: site.exponent - site.bits };
  const re = roundedPart(box.x, box);
  if (re === null) return null;
  if (site.kind === 'real') return [{ re, im: 0 }];
  const im = roundedPart(box.y, box);
  return im === null
    ? null
    : [
        { re, im },
        { re, im: -im },
      ];
}

/**
 * The roots ±√t for the root t of a real site, the four for a pair; null where the disc is too large. Negative t give roots
 * whose real part is zero, exactly.
 */
export function roundedSquareRoots(site: Site): RoundedRoot[] | null {
  if (!Number.isFinite(site.radius)) return null;
  const box = squareRootOf(site);
  if (box === null) return null;
  if (site.kind === 'real') {
    const size = roundedPart(box.x, box);
    if (size === null) return null;
    return site.x < 0n
      ? [
          { re: 0, im: size },
          { re: 0, im: -size },
        ]
      : [
          { re: size, im: 0 },
          { re: -size, im: 0 },
        ];
  }
  const re = roundedPart(box.x, box);
  const im = roundedPart(box.y, box);
  if (re === null || im === null) return null;
  return [re, -re].flatMap(part => [
    { re: part, im },
    { re: part, im: -im },
  ]);
}

/** A part whose interval is this many bits narrower than its value, and still holds a midpoint of doubles, is taken to be it. */
const TIE_BITS = 300;

/** Bits to which such a part is rounded first, so that a midpoint of doubles is met exactly and goes to the even one. */
const TIE_PRECISION = 200;

/** The double that both ends of v ± radius round to, or null; a part that is not zero never becomes zero. */
function roundedPart(v: bigint, { radius, unit }: Box): number | null {
  const size = v < 0n ? -v : v;
  if (size <= radius) return null;
  const low = dyadicToDouble(size - radius, unit);
  const high = dyadicToDouble(size + radius, unit);
  const isTie = low !== high && bitLength(size) - bitLength(radius) > TIE_BITS;
  if (low !== high && !isTie) return null;
  const nearest = Math.max(isTie ? roundedTie(size, unit) : low, Number.MIN_VALUE);
  return v < 0n ? -nearest : nearest;
}

function roundedTie(size: bigint, unit: number): number {
  const excess = bitLength(size) - TIE_PRECISION;
  const half = 1n << BigInt(excess - 1);
  return dyadicToDouble((size + half) >> BigInt(excess), unit + excess);
}

/** A box around |√t| for a real site, around √t in the first quadrant for a pair; null where the disc reaches zero. */
function squareRootOf(site: Site): Box | null {
  const modulus = Math.hypot(fromFixed(site.x, site.bits), fromFixed(site.y, site.bits));
  const relative = site.radius / modulus;
  if (!(relative < 0.125)) return null;
  // t = (X + iY) · 4^m with as many more bits as the root of X + iY is to keep.
  const parity = (site.exponent - site.bits - site.bits) & 1;
  const shift = site.bits + parity;
  const X = site.x << BigInt(shift);
  const Y = site.y << BigInt(shift);
  const unit = (site.exponent - site.bits - shift) / 2;
  const [x, y] = site.kind === 'real' ? [integerRoot(X < 0n ? -X : X), 0n] : complexRoot(X, Y);
  // |√t′ − √t| ≤ |t′ − t| / |√t| within a right angle; a few units for the whole-number roots and divisions.
  const scaled = toFixed(relative * (1 + 2 ** -40), site.bits) + 1n;
  const radius = (((x + y) * scaled) >> BigInt(site.bits)) + 8n;
  return { x, y, radius, unit };
}

/** √(X + iY) for Y > 0, within four units a part. */
function complexRoot(X: bigint, Y: bigint): [bigint, bigint] {
  const modulus = integerRoot(X * X + Y * Y);
  const larger = integerRoot((modulus + (X < 0n ? -X : X)) >> 1n);
  const smaller = Y / (2n * larger);
  return X < 0n ? [smaller, larger] : [larger, smaller];
}

/** floor(√x) for x ≥ 0 (Heron, from above). */
export function integerRoot(x: bigint): bigint {
  if (x === 0n) return 0n;
  let root = 1n << BigInt((bitLength(x) + 1) >> 1);
  for (;;) {
    const next = (root + x / root) >> 1n;
    if (next >= root) return root;
    root = next;
  }
}
