import { describe, expect, test } from 'vitest';
import type { SparseMatrix } from '../../../../src/algebra/index.ts';
import { compile, type StateSpace } from '../../../../src/compile/index.ts';
import { selfCheck } from '../../../../src/compile/self-check/index.ts';
import type { Diagram } from '../../../../src/diagram/index.ts';
import {
  differentiator,
  draw,
  gain,
  group,
  input,
  integrator,
  output,
  quotient,
  sheet,
  sum,
} from '../../../arbitraries/draw.ts';
import { randomDrawing } from '../../../performance/random-drawing.ts';
import { valueOf } from '../../results.ts';

const NO_PARAMETERS = new Map();

/** Every kind of block but the differentiator, with an algebraic loop. */
const everyKind = draw(
  [
    input('u'),
    input('v'),
    sum('e', '+-'),
    gain('k', '3/4'),
    quotient('lead', '2*s + 1', '0.1*s + 1'),
    { id: 'dead', kind: 'delay', time: '0.3', order: 3 },
    { id: 'limit', kind: 'limiter', lower: '-1', upper: '1' },
    {
      id: 'plant',
      kind: 'state-model',
      A: [
        ['0', '1'],
        ['-2', '-0.3'],
      ],
      B: [
        ['0', '1'],
        ['1', '0'],
      ],
      C: [
        ['1', '0'],
        ['0', '1'],
      ],
      D: [
        ['0', '0.2'],
        ['0', '0'],
      ],
    },
    group(
      'store',
      sheet(
        [input('in'), integrator('x'), gain('half', '1/2'), output('out')],
        ['in -> x', 'x -> half', 'half -> out'],
      ),
    ),
    output('y'),
    output('z'),
  ],
  [
    'u -> e',
    'plant -> e:1',
    'e -> k',
    'k -> lead',
    'lead -> dead',
    'dead -> limit',
    'limit -> plant',
    'v -> plant:1',
    'plant:1 -> store',
    'store -> y',
    'e -> z',
  ],
);

function corrupted(model: StateSpace, key: 'A' | 'B' | 'C' | 'D', entry: number, factor: number): StateSpace {
  const matrix: SparseMatrix<number> = model.numeric[key];
  const values = Float64Array.from(matrix.values);
  values[entry] = (values[entry] ?? Number.NaN) * factor;
  return { ...model, numeric: { ...model.numeric, [key]: { ...matrix, values } } };
}

function modelOf(diagram: Diagram): StateSpace {
  return valueOf(compile(diagram)).model;
}

test('a model of every kind of block agrees with its drawing to a few units in the last place', () => {
  const check = selfCheck(everyKind, NO_PARAMETERS, modelOf(everyKind));
  expect(check).toMatchObject({ passed: true, frequencies: 3, vectors: 0 });
  expect(check.error).toBeLessThan(100 * Number.EPSILON);
});

describe.each(['A', 'B', 'C', 'D'] as const)('an entry of %s', key => {
  const model = modelOf(everyKind);

  test('that is off by 1e-9 of its value is found, whichever it is', () => {
    const entries = model.numeric[key].values.length;
    expect(entries).toBeGreaterThan(0);
    for (let entry = 0; entry < entries; entry++) {
      const check = selfCheck(everyKind, NO_PARAMETERS, corrupted(model, key, entry, 1 + 1e-9));
      expect(check.passed, `entry ${entry}`).toBe(false);
    }
  });

  test('that has the wrong sign or is missing is found', () => {
    for (let entry = 0; entry < model.numeric[key].values.length; entry++) {
      expect(selfCheck(everyKind, NO_PARAMETERS, corrupted(model, key, entry, -1)).passed).toBe(false);
      expect(selfCheck(everyKind, NO_PARAMETERS, corrupted(model, key, entry, 0)).passed).toBe(false);
    }
  });
});

describe('a drawing that differentiates', () => {
  const drawing = draw(
    [
      input('u'),
      sum('e', '+-'),
      quotient('pd', '3*(s/4 + 1)', '1'),
      quotient('plant', '5', 's^2 + 2*s'),
      output('y'),
      output('ddt'),
      differentiator('d'),
    ],
    ['u -> e', 'plant -> e:1', 'e -> pd', 'pd -> plant', 'plant -> y', 'plant -> d', 'd -> ddt'],
  );
  const model = modelOf(drawing);

  test('agrees by its transfer matrix', () => {
    expect(selfCheck(drawing, NO_PARAMETERS, model)).toMatchObject({ passed: true, frequencies: 3 });
  });

  test.each(['A', 'B', 'C', 'D'] as const)('is found out by any wrong entry of %s', key => {
    for (let entry = 0; entry < model.numeric[key].values.length; entry++) {
      const check = selfCheck(drawing, NO_PARAMETERS, corrupted(model, key, entry, 1 + 1e-9));
      expect(check.passed, `entry ${entry}`).toBe(false);
    }
  });
});

describe('a drawing of more than 1,500 signals', () => {
  const drawing = randomDrawing({ blocks: 1600, seed: 11 });
  const model = valueOf(compile(drawing, { field: 'double' })).model;

  test('agrees with its states held at random values', () => {
    expect(selfCheck(drawing, NO_PARAMETERS, model)).toMatchObject({ passed: true, frequencies: 0, vectors: 3 });
  });

  test.each(['A', 'B', 'C'] as const)('is found out by a wrong entry of %s', key => {
    const entries = model.numeric[key].values.length;
    expect(entries).toBeGreaterThan(0);
    for (const entry of [0, entries >> 1, entries - 1]) {
      expect(selfCheck(drawing, NO_PARAMETERS, corrupted(model, key, entry, 1 + 1e-9)).passed).toBe(false);
    }
  });
});

test('a missing entry is found: a state that nothing is said to feed', () => {
  const drawing = draw([integrator('x')], ['x -> x']);
  const model = modelOf(drawing);
  const empty = { ...model.numeric.A, rowStart: Int32Array.of(0, 0), column: new Int32Array(0), values: [] };
  expect(selfCheck(drawing, NO_PARAMETERS, model).passed).toBe(true);
  expect(selfCheck(drawing, NO_PARAMETERS, { ...model, numeric: { ...model.numeric, A: empty } }).passed).toBe(false);
});

test('a model with a state too few fails', () => {
  const drawing = draw([input('u'), integrator('x'), integrator('w'), output('y')], ['u -> x', 'u -> w', 'x -> y']);
  const other = draw([input('u'), integrator('x'), output('y')], ['u -> x', 'x -> y']);
  expect(selfCheck(drawing, NO_PARAMETERS, modelOf(other))).toMatchObject({
    passed: false,
    error: 1,
    frequencies: 3,
  });
});

test('a model of another drawing fails: a sign, a wire and a gain', () => {
  const servo = (signs: string, value: string, from: string) =>
    draw(
      [input('u'), sum('e', signs), gain('k', value), integrator('v'), integrator('x'), output('y')],
      ['u -> e', `${from} -> e:1`, 'e -> k', 'k -> v', 'v -> x', 'x -> y'],
    );
  const right = servo('+-', '2', 'x');
  for (const wrong of [servo('++', '2', 'x'), servo('+-', '3', 'x'), servo('+-', '2', 'v')]) {
    expect(selfCheck(right, NO_PARAMETERS, modelOf(wrong)).passed).toBe(false);
  }
});

test.each(['0.999999999999', '0.9999999999', '1.000001'])(
  'a loop of gain %s is within what its conditioning allows',
  value => {
    const drawing = draw(
      [input('u'), sum('s', '++'), gain('k', value), integrator('x'), output('y')],
      ['u -> s', 's -> k', 'k -> s:1', 's -> x', 'x -> y'],
    );
    expect(valueOf(compile(drawing)).selfCheck.passed).toBe(true);
  },
);

test('signals that cancel exactly are no difference', () => {
  const drawing = draw(
    [input('u'), gain('a', '0.1'), gain('b', '3'), gain('c', '0.3'), sum('s', '+-'), integrator('x'), output('y')],
    ['u -> a', 'a -> b', 'b -> s', 'u -> c', 'c -> s:1', 's -> x', 's -> y'],
  );
  const { model, selfCheck: check } = valueOf(compile(drawing));
  expect(model.numeric.B.values).toHaveLength(0);
  expect(check.passed).toBe(true);
});

test('a signal that fades below the doubles along a long chain is no difference', () => {
  const lags = Array.from({ length: 900 }, (_, i) => quotient(`g${i}`, '1', '40*s + 1'));
  const wires = lags.slice(1).map((_, i) => `g${i} -> g${i + 1}`);
  const drawing = draw([input('u'), ...lags, output('y')], ['u -> g0', ...wires, 'g899 -> y']);
  expect(valueOf(compile(drawing)).selfCheck.passed).toBe(true);
});

test('powers of s beyond the doubles are avoided by a milder frequency', () => {
  const drawing = draw(
    [input('u'), quotient('lead', '(s + 1)^190', 's + 2'), quotient('lag', '1', '(s + 2)^189'), output('y')],
    ['u -> lead', 'lead -> lag', 'lag -> y'],
  );
  expect(valueOf(compile(drawing)).selfCheck).toMatchObject({ passed: true, frequencies: 3 });
});

test('nothing is compared where there is nothing: no state, and no input or no output', () => {
  for (const drawing of [draw([], []), draw([input('u'), gain('k', '2')], ['u -> k']), draw([output('y')], [])]) {
    expect(valueOf(compile(drawing)).selfCheck).toMatchObject({ passed: true, frequencies: 0, error: 0 });
  }
});

test('nothing is compared where a drawing that differentiates has no input or no output', () => {
  const drawing = draw([integrator('x'), differentiator('d'), output('y')], ['x -> d', 'd -> y']);
  expect(valueOf(compile(drawing)).selfCheck).toMatchObject({ passed: true, frequencies: 0 });
});

test('the limit grows with the drawing from 2,048 units in the last place', () => {
  expect(selfCheck(everyKind, NO_PARAMETERS, modelOf(everyKind)).limit).toBe(2048 * Number.EPSILON);
});
