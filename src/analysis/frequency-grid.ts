/**
 * The frequencies at which a response is sampled: evenly on a logarithmic axis, closer around every pole and zero near the
 * imaginary axis so that no resonance is missed, and in small steps of phase where there is dead time.
 */

import type { Root } from './poles.ts';

export interface GridRequest {
  /** Poles and zeros that bend the response. */
  readonly features: readonly Root[];
  /** Seconds. */
  readonly deadTimes: readonly number[];
  /** Frequencies in rad/s that have to lie well inside. */
  readonly shown?: readonly number[];
  /** Decades on either side of the outermost feature. */
  readonly margin: number;
}

/** Points a decade; around a resonance, distances from it in parts of its half-width. */
const A_DECADE = 60;
const AROUND = [0, 0.25, 0.5, 1, 1.5, 2, 3, 4, 6, 8, 12, 16, 32, 64] as const;

/** Phase in radians that dead time may turn from one point to the next, and most turns that are followed. */
const PHASE_STEP = 0.25;
const MOST_TURNS = 40;

/** Half-width that a resonance on the imaginary axis is given, relative to its frequency. */
const NARROWEST = 2 ** -26;

/** Angular frequencies in rad/s, ascending, none twice and none zero; whole decades around 1 rad/s where nothing bends. */
export function frequencyGrid({ features, deadTimes, shown = [], margin }: GridRequest): Float64Array {
  const lag = deadTimes.reduce((sum, seconds) => sum + seconds, 0);
  const corners = [
    ...features.map(({ re, im }) => Math.hypot(re, im)),
    ...shown,
    ...(lag > 0 ? [1 / lag, Math.PI / lag] : []),
  ].filter(size => size > 0 && Number.isFinite(size));
  const low = Math.floor(Math.log10(Math.min(...(corners.length > 0 ? corners : [1]))) - margin);
  const high = Math.ceil(Math.log10(Math.max(...(corners.length > 0 ? corners : [1]))) + margin);
  const [from, to] = [10 ** low, 10 ** high];
  const even = Array.from({ length: (high - low) * A_DECADE + 1 }, (_, k) => 10 ** (low + k / A_DECADE));
  const all = [...even, ...shown, ...features.flatMap(aroundResonance), ...turns(lag, to)];
  return Float64Array.from([...new Set(all.filter(w => w >= from && w <= to))]).sort();
}

function aroundResonance({ re, im }: Root): readonly number[] {
  if (im <= 0 || Math.abs(re) > im) return [];
  const width = Math.max(Math.abs(re), im * NARROWEST);
  return AROUND.flatMap(part => [im - part * width, im + part * width]).filter(w => w > im / 2 && w < im * 2);
}

function turns(lag: number, to: number): readonly number[] {
  if (lag === 0) return [];
  const count = Math.min(Math.ceil((to * lag) / PHASE_STEP), Math.ceil((MOST_TURNS * 2 * Math.PI) / PHASE_STEP));
  return Array.from({ length: count }, (_, k) => ((k + 1) * PHASE_STEP) / lag);
}
