/** y = u̇. */

import type { DifferentiatorBlock } from '../../diagram/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { QuantityReader } from '../quantities/index.ts';
import type { Contribution } from './contribution.ts';

/** A differentiator's law; the state that it brings where it acts as a lag bears the block's own name. */
export function differentiator<T>(
  _block: DifferentiatorBlock,
  { arithmetic }: QuantityReader<T>,
): Result<Contribution<T>> {
  const { zero, one } = arithmetic.field;
  return ok({
    states: [],
    A: [],
    B: [],
    C: [],
    D: [[zero]],
    derivatives: [one],
    derivativeSuffixes: [''],
    lowered: [],
  });
}
