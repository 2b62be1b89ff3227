/** Published and hand-worked drawings with what they do: poles, zeros, transfer functions, stability, structure, responses. */

import { expect, test } from 'vitest';
import { toFraction } from '../../src/algebra/index.ts';
import {
  allTransferFunctions,
  type Effort,
  frequencyResponse,
  isControllable,
  isObservable,
  kalmanRanks,
  poles,
  type Root,
  stability,
  stepMetrics,
  stepResponse,
  stepValuesAt,
  zeros,
} from '../../src/analysis/index.ts';
import { compile, type StateSpace } from '../../src/compile/index.ts';
import type { Block } from '../../src/diagram/index.ts';
import {
  type ExpectedRoot,
  type ExpectedStep,
  isWithin,
  readSituations,
  type Situation,
  type Tolerance,
} from './read-cases.ts';

function modelOf({ diagram }: Situation): StateSpace {
  const result = compile(diagram);
  if (!result.ok) throw new Error(result.problems.map(({ message }) => message).join(' '));
  return result.value.model;
}

const EFFORT: Effort = 'ordinary';

const asserting = (key: string) => readSituations().filter(({ expect: expected }) => expected[key] !== undefined);

function holdsDelay(blocks: readonly Block[]): boolean {
  return blocks.some(block => block.kind === 'delay' || (block.kind === 'group' && holdsDelay(block.sheet.blocks)));
}

/** Time and frequency answers of these cases are those of the true dead time, which the state-space model approximates. */
const withoutDeadTime = (situations: readonly Situation[]) =>
  situations.filter(({ diagram }) => !holdsDelay(diagram.blocks));

function listed<T>(value: unknown): readonly T[] {
  return (Array.isArray(value) ? value : [value]) as readonly T[];
}

/** Each expected root stands for another of the computed ones, with its multiplicity. */
function expectSameRoots(found: readonly Root[], wanted: readonly ExpectedRoot[], tolerance: Tolerance) {
  const left = [...found];
  for (const { re, im, multiplicity } of wanted) {
    const at = left.findIndex(
      root =>
        root.multiplicity === multiplicity && isWithin(root.re, re, tolerance) && isWithin(root.im, im, tolerance),
    );
    expect(at, `${re} ${im} × ${multiplicity} among ${JSON.stringify(left)}`).toBeGreaterThanOrEqual(0);
    left.splice(at, 1);
  }
  expect(left).toEqual([]);
}

function channelOf(model: StateSpace, { input, output }: { readonly input?: string; readonly output?: string }) {
  const at = (names: readonly { readonly name: string }[], wanted: string | undefined) => {
    const index = wanted === undefined ? 0 : names.findIndex(({ name }) => name === wanted);
    if (index < 0) throw new Error(`no signal ${wanted}`);
    return index;
  };
  return { input: at(model.inputs, input), output: at(model.outputs, output) };
}

test.each(asserting('poles'))('$name: its poles are certified, with their multiplicities', situation => {
  const found = poles(modelOf(situation), EFFORT);
  expect(found.route).toBe('certified');
  expectSameRoots(found.poles, situation.expect.poles ?? [], situation.tolerance('poles'));
});

test.each(asserting('zeros'))('$name: its invariant zeros', situation => {
  const found = zeros(modelOf(situation), EFFORT);
  expect(found.route).toBe('certified');
  expectSameRoots(found.zeros, situation.expect.zeros ?? [], situation.tolerance('zeros'));
});

test.each(asserting('transferFunctions'))('$name: its transfer functions, common factors cancelled', situation => {
  const model = modelOf(situation);
  const found = allTransferFunctions(model, EFFORT);
  const wanted = situation.expect.transferFunctions ?? [];
  expect(found).toHaveLength(model.inputs.length * model.outputs.length);
  for (const each of wanted) {
    const fraction = found.find(({ input, output }) => input === each.input && output === each.output);
    if (fraction?.route !== 'certified') throw new Error(`${each.output} from ${each.input} was not computed`);
    const tolerance = situation.tolerance('transferFunctions');
    for (const part of ['numerator', 'denominator'] as const) {
      expect(fraction[part]).toHaveLength(each[part].length);
      const isNear = each[part].map((value, i) => isWithin(fraction[part][i] ?? NaN, value, tolerance));
      expect(isNear, `${part} ${fraction[part].join(' ')}`).toEqual(each[part].map(() => true));
    }
    if (fraction.standsIn) continue;
    if (each.numeratorExact !== undefined) {
      expect(fraction.exact.numerator.map(toFraction)).toEqual(each.numeratorExact);
    }
    if (each.denominatorExact !== undefined)
      expect(fraction.exact.denominator.map(toFraction)).toEqual(each.denominatorExact);
  }
});

test.each(asserting('stability'))('$name: its stability is proved', situation => {
  expect(stability(modelOf(situation), EFFORT)).toMatchObject({ verdict: situation.expect.stability, proved: true });
});

test.each(asserting('controllable'))('$name: whether the inputs reach every state', situation => {
  const model = modelOf(situation);
  expect(isControllable(model, EFFORT).holds).toBe(situation.expect.controllable);
  const rank = situation.expect.controllableRank;
  if (rank !== undefined) expect(kalmanRanks(model, EFFORT)?.controllable).toBe(rank);
});

test.each(asserting('observable'))('$name: whether the outputs tell all states apart', situation => {
  const model = modelOf(situation);
  expect(isObservable(model, EFFORT).holds).toBe(situation.expect.observable);
  const rank = situation.expect.observableRank;
  if (rank !== undefined) expect(kalmanRanks(model, EFFORT)?.observable).toBe(rank);
});

/** Those that the linear model answers: with clipping the limiter acts. */
const linearSteps = (situation: Situation) =>
  listed<ExpectedStep>(situation.expect['step']).filter(({ simulation }) => simulation === undefined);

const stepping = withoutDeadTime(asserting('step')).filter(situation => linearSteps(situation).length > 0);

test.each(stepping)('$name: its step responses', situation => {
  const model = modelOf(situation);
  for (const step of linearSteps(situation)) {
    const found = stepValuesAt(model, channelOf(model, step), step.t);
    const isNear = step.y.map((value, k) => isWithin(found?.[k] ?? NaN, value, situation.tolerance('step')));
    expect(isNear, `${step.output}: ${found?.join(' ')}`).toEqual(step.y.map(() => true));
  }
});

test.each(stepping)('$name: the curve goes through the same points', situation => {
  const model = modelOf(situation);
  for (const step of linearSteps(situation)) {
    const { input, output } = channelOf(model, step);
    const horizon = step.t[step.t.length - 1] ?? 1;
    const parts = commonParts(step.t);
    const response = stepResponse(model, { input, outputs: [output], horizon, points: parts + 1 });
    if (response.status !== 'computed') throw new Error(response.reason);
    const found = step.t.map(t => response.y[0]?.[Math.round((t / horizon) * parts)] ?? NaN);
    const isNear = step.y.map((value, k) => isWithin(found[k] ?? NaN, value, situation.tolerance('step')));
    expect(isNear, `${step.output}: ${found.join(' ')}`).toEqual(step.y.map(() => true));
  }
});

/** The fewest equal parts of the last time whose ends hold all times. */
function commonParts(times: readonly number[]): number {
  const last = times[times.length - 1] ?? 1;
  const isWhole = (x: number) => Math.abs(x - Math.round(x)) < 1e-9;
  const parts = Array.from({ length: 10_000 }, (_, k) => k + 1).find(n => times.every(t => isWhole((t / last) * n)));
  if (parts === undefined) throw new Error(`no common part of ${times.join(', ')}`);
  return parts;
}

interface ExpectedMetrics {
  readonly input?: string;
  readonly output?: string;
  readonly overshootPercent?: number | null;
  readonly peakTime?: number | null;
  readonly riseTime10to90?: number | null;
  readonly settlingTime2percent?: number | null;
  readonly finalValue?: number | null;
}

test.each(withoutDeadTime(asserting('stepMetrics')))('$name: the figures of its step response', situation => {
  const model = modelOf(situation);
  for (const wanted of listed<ExpectedMetrics>(situation.expect['stepMetrics'])) {
    const found = stepMetrics(model, channelOf(model, wanted));
    expect(found.status).toBe('computed');
    const tolerance = situation.tolerance('stepMetrics');
    for (const key of [
      'overshootPercent',
      'peakTime',
      'riseTime10to90',
      'settlingTime2percent',
      'finalValue',
    ] as const) {
      const value = wanted[key];
      if (value === undefined) continue;
      if (value === null) expect(found[key], key).toBeNull();
      else expect(isWithin(found[key] ?? NaN, value, tolerance), `${key}: ${found[key]} for ${value}`).toBe(true);
    }
  }
});

interface ExpectedFrequency {
  readonly input?: string;
  readonly output?: string;
  readonly w: readonly number[];
  readonly re: readonly number[];
  readonly im: readonly number[];
}

test.each(withoutDeadTime(asserting('frequency')))('$name: its frequency responses', situation => {
  const model = modelOf(situation);
  for (const wanted of listed<ExpectedFrequency>(situation.expect['frequency'])) {
    const found = frequencyResponse(model, channelOf(model, wanted), wanted.w, EFFORT);
    const tolerance = situation.tolerance('frequency');
    wanted.w.forEach((w, k) => {
      expect(isWithin(found.re[k] ?? NaN, wanted.re[k] ?? NaN, tolerance), `re at ${w}: ${found.re[k]}`).toBe(true);
      expect(isWithin(found.im[k] ?? NaN, wanted.im[k] ?? NaN, tolerance), `im at ${w}: ${found.im[k]}`).toBe(true);
    });
  }
});
