/**
 * Where a loop transfer L crosses: |L(jω)| = 1, and L(jω) real and negative. From exact polynomials where L is an exact
 * fraction, else bracketed on a grid that follows every resonance and dead time, then refined.
 */

import { subtractPolynomials } from '../algebra/index.ts';
import { imaginaryPart, positiveFrequencies, squaredMagnitude } from './axis-polynomials.ts';
import { maximaBetween, zerosBetween } from './bracketing.ts';
import type { LoopTransfer } from './loop-transfer.ts';

/** A gain crossover. */
export interface GainCrossover {
  /** rad/s. */
  readonly omega: number;
  /** 180° + arg L, in (−180, 180]. */
  readonly phaseMargin: number;
}

/** A phase crossover. */
export interface PhaseCrossover {
  /** rad/s; 0 where L(0) is real and negative. */
  readonly omega: number;
  /** 1 / |L|: the factor on the gain that puts the loop on the edge; above one an increase, below one a reduction. */
  readonly gainMargin: number;
}

/** Every gain crossover, ascending in frequency; those of the grid where L is not exact. */
export function gainCrossovers(loop: LoopTransfer, grid: ArrayLike<number>): readonly GainCrossover[] {
  const { exact } = loop;
  const roots =
    exact === null
      ? null
      : positiveFrequencies(
          subtractPolynomials(squaredMagnitude(exact.numerator), squaredMagnitude(exact.denominator)),
        );
  return (roots ?? unitMagnitudes(loop, grid)).flatMap(omega => {
    const value = loop.valueAt(omega);
    if (value === null) return [];
    const [re, im] = value;
    // −L has the phase 180° + arg L; a real L = −1 is at zero from above.
    return [{ omega, phaseMargin: (Math.atan2(im === 0 ? 0 : -im, -re) * 180) / Math.PI }];
  });
}

/** With a maximum or minimum of |L| at one between two samples, both its flanks are found. */
function unitMagnitudes({ valueAt }: LoopTransfer, grid: ArrayLike<number>): readonly number[] {
  const level = (omega: number) => {
    const value = valueAt(omega);
    return value === null ? Number.NaN : Math.log(Math.hypot(...value));
  };
  const peaks = maximaBetween(level, grid);
  const dips = maximaBetween(omega => -level(omega), grid);
  return zerosBetween(level, merged(grid, [...peaks, ...dips]));
}

/** Every phase crossover, ascending in frequency; those of the grid where L is not exact. */
export function phaseCrossovers(loop: LoopTransfer, grid: ArrayLike<number>): readonly PhaseCrossover[] {
  const { exact, valueAt } = loop;
  const roots = exact === null ? null : positiveFrequencies(imaginaryPart(exact.numerator, exact.denominator));
  const imaginary = (omega: number) => valueAt(omega)?.[1] ?? Number.NaN;
  return [0, ...(roots ?? zerosBetween(imaginary, grid))].flatMap(omega => {
    const value = valueAt(omega);
    if (value === null || !(value[0] < 0) || !Number.isFinite(value[0])) return [];
    return [{ omega, gainMargin: 1 / Math.hypot(...value) }];
  });
}

function merged(grid: ArrayLike<number>, more: readonly number[]): Float64Array {
  return Float64Array.from([...Array.from(grid), ...more]).sort();
}
