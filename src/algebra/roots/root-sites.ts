/**
 * A site is a point near one root, in fixed point with a power-of-two scale of its own, and a disc around it. This file holds
 * the sites, their scale and precision, and how they see one another; the steps that move them stand on it.
 */

import { bitLength, exponentOf } from '../integer.ts';
import type { FixedPoint } from './fixed-point.ts';

/**
 * A point that stands for one root (`real`, `single`) or for a root and its conjugate (`pair`, y > 0). `radius` is in units
 * of 2^exponent: the root lies within it of the point, Infinity where nothing is known.
 */
export interface Site extends FixedPoint {
  readonly kind: 'real' | 'pair' | 'single';
  readonly radius: number;
}

/** Discs below this radius count as this large: beyond it doubles, which hold the radii, end. */
export const LEAST_RADIUS = 2 ** -900;

/** v · 2^−bits as a double, right to 2⁻⁵², also where v alone overflows. */
export function fromFixed(v: bigint, bits: number): number {
  if (bits < 900) return Number(v) * 2 ** -bits;
  const excess = bitLength(v) - 64;
  return excess > 0 ? Number(v >> BigInt(excess)) * 2 ** (excess - bits) : Number(v) * 2 ** -bits;
}

/** The multiple of 2^−bits next to the finite double x, within one unit or 2⁻⁵² |x|. */
export function toFixed(x: number, bits: number): bigint {
  if (x === 0) return 0n;
  const shift = Math.min(bits, 60 - exponentOf(x));
  const scaled = BigInt(Math.round(x * 2 ** Math.min(shift, 1000) * 2 ** Math.max(shift - 1000, 0)));
  return shift < bits ? scaled << BigInt(bits - shift) : scaled;
}

/** The point with `bits` or more binary places, the same place. */
export function withBits(site: Site, bits: number): Site {
  if (bits <= site.bits) return site;
  const shift = BigInt(bits - site.bits);
  return { ...site, x: site.x << shift, y: site.y << shift, bits };
}

/** The same place at the exponent at which its modulus is between ¼ and 1; one bit more for each doubling of the scale. */
export function normalised(site: Site): Site {
  const square = site.x * site.x + site.y * site.y;
  if (square === 0n) return site;
  const excess = bitLength(square) - 2 * site.bits; // |w|² < 2^excess
  if (excess > 0) {
    const up = Math.ceil(excess / 2);
    return { ...site, exponent: site.exponent + up, bits: site.bits + up, radius: site.radius * 2 ** -up };
  }
  const down = Math.floor(-excess / 2);
  if (down === 0) return site;
  const shift = BigInt(down);
  return {
    ...site,
    x: site.x << shift,
    y: site.y << shift,
    exponent: site.exponent - down,
    radius: site.radius * 2 ** down,
  };
}

/** How the other roots look from one site, in units of its 2^exponent. */
export interface View {
  /** Σ 1 / (w − wⱼ) over the other roots' points, conjugates included. */
  readonly re: number;
  readonly im: number;
  /** Bound on the distance from that sum to the same sum over the true roots; Infinity where a disc holds the point. */
  readonly error: number;
  /**
   * Lower bound on the distance to the nearest other point, the site's own conjugate included. For a single site whose disc
   * meets the real axis the conjugates of all others count as well: where its disc is far from them, the conjugate of its root
   * can be no other root, and so the root is real.
   */
  readonly nearest: number;
}

/** Exponents further apart than this make one of two roots nothing beside the other. */
const FAR = 60;

/** Discs below this, the scale of their own site being 1, cannot reach from one scale to a far one. */
export const SMALL_DISC = 0.125;

/** Points nearer than this (the scale being 1) are subtracted exactly instead of in doubles. */
const NEAR = 2 ** -20;

/** What each site sees. O(sites²) in doubles, whole numbers only between near neighbours. */
export function views(sites: readonly Site[]): View[] {
  const xs = Float64Array.from(sites, site => fromFixed(site.x, site.bits));
  const ys = Float64Array.from(sites, site => fromFixed(site.y, site.bits));
  return sites.map((_, i) => viewFrom(i, sites, xs, ys));
}

function viewFrom(i: number, sites: readonly Site[], xs: Float64Array, ys: Float64Array): View {
  const site = sites[i]!;
  const couldBeReal = site.kind === 'single' && Math.abs(ys[i]!) <= site.radius;
  // Half a unit in the last place for each operation on a term, and for each addition of a term.
  const unit = 2 ** -53 * (8 + 4 * sites.length);
  let [re, im, error] = [0, 0, 0];
  let nearest = Number.POSITIVE_INFINITY;
  // Twice each other site: as it stands, and mirrored where its conjugate is a root too or must be kept clear of.
  for (let k = 0; k < 2 * sites.length; k++) {
    const j = k >> 1;
    const other = sites[j]!;
    const isMirrored = (k & 1) === 1;
    const isRoot = isMirrored ? other.kind === 'pair' : j !== i;
    if (!isRoot && !(isMirrored && couldBeReal && j !== i)) continue;
    const shift = other.exponent - site.exponent;
    if (shift > FAR) {
      // More than 2⁵⁶ away where its disc is small.
      error += other.radius < SMALL_DISC ? 2 ** -50 : Number.POSITIVE_INFINITY;
      continue;
    }
    const factor = shift < -FAR ? 0 : shift === 0 ? 1 : 2 ** shift;
    let dx = xs[i]! - xs[j]! * factor;
    let dy = isMirrored ? ys[i]! + ys[j]! * factor : ys[i]! - ys[j]! * factor;
    let distance = Math.sqrt(dx * dx + dy * dy);
    let roundoff = unit * (1 + factor);
    if (distance < NEAR) {
      [dx, dy] = exactDifference(site, other, isMirrored);
      distance = Math.hypot(dx, dy);
      roundoff = unit * distance;
    }
    const reach = factor > 0 ? other.radius * factor : other.radius < SMALL_DISC ? 0 : Number.POSITIVE_INFINITY;
    const clear = (distance - roundoff) * (1 - 2 ** -40);
    nearest = Math.min(nearest, clear);
    if (!isRoot) continue;
    const gap = clear - reach;
    error = gap > 0 ? error + (reach + roundoff) / distance / gap : Number.POSITIVE_INFINITY;
    if (distance === 0) continue;
    re += dx / distance / distance;
    im -= dy / distance / distance;
  }
  return { re, im, error: error * (1 + 2 ** -20), nearest };
}

/** w − wⱼ (or its distance to the conjugate) in units of the first site's 2^exponent, right to 2⁻⁵². */
function exactDifference(site: Site, other: Site, isMirrored: boolean): [number, number] {
  const unit = Math.min(site.exponent - site.bits, other.exponent - other.bits);
  const own = BigInt(site.exponent - site.bits - unit);
  const its = BigInt(other.exponent - other.bits - unit);
  const y = isMirrored ? -other.y : other.y;
  const bits = site.exponent - unit;
  return [fromFixed((site.x << own) - (other.x << its), bits), fromFixed((site.y << own) - (y << its), bits)];
}
