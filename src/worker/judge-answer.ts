/** Points of a tolerance plan, judged one after the other. A worker of the pool does nothing else. */

import { judgePoint } from '../analysis/index.ts';
import type { JudgeAnswer, JudgeQuestion } from './protocol.ts';

export function judgeAnswer({ id, diagram, parameters, points, envelope }: JudgeQuestion): JudgeAnswer {
  return { kind: 'judge', id, judged: points.map(point => judgePoint(diagram, parameters, point, envelope)) };
}
