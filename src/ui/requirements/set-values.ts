/** Sets the drawing's parameters to a point of a tolerance plan, one undo step. */

import { diagramAt, type TolerancePlan, type TolerancePoint } from '../../analysis/index.ts';
import type { Edit } from '../../diagram/index.ts';
import { actions, store } from '../store/index.ts';

/** The values are written as the drawing's own plus or minus what they are moved by, so that nothing is rounded. */
export function setValues({ parameters }: TolerancePlan, point: TolerancePoint): void {
  const { diagram } = store.getState().document;
  const moved = diagramAt(diagram, parameters, point);
  const edits = moved.parameters.flatMap(({ name, value }, i): Edit[] =>
    value === diagram.parameters[i]?.value ? [] : [{ kind: 'setParameter', name, value }],
  );
  if (edits.length > 0) actions.editTogether(edits, 'Set the parameters to the worst case. Undo brings them back.');
}
