/** y = ± u₀ ± u₁ … */

import type { SummerBlock } from '../../diagram/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { QuantityReader } from '../quantities/index.ts';
import { type Contribution, memoryless } from './contribution.ts';

/** A summing point's law; its signs are read from first input to last. */
export function summer<T>(block: SummerBlock, { arithmetic }: QuantityReader<T>): Result<Contribution<T>> {
  const { one } = arithmetic.field;
  const minusOne = arithmetic.field.negate(one);
  return ok(memoryless([Array.from(block.signs, sign => (sign === '-' ? minusOne : one))]));
}
