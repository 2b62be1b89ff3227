/** Whether a judgement over tolerances is still of the drawing on the sheet. */

import { type Diagram, isSameModel } from '../../diagram/index.ts';
import type { TolerancesSlice } from '../store/index.ts';

export function isJudgedDrawing({ diagram: judged }: TolerancesSlice, drawing: Diagram): boolean {
  return isSameModel(judged, drawing) && judged.requirements === drawing.requirements && judged.cuts === drawing.cuts;
}
