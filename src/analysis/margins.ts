/**
 * How far the loop at a cut is from instability: gain, phase and delay margins at every crossover, the largest sensitivity
 * and complementary sensitivity, the modulus margin and the disk margin. L counts in negative feedback: S = 1 / (1 + L).
 */

import { toDouble } from '../algebra/index.ts';
import { maximaBetween } from './bracketing.ts';
import { type GainCrossover, gainCrossovers, type PhaseCrossover, phaseCrossovers } from './crossovers.ts';
import { frequencyGrid } from './frequency-grid.ts';
import type { LoopTransfer } from './loop-transfer.ts';

/** The largest magnitude of a response over all frequencies. */
export interface Peak {
  readonly magnitude: number;
  /** rad/s; null where it is only approached, towards ever higher frequencies. */
  readonly omega: number | null;
}

export interface DiskMargin {
  /** The largest α for which every perturbation (1 + δ/2) / (1 − δ/2) with |δ| < α leaves the loop stable. */
  readonly alpha: number;
  /** rad/s; null where it is only approached, towards ever higher frequencies. */
  readonly omega: number | null;
  /** Gain factors allowed at once with the phase: from low to high, `high` null where there is no bound. */
  readonly gainLow: number;
  readonly gainHigh: number | null;
  /** Degrees, either way. */
  readonly phase: number;
}

/** Every quantity null where it does not exist. */
export interface Margins {
  readonly gainCrossovers: readonly GainCrossover[];
  readonly phaseCrossovers: readonly PhaseCrossover[];
  /** The smallest factor above one and the largest below one that put the loop on the edge. */
  readonly gainMarginUp: PhaseCrossover | null;
  readonly gainMarginDown: PhaseCrossover | null;
  /** The crossover nearest to −1 in phase. */
  readonly phaseMargin: GainCrossover | null;
  /** The least additional dead time in seconds that puts a stable loop on the edge. */
  readonly delayMargin: { readonly seconds: number; readonly omega: number } | null;
  readonly sensitivity: Peak | null;
  readonly complementarySensitivity: Peak | null;
  /** The least distance from L to −1: 1 / max |S|. */
  readonly modulusMargin: number | null;
  /** Null for a loop that is not stable, too. */
  readonly diskMargin: DiskMargin | null;
}

/** Decades beyond the outermost corner that are searched. */
const SEARCHED = 3;

/**
 * The margins of a loop transfer. Delay and disk margin are those of a stable loop and null for any other.
 *
 * Disk margin: Seiler, Packard & Gahinet 2020, IEEE Control Systems 40(5), An Introduction to Disk Margins; the symmetric
 * disk, α = 1 / max |(S − T) / 2|, from 1 + L (1 + δ/2) / (1 − δ/2) = 0 at δ = 2 (1 + L) / (1 − L).
 */
export function margins(loop: LoopTransfer): Margins {
  const { features, deadTimes } = loop;
  const coarse = frequencyGrid({ features, deadTimes, margin: SEARCHED });
  const gains = gainCrossovers(loop, coarse);
  const phases = phaseCrossovers(loop, coarse);
  const grid = frequencyGrid({
    features,
    deadTimes,
    shown: [...gains, ...phases].map(({ omega }) => omega).filter(omega => omega > 0),
    margin: SEARCHED,
  });
  const isStable = loop.closedLoop === 'stable';
  const above = phases.filter(({ gainMargin }) => gainMargin > 1);
  const below = phases.filter(({ gainMargin }) => gainMargin < 1);
  const sensitivity = peakOf(loop, grid, ([re, im]) => 1 / Math.hypot(1 + re, im));
  return {
    gainCrossovers: gains,
    phaseCrossovers: phases,
    gainMarginUp: leastBy(above, ({ gainMargin }) => gainMargin),
    gainMarginDown: leastBy(below, ({ gainMargin }) => -gainMargin),
    phaseMargin: leastBy(gains, ({ phaseMargin }) => Math.abs(phaseMargin)),
    delayMargin: isStable ? leastBy(gains.map(delayAt), ({ seconds }) => seconds) : null,
    sensitivity,
    complementarySensitivity: peakOf(loop, grid, ([re, im]) => Math.hypot(re, im) / Math.hypot(1 + re, im)),
    modulusMargin: sensitivity === null ? null : 1 / sensitivity.magnitude,
    diskMargin: isStable ? diskMargin(loop, grid) : null,
  };
}

/** The phase that a delay may take away, in (0, 2π], over the frequency. */
function delayAt({ omega, phaseMargin }: GainCrossover): { readonly seconds: number; readonly omega: number } {
  const phase = (phaseMargin * Math.PI) / 180;
  return { seconds: (phase > 0 ? phase : phase + 2 * Math.PI) / omega, omega };
}

function diskMargin(loop: LoopTransfer, grid: ArrayLike<number>): DiskMargin | null {
  const peak = peakOf(loop, grid, ([re, im]) => Math.hypot(1 - re, im) / (2 * Math.hypot(1 + re, im)));
  if (peak === null || peak.magnitude === 0) return null;
  const alpha = 1 / peak.magnitude;
  return {
    alpha,
    omega: peak.omega,
    gainLow: Math.max(0, (2 - alpha) / (2 + alpha)),
    gainHigh: alpha < 2 ? (2 + alpha) / (2 - alpha) : null,
    phase: (2 * Math.atan(alpha / 2) * 180) / Math.PI,
  };
}

type Value = readonly [re: number, im: number];

/**
 * The largest magnitude that a function of L takes: at a maximum between the samples, at an end, or towards high frequencies
 * where an exact L has a limit; null where it has no bound.
 */
function peakOf(loop: LoopTransfer, grid: ArrayLike<number>, magnitude: (value: Value) => number): Peak | null {
  const at = (omega: number) => {
    const value = loop.valueAt(omega);
    return value === null ? Number.NaN : magnitude(value);
  };
  const limit = limitAtHighFrequencies(loop);
  const first = grid[0] ?? 1;
  const candidates: Peak[] = [0, first, ...maximaBetween(at, grid)].map(omega => ({ magnitude: at(omega), omega }));
  if (limit === null) candidates.push({ magnitude: at(grid[grid.length - 1] ?? 1), omega: grid[grid.length - 1] ?? 1 });
  else candidates.push({ magnitude: magnitude([limit, 0]), omega: null });
  const known = candidates.filter(({ magnitude: size }) => !Number.isNaN(size));
  const highest = leastBy(known, ({ magnitude: size }) => -size);
  return highest === null || !Number.isFinite(highest.magnitude) ? null : highest;
}

/** L(j∞) of an exact fraction; null where it is not known or not finite. */
function limitAtHighFrequencies({ exact }: LoopTransfer): number | null {
  if (exact === null) return null;
  const { numerator, denominator } = exact;
  if (numerator.length < denominator.length) return 0;
  const [leading] = numerator;
  return leading === undefined || numerator.length > denominator.length ? null : toDouble(leading);
}

/** The first item with the least measure; null of none. */
function leastBy<T>(items: readonly T[], measure: (item: T) => number): T | null {
  let best: T | null = null;
  for (const item of items) if (best === null || measure(item) < measure(best)) best = item;
  return best;
}
