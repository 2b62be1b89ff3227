/** Drawings to start from. */

import type { Diagram } from '../types.ts';
import { SURVEY_WINCH } from './survey-winch.ts';

export { type WorkedDrawing, workedDrawings } from './worked-drawings.ts';

/** The drawing that a first visit opens with: a survey winch with its tension loop, four states. */
export function startingDrawing(): Diagram {
  return SURVEY_WINCH;
}
