/**
 * A response drawn over frequency: magnitude in dB and phase in degrees without jumps, on a grid that misses no resonance, and
 * the bandwidth. Of a channel of the drawing or of the loop transfer at a cut; dead time true.
 */

import {
  multiplyPolynomials,
  type Polynomial,
  rational,
  scalePolynomial,
  subtractPolynomials,
} from '../algebra/index.ts';
import type { StateSpace } from '../compile/index.ts';
import type { Diagram } from '../diagram/index.ts';
import { positiveFrequencies, squaredMagnitude } from './axis-polynomials.ts';
import { zerosBetween } from './bracketing.ts';
import { frequencyGrid, type GridRequest } from './frequency-grid.ts';
import type { Response } from './frequency-response.ts';
import type { Root } from './poles.ts';
import { trueResponse } from './true-response.ts';

export interface FrequencyCurve {
  /** rad/s, ascending. */
  readonly omega: Float64Array;
  /** dB; −Infinity where the response is zero, NaN at a pole on the imaginary axis. */
  readonly magnitude: Float64Array;
  /** Degrees without jumps of 360; NaN where the magnitude is not finite. */
  readonly phase: Float64Array;
}

export interface ChannelFrequency {
  readonly curve: FrequencyCurve;
  /** `direct`: the raw equations with true dead time. */
  readonly route: 'certified' | 'direct' | 'floating';
  /**
   * The first frequency in rad/s at which the magnitude is down by a factor √2 from its value at rest; null where that value is
   * zero or none, or where it never is.
   */
  readonly bandwidth: number | null;
}

/** The frequency response of a channel, by positions, of a diagram and the model that `compile` made of it. */
export function channelFrequency(
  diagram: Diagram,
  model: StateSpace,
  channel: { readonly input: number; readonly output: number },
): ChannelFrequency {
  const { valueAt, route, features, deadTimes, fraction } = trueResponse(diagram, model, channel);
  const grid = { features, deadTimes, margin: DRAWN };
  const isExact = fraction !== null && route !== 'direct';
  return {
    curve: frequencyCurve(valueAt, grid, orderAtZero(features, fraction?.numerator)),
    route,
    bandwidth: isExact ? exactBandwidth(fraction) : bandwidthOn(valueAt, grid),
  };
}

/** Decades drawn beyond the outermost corner. */
const DRAWN = 1;

/** The curve of a response; `order` is that of its pole (negative: zero) at s = 0, which says where the phase begins. */
export function frequencyCurve(valueAt: Response, request: GridRequest, order: number): FrequencyCurve {
  const omega = frequencyGrid(request);
  const magnitude = new Float64Array(omega.length);
  const phase = new Float64Array(omega.length);
  let before = -90 * order;
  omega.forEach((w, k) => {
    const value = valueAt(w);
    magnitude[k] = value === null ? Number.NaN : 20 * Math.log10(Math.hypot(...value));
    if (value === null || (value[0] === 0 && value[1] === 0)) {
      phase[k] = Number.NaN;
      return;
    }
    const principal = (Math.atan2(value[1], value[0]) * 180) / Math.PI;
    before = principal + 360 * Math.round((before - principal) / 360);
    phase[k] = before;
  });
  return { omega, magnitude, phase };
}

/** The order of the pole at s = 0, that of a zero counting negative. */
export function orderAtZero(features: readonly Root[], numerator: Polynomial | undefined): number {
  const atZero = features.find(({ re, im }) => re === 0 && im === 0)?.multiplicity ?? 0;
  return numerator !== undefined && numerator.at(-1)?.n === 0n ? -atZero : atZero;
}

interface Fraction {
  readonly numerator: Polynomial;
  readonly denominator: Polynomial;
}

/** The first root of 2 |N|² D(0)² − |D|² N(0)² in ω². */
function exactBandwidth({ numerator, denominator }: Fraction): number | null {
  const [n, d] = [numerator.at(-1), denominator.at(-1)];
  if (n === undefined || d === undefined || n.n === 0n || d.n === 0n) return null;
  const squared = (constant: Polynomial) => multiplyPolynomials(constant, constant);
  const left = multiplyPolynomials(squared([d]), scalePolynomial(rational(2n), squaredMagnitude(numerator)));
  const right = multiplyPolynomials(squared([n]), squaredMagnitude(denominator));
  return positiveFrequencies(subtractPolynomials(left, right))?.[0] ?? null;
}

function bandwidthOn(valueAt: Response, request: GridRequest): number | null {
  const rest = valueAt(0);
  if (rest === null || Math.hypot(...rest) === 0) return null;
  const level = Math.hypot(...rest) * Math.SQRT1_2;
  const above = (omega: number) => Math.hypot(...(valueAt(omega) ?? [Number.NaN])) - level;
  return zerosBetween(above, frequencyGrid(request))[0] ?? null;
}
