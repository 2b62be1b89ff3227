import { describe, expect, test } from 'vitest';
import { type Rational, toFraction, toRows, ZERO } from '../../../src/algebra/index.ts';
import { compile, type Derivation } from '../../../src/compile/index.ts';
import type { Diagram } from '../../../src/diagram/index.ts';
import { draw, gain, group, input, integrator, output, quotient, sheet, sum } from '../../arbitraries/draw.ts';
import { problemsOf, valueOf } from '../results.ts';

const derivationOf = (diagram: Diagram): Derivation => valueOf(compile(diagram));

function exact(diagram: Diagram) {
  const { rational } = derivationOf(diagram).model;
  if (rational === null) throw new Error('derived in doubles');
  const text = (key: 'A' | 'B' | 'C' | 'D') => toRows<Rational>(rational[key], ZERO).map(row => row.map(toFraction));
  return { A: text('A'), B: text('B'), C: text('C'), D: text('D') };
}

describe('names', () => {
  test('two states of one name are refused', () => {
    const drawing = draw([{ ...integrator('a'), name: 'x_1' }, quotient('x', '1', 's + 1')], ['x -> a', 'a -> x']);
    expect(problemsOf(compile(drawing))).toEqual([
      'duplicate-name: Two states are called x_1. Give one of their blocks another name.',
    ]);
    expect(compile(drawing)).toMatchObject({ problems: [{ blocks: ['a', 'x'] }] });
  });

  test('two groups of one name are refused for the states in them, and inputs and outputs likewise', () => {
    const inner = sheet([integrator('q')], []);
    const drawing = draw(
      [
        { ...group('g', inner), name: 'tank' },
        { ...group('h', inner), name: 'tank' },
        { ...input('u'), name: 'flow' },
        { ...input('v'), name: 'flow' },
        { ...output('y'), name: 'level' },
        { ...output('z'), name: 'level' },
      ],
      [],
    );
    expect(problemsOf(compile(drawing))).toEqual([
      'duplicate-name: Two states are called tank.q. Give one of their blocks another name.',
      'duplicate-name: Two inputs are called flow. Give one of their blocks another name.',
      'duplicate-name: Two outputs are called level. Give one of their blocks another name.',
    ]);
  });

  test('an output may bear the name of a state', () => {
    const drawing = draw([integrator('x'), { ...output('y'), name: 'x' }], ['x -> y']);
    expect(derivationOf(drawing).model.outputs).toEqual([{ name: 'x', block: 'y' }]);
  });

  test('units of inputs, outputs and states are handed on', () => {
    const drawing = draw(
      [
        { id: 'u', kind: 'input', unit: 'N' },
        { id: 'x', kind: 'integrator', unit: 'm/s', initial: '3' },
        { id: 'y', kind: 'output', unit: 'm/s' },
      ],
      ['u -> x', 'x -> y'],
    );
    const { model } = derivationOf(drawing);
    expect(model.inputs).toEqual([{ name: 'u', block: 'u', unit: 'N' }]);
    expect(model.states).toEqual([{ name: 'x', block: 'x', unit: 'm/s' }]);
    expect(model.outputs).toEqual([{ name: 'y', block: 'y', unit: 'm/s' }]);
    expect(model.initialState).toEqual([3]);
  });
});

describe('small drawings', () => {
  test('an empty sheet is a model of empty matrices', () => {
    const { model, loops, warnings, selfCheck } = derivationOf(draw([], []));
    expect(exact(draw([], []))).toEqual({ A: [], B: [], C: [], D: [] });
    expect([model.states, model.inputs, model.outputs, loops, warnings]).toEqual([[], [], [], [], []]);
    expect(selfCheck).toMatchObject({ error: 0, passed: true, frequencies: 0 });
  });

  test('an input wired to an output is passed through', () => {
    expect(exact(draw([input('u'), output('y')], ['u -> y']))).toEqual({ A: [], B: [], C: [[]], D: [['1']] });
  });

  test('an output with nothing wired to it reads zero', () => {
    expect(exact(draw([input('u'), output('y')], [])).D).toEqual([['0']]);
  });

  test('one signal may feed both inputs of a summing point', () => {
    const drawing = draw([input('u'), sum('s', '+-'), output('y')], ['u -> s', 'u -> s:1', 's -> y']);
    expect(exact(drawing).D).toEqual([['0']]);
  });

  test('a summing point may feed itself: y = u + y/3 by way of a gain', () => {
    const drawing = draw(
      [input('u'), sum('s', '++'), gain('k', '1/3'), output('y')],
      ['u -> s', 's -> k', 'k -> s:1', 's -> y'],
    );
    expect(exact(drawing).D).toEqual([['3/2']]);
    expect(derivationOf(drawing).loops).toEqual([{ blocks: ['s', 'k'] }]);
  });

  test('a state model with its own output wired back to its input is one loop', () => {
    const plant = { id: 'p', kind: 'state-model', A: [['-1']], B: [['1']], C: [['1']], D: [['1/2']] } as const;
    const drawing = draw([plant, output('y')], ['p -> p', 'p -> y']); // y = x + y/2, so y = 2 x and ẋ = −x + 2 x
    expect(exact(drawing)).toMatchObject({ A: [['1']], C: [['2']] });
  });
});

describe('algebraic loops', () => {
  const loop = (id: string, value: string) => ({
    blocks: [sum(`${id}s`, '++'), gain(`${id}k`, value)],
    wires: [`${id}s -> ${id}k`, `${id}k -> ${id}s:1`],
  });

  test('every loop without solution is reported, in document order', () => {
    const [a, b, c] = [loop('a', '1'), loop('b', '2'), loop('c', '4/4')];
    const drawing = draw([...c.blocks, ...b.blocks, ...a.blocks], [...a.wires, ...b.wires, ...c.wires]);
    expect(problemsOf(compile(drawing))).toEqual(
      ['c', 'a'].map(
        id =>
          `loop-without-solution: The algebraic loop through summing point ${id}s and gain ${id}k has no unique solution. ` +
          'Change a gain or put an integrator in it.',
      ),
    );
  });

  test('a loop that feeds nothing is reported all the same, and left out of the model where it has a solution', () => {
    const { blocks, wires } = loop('a', '1');
    const rest = [input('u'), output('y')];
    expect(compile(draw([...rest, ...blocks], ['u -> y', ...wires])).ok).toBe(false);
    const solvable = loop('a', '3');
    expect(derivationOf(draw([...rest, ...solvable.blocks], ['u -> y', ...solvable.wires])).loops).toHaveLength(1);
  });

  test('a gain of zero opens a loop', () => {
    const { blocks, wires } = loop('a', 'k');
    expect(derivationOf(draw(blocks, wires, { k: '0' })).loops).toEqual([]);
  });

  test('an integrator in it makes a loop dynamic', () => {
    const drawing = draw([sum('s', '++'), integrator('x')], ['s -> x', 'x -> s:1']);
    expect(derivationOf(drawing).loops).toEqual([]);
  });

  test('direct feedthrough of a transfer function closes a loop', () => {
    const drawing = draw([sum('s', '++'), quotient('g', 's + 3', 's + 1')], ['s -> g', 'g -> s:1']);
    expect(problemsOf(compile(drawing))).toEqual([
      'loop-without-solution: The algebraic loop through summing point s and transfer function g has no unique solution. ' +
        'Change a gain or put an integrator in it.',
    ]);
  });

  test('a group that hands its input back to itself is a loop without solution', () => {
    const drawing = draw([group('g', sheet([input('i'), output('o')], ['i -> o']))], ['g -> g']);
    expect(problemsOf(compile(drawing))).toEqual([
      'loop-without-solution: The algebraic loop through input g.i and output g.o has no unique solution. ' +
        'Change a gain or put an integrator in it.',
    ]);
  });

  test('a loop through a group names the blocks inside', () => {
    const inner = sheet([input('i'), gain('k', '1'), output('o')], ['i -> k', 'k -> o']);
    const drawing = draw([sum('s', '++'), group('g', inner)], ['s -> g', 'g -> s:1']);
    expect(problemsOf(compile(drawing))[0]).toContain('through summing point s and gain g.k has');
  });

  test('a loop 2e-9 away from no solution is warned of, one 2e-7 away is not', () => {
    const warned = (value: string) => {
      const { blocks, wires } = loop('a', value);
      return derivationOf(draw(blocks, wires)).warnings.filter(({ code }) => code === 'nearly-singular-loop');
    };
    expect(warned('0.999999996')).toEqual([
      {
        code: 'nearly-singular-loop',
        blocks: ['as', 'ak'],
        message:
          'The algebraic loop through summing point as and gain ak is nearly without a solution: ' +
          'changing its gains by 2e-9 of their values can take it away. Check the gains.',
      },
    ]);
    expect(warned('0.9999996')).toEqual([]);
  });

  test('in doubles a loop that rounding cannot tell from a singular one is refused', () => {
    const { blocks, wires } = loop('a', '49*k');
    const drawing = draw([...blocks], wires, { k: '1/49' });
    expect(compile(drawing, { field: 'double' }).ok).toBe(false);
    const nearly = loop('a', '0.99999999999');
    expect(compile(draw(nearly.blocks, nearly.wires), { field: 'double' }).ok).toBe(true);
  });
});

describe('quantities', () => {
  test('every block at fault is named before its fault', () => {
    const drawing = draw([gain('a', '2 k'), { ...gain('b', '1/z'), name: 'K_p' }], [], { k: '1', z: '0' });
    const result = compile(drawing);
    expect(problemsOf(result)).toEqual([
      expect.stringMatching(/^bad-expression: Gain a: "2 k" /),
      expect.stringMatching(/^division-by-zero: Gain K_p: /),
    ]);
    expect(result).toMatchObject({ problems: [{ blocks: ['a'] }, { blocks: ['b'] }] });
  });

  test('a fault inside a group is told with the path and the full name', () => {
    const drawing = draw([group('g', sheet([quotient('f', '1', '0')], []))], []);
    expect(compile(drawing)).toMatchObject({
      problems: [
        {
          blocks: ['g.f'],
          message: 'Transfer function g.f: its denominator 0 is zero. Give it another value.',
        },
      ],
    });
  });

  test('faulty parameters stop everything else', () => {
    expect(problemsOf(compile(draw([gain('a', '2 k')], [], { p: 'p' })))).toHaveLength(1);
  });

  test('an irrational gain is warned of and stands in as its double', () => {
    const drawing = draw([input('u'), gain('k', 'sqrt(2)'), output('y')], ['u -> k', 'k -> y']);
    const { model, warnings } = derivationOf(drawing);
    expect(model.irrational).toEqual(['k: sqrt(2)']);
    expect(warnings).toEqual([
      {
        code: 'irrational-value',
        blocks: ['k'],
        message: 'Gain k: sqrt(2) is irrational. The matrices hold its nearest double, and there are no exact ones.',
      },
    ]);
    expect(toRows(model.numeric.D, 0)).toEqual([[Math.SQRT2]]);
    expect(exact(drawing).D[0]?.[0]).toMatch(/^\d+\/\d+$/);
  });

  test('an irrational parameter that no matrix depends on makes nothing irrational', () => {
    const drawing = draw([{ id: 'x', kind: 'integrator', initial: 'r' }], [], { r: 'sqrt(2)', q: 'pi' });
    expect(derivationOf(drawing).model.irrational).toEqual([]);
  });

  test('gains whose product fits no double are refused by the state that they feed', () => {
    const drawing = draw([integrator('x'), gain('a', '1e200'), gain('b', '1e200')], ['x -> a', 'a -> b', 'b -> x']);
    for (const field of ['rational', 'double'] as const) {
      expect(problemsOf(compile(drawing, { field }))).toEqual([
        'bad-value: The equation of state x has a coefficient that fits no double. Choose other units.',
      ]);
    }
  });
});

test('warnings come in document order, whatever finds them', () => {
  const drawing = draw(
    [
      sum('late', '++'),
      quotient('lowered', '1', 'z*s + 1'),
      group('g', sheet([input('i'), gain('k', 'r')], ['i -> k'])),
      gain('first', 'r'),
    ],
    ['lowered -> late'],
    { r: 'sqrt(3)', z: '0' },
  );
  expect(derivationOf(drawing).warnings.map(({ code, blocks }) => [code, blocks[0]])).toEqual([
    ['port-not-connected', 'late'],
    ['port-not-connected', 'lowered'],
    ['order-lowered', 'lowered'],
    ['port-not-connected', 'g'],
    ['irrational-value', 'g.k'],
    ['port-not-connected', 'first'],
  ]);
});

describe('the field', () => {
  const servo = draw(
    [sum('s', '+-'), integrator('x'), input('u'), output('y')],
    ['u -> s', 'x -> s:1', 's -> x', 'x -> y'],
  );

  test('is the rationals where nothing is said', () => {
    expect(derivationOf(servo)).toMatchObject({ route: 'rational' });
  });

  test('doubles give no exact matrices', () => {
    const derivation = valueOf(compile(servo, { field: 'double' }));
    expect(derivation).toMatchObject({ route: 'double', model: { rational: null } });
    expect(toRows(derivation.model.numeric.A, 0)).toEqual([[-1]]);
  });

  test('falls back to doubles where exact fractions would be long work, unless they are asked for', () => {
    const n = 160;
    const gains = Array.from({ length: n }, (_, i) => gain(`k${i}`, `0.9${i}${'7'.repeat(100)}1`));
    const states = Array.from({ length: n }, (_, i) => integrator(`x${i}`));
    const chain = gains.slice(1).map((_, i) => `k${i} -> k${i + 1}`);
    const drawing = draw(
      [sum('s', '++'), ...gains, ...states],
      ['x0 -> s', 's -> k0', ...chain, `k${n - 1} -> s:1`, ...states.map((_, i) => `k${i} -> x${i}`)],
    );
    expect(valueOf(compile(drawing)).route).toBe('double');
    expect(valueOf(compile(drawing)).selfCheck.passed).toBe(true);
  });
});

test('the same drawing gives the same bytes', () => {
  const drawing = draw(
    [input('u'), sum('s', '+-'), gain('k', 'sqrt(2)/3'), integrator('x'), output('y')],
    ['u -> s', 'k -> s:1', 's -> k', 's -> x', 'x -> y'],
  );
  const text = () => JSON.stringify(compile(drawing), (_, value) => (typeof value === 'bigint' ? `${value}n` : value));
  expect(text()).toBe(text());
});
