/** Six worked drawings from six trades, apart from the first one since only who looks for them needs them. */

import type { Diagram } from '../types.ts';
import { ACTIVE_SUSPENSION } from './active-suspension.ts';
import { BUCK_CONVERTER } from './buck-converter.ts';
import { HEADING_AUTOPILOT } from './heading-autopilot.ts';
import { MIXING_TANK } from './mixing-tank.ts';
import { STEERING_MIRROR } from './steering-mirror.ts';
import { SURVEY_WINCH } from './survey-winch.ts';

/** A worked drawing and the trade it comes from. */
export interface WorkedDrawing {
  readonly trade: string;
  readonly diagram: Diagram;
}

/** Six worked drawings from six trades, the survey winch first. */
export function workedDrawings(): readonly WorkedDrawing[] {
  return [
    { trade: 'drive', diagram: SURVEY_WINCH },
    { trade: 'process', diagram: MIXING_TANK },
    { trade: 'vehicle', diagram: ACTIVE_SUSPENSION },
    { trade: 'power electronics', diagram: BUCK_CONVERTER },
    { trade: 'precision motion', diagram: STEERING_MIRROR },
    { trade: 'marine', diagram: HEADING_AUTOPILOT },
  ];
}
