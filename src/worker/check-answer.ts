/** The model's check against the drawing: after the matrices, which do not wait for it. */

import { checkModel, type StateSpace } from '../compile/index.ts';
import type { Diagram } from '../diagram/index.ts';
import type { CheckAnswer } from './protocol.ts';

export function checkAnswer(revision: number, diagram: Diagram, model: StateSpace): CheckAnswer {
  return { kind: 'check', revision, selfCheck: checkModel(diagram, model) };
}
