/** The structure of the model, and on request the minimal one with the change of state that gives it. */

import {
  type MinimalModel,
  minimalModel,
  type StructureReport,
  structureReport,
} from '../../analysis/minimal/index.ts';
import { FORMATS, type Format } from '../../deliver/index.ts';
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
  /** What the minimal model can be saved as. */
  readonly formats: readonly SavedFormat[];
}

/** A format without its writer, which stays in the worker. */
export type SavedFormat = Pick<Format, 'id' | 'label' | 'extension' | 'mime'>;

export function answer(
  { derivation: { model } }: Subject,
  { withMinimal }: StructureQuestion,
): Result<StructureAnswer> {
  const report = structureReport(model);
  if (report === null) {
    const message = `The model has ${model.states.length} states. Its structure is decided exactly for up to 32.`;
    return fail(problem('not-supported', message));
  }
  const formats = FORMATS.filter(({ scope }) => scope === 'model').map(
    ({ id, label, extension, mime }): SavedFormat => ({ id, label, extension, mime }),
  );
  return ok({ report, minimal: withMinimal ? minimalModel(model) : null, formats });
}
