/** y = u: the input and output blocks on a group's own sheet hand their signal through. */

import type { InputBlock, OutputBlock } from '../../diagram/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { QuantityReader } from '../quantities/index.ts';
import { type Contribution, memoryless } from './contribution.ts';

/** The law of an input or output block inside a group; those of the top sheet are the model's own and have none. */
export function boundary<T>(
  _block: InputBlock | OutputBlock,
  { arithmetic }: QuantityReader<T>,
): Result<Contribution<T>> {
  return ok(memoryless([[arithmetic.field.one]]));
}
