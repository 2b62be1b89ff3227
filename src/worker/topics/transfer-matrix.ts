/** The transfer functions of every channel: outputs × inputs. */

import { type TransferFunction, transferFunction } from '../../analysis/index.ts';
import { channelStates } from '../../analysis/minimal/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { Subject, Topic } from './topic.ts';

export type TransferMatrixTopic = Topic<null, TransferMatrix>;

/** Row by row: `entries[output][input]`. */
export interface TransferMatrix {
  readonly entries: readonly (readonly TransferFunction[])[];
  /** Names of the states that take part in each; null where the model is too large to tell. */
  readonly states: readonly (readonly (readonly string[])[])[] | null;
}

export function answer({ derivation: { model } }: Subject): Result<TransferMatrix> {
  const entries = model.outputs.map((_, output) =>
    model.inputs.map((_, input) => transferFunction(model, output, input)),
  );
  const states = channelStates(model)?.map(row =>
    row.map(positions => positions.map(state => model.states[state]?.name ?? '')),
  );
  return ok({ entries, states: states ?? null });
}
