/** y = u within the limits. The linear model takes a limiter as unity; time simulation clips. */

import type { LimiterBlock } from '../../diagram/index.ts';
import { fail, ok, problem, type Result } from '../../problem/index.ts';
import type { QuantityReader } from '../quantities/index.ts';
import { type Contribution, memoryless } from './contribution.ts';

/** A limiter's law in the linear model; limits in the wrong order are refused. */
export function limiter<T>(block: LimiterBlock, reader: QuantityReader<T>): Result<Contribution<T>> {
  const lower = reader.double(block.lower);
  const upper = reader.double(block.upper);
  if (!lower.ok) return lower;
  if (!upper.ok) return upper;
  if (lower.value > upper.value) {
    const limits = `its lower limit ${block.lower} is above its upper limit ${block.upper}`;
    return fail(problem('bad-value', `${limits}. Exchange them.`));
  }
  return ok(memoryless([[reader.arithmetic.field.one]]));
}
