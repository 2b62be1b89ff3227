/** The inputs of time answers, as free responses: the system extended by the states that make the input. */

import { type DenseMatrix, zeroMatrix } from '../numeric/index.ts';
import type { ChannelSystem } from './channel-system.ts';
import type { FreeSystem } from './free-response.ts';

/** What the input does, with the model at rest before: a unit step, a unit impulse, a ramp of slope 1 per second. */
export type Excitation = 'step' | 'impulse' | 'ramp';

/**
 * The free system whose output is the response. An impulse through direct feedthrough is left out: it is no function of
 * time.
 */
export function excitedSystem({ A, B, C, D }: ChannelSystem, excitation: Excitation): FreeSystem {
  switch (excitation) {
    case 'step':
      return extended(A, B, C, D, 1);
    case 'ramp':
      return extended(A, B, C, D, 2);
    case 'impulse':
      return { M: A, C, start: B.data };
    default:
      return unreachable(excitation);
  }
}

/** With the chain of 1 or 2 integrators whose last holds 1 at the start and whose first is the input. */
function extended(A: DenseMatrix, B: DenseMatrix, C: DenseMatrix, D: DenseMatrix, chain: 1 | 2): FreeSystem {
  const n = A.rows;
  const size = n + chain;
  const M = zeroMatrix(size, size);
  const outputs = zeroMatrix(C.rows, size);
  for (let i = 0; i < n; i++) {
    M.data.set(A.data.subarray(i * n, (i + 1) * n), i * size);
    M.data[i * size + n] = B.data[i]!;
  }
  if (chain === 2) M.data[n * size + n + 1] = 1;
  for (let i = 0; i < C.rows; i++) {
    outputs.data.set(C.data.subarray(i * n, (i + 1) * n), i * size);
    outputs.data[i * size + n] = D.data[i]!;
  }
  const start = new Float64Array(size);
  start[size - 1] = 1;
  return { M, C: outputs, start };
}

function unreachable(excitation: never): never {
  throw new Error(`no excitation of this kind: ${String(excitation)}`);
}
