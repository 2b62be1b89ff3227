import { expect, test } from 'vitest';
import { rational } from '../../../../src/algebra/index.ts';
import { Effort, withinEffort } from '../../../../src/algebra/symbolic/index.ts';
import { meteredRationals, rationalArithmetic } from '../../../../src/compile/quantities/index.ts';

test('metered rationals have the values of plain ones', () => {
  const { field } = meteredRationals({ effort: new Effort() });
  const [a, b] = [rational(3n, 7n), rational(-2n, 5n)];
  for (const operation of ['add', 'subtract', 'multiply', 'divide'] as const) {
    expect(field[operation](a, b)).toEqual(rationalArithmetic.field[operation](a, b));
  }
});

test('a product of long numbers counts with the product of their lengths', () => {
  const effort = new Effort();
  const { field } = meteredRationals({ effort });
  field.multiply(rational(1n), rational(2n));
  const short = effort.spent;
  const long = rational(3n ** 4000n, 2n ** 6400n); // 100 words each
  field.multiply(long, long);
  expect(effort.spent - short).toBeGreaterThan(30_000);
  expect(effort.spent - short).toBeLessThan(50_000);
  expect(short).toBeLessThan(20);
});

test('work beyond the effort is given up', () => {
  const { field } = meteredRationals({ effort: new Effort({ maximumOperations: 1000 }) });
  const outcome = withinEffort(() => {
    let value = field.one;
    for (let i = 0; i < 1000; i++) value = field.add(value, field.one);
    return value;
  });
  expect(outcome).toEqual({ finished: false, limit: 'operations' });
});
