/** Edits of annotations: texts and frames that stand on a sheet for the reader and are no part of the model. */

import { onOneLine } from '../../expression/index.ts';
import { fail, ok, problem, type Result } from '../../problem/index.ts';
import { MOST_ANNOTATIONS } from '../limits.ts';
import { annotationFault } from '../reading/index.ts';
import type { Annotation, Sheet } from '../types.ts';
import { isTooFar, tooFar } from './block-edits.ts';
import type { AddAnnotations, MoveAnnotations, RemoveAnnotations, SetAnnotation } from './edit.ts';
import { freshIdAmong } from './fresh.ts';

/** Adds annotations; an id that is taken gets a number. */
export function addAnnotations(sheet: Sheet, { annotations, dx = 0, dy = 0 }: AddAnnotations): Result<Sheet> {
  if (annotations.length === 0) return ok(sheet);
  const before = sheet.annotations ?? [];
  if (before.length + annotations.length > MOST_ANNOTATIONS) {
    const message = `A sheet has at most ${MOST_ANNOTATIONS} annotations. Remove some first.`;
    return fail(problem('too-large', message));
  }
  const taken = new Set(before.map(({ id }) => id));
  const added = annotations.map(annotation => {
    const id = freshIdAmong(taken, annotation.id);
    taken.add(id);
    return moved({ ...annotation, id }, dx, dy);
  });
  return checked(sheet, [...before, ...added], added);
}

/** Takes annotations off the sheet. */
export function removeAnnotations(sheet: Sheet, { ids }: RemoveAnnotations): Result<Sheet> {
  const gone = missing(sheet, ids);
  if (gone !== null) return fail(gone);
  if (ids.length === 0) return ok(sheet);
  const isRemoved = new Set(ids);
  const { annotations = [], ...rest } = sheet;
  const kept = annotations.filter(({ id }) => !isRemoved.has(id));
  return ok(kept.length === 0 ? rest : { ...rest, annotations: kept });
}

/** Moves annotations by (dx, dy). */
export function moveAnnotations(sheet: Sheet, { ids, dx, dy }: MoveAnnotations): Result<Sheet> {
  const gone = missing(sheet, ids);
  if (gone !== null) return fail(gone);
  if (ids.length === 0 || (dx === 0 && dy === 0)) return ok(sheet);
  const isMoved = new Set(ids);
  const annotations = (sheet.annotations ?? []).map(other => (isMoved.has(other.id) ? moved(other, dx, dy) : other));
  return checked(
    sheet,
    annotations,
    annotations.filter(({ id }) => isMoved.has(id)),
  );
}

/** Writes another text or gives another place or size. */
export function setAnnotation(sheet: Sheet, { id, text, place, size }: SetAnnotation): Result<Sheet> {
  const before = sheet.annotations?.find(annotation => annotation.id === id);
  if (before === undefined) return fail(goneAnnotation(id));
  const after: Annotation = {
    ...before,
    text: text ?? before.text,
    at: place ?? before.at,
    size: size ?? before.size,
  };
  if (isSame(before, after)) return ok(sheet);
  const annotations = (sheet.annotations ?? []).map(other => (other === before ? after : other));
  return checked(sheet, annotations, [after]);
}

function isSame(a: Annotation, b: Annotation): boolean {
  return a.text === b.text && `${a.at} ${a.size}` === `${b.at} ${b.size}`;
}

function moved(annotation: Annotation, dx: number, dy: number): Annotation {
  if (dx === 0 && dy === 0) return annotation;
  return { ...annotation, at: [annotation.at[0] + dx, annotation.at[1] + dy] };
}

/** The sheet with its annotations, where those that are new may stand in a file. */
function checked(sheet: Sheet, annotations: readonly Annotation[], changed: readonly Annotation[]): Result<Sheet> {
  if (changed.some(({ at }) => isTooFar(at))) return fail(tooFar());
  for (const annotation of changed) {
    const fault = annotationFault(annotation);
    if (fault !== null) return fail(problem('bad-value', `${annotationTitleAtStart(annotation)}: ${fault}`));
  }
  return ok({ ...sheet, annotations });
}

function annotationTitleAtStart({ kind, text, id }: Annotation): string {
  const words = onOneLine(text);
  return `${kind === 'text' ? 'Text' : 'Frame'} ${words === '' ? id : words}`;
}

function missing(sheet: Sheet, ids: readonly string[]) {
  const known = new Set(sheet.annotations?.map(({ id }) => id));
  const gone = ids.find(id => !known.has(id));
  return gone === undefined ? null : goneAnnotation(gone);
}

function goneAnnotation(id: string) {
  return problem('bad-value', `There is no annotation ${id} on this sheet. Choose one that is there.`);
}
