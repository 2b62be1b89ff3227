/** The transfer functions of every channel: outputs × inputs. */

import { type TransferFunction, transferFunction } from '../../analysis/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { Subject, Topic } from './topic.ts';

export type TransferMatrixTopic = Topic<null, TransferMatrix>;

/** Row by row: `entries[output][input]`. */
export interface TransferMatrix {
  readonly entries: readonly (readonly TransferFunction[])[];
}

export function answer({ derivation: { model } }: Subject): Result<TransferMatrix> {
  const entries = model.outputs.map((_, output) =>
    model.inputs.map((_, input) => transferFunction(model, output, input)),
  );
  return ok({ entries });
}
