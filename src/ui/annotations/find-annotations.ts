/** Finding texts and frames by what is written in them. */

import type { Annotation, Sheet } from '../../diagram/index.ts';

/** Annotations whose text holds the wanted one, capitals or not, in document order; none for a blank text. */
export function findAnnotations({ annotations = [] }: Sheet, text: string): readonly Annotation[] {
  const wanted = text.trim().toLowerCase();
  if (wanted === '') return [];
  return annotations.filter(annotation => annotation.text.replaceAll(/\s+/g, ' ').toLowerCase().includes(wanted));
}
