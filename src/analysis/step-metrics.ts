/**
 * Figures of a unit step response from rest, found on the response itself and not on samples: rise time, overshoot, peak,
 * settling time, final value, by the definitions of IEC 60050-351 with the limits 10 %, 90 % and 2 %.
 */

import type { StateSpace } from '../compile/index.ts';
import { channelMotion } from './channel-motion.ts';
import type { ResolvedResponse } from './resolved-response.ts';
import { lastTimeOutside, type SettledResponse, settledResponse } from './settling.ts';
import { type CurvePoint, crossing, estimatedTurns, turningPoints, turnMargin } from './turning-points.ts';

/** A figure is null where the quantity does not exist; times in s. */
export interface StepMetrics {
  readonly input: string;
  readonly output: string;
  /** C (−A)⁻¹ B + D; null where the response does not settle. */
  readonly finalValue: number | null;
  /** Excess of the largest value (of the smallest, where the final value is negative) over the final value, in % of it; 0 without. */
  readonly overshootPercent: number | null;
  /** That largest value, and when it is reached; null without overshoot. */
  readonly peak: number | null;
  readonly peakTime: number | null;
  /** From the first time at 10 % of the final value to the first at 90 %. */
  readonly riseTime10to90: number | null;
  /** The last time outside ±2 % of the final value; 0 where it never is. */
  readonly settlingTime2percent: number | null;
  /** Whether the figures were computed; `not-computed` where following the response would take too long or its poles did not converge. */
  readonly status: 'computed' | 'not-computed';
  /** Whether final value and settling rest on exact arithmetic. */
  readonly route: 'certified' | 'floating';
}

const RISE_FROM = 0.1;
const RISE_TO = 0.9;
const SETTLING_BAND = 0.02;

/** An excess below this share of the largest value is rounding: 64 ε, several times the error of the response. */
const ROUNDING = 64 * Number.EPSILON;

const NONE = {
  finalValue: null,
  overshootPercent: null,
  peak: null,
  peakTime: null,
  riseTime10to90: null,
  settlingTime2percent: null,
} as const;

/**
 * The figures of the response of one output to one input, by their positions. A response that settles at zero has a final
 * value and no other figure, since each of them is a share of it.
 */
export function stepMetrics(
  model: StateSpace,
  channel: { readonly input: number; readonly output: number },
): StepMetrics {
  const names = { input: model.inputs[channel.input]?.name ?? '', output: model.outputs[channel.output]?.name ?? '' };
  const motion = channelMotion(model, channel.output, channel.input);
  if (motion === null) return { ...names, ...NONE, status: 'not-computed', route: 'floating' };
  const { route, finalValue } = motion;
  if (!motion.settles || finalValue === null) return { ...names, ...NONE, status: 'computed', route };
  if (finalValue === 0) return { ...names, ...NONE, finalValue, status: 'computed', route };
  const settled = settledResponse(motion);
  if (settled === null) return { ...names, ...NONE, finalValue, status: 'not-computed', route };
  return { ...names, finalValue, ...figuresOf(settled), status: 'computed', route };
}

function figuresOf(settled: SettledResponse) {
  const { response, finalValue, largest } = settled;
  const peak = highestPoint(response, finalValue < 0 ? -1 : 1, Math.abs(finalValue) + ROUNDING * largest);
  const excess = Math.abs(peak.y) - Math.abs(finalValue);
  const hasOvershoot = peak.y > 0 === finalValue > 0 && excess > ROUNDING * largest;
  const from = firstTimeAt(response, RISE_FROM * finalValue);
  const to = firstTimeAt(response, RISE_TO * finalValue);
  return {
    overshootPercent: hasOvershoot ? (100 * excess) / Math.abs(finalValue) : 0,
    peak: hasOvershoot ? peak.y : null,
    peakTime: hasOvershoot ? peak.t : null,
    riseTime10to90: from === null || to === null ? null : to - from,
    settlingTime2percent: lastTimeOutside(settled, SETTLING_BAND * Math.abs(finalValue)),
  };
}

/** The point at which sign · y is largest, the first of several; turning points not above `floor` are not looked for. */
function highestPoint(response: ResolvedResponse, sign: 1 | -1, floor: number): CurvePoint {
  const y = response.y[0]!;
  let best: CurvePoint = { t: 0, y: y[0]! };
  for (let k = 1; k < y.length; k++) if (sign * y[k]! > sign * best.y) best = { t: response.t[k]!, y: y[k]! };
  for (let k = 0; k + 1 < y.length; k++) {
    const reach = turnMargin(response, 0, k) - Math.max(floor, sign * best.y);
    if (!estimatedTurns(response, 0, k).some(turn => sign * turn + reach > 0)) continue;
    for (const turn of turningPoints(response, 0, k)) if (sign * turn.y > sign * best.y) best = turn;
  }
  return best;
}

/** The first time at which the response, coming from zero, has reached the level; 0 where it starts beyond it. */
function firstTimeAt(response: ResolvedResponse, level: number): number | null {
  const sign = level < 0 ? -1 : 1;
  const y = response.y[0]!;
  if (sign * y[0]! >= sign * level) return 0;
  for (let k = 0; k + 1 < y.length; k++) {
    const reach = turnMargin(response, 0, k) - sign * level;
    const mayTurn = estimatedTurns(response, 0, k).some(turn => sign * turn + reach >= 0);
    if (sign * y[k + 1]! < sign * level && !mayTurn) continue;
    const time = crossing(response, 0, k, level, 'first');
    if (time !== null) return time;
  }
  return null;
}
