/** y = k u. */

import type { GainBlock } from '../../diagram/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { QuantityReader } from '../quantities/index.ts';
import { type Contribution, memoryless } from './contribution.ts';

/** A gain's law. */
export function gain<T>(block: GainBlock, reader: QuantityReader<T>): Result<Contribution<T>> {
  const k = reader.quantity(block.gain);
  return k.ok ? ok(memoryless([[k.value]])) : k;
}
