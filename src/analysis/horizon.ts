/**
 * How long a response is shown when nobody says: long enough to see it settle, short enough to see it move. Follows from the
 * poles and the step response alone, so the same model always gets the same horizon.
 */

import type { ChannelMotion } from './channel-motion.ts';
import type { Root } from './poles.ts';
import { lastTimeOutside, type SettledResponse, settledResponse } from './settling.ts';
import { estimatedTurns } from './turning-points.ts';

/**
 * `settled`: everything of the step response is in it. `oscillation`: cut while it still swings. `growth`: an unstable
 * response, cut while its growth fits a drawing. `drift`: poles on the imaginary axis, nothing settles. `asked`: given.
 */
export type HorizonReason = 'settled' | 'oscillation' | 'growth' | 'drift' | 'asked';

export interface Horizon {
  /** s. */
  readonly duration: number;
  readonly reason: HorizonReason;
}

/** A response is at rest once it stays within this share of its largest deviation. */
const AT_REST = 0.01;

/** Room after it has come to rest, as a factor. */
const ROOM = 1.2;

/** Most turning points shown (40 periods of an oscillation), and the share of the largest deviation at which a turn counts. */
const MOST_TURNS = 80;
const VISIBLE = 0.05;

/** An unstable response is shown while its fastest growing mode grows by a factor of e⁵, about 150. */
const GROWTH = 5;

/** Undamped oscillations are shown for this many periods of the slowest, 40 of the fastest at most. */
const PERIODS = 8;
const MOST_PERIODS = 40;

/** A decaying mode beside a drift is shown for this many time constants. */
const TIME_CONSTANTS = 8;

/** Horizon of an integrator alone, which has no time of its own: 10 s. */
const INTEGRATOR_ALONE = 10;

/** Leading figures to which a horizon is rounded up. */
const ROUND_FIGURES = [1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8, 10] as const;

/** The horizon for one channel, rounded up to a short figure. */
export function horizonOf(motion: ChannelMotion): Horizon {
  if (!motion.settles) return horizonOfPoles(motion.modes);
  if (motion.modes.length === 0) return { duration: 1, reason: 'settled' };
  const settled = settledResponse(motion);
  if (settled === null) return { duration: roundUp(driftDuration(motion.modes)), reason: 'oscillation' };
  return settledHorizon(settled);
}

/** The horizon for motions of which only the poles are known: decaying ones get 8 time constants of the slowest. */
export function horizonOfPoles(poles: readonly Root[]): Horizon {
  const unstable = poles.filter(({ re }) => re > 0);
  if (unstable.length > 0) return { duration: roundUp(growthDuration(unstable)), reason: 'growth' };
  const decays = poles.every(({ re }) => re < 0);
  return { duration: roundUp(driftDuration(poles)), reason: decays ? 'settled' : 'drift' };
}

function settledHorizon(settled: SettledResponse): Horizon {
  const { response, largestDeviation } = settled;
  if (largestDeviation === 0) return { duration: roundUp(response.t[response.t.length - 1]! / 4), reason: 'settled' };
  const atRest = ROOM * lastTimeOutside(settled, AT_REST * largestDeviation);
  const manyTurns = timeOfTurn(settled, MOST_TURNS);
  return manyTurns !== null && manyTurns < atRest
    ? { duration: roundUp(manyTurns), reason: 'oscillation' }
    : { duration: roundUp(atRest > 0 ? atRest : response.t[response.t.length - 1]! / 4), reason: 'settled' };
}

/** When the response has turned this many times by visible amounts; null where it never does. */
function timeOfTurn({ response, finalValue, largestDeviation }: SettledResponse, wanted: number): number | null {
  let turns = 0;
  for (let k = 0; k + 1 < response.t.length; k++) {
    const visible = estimatedTurns(response, 0, k).filter(y => Math.abs(y - finalValue) >= VISIBLE * largestDeviation);
    turns += visible.length;
    if (turns >= wanted) return response.t[k + 1]!;
  }
  return null;
}

function growthDuration(unstable: readonly Root[]): number {
  const growth = GROWTH / Math.max(...unstable.map(({ re }) => re));
  const fastest = Math.max(...unstable.map(({ im }) => Math.abs(im)));
  return fastest === 0 ? growth : Math.min(growth, (MOST_PERIODS * 2 * Math.PI) / fastest);
}

function driftDuration(modes: readonly Root[]): number {
  const frequencies = modes.filter(({ im }) => im > 0).map(({ im }) => im);
  const decays = modes.filter(({ re }) => re < 0).map(({ re }) => TIME_CONSTANTS / -re);
  const onAxis = modes.filter(({ re, im }) => re >= 0 && im > 0).map(({ im }) => im);
  const periods = onAxis.length === 0 ? 0 : (PERIODS * 2 * Math.PI) / Math.min(...onAxis);
  const wanted = Math.max(periods, ...decays);
  if (wanted === 0) return INTEGRATOR_ALONE;
  return frequencies.length === 0 ? wanted : Math.min(wanted, (MOST_PERIODS * 2 * Math.PI) / Math.max(...frequencies));
}

/** What a duration may exceed the short figure by. */
const SLACK = 0.02;

/** The next of 1, 1.2, 1.5, 2, … times a power of ten. */
function roundUp(duration: number): number {
  const exponent = Math.floor(Math.log10(duration));
  const unit = Number(`1e${exponent}`);
  const figure = ROUND_FIGURES.find(candidate => candidate * unit * (1 + SLACK) >= duration) ?? 10;
  return Number(`${figure}e${exponent}`);
}
