/** The first answer: the model itself, since the matrices are what is waited for; its check follows. */

import { type CompileOptions, deriveModel, type ModelMemory } from '../compile/index.ts';
import type { ModelAnswer, Question } from './protocol.ts';
import { quantityValues } from './quantity-values.ts';

/** Derives the drawing of the question, with what the last one left; runs without a worker too. */
export function modelAnswer(
  { revision, diagram }: Extract<Question, { kind: 'derive' }>,
  field: CompileOptions['field'] & string,
  memory: ModelMemory,
): ModelAnswer {
  const start = performance.now();
  const outcome = deriveModel(diagram, { field, memory });
  return { kind: 'model', revision, outcome, values: quantityValues(diagram), elapsed: performance.now() - start };
}
