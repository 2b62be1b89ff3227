/**
 * Requirements against the closed forms of the standard second-order loop ω₀² / (s (s + 2 ζ ω₀)) under unit feedback, as every
 * textbook of control has them (Ogata, Modern Control Engineering, chapters 5 and 7; from memory, each derived anew beside it).
 */

import { describe, expect, test } from 'vitest';
import { type Assessment, assess } from '../../../../src/analysis/index.ts';
import { compile } from '../../../../src/compile/index.ts';
import { type Block, type Diagram, type Requirement, readDiagram } from '../../../../src/diagram/index.ts';
import { draw, gain, input, output, quotient, sum } from '../../../arbitraries/draw.ts';

const ZETA = 0.5;
const OMEGA = 2;

/** Closed loop ω₀² / (s² + 2 ζ ω₀ s + ω₀²), with a cut in its feedback. */
const second: Diagram = {
  ...draw(
    [input('r'), sum('e', '+-'), quotient('plant', 'w^2', 's^2 + 2*z*w*s'), output('y')],
    ['r -> e', 'e -> plant', 'plant -> y', 'plant -> e:1'],
    { w: String(OMEGA), z: String(ZETA) },
  ),
  cuts: [{ to: ['e', 1] }],
};

function assessed(diagram: Diagram, ...requirements: readonly Requirement[]): readonly Assessment[] {
  const whole = { ...diagram, requirements };
  const derived = compile(whole);
  if (!derived.ok) throw new Error(derived.problems[0]?.message);
  return assess(whole, derived.value.model);
}

function one(diagram: Diagram, requirement: Requirement): Assessment {
  const [found] = assessed(diagram, requirement);
  if (found === undefined) throw new Error('nothing was assessed');
  return found;
}

const channel = { input: 'r', output: 'y' } as const;
const atCut = { cut: 'cut 1' } as const;
const root = Math.sqrt(1 - ZETA ** 2);
/** |L| = 1 at ω₀ √(√(4 ζ⁴ + 1) − 2 ζ²). */
const crossover = OMEGA * Math.sqrt(Math.sqrt(4 * ZETA ** 4 + 1) - 2 * ZETA ** 2);
const phaseMargin = Math.atan2(2 * ZETA * OMEGA, crossover);

describe('figures of the second-order loop', () => {
  test.each<[string, Requirement, number]>([
    // exp(−π ζ / √(1 − ζ²)), the peak of 1 − e^(−ζ ω₀ t) sin(…) / √(1 − ζ²)
    ['overshoot', { kind: 'overshoot', ...channel, most: '100' }, 100 * Math.exp((-Math.PI * ZETA) / root)],
    ['steady error', { kind: 'steady-error', ...channel, most: '1' }, 0],
    ['damping', { kind: 'damping', least: '0' }, ZETA],
    // −3 dB at ω₀ √(1 − 2 ζ² + √((1 − 2 ζ²)² + 1))
    [
      'bandwidth',
      { kind: 'bandwidth', ...channel, least: '0' },
      OMEGA * Math.sqrt(1 - 2 * ZETA ** 2 + Math.sqrt((1 - 2 * ZETA ** 2) ** 2 + 1)),
    ],
    // the resonance 1 / (2 ζ √(1 − ζ²)) at ω₀ √(1 − 2 ζ²)
    [
      'largest magnitude',
      { kind: 'magnitude', ...channel, band: ['0', '10'], most: '20' },
      20 * Math.log10(1 / (2 * ZETA * root)),
    ],
    // beyond the resonance the largest is at the band's lower end: |G(4 j)| with ω₀ = 2 and ζ = ½ is 4 / |4 − 16 + 8 j|
    [
      'largest magnitude of a band',
      { kind: 'magnitude', ...channel, band: ['2*w', '10*w'], most: '20' },
      20 * Math.log10(4 / Math.hypot(12, 8)),
    ],
    ['phase margin', { kind: 'phase-margin', ...atCut, least: '0' }, (phaseMargin * 180) / Math.PI],
    ['delay margin', { kind: 'delay-margin', ...atCut, least: '0' }, phaseMargin / crossover],
  ])('%s', (_, requirement, expected) => {
    const { value, status } = one(second, requirement);
    expect(value).toBeCloseTo(expected, 9);
    expect(status).toBe('met');
  });

  test('settling and rise by solving the closed form', () => {
    const y = (t: number) => 1 - (Math.exp(-ZETA * OMEGA * t) * Math.sin(OMEGA * root * t + Math.acos(ZETA))) / root;
    const settling = one(second, { kind: 'settling-time', ...channel, most: '10' }).value ?? Number.NaN;
    expect(Math.abs(y(settling) - 1)).toBeCloseTo(0.02, 9);
    const rise = one(second, { kind: 'rise-time', ...channel, most: '10' }).value ?? Number.NaN;
    const from = bisected(t => y(t) - 0.1, 0, 1);
    expect(y(from + rise)).toBeCloseTo(0.9, 9);
  });
});

function bisected(f: (t: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  for (let step = 0; step < 60; step++) {
    const middle = (low + high) / 2;
    if (f(middle) < 0) low = middle;
    else high = middle;
  }
  return low;
}

describe('met or missed', () => {
  test('a bound equal to the figure is met, by 0', () => {
    expect(one(second, { kind: 'damping', least: 'z' })).toMatchObject({ status: 'met', slack: 0, bound: 0.5 });
  });

  test('the slack is positive inside and negative outside', () => {
    expect(one(second, { kind: 'damping', least: '0.3' }).slack).toBeCloseTo(0.2, 12);
    expect(one(second, { kind: 'damping', least: '0.7' })).toMatchObject({ status: 'missed' });
    expect(one(second, { kind: 'damping', least: '0.7' }).slack).toBeCloseTo(-0.2, 12);
    expect(one(second, { kind: 'bandwidth', ...channel, most: '1' })).toMatchObject({ status: 'missed' });
  });

  test('a gain margin without a phase crossover meets any bound and has no figure', () => {
    expect(one(second, { kind: 'gain-margin', ...atCut, least: '100' })).toEqual({
      requirement: { kind: 'gain-margin', cut: 'cut 1', least: '100' },
      status: 'met',
      value: null,
      bound: 100,
      slack: null,
      reason: 'No gain puts the loop on the edge.',
    });
  });

  /** k / (s + 1)³ under unit feedback is stable up to k = 8 (Routh): at k = 4 the gain margin is a factor 2. */
  const third = (k: string): Diagram => ({
    ...draw(
      [input('r'), sum('e', '+-'), gain('K', k), quotient('plant', '1', '(s + 1)^3'), output('y')],
      ['r -> e', 'e -> K', 'K -> plant', 'plant -> y', 'plant -> e:1'],
    ),
    cuts: [{ to: ['plant', 0], name: 'valve' }],
  });

  test('the gain margin at a cut with a name', () => {
    const found = one(third('4'), { kind: 'gain-margin', cut: 'valve', least: '6' });
    expect(found.value).toBeCloseTo(20 * Math.log10(2), 9);
    expect(found.status).toBe('met');
  });

  test.each<[Requirement, string]>([
    [{ kind: 'stable' }, 'It is unstable.'],
    [{ kind: 'overshoot', ...channel, most: '10' }, 'The step response does not settle.'],
    [{ kind: 'gain-margin', cut: 'valve', least: '1' }, 'The closed loop has no margin, since it is unstable.'],
  ])('an unstable loop misses %j', (requirement, reason) => {
    expect(one(third('9'), requirement)).toMatchObject({ status: 'missed', value: null, slack: null, reason });
  });

  test('stability is met by a stable loop and missed on its edge', () => {
    expect(one(third('7.999'), { kind: 'stable' })).toMatchObject({ status: 'met', reason: 'It is stable.' });
    expect(one(third('8'), { kind: 'stable' })).toMatchObject({
      status: 'missed',
      reason: 'It is on the edge of stability.',
    });
  });
});

describe('what cannot be checked', () => {
  test.each<[Requirement, string]>([
    [{ kind: 'overshoot', input: 'w', output: 'y', most: '1' }, 'There is no input w in the drawing.'],
    [{ kind: 'overshoot', input: 'r', output: 'z', most: '1' }, 'There is no output z in the drawing.'],
    [{ kind: 'phase-margin', cut: 'cut 2', least: '1' }, 'There is no cut cut 2 in the drawing.'],
    [{ kind: 'damping', least: 'Q' }, 'Q is not a parameter. Add Q to the parameters.'],
    [
      { kind: 'magnitude', ...channel, band: ['5', '5'], most: '1' },
      'The band is empty. Its first end has to be 0 or more, and below the second.',
    ],
  ])('%j says why', (requirement, reason) => {
    expect(one(second, requirement)).toMatchObject({ status: 'unchecked', value: null, slack: null });
    expect(one(second, requirement).reason).toBe(reason);
  });
});

test('a drawing that requires nothing has nothing to assess', () => {
  expect(assessed(second)).toEqual([]);
  const read = readDiagram(JSON.stringify({ ...second, requirements: [] }));
  expect(read.ok).toBe(true);
});

const lag = (id: string): Block => quotient(id, '1', 's + 1');

test('a response at rest that is zero has no bandwidth', () => {
  const rejection = draw(
    [input('r'), quotient('washout', 's', 's + 1'), lag('lag'), output('y')],
    ['r -> washout', 'washout -> lag', 'lag -> y'],
  );
  expect(one(rejection, { kind: 'bandwidth', ...channel, least: '1' })).toMatchObject({
    status: 'missed',
    reason: 'The response at rest is zero, so there is no bandwidth.',
  });
});
