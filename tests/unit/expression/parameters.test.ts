import { describe, expect, test } from 'vitest';
import { toFraction } from '../../../src/algebra/index.ts';
import { evaluateParameters } from '../../../src/expression/index.ts';
import { problemsOf, valueOf } from '../results.ts';

const named = (definitions: Readonly<Record<string, string>>) =>
  Object.entries(definitions).map(([name, value]) => ({ name, value }));

function fractions(definitions: Readonly<Record<string, string>>): Record<string, string> {
  const values = valueOf(evaluateParameters(named(definitions)));
  return Object.fromEntries([...values].map(([name, { exact }]) => [name, exact === null ? '' : toFraction(exact)]));
}

describe('parameters', () => {
  test('use one another in any order', () => {
    expect(fractions({ a: '2*b', b: 'c/3', c: '0.3' })).toEqual({ a: '1/5', b: '1/10', c: '3/10' });
  });

  test('keep the order they are given in', () => {
    expect([...valueOf(evaluateParameters(named({ b: 'a', c: '1', a: 'c' }))).keys()]).toEqual(['b', 'c', 'a']);
  });

  test('may leave the range of doubles as long as no block uses them', () => {
    const values = valueOf(evaluateParameters(named({ a: '1e400', b: 'a/1e400', c: 'sqrt(-1)', d: 'exp(1e4)' })));
    expect(values.get('a')?.double).toBe(Number.POSITIVE_INFINITY);
    expect(values.get('b')).toEqual({ exact: { n: 1n, d: 1n }, double: 1 });
    expect(values.get('c')?.double).toBeNaN();
    expect(values.get('d')?.double).toBe(Number.POSITIVE_INFINITY);
  });

  test('named as members of every object are names like others', () => {
    expect(fractions({ constructor: '2', toString: 'constructor + 1', hasOwnProperty: '1' })).toEqual({
      constructor: '2',
      toString: '3',
      hasOwnProperty: '1',
    });
  });

  test('in a chain of 10,000 are evaluated without recursion, from either end', () => {
    const chain = Array.from({ length: 10_000 }, (_, i) => ({ name: `p${i}`, value: i === 0 ? '1' : `p${i - 1} + 1` }));
    expect(valueOf(evaluateParameters(chain)).get('p9999')?.double).toBe(10_000);
    expect(valueOf(evaluateParameters([...chain].reverse())).get('p9999')?.double).toBe(10_000);
  });
});

describe('parameters are refused', () => {
  test('in a cycle, which is named from its first member on; what uses it is not blamed', () => {
    expect(problemsOf(evaluateParameters(named({ x: 'a', a: 'c', b: 'a + 1', c: '2*b', y: '1' })))).toEqual([
      'cyclic-parameters: Parameter a: its value leads back to itself, a → c → b → a. Give one of them a value of its own.',
    ]);
  });

  test('where one uses itself', () => {
    expect(problemsOf(evaluateParameters(named({ a: 'a + 1' })))).toEqual([
      'cyclic-parameters: Parameter a: its value uses a itself. Give it a value of its own.',
    ]);
  });

  test('in two cycles, each named', () => {
    expect(problemsOf(evaluateParameters(named({ a: 'b', b: 'a', c: 'd', d: 'c' })))).toEqual([
      'cyclic-parameters: Parameter a: its value leads back to itself, a → b → a. Give one of them a value of its own.',
      'cyclic-parameters: Parameter c: its value leads back to itself, c → d → c. Give one of them a value of its own.',
    ]);
  });

  test('in a cycle of thousands, without recursion', () => {
    const ring = Array.from({ length: 10_000 }, (_, i) => ({ name: `p${i}`, value: `p${(i + 1) % 10_000}` }));
    const [message] = problemsOf(evaluateParameters(ring));
    expect(message).toBe(
      'cyclic-parameters: Parameter p0: its value leads back to itself, ' +
        'p0 → p1 → p2 → p3 → p4 → p5 → p6 → p7 → p8 → p9 → p10 → … → p0. Give one of them a value of its own.',
    );
  });

  test('with the parameter named and told apart by its field', () => {
    const result = evaluateParameters(named({ a: '2 k', b: 'aa', c: '1/0', d: 'c' }));
    expect(problemsOf(result)).toEqual([
      'bad-expression: Parameter a: "2 k" is not an expression. Write 2*k.',
      'unknown-parameter: Parameter b: aa is not a parameter. Add aa to the parameters.',
      'division-by-zero: Parameter c: "1/0" divides by zero. Change a value in it.',
    ]);
    expect(result.ok ? [] : result.problems.map(({ parameter }) => parameter)).toEqual(['a', 'b', 'c']);
  });

  test('that square one another beyond what is kept', () => {
    const squares = Array.from({ length: 40 }, (_, i) => ({ name: `p${i}`, value: i === 0 ? '10' : `p${i - 1}^2` }));
    expect(problemsOf(evaluateParameters(squares))).toEqual([
      'bad-expression: Parameter p12: The exact value of "p11^2" has more than 8192 binary digits. Use a smaller exponent.',
    ]);
  });
});
