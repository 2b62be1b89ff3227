/**
 * A step response followed until it has settled, and when it last left a band around its final value. Under the metrics of
 * a step and the choice of a horizon.
 */

import type { ChannelMotion } from './channel-motion.ts';
import { remembered } from './exact-model.ts';
import { excitedSystem } from './excitation.ts';
import { lifetime, type ResolvedResponse, resolvedResponse } from './resolved-response.ts';
import { crossing, estimatedTurns, turnMargin } from './turning-points.ts';

export interface SettledResponse {
  readonly response: ResolvedResponse;
  readonly finalValue: number;
  /** Largest |y| and largest |y − final value| over the points. */
  readonly largest: number;
  readonly largestDeviation: number;
}

/** Share of the final value (of the largest deviation, where that is zero) to which the response must have come. */
const SETTLED = 1e-3;

/** Horizons tried, each twice the one before: slow modes of huge weight need more than the lifetime of their pole. */
const MOST_HORIZONS = 6;

/**
 * The step response of a settling channel until it is within 0.1 % for good; null where it does not settle, or where
 * following it is not worth the time (see resolvedResponse).
 */
export function settledResponse(motion: ChannelMotion): SettledResponse | null {
  return remembered(known, motion, () => ({ found: followedToRest(motion) })).found;
}

const known = new WeakMap<ChannelMotion, { readonly found: SettledResponse | null }>();

function followedToRest(motion: ChannelMotion): SettledResponse | null {
  const { finalValue, modes } = motion;
  if (!motion.settles || finalValue === null) return null;
  const system = excitedSystem(motion.system, 'step');
  let horizon = modes.reduce((longest, mode) => Math.max(longest, lifetime(mode, modes, Number.EPSILON)), 0);
  if (horizon === 0) horizon = 1; // a channel without dynamics: any time will do
  for (let tried = 0; tried < MOST_HORIZONS; tried++, horizon *= 2) {
    const response = resolvedResponse(system, modes, horizon);
    if (response === null) return null;
    const settled = withExtremes(response, finalValue);
    if (hasSettled(settled)) return settled;
  }
  return null;
}

function withExtremes(response: ResolvedResponse, finalValue: number): SettledResponse {
  let [largest, largestDeviation] = [0, 0];
  for (const y of response.y[0]!) {
    largest = Math.max(largest, Math.abs(y));
    largestDeviation = Math.max(largestDeviation, Math.abs(y - finalValue));
  }
  return { response, finalValue, largest, largestDeviation };
}

/** Whether the last eighth of the horizon stays within `SETTLED`. */
function hasSettled({ response: { t, y }, finalValue, largestDeviation }: SettledResponse): boolean {
  const limit = SETTLED * (finalValue === 0 ? largestDeviation : Math.abs(finalValue));
  const from = (t[t.length - 1]! * 7) / 8;
  return y[0]!.every((value, k) => t[k]! < from || Math.abs(value - finalValue) <= limit);
}

/** The last time (s) at which |y − final value| is above `band`; 0 where it never is. */
export function lastTimeOutside({ response, finalValue }: SettledResponse, band: number): number {
  const y = response.y[0]!;
  const isOutside = (value: number) => Math.abs(value - finalValue) > band;
  for (let k = y.length - 2; k >= 0; k--) {
    if (!isOutside(y[k]!) && !mayTurnOutside(response, k, finalValue, band)) continue;
    const above = crossing(response, 0, k, finalValue + band, 'last');
    const below = crossing(response, 0, k, finalValue - band, 'last');
    if (above !== null || below !== null) return Math.max(above ?? 0, below ?? 0);
    if (isOutside(y[k]!)) return response.t[k]!;
  }
  return 0;
}

function mayTurnOutside(response: ResolvedResponse, k: number, finalValue: number, band: number): boolean {
  const margin = turnMargin(response, 0, k);
  return estimatedTurns(response, 0, k).some(turn => Math.abs(turn - finalValue) + margin > band);
}
