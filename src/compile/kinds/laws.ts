/** The one table from a block's kind to its law. A new kind is registered here and nowhere else in compile. */

import type { Result } from '../../problem/index.ts';
import type { SimpleBlock } from '../flatten/index.ts';
import type { QuantityReader } from '../quantities/index.ts';
import { boundary } from './boundary.ts';
import type { Contribution } from './contribution.ts';
import { delay } from './delay.ts';
import { differentiator } from './differentiator.ts';
import { gain } from './gain.ts';
import { integrator } from './integrator.ts';
import { limiter } from './limiter.ts';
import { stateModel } from './state-model.ts';
import { summer } from './summer.ts';
import { transferFunction } from './transfer-function.ts';

/** What a block contributes to the equations. Problems carry messages without the block's name. */
export function contributionOf<T>(block: SimpleBlock, reader: QuantityReader<T>): Result<Contribution<T>> {
  switch (block.kind) {
    case 'input':
    case 'output':
      return boundary(block, reader);
    case 'gain':
      return gain(block, reader);
    case 'summer':
      return summer(block, reader);
    case 'integrator':
      return integrator(block, reader);
    case 'transfer-function':
      return transferFunction(block, reader);
    case 'state-model':
      return stateModel(block, reader);
    case 'delay':
      return delay(block, reader);
    case 'differentiator':
      return differentiator(block, reader);
    case 'limiter':
      return limiter(block, reader);
    default:
      return block satisfies never;
  }
}
