import { expect, test } from 'vitest';
import { toRows } from '../../../../src/algebra/index.ts';
import { createSymbolicField, type RationalFunction } from '../../../../src/algebra/symbolic/index.ts';
import { compile, deriveSymbolic } from '../../../../src/compile/index.ts';
import type { Diagram } from '../../../../src/diagram/index.ts';
import { evaluateIn, parseExpression } from '../../../../src/expression/index.ts';
import { differentiator, draw, gain, input, integrator, output, quotient, sum } from '../../../arbitraries/draw.ts';
import { problemsOf, valueOf } from '../../results.ts';

const field = createSymbolicField();

function modelOf(diagram: Diagram) {
  const outcome = valueOf(deriveSymbolic(diagram));
  if (!outcome.finished) throw new Error(`given up at its limit of ${outcome.limit}`);
  return outcome.value;
}

/** The entry that a text says; `atoms` are texts that stand for one symbol each. */
function formula(text: string, atoms: Readonly<Record<string, string>> = {}): RationalFunction {
  const value = evaluateIn(valueOf(parseExpression(text)), field, name => field.variable(atoms[name] ?? name));
  if (value === null) throw new Error(`${text} is no rational function`);
  return value;
}

const entry = (diagram: Diagram, key: 'A' | 'B' | 'C' | 'D', i: number, j: number) =>
  toRows(modelOf(diagram).matrices[key], field.zero)[i]?.[j];

test('a loop is solved in the symbols of its gains', () => {
  const drawing = draw(
    [input('u'), sum('e', '+-'), gain('a', 'K_1'), gain('b', 'K_2'), output('y')],
    ['u -> e', 'e -> a', 'a -> b', 'b -> e:1', 'a -> y'],
    { K_1: '2', K_2: '3' },
  );
  expect(entry(drawing, 'D', 0, 0)).toEqual(formula('K_1/(1 + K_1*K_2)'));
});

test('a parameter is a symbol of its own, whatever its value is made of', () => {
  const drawing = draw([integrator('x'), gain('k', '-w^2')], ['x -> k', 'k -> x'], { w: 'sqrt(c/m)', c: '4', m: '1' });
  expect(entry(drawing, 'A', 0, 0)).toEqual(formula('-w^2'));
});

test('what is irrational stays as it was written, as one symbol', () => {
  const drawing = draw(
    [integrator('x'), gain('k', '-2*sqrt(c/m)*pi + 2^n'), gain('j', 'sqrt(4)*c')],
    ['x -> k', 'k -> j', 'j -> x'],
    { c: '4', m: '1', n: '3' },
  );
  const atoms = { root: 'sqrt(c/m)', power: '(2^n)' };
  expect(entry(drawing, 'A', 0, 0)).toEqual(formula('2*c*(power - 2*root*pi)', atoms));
});

test('a coefficient of a polynomial may be irrational', () => {
  const drawing = draw([input('u'), quotient('g', '1', 's + sqrt(k)'), output('y')], ['u -> g', 'g -> y'], { k: '2' });
  expect(entry(drawing, 'A', 0, 0)).toEqual(formula('-root', { root: 'sqrt(k)' }));
});

test('the order is that of the parameters’ values: a leading coefficient that is zero is left out', () => {
  const drawing = draw([input('u'), quotient('g', 'a*s + b', 'a*s^2 + b*s + c'), output('y')], ['u -> g', 'g -> y'], {
    a: '0',
    b: '2',
    c: '3',
  });
  const model = modelOf(drawing);
  expect(model.states.map(({ name }) => name)).toEqual(['g_1']);
  expect(toRows(model.matrices.A, field.zero)).toEqual([[formula('-c/b')]]);
});

test('dead time is a symbol in its approximant', () => {
  const drawing = draw(
    [input('u'), { id: 'd', kind: 'delay', time: 'T', order: 1 }, output('y')],
    ['u -> d', 'd -> y'],
    {
      T: '0.5',
    },
  );
  expect(entry(drawing, 'A', 0, 0)).toEqual(formula('-2/T'));
});

test('a drawing that differentiates is reduced in symbols', () => {
  const drawing = draw(
    [input('u'), sum('f', '+-'), gain('m', '1/M'), integrator('v'), differentiator('d'), gain('k', 'K'), output('y')],
    ['u -> f', 'f -> m', 'm -> v', 'v -> d', 'd -> k', 'k -> f:1', 'v -> y'],
    { M: '2', K: '3' },
  );
  expect(entry(drawing, 'B', 0, 0)).toEqual(formula('1/(M + K)'));
});

test('its problems are those of the numeric model', () => {
  const drawing = draw([gain('k', '1/z')], [], { z: '0' });
  expect(problemsOf(deriveSymbolic(drawing))).toEqual(problemsOf(compile(drawing)));
});

test('a loop that is singular for every value of its parameters is refused by name', () => {
  const drawing = draw([sum('s', '++'), gain('k', 'a/a'), output('y')], ['s -> k', 'k -> s:1', 's -> y'], { a: '2' });
  expect(problemsOf(deriveSymbolic(drawing))).toEqual(problemsOf(compile(drawing)));
});

test('formulas beyond the effort are given up with the limit that they met', () => {
  const names = Array.from({ length: 12 }, (_, i) => `p${i}`);
  const drawing = draw(
    [sum('s', '+'.repeat(12)), ...names.map(name => gain(`g${name}`, `1/(1 + ${name})`)), integrator('x'), output('y')],
    [...names.flatMap((name, i) => [`x -> g${name}`, `g${name} -> s:${i}`]), 's -> x', 'x -> y'],
    Object.fromEntries(names.map(name => [name, '1'])),
  );
  expect(valueOf(deriveSymbolic(drawing, { limits: { maximumTerms: 100 } }))).toEqual({
    finished: false,
    limit: 'terms',
  });
  expect(valueOf(deriveSymbolic(drawing)).finished).toBe(true);
});

test('derived parameters are written out where that is asked for, in any order of the list', () => {
  const drawing = draw([integrator('x'), gain('k', '-w2*g')], ['x -> k', 'k -> x'], {
    w2: 'c/m',
    g: 'h + w2',
    c: '4',
    m: '1',
    h: '2',
  });
  const outcome = valueOf(deriveSymbolic(drawing, { expanded: true }));
  const A = outcome.finished ? toRows(outcome.value.matrices.A, field.zero) : [];
  expect(A).toEqual([[formula('-(c/m)*(h + c/m)')]]);
  expect(entry(drawing, 'A', 0, 0)).toEqual(formula('-w2*g'));
});

/** y = u − L dy/dt: in general a lag with the state of the differentiator, at L = 0 the input itself. */
const lagOrNone = (L: string) =>
  draw(
    [input('u'), sum('e', '+-'), output('y'), differentiator('d'), gain('g', 'L')],
    ['u -> e', 'e -> y', 'e -> d', 'd -> g', 'g -> e:1'],
    { L },
  );

test('a factor that is zero at the values of the parameters is named, where a general expression divides by it', () => {
  expect(modelOf(lagOrNone('0'))).toMatchObject({ states: [{ name: 'd' }], vanishing: ['L'] });
  expect(valueOf(compile(lagOrNone('0'))).model.states).toEqual([]);
  expect(modelOf(lagOrNone('2'))).toMatchObject({ states: [{ name: 'd' }], vanishing: [] });
});
