/** The structure of the model, and on request the minimal one with the change of state that gives it. */

import {
  type MinimalModel,
  minimalModel,
  type StructureReport,
  structureReport,
} from '../../analysis/minimal/index.ts';
import { fail, ok, problem, type Result } from '../../problem/index.ts';
import type { Subject, Topic } from './topic.ts';

export type StructureTopic = Topic<StructureQuestion, StructureAnswer>;

export interface StructureQuestion {
  readonly withMinimal: boolean;
}

export interface StructureAnswer {
  readonly report: StructureReport;
  /** Null where it is not asked for. */
  readonly minimal: MinimalModel | null;
}

export function answer(
  { derivation: { model } }: Subject,
  { withMinimal }: StructureQuestion,
): Result<StructureAnswer> {
  const report = structureReport(model);
  if (report === null) {
    const message = `The model has ${model.states.length} states. Its structure is decided exactly for up to 32.`;
    return fail(problem('not-supported', message));
  }
  return ok({ report, minimal: withMinimal ? minimalModel(model) : null });
}
