/** What a step plot is made from, and the sentences that say the same in words. Times in seconds. */

import type { StepMetrics } from '../../analysis/index.ts';
import { plainName } from '../../expression/index.ts';
import { formatNumber, formatPadded, formatUnit } from '../figures/index.ts';
import type { Band } from './band-path.ts';
import type { Samples } from './curve-path.ts';

/** One answer to the step. */
export interface StepCurve extends Samples {
  /** What tells it from the others, `linear` or `with clipping`; not shown where it is the only one. */
  readonly label: string;
}

/** One channel’s answer to a unit step. */
export interface StepContent {
  /** Names as in the model. */
  readonly input: string;
  readonly output: string;
  readonly outputUnit?: string | undefined;
  /** The first is the one that `metrics` are about. */
  readonly curves: readonly StepCurve[];
  /** null: not computed. */
  readonly metrics: StepMetrics | null;
  /** Words in place of those for a unit step from rest. */
  readonly words?: { readonly title: string; readonly summary: string | null } | undefined;
  /** Where the response runs over the tolerances of the parameters; absent where that was not judged. */
  readonly envelope?: Band | undefined;
}

const DIGITS = 3;

/** Digits of the final value and of values read off the curve. */
export const VALUE_DIGITS = 4;

/** `rise 1.75 s · overshoot 23.3 % · within 2 % after 10.4 s · final 1.000`, or how the response fails to settle. */
export function stepSummary(metrics: StepMetrics | null): string {
  if (metrics === null || metrics.status === 'not-computed') return 'figures not computed';
  const { finalValue, overshootPercent, riseTime10to90, settlingTime2percent } = metrics;
  if (finalValue === null) return 'does not settle';
  const parts: string[] = [];
  if (riseTime10to90 !== null) parts.push(`rise ${seconds(riseTime10to90)}`);
  if (overshootPercent !== null) parts.push(overshootText(overshootPercent));
  if (settlingTime2percent !== null) parts.push(`within 2 % after ${seconds(settlingTime2percent)}`);
  parts.push(`final ${finalText(finalValue)}`);
  return parts.join(' · ');
}

/** `peak +23.3 % at 4.05 s`; null where there is no overshoot to mark. */
export function peakText(metrics: StepMetrics | null): string | null {
  const peak = peakOf(metrics);
  if (metrics === null || peak === null) return null;
  return `peak +${formatNumber(metrics.overshootPercent ?? 0, DIGITS)} % at ${seconds(peak.time)}`;
}

/** Where the response goes farthest over its final value; null where it never does, or does not settle. */
export function peakOf(metrics: StepMetrics | null): { readonly time: number; readonly value: number } | null {
  if (metrics === null || metrics.peakTime === null || metrics.peak === null) return null;
  return { time: metrics.peakTime, value: metrics.peak };
}

/** `step in r, response of F`: the plot's title. */
export function stepTitle({ input, output, words }: StepContent): string {
  return words?.title ?? `step in ${plainName(input)}, response of ${plainName(output)}`;
}

/** The summary of a plot, in its own words where it has some. */
export function contentSummary({ metrics, words }: StepContent): string {
  return words?.summary ?? stepSummary(metrics);
}

/** `F = 1.233 N`, with the curve's label where there are several. */
export function valueText(content: StepContent, curve: StepCurve, value: number | undefined): string {
  const name = content.curves.length > 1 ? curve.label : plainName(content.output);
  if (value === undefined || !Number.isFinite(value)) return `${name}: none`;
  const unit = content.outputUnit === undefined ? '' : ` ${formatUnit(content.outputUnit)}`;
  return `${name} = ${formatPadded(value, VALUE_DIGITS)}${unit}`;
}

/** `t = 4.05 s`. */
export function momentText(time: number): string {
  return `t = ${seconds(time)}`;
}

function seconds(time: number): string {
  return `${formatNumber(time, DIGITS)} s`;
}

function overshootText(percent: number): string {
  return percent > 0 ? `overshoot ${formatNumber(percent, DIGITS)} %` : 'no overshoot';
}

function finalText(value: number): string {
  return value === 0 ? '0' : formatPadded(value, VALUE_DIGITS);
}
