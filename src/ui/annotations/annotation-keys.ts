/** Keys for texts and frames: those that place one, and those that a chosen one takes before blocks and wires do. */

import { GRID } from '../../diagram/geometry/index.ts';
import type { Edit, Point } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { focusSheet } from '../sheet/focus-block.ts';
import { actions, store } from '../store/index.ts';
import {
  beginFrame,
  beginRewriting,
  beginText,
  chosenAnnotations,
  focusedAnnotation,
  moveTogether,
  sizeChosen,
} from './annotation-commands.ts';
import { countedThings } from './annotation-texts.ts';

const STEPS: Readonly<Record<string, Point>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};

/** Squares that an arrow key moves with Shift held, and sheet units of a square. */
const LONG_MOVE = 5;
const SQUARE = GRID;

/** Whether the key did something to annotations. */
export function annotationKey({ key, altKey, shiftKey, ctrlKey, metaKey }: KeyboardEvent): boolean {
  const isPlain = !altKey && !ctrlKey && !metaKey;
  // A field is about to open: what is typed meanwhile is meant for it and must not place blocks.
  if (isPlain && (store.getState().view.annotating ?? null) !== null) {
    if (key === 'Escape') actions.annotate(null);
    return true;
  }
  if (isPlain && key === 't') return beginText(null);
  if (isPlain && key === 'b') return beginFrame();
  const chosen = chosenAnnotations();
  if (chosen.size === 0) return false;
  const step = STEPS[key];
  if (step !== undefined && altKey && !ctrlKey && !metaKey) return sizeChosen(step);
  if (!isPlain) return false;
  if (step !== undefined) return moveChosen(chosen, step, shiftKey ? LONG_MOVE : 1);
  switch (key) {
    case 'Enter': {
      const [id] = chosen;
      return id !== undefined && beginRewriting(focusedAnnotation() ?? id);
    }
    case ' ':
      return toggleFocused();
    case 'Delete':
    case 'Backspace':
      return removeChosen(chosen);
    default:
      return false;
  }
}

function moveChosen(chosen: ReadonlySet<string>, [x, y]: Point, squares: number): boolean {
  moveTogether(chosen, store.getState().selection.blocks, [x * squares * SQUARE, y * squares * SQUARE]);
  return true;
}

function toggleFocused(): boolean {
  const focused = focusedAnnotation();
  if (focused === null) return false;
  const { selection } = store.getState();
  const annotations = new Set(selection.annotations);
  if (!annotations.delete(focused)) annotations.add(focused);
  actions.select({ ...selection, annotations });
  return true;
}

/** Annotations, with the blocks and wires selected beside them, as one step. */
function removeChosen(chosen: ReadonlySet<string>): boolean {
  const { selection, document: slice } = store.getState();
  const { blocks } = selection;
  const edits: Edit[] = slice.diagram.wires
    .filter(wire => selection.wires.has(wireKey(wire)) && !blocks.has(wire.from[0]) && !blocks.has(wire.to[0]))
    .map(({ to }) => ({ kind: 'disconnect', to }));
  edits.push({ kind: 'removeAnnotations', ids: [...chosen] });
  if (blocks.size > 0) edits.push({ kind: 'removeBlocks', ids: [...blocks] });
  actions.editTogether(edits, `Removed ${countedThings(blocks.size, chosen.size)}.`);
  focusSheet();
  return true;
}
