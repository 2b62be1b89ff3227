/** ẋ = u, y = x. */

import type { IntegratorBlock } from '../../diagram/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { QuantityReader } from '../quantities/index.ts';
import type { Contribution } from './contribution.ts';

/** An integrator's law; its state bears the block's own name. */
export function integrator<T>(block: IntegratorBlock, reader: QuantityReader<T>): Result<Contribution<T>> {
  const initial = block.initial === undefined ? ok(0) : reader.double(block.initial);
  if (!initial.ok) return initial;
  const { zero, one } = reader.arithmetic.field;
  const state = { suffix: '', initial: initial.value };
  return ok({
    states: [block.unit === undefined ? state : { ...state, unit: block.unit }],
    A: [[zero]],
    B: [[one]],
    C: [[one]],
    D: [[zero]],
    derivatives: [],
    derivativeSuffixes: [],
    lowered: [],
  });
}
