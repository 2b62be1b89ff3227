/**
 * The figure that a requirement is about, measured on the drawing and its model. Margins, bandwidth and magnitudes are with true dead
 * time; figures of the step response, poles and stability are the state-space model's.
 */

import type { StateSpace } from '../../compile/index.ts';
import { type Diagram, type Requirement, requirementRule } from '../../diagram/index.ts';
import { evaluateQuantity, onOneLine, type Scope } from '../../expression/index.ts';
import { fail, ok, problem, type Result } from '../../problem/index.ts';
import { maximaBetween } from '../bracketing.ts';
import { channelFrequency } from '../frequency-curve.ts';
import { frequencyGrid } from '../frequency-grid.ts';
import { loopTransfer } from '../loop-transfer.ts';
import { type Margins, margins } from '../margins.ts';
import { dampingRatio } from '../pole-figures.ts';
import { poles } from '../poles.ts';
import { type Stability, stability } from '../stability.ts';
import { type StepMetrics, stepMetrics } from '../step-metrics.ts';
import { trueResponse } from '../true-response.ts';

/** A drawing, its model, and its parameters' values. */
export interface Measured {
  readonly diagram: Diagram;
  readonly model: StateSpace;
  readonly scope: Scope;
}

export type Measurement =
  /** In the kind's unit. */
  | { readonly kind: 'value'; readonly value: number }
  /** It grows without limit, as a gain margin without a phase crossover does. `reason` ends a sentence. */
  | { readonly kind: 'unlimited'; readonly reason: string }
  /** There is no such figure, which misses the requirement: an overshoot of what does not settle. `reason` ends a sentence. */
  | { readonly kind: 'none'; readonly reason: string }
  /** Whether it holds, for a kind without a figure. */
  | { readonly kind: 'holds'; readonly holds: boolean; readonly reason: string };

const value = (figure: number): Measurement => ({ kind: 'value', value: figure });
const none = (reason: string): Measurement => ({ kind: 'none', reason });
const unlimited = (reason: string): Measurement => ({ kind: 'unlimited', reason });

/** Measures many requirements of one drawing; what several of them ask is computed once. Problems say what is not there. */
export function measurer({ diagram, model, scope }: Measured): (requirement: Requirement) => Result<Measurement> {
  const steps = new Map<string, StepMetrics>();
  const loops = new Map<string, Result<LoopFigures>>();
  return requirement => {
    switch (requirementRule(requirement.kind).subject) {
      case 'loop':
        return ok(ofLoop(requirement, model));
      case 'channel': {
        const channel = channelOf(requirement, model);
        if (!channel.ok) return channel;
        const step = () => remembered(steps, keyOf(channel.value), () => stepMetrics(model, channel.value));
        return ofChannel(requirement, { diagram, model, scope }, channel.value, step);
      }
      case 'cut': {
        const figures = remembered(loops, requirement.cut ?? '', () => loopAt(requirement.cut ?? '', diagram));
        return figures.ok ? ok(ofCut(requirement, figures.value)) : figures;
      }
    }
  };
}

function remembered<V>(known: Map<string, V>, key: string, compute: () => V): V {
  const before = known.get(key);
  if (before !== undefined) return before;
  const computed = compute();
  known.set(key, computed);
  return computed;
}

interface Channel {
  readonly input: number;
  readonly output: number;
}

const keyOf = ({ input, output }: Channel) => `${input} ${output}`;

function channelOf({ input, output }: Requirement, model: StateSpace): Result<Channel> {
  const found = {
    input: model.inputs.findIndex(({ name }) => name === input),
    output: model.outputs.findIndex(({ name }) => name === output),
  };
  if (found.input < 0) return fail(problem('bad-value', `There is no input ${onOneLine(input ?? '')} in the drawing.`));
  if (found.output < 0)
    return fail(problem('bad-value', `There is no output ${onOneLine(output ?? '')} in the drawing.`));
  return ok(found);
}

const VERDICTS: Readonly<Record<Stability['verdict'], string>> = {
  stable: 'it is stable',
  marginal: 'it is on the edge of stability',
  unstable: 'it is unstable',
  undecided: 'its stability could not be decided in doubles',
};

function ofLoop({ kind }: Requirement, model: StateSpace): Measurement {
  const { verdict } = stability(model);
  if (kind === 'stable') return { kind: 'holds', holds: verdict === 'stable', reason: VERDICTS[verdict] };
  const found = poles(model);
  if (found.route === 'not-converged') return none('its poles could not be computed');
  // A pole at the origin has no damping ratio; it is as little damped as any on the axis.
  const least = Math.min(...found.poles.map(pole => dampingRatio(pole) ?? 0));
  return found.poles.length === 0 ? unlimited('it has no poles') : value(least);
}

function ofChannel(
  requirement: Requirement,
  measured: Measured,
  channel: Channel,
  step: () => StepMetrics,
): Result<Measurement> {
  const { diagram, model } = measured;
  switch (requirement.kind) {
    case 'bandwidth': {
      const { bandwidth } = channelFrequency(diagram, model, channel);
      return ok(bandwidth === null ? withoutBandwidth(measured, channel) : value(bandwidth));
    }
    case 'magnitude':
      return largestMagnitude(requirement, measured, channel);
    default:
      return ok(ofStep(requirement, step()));
  }
}

function withoutBandwidth({ diagram, model }: Measured, channel: Channel): Measurement {
  const atRest = trueResponse(diagram, model, channel).valueAt(0);
  if (atRest === null) return none('it has a pole at zero, so there is no bandwidth');
  if (Math.hypot(...atRest) === 0) return none('the response at rest is zero, so there is no bandwidth');
  return unlimited('the magnitude never falls by 3 dB');
}

function ofStep({ kind }: Requirement, metrics: StepMetrics): Measurement {
  const { finalValue, overshootPercent, riseTime10to90, settlingTime2percent, status } = metrics;
  if (finalValue === null) {
    return none(
      status === 'computed' ? 'the step response does not settle' : 'the step response could not be computed',
    );
  }
  if (kind === 'steady-error') return value(Math.abs(1 - finalValue));
  const figure = kind === 'overshoot' ? overshootPercent : kind === 'rise-time' ? riseTime10to90 : settlingTime2percent;
  if (figure !== null) return value(figure);
  return none(finalValue === 0 ? 'the step response settles at zero' : 'the step response could not be followed');
}

/** The peak over the band in dB, at an end or at a maximum between the samples of a grid that follows every resonance. */
function largestMagnitude(
  { band }: Requirement,
  { diagram, model, scope }: Measured,
  channel: Channel,
): Result<Measurement> {
  const ends = (band ?? ['0', '0']).map(text => evaluateQuantity(text, scope));
  const [low, high] = ends;
  if (low === undefined || high === undefined || !low.ok || !high.ok) return ends.find(end => !end.ok) as Result<never>;
  const [from, to] = [low.value.double, high.value.double];
  if (!(from >= 0 && from < to)) {
    return fail(problem('bad-value', 'The band is empty. Its first end has to be 0 or more, and below the second.'));
  }
  const { valueAt, features, deadTimes } = trueResponse(diagram, model, channel);
  const shown = [from, to].filter(omega => omega > 0);
  const grid = frequencyGrid({ features, deadTimes, shown, margin: 1 }).filter(omega => omega >= from && omega <= to);
  const size = (omega: number) => {
    const found = valueAt(omega);
    return found === null ? Number.POSITIVE_INFINITY : Math.hypot(...found);
  };
  const largest = Math.max(...[from, to, ...grid, ...maximaBetween(size, grid)].map(size));
  return ok(
    largest === Number.POSITIVE_INFINITY ? none('it has a pole on the axis there') : value(20 * Math.log10(largest)),
  );
}

interface LoopFigures {
  readonly margins: Margins;
  readonly closedLoop: Stability['verdict'];
}

function loopAt(name: string, diagram: Diagram): Result<LoopFigures> {
  const cut = (diagram.cuts ?? []).find((each, k) => (each.name ?? `cut ${k + 1}`) === name);
  if (cut === undefined) return fail(problem('bad-value', `There is no cut ${onOneLine(name)} in the drawing.`));
  const loop = loopTransfer(diagram, cut.to);
  return loop.ok ? ok({ margins: margins(loop.value), closedLoop: loop.value.closedLoop }) : loop;
}

function ofCut({ kind }: Requirement, { margins: found, closedLoop }: LoopFigures): Measurement {
  if (closedLoop !== 'stable') return none(`the closed loop has no margin, since ${VERDICTS[closedLoop]}`);
  switch (kind) {
    case 'gain-margin': {
      const factors = [found.gainMarginUp, found.gainMarginDown].flatMap(each =>
        each === null ? [] : [each.gainMargin],
      );
      const least = Math.min(...factors.map(factor => Math.abs(20 * Math.log10(factor))));
      return factors.length === 0 ? unlimited('no gain puts the loop on the edge') : value(least);
    }
    case 'phase-margin':
      return found.phaseMargin === null
        ? unlimited('the loop has no gain crossover')
        : value(Math.abs(found.phaseMargin.phaseMargin));
    case 'delay-margin':
      return found.delayMargin === null
        ? unlimited('no dead time puts the loop on the edge')
        : value(found.delayMargin.seconds);
    case 'modulus-margin':
      return found.modulusMargin === null ? none('the sensitivity has no largest value') : value(found.modulusMargin);
    default:
      return found.diskMargin === null ? unlimited('the loop transfer is zero') : value(found.diskMargin.alpha);
  }
}
