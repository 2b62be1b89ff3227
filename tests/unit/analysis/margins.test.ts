/** Margins at a cut: closed forms of textbook loops, laws of the loop transfer, dead time, and what there is none of. */

import { expect, test } from 'vitest';
import { channelFrequency, type LoopTransfer, loopTransfer, margins } from '../../../src/analysis/index.ts';
import { compile, directResponse } from '../../../src/compile/index.ts';
import type { Block, Diagram, PortReference } from '../../../src/diagram/index.ts';

/** reference → error → the blocks in a row → output, the last one fed back. */
function loopOf(...row: readonly Block[]): Diagram {
  const chain = ['r', 'e', ...row.map(({ id }) => id), 'y'];
  const last = row.at(-1)?.id ?? 'e';
  return {
    format: 'poleward-diagram',
    version: 1,
    title: '',
    parameters: [],
    blocks: [{ kind: 'input', id: 'r' }, { kind: 'summer', id: 'e', signs: '+-' }, ...row, { kind: 'output', id: 'y' }],
    wires: [
      ...chain.slice(1).map((id, k) => ({ from: [chain[k] ?? '', 0], to: [id, 0] }) as const),
      { from: [last, 0], to: ['e', 1] },
    ],
  };
}

const plant = (numerator: string, denominator: string): Block => ({
  kind: 'transfer-function',
  id: 'plant',
  numerator,
  denominator,
});
const AT_PLANT: PortReference = ['plant', 0];

function transferAt(diagram: Diagram, to: PortReference = AT_PLANT): LoopTransfer {
  const found = loopTransfer(diagram, to);
  if (!found.ok) throw new Error(found.problems.map(({ message }) => message).join(' '));
  return found.value;
}

const RADIANS = Math.PI / 180;

// L = ωn² / (s (s + 2 ζ ωn)): tan PM = 2ζ / √(√(1 + 4ζ⁴) − 2ζ²) and the crossover ωn √(√(1 + 4ζ⁴) − 2ζ²), in every textbook
// of classical control; the closed loop's −3 dB bandwidth is ωn √(1 − 2ζ² + √((1 − 2ζ²)² + 1)).
test.each([0.1, 0.25, 0.5, 0.75, 1, 2])(
  'the second-order loop with damping ratio %d has the closed-form margins',
  zeta => {
    const wn = 3;
    const diagram = loopOf(plant(`${wn}^2`, `s*(s + 2*${zeta}*${wn})`));
    const found = margins(transferAt(diagram));
    const inner = Math.sqrt(Math.sqrt(1 + 4 * zeta ** 4) - 2 * zeta ** 2);
    expect(found.phaseMargin?.omega).toBeCloseTo(wn * inner, 11);
    expect(found.phaseMargin?.phaseMargin).toBeCloseTo(Math.atan2(2 * zeta, inner) / RADIANS, 10);
    expect(found.delayMargin?.seconds).toBeCloseTo(Math.atan2(2 * zeta, inner) / (wn * inner), 11);
    expect(found.phaseCrossovers).toEqual([]);
    const derived = compile(diagram);
    if (!derived.ok) throw new Error('no model');
    const { bandwidth } = channelFrequency(diagram, derived.value.model, { input: 0, output: 0 });
    const square = 1 - 2 * zeta ** 2;
    expect(bandwidth).toBeCloseTo(wn * Math.sqrt(square + Math.sqrt(square ** 2 + 1)), 11);
  },
);

test('an integrating loop k/s leaves a disk margin of 2, a modulus margin of 1 and a delay margin of π/(2k)', () => {
  const found = margins(transferAt(loopOf(plant('4', 's'))));
  expect(found.diskMargin?.alpha).toBeCloseTo(2, 12);
  expect(found.diskMargin?.phase).toBeCloseTo(90, 10);
  expect(found.modulusMargin).toBe(1);
  expect(found.sensitivity).toEqual({ magnitude: 1, omega: null });
  expect(found.delayMargin?.seconds).toBeCloseTo(Math.PI / 8, 13);
});

test('the peak of T is that of the second-order resonance, 1 / (2ζ √(1 − ζ²)) at ωn √(1 − 2ζ²)', () => {
  const [wn, zeta] = [3, 0.01];
  const { complementarySensitivity } = margins(transferAt(loopOf(plant('9', 's*(s + 2*0.01*3)'))));
  expect(complementarySensitivity?.magnitude).toBeCloseTo(1 / (2 * zeta * Math.sqrt(1 - zeta ** 2)), 9);
  expect(complementarySensitivity?.omega).toBeCloseTo(wn * Math.sqrt(1 - 2 * zeta ** 2), 6);
});

test('the smallest disk perturbation puts a closed-loop pole on the axis: (1 − L) δ = 2 (1 + L) there', () => {
  const loop = transferAt(loopOf(plant('2', '(s + 1)^3')));
  const disk = margins(loop).diskMargin;
  const omega = disk?.omega ?? NaN;
  const [re, im] = loop.valueAt(omega) ?? [NaN, NaN];
  const size = (2 * Math.hypot(1 + re, im)) / Math.hypot(1 - re, im);
  expect(disk?.alpha).toBeCloseTo(size, 12);
  for (const nearby of [omega * 0.99, omega * 1.01]) {
    const [a, b] = loop.valueAt(nearby) ?? [NaN, NaN];
    expect((2 * Math.hypot(1 + a, b)) / Math.hypot(1 - a, b)).toBeGreaterThan(size);
  }
});

test('dead time in an integrating loop: crossovers at k and π/(2T), gain margin π/(2kT), phase margin 90° − kT', () => {
  const delay: Block = { kind: 'delay', id: 'pipe', time: '0.5' };
  const loop = transferAt(loopOf(plant('1.2', 's'), delay));
  const found = margins(loop);
  expect(loop.route).toBe('direct');
  expect(found.phaseMargin?.omega).toBeCloseTo(1.2, 12);
  expect(found.phaseMargin?.phaseMargin).toBeCloseTo(90 - 0.6 / RADIANS, 10);
  expect(found.phaseCrossovers[0]?.omega).toBeCloseTo(Math.PI, 12);
  expect(found.gainMarginUp?.gainMargin).toBeCloseTo(Math.PI / 1.2, 12);
  expect(found.phaseCrossovers[1]?.omega).toBeCloseTo(5 * Math.PI, 11);
});

test('a cut on a wire that is in no loop gives L = 0 and no margin', () => {
  const diagram = loopOf(plant('1', 's + 1'));
  for (const to of [
    ['y', 0],
    ['e', 0],
  ] as const) {
    const loop = transferAt(diagram, to);
    expect(loop.exact?.numerator).toEqual([]);
    expect(loop.valueAt(2)?.map(Math.abs)).toEqual([0, 0]);
    expect(margins(loop)).toMatchObject({
      gainCrossovers: [],
      phaseCrossovers: [],
      phaseMargin: null,
      modulusMargin: 1,
    });
  }
});

test('every wire around one loop gives the same margins', () => {
  const diagram = loopOf(plant('2', '(s + 1)^3'), { kind: 'gain', id: 'k', gain: '1.5' });
  const found = (
    [
      ['plant', 0],
      ['k', 0],
      ['e', 1],
    ] as const
  ).map(to => margins(transferAt(diagram, to)));
  expect(found[1]).toEqual(found[0]);
  expect(found[2]).toEqual(found[0]);
});

test('a loop that is not stable has crossovers and no delay or disk margin', () => {
  const found = margins(transferAt(loopOf(plant('9', '(s + 1)^3'))));
  expect(found.gainMarginDown?.gainMargin).toBeCloseTo(8 / 9, 12);
  expect(found.gainMarginUp).toBeNull();
  expect(found.phaseMargin?.phaseMargin).toBeLessThan(0);
  expect(found).toMatchObject({ delayMargin: null, diskMargin: null });
});

test('L is conjugate at −ω, and the exact route equals the direct solution of the opened drawing', () => {
  const diagram = loopOf(plant('s + 3', 's^3 + 0.4*s^2 + 5*s + 1'), { kind: 'gain', id: 'k', gain: '0.7' });
  const loop = transferAt(diagram);
  const opened: Diagram = {
    ...diagram,
    wires: [
      ...diagram.wires.filter(({ to }) => to[0] !== 'plant' && to[0] !== 'y' && to[0] !== 'e'),
      { from: ['r', 0], to: ['plant', 0] },
      { from: ['k', 0], to: ['e', 1] },
      { from: ['e', 0], to: ['y', 0] },
    ],
  };
  const direct = directResponse(opened);
  if (!direct.ok) throw new Error('no direct response');
  for (const omega of [0.01, 0.37, 2.2, 2.24, 19, 400]) {
    const [re, im] = loop.valueAt(omega) ?? [NaN, NaN];
    const [back] = direct.value.at({ re: 0, im: omega }, 0) ?? [];
    const size = Math.hypot(re, im);
    expect(Math.hypot(re + (back?.re ?? NaN), im + (back?.im ?? NaN)) / size).toBeLessThan(1e-12);
    const [mirroredRe, mirroredIm] = loop.valueAt(-omega) ?? [NaN, NaN];
    expect(Math.hypot(mirroredRe - re, mirroredIm + im) / size).toBeLessThan(64 * Number.EPSILON);
  }
});

test('the phase of four integrators runs on at −360° without a jump', () => {
  const diagram: Diagram = loopOf(plant('1', 's^4'));
  const open = { ...diagram, wires: diagram.wires.filter(({ to }) => to[1] === 0) };
  const derived = compile(open);
  if (!derived.ok) throw new Error('no model');
  const { curve, bandwidth } = channelFrequency(open, derived.value.model, { input: 0, output: 0 });
  expect(curve.phase.every(phase => Math.abs(phase + 360) < 1e-9)).toBe(true);
  expect(bandwidth).toBeNull();
});

test('a channel of one dead time has magnitude 1 and the phase −ωT on every turn', () => {
  const diagram = loopOf({ kind: 'delay', id: 'pipe', time: '0.25' });
  const open: Diagram = { ...diagram, wires: diagram.wires.filter(({ to }) => to[1] === 0) };
  const derived = compile(open);
  if (!derived.ok) throw new Error('no model');
  const { curve, route, bandwidth } = channelFrequency(open, derived.value.model, { input: 0, output: 0 });
  expect(route).toBe('direct');
  expect(bandwidth).toBeNull();
  expect(Math.max(...curve.omega) * 0.25).toBeGreaterThan(4 * Math.PI);
  curve.omega.forEach((omega, k) => {
    expect(curve.magnitude[k]).toBeCloseTo(0, 12);
    expect(curve.phase[k]).toBeCloseTo((-omega * 0.25) / RADIANS, 8);
  });
});

test('a cut where no wire ends is refused and names the block', () => {
  const found = loopTransfer(loopOf(plant('1', 's')), ['plant', 3]);
  expect(found).toMatchObject({
    ok: false,
    problems: [{ message: 'No wire ends at port 3 of block plant. Put the cut on a wire.' }],
  });
});
