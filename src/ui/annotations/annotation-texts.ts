/** How annotations are said: to the screen reader, in the notice, in the find field. */

import type { Annotation, Sheet } from '../../diagram/index.ts';
import { shownTitle } from '../sheet/block-sentence.ts';
import { insideFrame } from './inside-frame.ts';

/** `text from the data sheet`, `frame speed loop`, `frame` where it has no title. */
export function annotationTitle({ kind, text }: Pick<Annotation, 'kind' | 'text'>): string {
  return `${kind} ${text.replaceAll(/\s+/g, ' ')}`.trim();
}

/** Characters of a title in a notice. */
const SHORT = 40;

/** The title as a notice says it: its beginning where it is long, without a full stop of its own. */
export function shortTitle(annotation: Pick<Annotation, 'kind' | 'text'>): string {
  const title = annotationTitle(annotation);
  const characters = [...title];
  return characters.length > SHORT ? `${characters.slice(0, SHORT).join('')}…` : title.replace(/\.$/, '');
}

/** The title, and for a frame what it stands around. */
export function annotationSentence(annotation: Annotation, sheet: Sheet): string {
  if (annotation.kind === 'text') return annotationTitle(annotation);
  const { blocks } = insideFrame(sheet, annotation);
  const around = sheet.blocks.filter(({ id }) => blocks.has(id)).map(shownTitle);
  return `${annotationTitle(annotation)}, around ${around.length === 0 ? 'no block' : around.join(' and ')}`;
}

/** `2 blocks`, `1 annotation`, `2 blocks and 1 annotation`. */
export function countedThings(blocks: number, annotations: number): string {
  const counted = (count: number, word: string) => (count === 1 ? `1 ${word}` : `${count} ${word}s`);
  if (annotations === 0) return counted(blocks, 'block');
  const noted = counted(annotations, 'annotation');
  return blocks === 0 ? noted : `${counted(blocks, 'block')} and ${noted}`;
}
