/** The annotations of a sheet by their shape: what shape.ts reads of them, and what an edit's result is held to. */

import * as v from 'valibot';
import { LARGEST_ANNOTATION, LONGEST_ANNOTATION, MOST_ANNOTATIONS, SMALLEST_ANNOTATION } from '../limits.ts';
import type { Annotation } from '../types.ts';
import { idSchema, pointSchema } from './block-schemas.ts';
import { note, type Reading } from './reading.ts';
import { whatIsWrong } from './wording.ts';

const SIZE = `[width, height]: two numbers from ${SMALLEST_ANNOTATION} to ${LARGEST_ANNOTATION}`;
const length = v.pipe(v.number(SIZE), v.minValue(SMALLEST_ANNOTATION, SIZE), v.maxValue(LARGEST_ANNOTATION, SIZE));

const TEXT = `text of at most ${LONGEST_ANNOTATION} characters`;

const annotationSchema = v.object({
  id: idSchema,
  kind: v.picklist(['text', 'frame'], '"text" or "frame"'),
  at: pointSchema,
  size: v.strictTuple([length, length], SIZE),
  text: v.optional(v.pipe(v.string(TEXT), v.maxLength(LONGEST_ANNOTATION, TEXT)), ''),
});

/** The annotations that a value holds, those of one id together noted as a problem; `title` begins each sentence. */
export function readAnnotations(value: unknown, title: string, reading: Reading): readonly Annotation[] {
  if (!Array.isArray(value)) {
    note(reading, 'bad-value', `${title}: "annotations" is not a list.`);
    return [];
  }
  if (value.length > MOST_ANNOTATIONS) {
    note(reading, 'too-large', `${title} has ${value.length} annotations, ${MOST_ANNOTATIONS} at most are read.`);
    return [];
  }
  const seen = new Set<string>();
  return value.flatMap((item: unknown, i) => {
    const parsed = v.safeParse(annotationSchema, item);
    const where = `${title}, the annotation at place ${i + 1}`;
    if (!parsed.success) {
      note(reading, 'bad-value', `${where}: ${whatIsWrong(parsed.issues[0])}`);
      return [];
    }
    const { id } = parsed.output;
    if (seen.has(id)) note(reading, 'duplicate-id', `${where}: another one has the id ${id}. Give it one of its own.`);
    seen.add(id);
    return [parsed.output];
  });
}

/** What keeps an annotation from standing in a file, as the end of a sentence; null where nothing does. */
export function annotationFault(annotation: Annotation): string | null {
  const parsed = v.safeParse(annotationSchema, annotation);
  return parsed.success ? null : whatIsWrong(parsed.issues[0]);
}
