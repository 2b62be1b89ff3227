/** What the hand does to texts and frames: placing, writing, moving, sizing, removing; one undo step each, said aloud. */

import { GRID, snap, textHeight } from '../../diagram/geometry/index.ts';
import type { Annotation, Edit, Point } from '../../diagram/index.ts';
import { focusSheet } from '../sheet/focus-block.ts';
import { pointerPlace } from '../sheet/pointer.ts';
import { actions, store } from '../store/index.ts';
import { sheetView } from '../write-line/sheet-view.ts';
import { countedThings, shortTitle } from './annotation-texts.ts';
import { frameAround, withInside } from './inside-frame.ts';

/** Width of a new text, and size of a frame around nothing. */
const TEXT_WIDTH = 12 * GRID;
const FRAME_SIZE = [14 * GRID, 8 * GRID] as const;

/** Ids of the annotations that a command is for: the selected ones, else the one in focus. */
export function chosenAnnotations(): ReadonlySet<string> {
  const { annotations, blocks } = store.getState().selection;
  const focused = focusedAnnotation();
  if (annotations !== undefined && annotations.size > 0) return annotations;
  return focused === null || blocks.size > 0 ? new Set() : new Set([focused]);
}

/** The annotation whose element has the focus, null where none has. */
export function focusedAnnotation(): string | null {
  const element = document.activeElement?.closest('.annotation');
  return element instanceof HTMLElement ? (element.dataset['annotation'] ?? null) : null;
}

/** Keyboard focus on an annotation, after the next picture has put it there. */
export function focusAnnotation(id: string): void {
  requestAnimationFrame(() => {
    document.querySelector<HTMLElement>(`.annotation[data-annotation="${CSS.escape(id)}"]`)?.focus({
      preventScroll: true,
    });
  });
}

/** Opens an empty text for writing: at the place, else where the pointer is, else in the middle of what is seen. */
export function beginText(at: Point | null): boolean {
  const place = snap(at ?? pointerPlace() ?? sheetView().centre());
  actions.annotate({ id: '', kind: 'text', at: place, size: [TEXT_WIDTH, GRID], text: '' });
  return true;
}

/** Opens a frame for its title: around the selected blocks, else where the pointer is. */
export function beginFrame(): boolean {
  const { document, selection } = store.getState();
  const around = frameAround(document.diagram, selection.blocks);
  const place = snap(pointerPlace() ?? sheetView().centre());
  actions.annotate({ id: '', kind: 'frame', text: '', ...(around ?? { at: place, size: FRAME_SIZE }) });
  return true;
}

/** Opens what is written in an annotation. */
export function beginRewriting(id: string): boolean {
  const annotation = annotationOf(id);
  if (annotation === undefined) return false;
  actions.annotate(annotation);
  return true;
}

/** Keeps what was written: a new annotation is added, a text without a word is no text. */
export function keepWritten(annotation: Annotation, text: string): void {
  actions.annotate(null);
  const { id, kind, size } = annotation;
  const isBlank = kind === 'text' && text.trim() === '';
  if (isBlank && id !== '') return void removeAnnotations([id]);
  if (isBlank) return focusSheet();
  const fitted: Annotation['size'] = kind === 'text' ? [size[0], textHeight(text, size[0])] : size;
  if (id === '') return addAnnotation({ ...annotation, text, size: fitted });
  actions.edit({ kind: 'setAnnotation', id, text, size: fitted }, `Wrote ${shortTitle({ kind, text })}.`);
  focusAnnotation(id);
}

/** Adds a text where the write-a-block line was opened, else in the middle of what is seen. Why it was refused, or null. */
export function writeText(text: string): string | null {
  const { writingAt } = store.getState().view;
  const at = snap(writingAt?.at ?? sheetView().centre());
  const size = [TEXT_WIDTH, textHeight(text, TEXT_WIDTH)] as const;
  const problems = added({ id: 'text', kind: 'text', at, size, text });
  actions.beginWritingAt(null);
  return problems[0]?.message ?? null;
}

function addAnnotation(annotation: Annotation): void {
  if (added({ ...annotation, id: annotation.kind }).length > 0) return;
  const id = store.getState().document.diagram.annotations?.at(-1)?.id;
  if (id !== undefined) focusAnnotation(id);
}

function added(annotation: Annotation) {
  const said = `Placed ${shortTitle(annotation)}.`;
  const problems = actions.edit({ kind: 'addAnnotations', annotations: [annotation] }, said);
  const id = store.getState().document.diagram.annotations?.at(-1)?.id;
  if (problems.length === 0 && id !== undefined) actions.selectAnnotations([id]);
  return problems;
}

/** Moves annotations, all that stands inside those that are frames, and the blocks chosen with them, as one step. */
export function moveTogether(annotations: ReadonlySet<string>, blocks: ReadonlySet<string>, [dx, dy]: Point): void {
  const inside = withInside(store.getState().document.diagram, annotations);
  const edits: Edit[] = [{ kind: 'moveAnnotations', ids: [...inside.annotations], dx, dy }];
  const moved = new Set([...inside.blocks, ...blocks]);
  if (moved.size > 0) edits.push({ kind: 'moveBlocks', ids: [...moved], dx, dy });
  actions.editTogether(edits, `Moved ${countedThings(moved.size, inside.annotations.size)}.`);
}

/** Gives an annotation another size, whole squares; a text takes the height that it needs. */
export function sizeAnnotation(id: string, [width, height]: readonly [number, number]): void {
  const annotation = annotationOf(id);
  if (annotation === undefined) return;
  const size = sizeOnGrid(annotation, [width, height]);
  actions.edit({ kind: 'setAnnotation', id, size }, `${size[0] / GRID} by ${size[1] / GRID} squares.`);
}

/** The size nearest to a wanted one that an annotation can have. */
export function sizeOnGrid({ kind, text }: Annotation, [width, height]: readonly [number, number]): Annotation['size'] {
  const squares = (length: number) => Math.max(2, Math.round(length / GRID)) * GRID;
  return [squares(width), kind === 'text' ? textHeight(text, squares(width)) : squares(height)];
}

/** Makes the chosen annotations wider and higher by squares. */
export function sizeChosen([across, down]: Point): boolean {
  const ids = [...chosenAnnotations()];
  const edits = ids.flatMap((id): Edit[] => {
    const annotation = annotationOf(id);
    if (annotation === undefined) return [];
    const [width, height] = annotation.size;
    const size = sizeOnGrid(annotation, [width + across * GRID, height + down * GRID]);
    return [{ kind: 'setAnnotation', id, size }];
  });
  if (edits.length === 0) return false;
  const last = edits.at(-1);
  const size = last?.kind === 'setAnnotation' ? last.size : undefined;
  const said = size === undefined ? '' : `${size[0] / GRID} by ${size[1] / GRID} squares.`;
  actions.editTogether(edits, said);
  return true;
}

/** Takes annotations away; what a frame stood around stays. */
export function removeAnnotations(ids: readonly string[]): boolean {
  if (ids.length === 0) return false;
  const titles = ids.flatMap(id => annotationOf(id) ?? []).map(shortTitle);
  actions.edit({ kind: 'removeAnnotations', ids }, `Removed ${titles.join(', ')}.`);
  focusSheet();
  return true;
}

/** The annotation of an id on the sheet that is shown. */
export function annotationOf(id: string): Annotation | undefined {
  return store.getState().document.diagram.annotations?.find(annotation => annotation.id === id);
}
