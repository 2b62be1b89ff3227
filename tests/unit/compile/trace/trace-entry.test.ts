import { describe, expect, test } from 'vitest';
import { toFraction } from '../../../../src/algebra/index.ts';
import { compile } from '../../../../src/compile/index.ts';
import {
  entriesOn,
  type Trace,
  type TracedDrawing,
  traceable,
  traceEntry,
} from '../../../../src/compile/trace/index.ts';
import { type Block, type Diagram, type Parameter, startingDrawing, type Wire } from '../../../../src/diagram/index.ts';

function drawing(blocks: readonly Block[], links: readonly string[], parameters: readonly Parameter[] = []): Diagram {
  const wires = links.map((link): Wire => {
    const [from = '', to = ''] = link.split(' ');
    const [block = '', port = '0'] = to.split(':');
    return { from: [from, 0], to: [block, Number(port)] };
  });
  return { format: 'poleward-diagram', version: 1, title: '', parameters, blocks, wires };
}

function traced(diagram: Diagram): TracedDrawing {
  const derived = compile(diagram);
  if (!derived.ok) throw new Error(derived.problems[0]?.message);
  const result = traceable(diagram, derived.value.model);
  if (!result.ok) throw new Error('not readable');
  return result.value;
}

function entry(diagram: Diagram, row: string, column: string, limits?: Parameters<typeof traceEntry>[2]): Trace {
  const ready = traced(diagram);
  const { states, inputs, outputs } = ready.model;
  const at = (list: readonly { readonly name: string }[], name: string) => list.findIndex(each => each.name === name);
  const isOutput = row.startsWith('>');
  const place = {
    row: at(isOutput ? [...states.map(() => ({ name: '' })), ...outputs] : states, isOutput ? row.slice(1) : row),
    column: at([...states, ...inputs], column),
  };
  return traceEntry(ready, place, limits);
}

function done(trace: Trace): Extract<Trace, { outcome: 'traced' }> {
  if (trace.outcome !== 'traced') throw new Error(trace.reason);
  return trace;
}

const said = ({ steps }: { readonly steps: readonly { readonly word: string; readonly math: string }[] }) =>
  steps.map(({ word, math }) => `${word} ${math}`.trim());

describe('the winch that the page begins with', () => {
  // Drum: J ω̇ = T − R F − b ω, so the entry is 1/J with J = 0.8.
  test('names 1/J as the way from the torque to the drum’s speed', () => {
    const trace = done(entry(startingDrawing(), 'omega', 'T'));
    expect(toFraction(trace.value.exact)).toBe('5/4');
    expect(trace.value.symbols).toBe('1/J');
    expect(trace.paths.map(said)).toEqual([['integrator T', 'summing point', '1/J', 'integrator omega']]);
    expect(trace.paths[0]?.wires).toEqual([
      { sheet: '', block: 'torque', port: 0 },
      { sheet: '', block: 'drum', port: 0 },
      { sheet: '', block: 'omega', port: 0 },
    ]);
    expect(trace.from).toEqual({ name: 'T', block: 'T', kind: 'state' });
    expect(trace.to).toEqual({ name: 'omega', block: 'omega', kind: 'derivative' });
  });

  test('has no path where the entry is zero', () => {
    const trace = done(entry(startingDrawing(), 'omega', 'r'));
    expect([trace.value.exact.n, trace.paths, trace.wires]).toEqual([0n, [], []]);
  });
});

const LOOP = drawing(
  [
    { id: 'r', kind: 'input' },
    { id: 'e', kind: 'summer', signs: '+-' },
    { id: 'g1', kind: 'gain', gain: 'K1' },
    { id: 'g2', kind: 'gain', gain: 'K2' },
    { id: 'g3', kind: 'gain', gain: 'K3' },
    { id: 'x', kind: 'integrator' },
  ],
  ['r e', 'e g1', 'g1 g2', 'g2 x', 'g2 g3', 'g3 e:1'],
  [
    { name: 'K1', value: '2' },
    { name: 'K2', value: '3' },
    { name: 'K3', value: '1/4' },
  ],
);

test('a value that is too long for a sentence stands as a number alone', () => {
  const names = Array.from({ length: 20 }, (_, i) => `constant_${i}`);
  const chain = drawing(
    [
      { id: 'r', kind: 'input' },
      ...names.map((gain, i): Block => ({ id: `g${i}`, kind: 'gain', gain })),
      { id: 'y', kind: 'output' },
    ],
    ['r g0', ...names.slice(1).map((_, i) => `g${i} g${i + 1}`), 'g19 y'],
    names.map(name => ({ name, value: '2' })),
  );
  const { value } = done(entry(chain, '>y', 'r'));
  expect([toFraction(value.exact), value.symbols]).toEqual(['1048576', null]);
});

describe('an algebraic loop', () => {
  // Negative feedback: forward K1 K2, loop −K1 K2 K3 (any textbook; Mason 1956 for the general case).
  test('gives the forward product over one plus the loop’s', () => {
    const trace = done(entry(LOOP, 'x', 'r'));
    expect(trace.value.symbols).toBe('K1*K2/(1 + K1*K2*K3)');
    expect(toFraction(trace.value.exact)).toBe('12/5');
    expect(trace.determinant.symbols).toBe('1 + K1*K2*K3');
    expect(trace.loops.map(({ product }) => product.symbols)).toEqual(['-K1*K2*K3']);
    expect(trace.paths.map(({ product, cofactor }) => [product.symbols, cofactor.symbols])).toEqual([['K1*K2', '1']]);
  });

  test('has its blocks among those of the entry, in document order', () => {
    expect(entry(LOOP, 'x', 'r').blocks).toEqual(['r', 'e', 'g1', 'g2', 'g3', 'x']);
  });
});

test('a way through a group has the wire on each sheet', () => {
  const inner = drawing(
    [
      { id: 'in', kind: 'input' },
      { id: 'k', kind: 'gain', gain: '3' },
      { id: 'out', kind: 'output' },
    ],
    ['in k', 'k out'],
  );
  const whole = drawing(
    [
      { id: 'r', kind: 'input' },
      { id: 'box', kind: 'group', sheet: { blocks: inner.blocks, wires: inner.wires } },
      { id: 'y', kind: 'output' },
    ],
    ['r box', 'box y'],
  );
  const trace = done(entry(whole, '>y', 'r'));
  expect(toFraction(trace.value.exact)).toBe('3');
  expect(said(trace.paths[0] ?? { steps: [] })).toEqual(['input r', '3', 'output y']);
  expect(trace.wires).toEqual([
    { sheet: '', block: 'box', port: 0 },
    { sheet: 'box', block: 'k', port: 0 },
    { sheet: 'box', block: 'out', port: 0 },
    { sheet: '', block: 'y', port: 0 },
  ]);
});

test('a transfer function’s own states are traced inside it', () => {
  const lag = drawing(
    [
      { id: 'u', kind: 'input' },
      { id: 'P', kind: 'transfer-function', numerator: '1', denominator: 's^2 + a*s + b' },
      { id: 'y', kind: 'output' },
    ],
    ['u P', 'P y'],
    [
      { name: 'a', value: '3' },
      { name: 'b', value: '2' },
    ],
  );
  const trace = done(entry(lag, 'P_2', 'P_1'));
  expect([trace.value.symbols, toFraction(trace.value.exact)]).toEqual(['-b', '-2']);
  expect(trace.paths.map(said)).toEqual([['transfer function P']]);
});

describe('a drawing that differentiates', () => {
  // x is fed u − 2 ẋ, so ẋ = u / 3: an algebraic loop that the derivative of the state closes.
  const fed = drawing(
    [
      { id: 'u', kind: 'input' },
      { id: 'e', kind: 'summer', signs: '+-' },
      { id: 'x', kind: 'integrator' },
      { id: 'd', kind: 'differentiator' },
      { id: 'k', kind: 'gain', gain: '2' },
      { id: 'y', kind: 'output' },
    ],
    ['u e', 'e x', 'x d', 'd k', 'k e:1', 'x y'],
  );

  test('is traced where only states are differentiated', () => {
    const trace = done(entry(fed, 'x', 'u'));
    expect(toFraction(trace.value.exact)).toBe('1/3');
    expect(trace.loops).toHaveLength(1);
  });

  test('says where a state was shifted by an input', () => {
    const shifted = drawing(
      [
        { id: 'u', kind: 'input' },
        { id: 'd', kind: 'differentiator' },
        { id: 'x', kind: 'integrator' },
        { id: 'y', kind: 'output' },
      ],
      ['u d', 'd x', 'x y'],
    );
    expect(entry(shifted, '>y', 'u')).toMatchObject({
      outcome: 'not-traced',
      reason:
        'A state was shifted by an input, since its equation holds that input’s derivative: the entry gathers what the shift brings, which no path shows.',
    });
  });

  test('says where a differentiation acts as a lag', () => {
    const lag = drawing(
      [
        { id: 'u', kind: 'input' },
        { id: 'e', kind: 'summer', signs: '+-' },
        { id: 'd', kind: 'differentiator' },
        { id: 'y', kind: 'output' },
      ],
      ['u e', 'd e:1', 'e d', 'e y'],
    );
    expect(entry(lag, 'd', 'u')).toMatchObject({
      outcome: 'not-traced',
      reason:
        'd is the state of a differentiation that acts as a lag: it comes of reducing the equations together, not of paths.',
    });
    expect(entry(lag, '>y', 'u')).toMatchObject({
      reason:
        'A differentiation on the way to y acts as a lag or binds states to one another: the entry comes of reducing the equations together, not of paths.',
    });
  });
});

describe('too many ways', () => {
  /** Each stage doubles the paths. */
  const ladder = (stages: number) =>
    drawing(
      [
        { id: 'r', kind: 'input' },
        ...Array.from({ length: stages }, (_, i): Block => ({ id: `s${i}`, kind: 'summer', signs: '++' })),
        { id: 'y', kind: 'output' },
      ],
      [
        ...Array.from({ length: stages }, (_, i) => [`${i === 0 ? 'r' : `s${i - 1}`} s${i}`]).flat(),
        ...Array.from({ length: stages }, (_, i) => `${i === 0 ? 'r' : `s${i - 1}`} s${i}:1`),
        `s${stages - 1} y`,
      ],
    );

  test('are all listed up to the limit', () => {
    const trace = done(entry(ladder(6), '>y', 'r'));
    expect(trace.paths).toHaveLength(64);
    expect(toFraction(trace.value.exact)).toBe('64');
  });

  test('are marked and not listed beyond it', () => {
    const trace = entry(ladder(7), '>y', 'r');
    expect(trace).toMatchObject({
      outcome: 'not-traced',
      reason:
        'There are more than 64 action paths from r to y to list one by one; the blocks and wires on them are marked.',
    });
    expect(trace.blocks).toHaveLength(9);
  });

  test('are given up where the search itself takes too long', () => {
    expect(entry(ladder(7), '>y', 'r', { paths: 1000, loops: 10, steps: 20 })).toMatchObject({
      reason:
        'There are too many ways through the drawing from r to y to list one by one; the blocks and wires on them are marked.',
    });
  });

  test('of loops are told as such', () => {
    expect(entry(LOOP, 'x', 'r', { paths: 10, loops: 0, steps: 1000 })).toMatchObject({
      reason:
        'More than 0 loops, or too many sets of them, meet the action paths from r to the derivative of x to list one by one; the blocks and wires on them are marked.',
    });
  });
});

describe('the entries on a part', () => {
  test('of the winch’s drum gain are the three that hold 1/J', () => {
    const ready = traced(startingDrawing());
    expect(entriesOn(ready, { block: 'drum' })).toEqual([
      { row: 0, column: 0 },
      { row: 0, column: 1 },
      { row: 0, column: 3 },
    ]);
  });

  test('of an integrator are its row and its column', () => {
    const ready = traced(startingDrawing());
    // q is read by T alone and made of r and F.
    expect(entriesOn(ready, { block: 'q' })).toEqual([
      { row: 2, column: 1 },
      { row: 2, column: 4 },
      { row: 3, column: 2 },
    ]);
  });

  test('of a wire are those whose ways run over it', () => {
    const ready = traced(startingDrawing());
    const wire = { sheet: '', block: 'torque', port: 1 };
    expect(entriesOn(ready, { wire })).toEqual([{ row: 0, column: 1 }]);
  });
});
