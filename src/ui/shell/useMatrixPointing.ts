/** What the system matrix is told of pointing and tells of it. */

import type { StateSpace } from '../../compile/index.ts';
import type { MatrixPlace } from '../results/index.ts';
import { actions, type State, useStore } from '../store/index.ts';

const pointing = (state: State) => state.pointing;

const NONE: readonly MatrixPlace[] = [];

/** The properties of `SystemMatrix` that concern pointing. */
export function useMatrixPointing({ states, inputs, outputs }: StateSpace) {
  const { entry, part, answer } = useStore(pointing);
  const isInside =
    entry !== null && entry.row < states.length + outputs.length && entry.column < states.length + inputs.length;
  const lit = entry === null && part !== null && answer?.kind === 'part' ? answer.entries : NONE;
  return {
    onPoint: actions.pointAtEntry,
    onPointEnd: actions.leaveEntry,
    pointed: isInside ? entry : null,
    lit,
  };
}
