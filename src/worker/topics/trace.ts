/** Why an entry of the system matrix is what it is, and which entries a block or wire takes part in. */

import type { UncheckedDerivation } from '../../compile/index.ts';
import {
  type DrawingPart,
  type EntryPlace,
  entriesOn,
  type Trace,
  type TracedDrawing,
  traceable,
  traceEntry,
} from '../../compile/trace/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { Subject, Topic } from './topic.ts';

export type TraceTopic = Topic<TraceQuestion, TraceAnswer>;

export type TraceQuestion =
  | { readonly kind: 'entry'; readonly place: EntryPlace }
  | { readonly kind: 'part'; readonly part: DrawingPart };

/** With what it answers, since the hand may have moved on. */
export type TraceAnswer =
  /** `trace` is null where the model has no such place. */
  | { readonly kind: 'entry'; readonly place: EntryPlace; readonly trace: Trace | null }
  | { readonly kind: 'part'; readonly part: DrawingPart; readonly entries: readonly EntryPlace[] };

const known = new WeakMap<UncheckedDerivation, Result<TracedDrawing>>();

export function answer({ diagram, derivation }: Subject, question: TraceQuestion): Result<TraceAnswer> {
  const traced = known.get(derivation) ?? traceable(diagram, derivation.model);
  known.set(derivation, traced);
  if (!traced.ok) return traced;
  switch (question.kind) {
    case 'entry': {
      const { place } = question;
      const trace = isPlace(traced.value, place) ? traceEntry(traced.value, place) : null;
      return ok({ kind: 'entry', place, trace });
    }
    case 'part':
      return ok({ kind: 'part', part: question.part, entries: entriesOn(traced.value, question.part) });
    default:
      return question satisfies never;
  }
}

function isPlace({ model: { states, inputs, outputs } }: TracedDrawing, { row, column }: EntryPlace): boolean {
  return row < states.length + outputs.length && column < states.length + inputs.length;
}
