/**
 * From approximate roots to discs that are proved to hold one root each: steps in fixed point, more bits where rounding hides
 * the value, until n discs n |f / f′| do not meet. Real roots and conjugate pairs are told apart on the way, so that in the
 * end the discs lie symmetric to the real axis and one that meets it holds a real root.
 */

import type { ApproximateRoot } from './approximate-roots.ts';
import { normalised, type Site, SMALL_DISC, toFixed, views, withBits } from './root-sites.ts';
import { discRadius, type Newton, newtonAt, type Subject, stepped } from './root-steps.ts';

/** Relative accuracy that the first evaluation in fixed point aims at, beyond what conditioning costs. */
const FIRST_BITS = 88;

/** Precision is raised in steps of this, so that scaled coefficients are shared between roots. */
const BIT_STEP = 32;

/** Bits beyond which a root counts as not found: the discs' radii end at 2⁻⁹⁰⁰. */
export const MOST_BITS = 8192;

/** Rounds for a symmetric set, whose points need a few steps at most where they stand for what they are said to. */
const SYMMETRIC_ROUNDS = 8;

/** Rounds for a set of single points, which may start far from the roots. */
const SINGLE_ROUNDS = 400;

/**
 * Sites whose discs hold one root each and together all roots, real ones and pairs, after a step of third order from the
 * points at which that was proved; null where precision or rounds ran out.
 */
export function isolated(subject: Subject, approximations: readonly ApproximateRoot[]): Site[] | null {
  const guess = symmetricSites(approximations.map(root => firstSite(root, subject.degree)));
  const direct = guess === null ? null : separated(subject, guess, SYMMETRIC_ROUNDS);
  if (direct !== null) return direct;
  const start = approximations.map((root, i) => scattered(firstSite(root, subject.degree), i));
  const singles = separated(subject, start, SINGLE_ROUNDS);
  const sites = singles === null ? null : symmetricSites(singles);
  return sites === null ? null : separated(subject, sites, SYMMETRIC_ROUNDS);
}

/** The approximation as a single site with the bits that its slope and its smaller part ask for. */
function firstSite({ re, im, exponent, error, slope }: ApproximateRoot, degree: number): Site {
  const smaller = Math.max(Math.min(Math.abs(re), Math.abs(im)), 2 ** -60);
  const loss = Math.log2((3 * degree + 6) / Math.max(slope, 2 ** -200)) - Math.log2(Math.min(1, smaller));
  const bits = roundedBits(FIRST_BITS + Math.max(0, loss));
  const site: Site = {
    kind: 'single',
    x: toFixed(re, bits),
    y: toFixed(im, bits),
    exponent,
    bits,
    radius: degree * error,
  };
  return normalised(site);
}

/** The golden section of the full turn, which spreads successive angles evenly. */
const GOLDEN_ANGLE = Math.PI * (3 - Math.sqrt(5));

/**
 * The site moved within its own uncertainty, each in another direction: points that coincide, or lie on the real axis while
 * their roots do not, would stay so for ever.
 */
function scattered(site: Site, index: number): Site {
  const wide = withBits(site, 2 * FIRST_BITS);
  const distance = Math.min(Math.max(site.radius, 2 ** -48), 2 ** -6);
  const x = wide.x + toFixed(distance * Math.cos(index * GOLDEN_ANGLE + 1), wide.bits);
  const y = wide.y + toFixed(distance * Math.sin(index * GOLDEN_ANGLE + 1), wide.bits);
  return { ...wide, x, y };
}

function roundedBits(bits: number): number {
  return Math.ceil(bits / BIT_STEP) * BIT_STEP;
}

/**
 * Steps the sites until every disc is small against the distance to the nearest other point, so that no two meet, then takes
 * the step that goes with the proof. A site whose own disc is small already stays where it is meanwhile. Null where that does
 * not come about within `rounds`.
 */
function separated(subject: Subject, start: readonly Site[], rounds: number): Site[] | null {
  const sites = start.map(normalised);
  const newtons = new Array<Newton | null>(sites.length).fill(null);
  for (let round = 0; round < rounds; round++) {
    sites.forEach((site, i) => {
      if (newtons[i] !== null) return;
      const newton = newtonAt(subject, site);
      newtons[i] = newton;
      sites[i] = { ...site, radius: discRadius(newton, subject.degree) };
    });
    const seen = views(sites);
    const next = sites.map((site, i) => stepped(site, newtons[i]!, seen[i]!));
    const isWide = sites.map(({ radius }, i) => !(radius < Math.min(seen[i]!.nearest * CLEARANCE, SMALL_DISC)));
    if (!isWide.includes(true)) return sites.map((site, i) => smaller(site, next[i]!));
    next.forEach((site, i) => {
      if (!isWide[i]) return;
      sites[i] = movedOn(site, newtons[i]!.isHidden);
      newtons[i] = null;
    });
    if (sites.some(site => site.bits > MOST_BITS)) return null;
  }
  return null;
}

/**
 * Largest share of the distance to the nearest point that a disc may have. Then N |S| < 1/8, and the errors of S through the
 * other discs add N/7 of the same at most, which keeps the bound on the step below the 1/4 that it needs.
 */
const CLEARANCE = 1 / 8;

/** The site with the smaller disc: before a step, or after it and brought to scale. */
export function smaller(before: Site, after: Site): Site {
  return after.radius < before.radius ? normalised(after) : before;
}

/** A site that is on its way: nothing is known about its disc, and it has twice the bits where rounding hid the value. */
function movedOn(site: Site, isHidden: boolean): Site {
  const moved = normalised({ ...site, radius: Number.POSITIVE_INFINITY });
  return isHidden ? withBits(moved, roundedBits(2 * moved.bits)) : moved;
}

/**
 * The same roots as real sites and conjugate pairs: a point whose disc meets the real axis is taken for a real root, the
 * others above it for one of a pair. Null where not as many lie below. What comes out is a guess that `separated` proves or
 * rejects.
 */
function symmetricSites(singles: readonly Site[]): Site[] | null {
  let below = 0;
  const sites: Site[] = [];
  for (const site of singles) {
    const reach = toFixed(Math.min(site.radius, 1), site.bits);
    if (site.y <= reach && -site.y <= reach) sites.push({ ...site, kind: 'real', y: 0n });
    else if (site.y > 0n) sites.push({ ...site, kind: 'pair' });
    else below++;
  }
  return sites.filter(({ kind }) => kind === 'pair').length === below ? sites : null;
}
