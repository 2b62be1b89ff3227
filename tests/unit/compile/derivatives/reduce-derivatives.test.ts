import { describe, expect, test } from 'vitest';
import { type Rational, toFraction, toRows, ZERO } from '../../../../src/algebra/index.ts';
import { compile } from '../../../../src/compile/index.ts';
import type { Diagram } from '../../../../src/diagram/index.ts';
import { differentiator, draw, gain, input, integrator, output, quotient, sum } from '../../../arbitraries/draw.ts';
import { problemsOf, valueOf } from '../../results.ts';

function modelOf(diagram: Diagram) {
  const { model, selfCheck } = valueOf(compile(diagram, { field: 'rational' }));
  expect(selfCheck.passed).toBe(true);
  const { rational } = model;
  if (rational === null) throw new Error('derived in doubles');
  const text = (key: 'A' | 'B' | 'C' | 'D') => toRows<Rational>(rational[key], ZERO).map(row => row.map(toFraction));
  return {
    states: model.states.map(({ name }) => name),
    shifted: model.shiftedStates,
    A: text('A'),
    B: text('B'),
    C: text('C'),
    D: text('D'),
  };
}

describe('no state is added or lost', () => {
  test('where a state is differentiated: the derivative of an integrator is what it is fed', () => {
    const drawing = draw(
      [input('u'), integrator('x'), gain('k', '3'), sum('s', '+-'), differentiator('d'), output('y')],
      ['u -> s', 'x -> k', 'k -> s:1', 's -> x', 'x -> d', 'd -> y'],
    );
    expect(modelOf(drawing)).toEqual({
      states: ['x'],
      shifted: [],
      A: [['-3']],
      B: [['1']],
      C: [['-3']],
      D: [['1']],
    });
  });

  test('where two differentiators in a row take the second derivative of a double integrator', () => {
    const drawing = draw(
      [input('u'), integrator('v'), integrator('x'), differentiator('d'), differentiator('e'), output('y')],
      ['u -> v', 'v -> x', 'x -> d', 'd -> e', 'e -> y'],
    );
    expect(modelOf(drawing)).toMatchObject({ states: ['v', 'x'], C: [['0', '0']], D: [['1']], shifted: [] });
  });

  test('where acceleration is fed back: m + k takes the place of the mass', () => {
    // v̇ = (u − k v̇)/m with m = 2, k = 3 gives v̇ = u/5.
    const drawing = draw(
      [input('u'), sum('f', '+-'), gain('m', '1/2'), integrator('v'), differentiator('d'), gain('k', '3'), output('y')],
      ['u -> f', 'f -> m', 'm -> v', 'v -> d', 'd -> k', 'k -> f:1', 'v -> y'],
    );
    expect(modelOf(drawing)).toMatchObject({ states: ['v'], A: [['0']], B: [['1/5']], shifted: [] });
  });
});

describe('an input that is differentiated', () => {
  test('shifts the state behind it: 4s/(s + 4) = 4 − 16/(s + 4)', () => {
    const drawing = draw(
      [input('u'), differentiator('d'), quotient('f', '4', 's + 4'), output('y')],
      ['u -> d', 'd -> f', 'f -> y'],
    );
    // x = z + u with ż = −4 z − 4 u, y = 4 z + 4 u.
    expect(modelOf(drawing)).toEqual({
      states: ['f_1'],
      shifted: ['f_1'],
      A: [['-4']],
      B: [['-4']],
      C: [['4']],
      D: [['4']],
    });
  });

  test('twice shifts two states by way of the first derivative: s²/(s + 1)² = 1 − 2/(s + 1) + 1/(s + 1)²', () => {
    const drawing = draw(
      [input('u'), differentiator('d'), differentiator('e'), quotient('f', '1', '(s + 1)^2'), output('y')],
      ['u -> d', 'd -> e', 'e -> f', 'f -> y'],
    );
    expect(modelOf(drawing)).toMatchObject({
      states: ['f_1', 'f_2'],
      shifted: ['f_1', 'f_2'],
      A: [
        ['0', '1'],
        ['-1', '-2'],
      ],
      D: [['1']],
    });
  });

  test('by an improper transfer function: (s² + 1) / 1 behind 1/(s + 2)² is proper', () => {
    const drawing = draw(
      [input('u'), quotient('n', 's^2 + 1', '1'), quotient('f', '1', '(s + 2)^2'), output('y')],
      ['u -> n', 'n -> f', 'f -> y'],
    );
    expect(modelOf(drawing)).toMatchObject({ states: ['f_1', 'f_2'], D: [['1']] });
  });

  test('cancels where an integrator follows: the state is shifted to nothing that the input reaches', () => {
    const drawing = draw(
      [input('u'), differentiator('d'), integrator('x'), output('y')],
      ['u -> d', 'd -> x', 'x -> y'],
    );
    expect(modelOf(drawing)).toEqual({ states: ['x'], shifted: ['x'], A: [['0']], B: [['0']], C: [['1']], D: [['1']] });
  });

  test('is refused where it reaches an output, by the names of all three', () => {
    const drawing = draw(
      [{ ...input('u'), name: 'flow' }, differentiator('ddt'), gain('k', '2'), { ...output('y'), name: 'rate' }],
      ['u -> ddt', 'ddt -> k', 'k -> y'],
    );
    expect(problemsOf(compile(drawing))).toEqual([
      'derivative-of-input: Output rate needs a derivative of input flow, which differentiator ddt would have to form. ' +
        'Put a lag in its place, or take the output from behind an integrator.',
    ]);
    expect(compile(drawing)).toMatchObject({ problems: [{ blocks: ['ddt'] }] });
  });

  test('is refused once for each output and input', () => {
    const drawing = draw(
      [input('u'), input('v'), sum('s', '++'), differentiator('d'), differentiator('e'), output('y'), output('z')],
      ['u -> s', 'v -> s:1', 's -> d', 'd -> e', 'e -> y', 'u -> z'],
    );
    expect(problemsOf(compile(drawing))).toEqual(
      ['u', 'v'].map(
        name =>
          `derivative-of-input: Output y needs a derivative of input ${name}, ` +
          'which differentiator d and differentiator e would have to form. ' +
          'Put a lag in its place, or take the output from behind an integrator.',
      ),
    );
  });
});

describe('a differentiator inside an algebraic loop', () => {
  test('acts as a lag and brings a state of its name: y = u − k ẏ is 1/(k s + 1)', () => {
    const drawing = draw(
      [input('u'), sum('e', '+-'), differentiator('d'), gain('k', '4'), output('y')],
      ['u -> e', 'e -> d', 'd -> k', 'k -> e:1', 'e -> y'],
    );
    expect(modelOf(drawing)).toEqual({
      states: ['d'],
      shifted: [],
      A: [['-1/4']],
      B: [['1/4']],
      C: [['1']],
      D: [['0']],
    });
  });

  test('stands among the states where its block stands', () => {
    const drawing = draw(
      [integrator('a'), sum('e', '+-'), differentiator('d'), integrator('b')],
      ['a -> e', 'e -> d', 'd -> e:1', 'd -> b'],
    );
    expect(modelOf(drawing).states).toEqual(['a', 'd', 'b']);
  });

  test('improper brings numbered states behind its own: e = u − (s² + 1/(s + 1)) e', () => {
    const drawing = draw(
      [input('u'), sum('e', '+-'), quotient('n', 's^2*(s + 1) + 1', 's + 1'), output('y')],
      ['u -> e', 'e -> n', 'n -> e:1', 'e -> y'],
    );
    expect(modelOf(drawing).states).toEqual(['n_1', 'n_2', 'n_3']);
  });

  test('whose state would bear the name of another is refused', () => {
    const drawing = draw(
      [{ ...integrator('a'), name: 'd' }, sum('e', '+-'), differentiator('d')],
      ['a -> e', 'e -> d', 'd -> e:1'],
    );
    expect(problemsOf(compile(drawing))).toEqual([
      'duplicate-name: Two states are called d. Give one of their blocks another name.',
    ]);
  });
});

test('a state that a constraint binds is gone: x = (u + x + ẋ)/s means x = −u', () => {
  const drawing = draw(
    [input('u'), sum('s', '+++'), integrator('x'), differentiator('d'), output('y')],
    ['u -> s', 'x -> s:1', 'x -> d', 'd -> s:2', 's -> x', 'x -> y'],
  );
  expect(modelOf(drawing)).toMatchObject({ states: [], D: [['-1']] });
});

test('derivatives that nothing determines are refused: ẋ = u + ẋ', () => {
  const drawing = draw(
    [input('u'), sum('s', '++'), integrator('x'), differentiator('d')],
    ['u -> s', 'x -> d', 'd -> s:1', 's -> x'],
  );
  expect(problemsOf(compile(drawing))).toEqual([
    'loop-without-solution: The algebraic loop through differentiator d has no unique solution. ' +
      'Change a gain or put an integrator in it.',
  ]);
});

test('in doubles rounding makes no derivative of an input out of terms that cancel', () => {
  const drawing = draw(
    [input('u'), differentiator('d'), gain('a', '0.1'), gain('b', '3'), gain('c', '0.3'), sum('s', '+-'), output('y')],
    ['u -> d', 'd -> a', 'a -> b', 'b -> s', 'd -> c', 'c -> s:1', 's -> y'],
  );
  expect(compile(drawing, { field: 'rational' }).ok).toBe(true);
  expect(compile(drawing, { field: 'double' }).ok).toBe(true);
});
