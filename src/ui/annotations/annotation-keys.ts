/** Keys for texts and frames: those that place one, and those that a chosen one takes before blocks and wires do. */

import { GRID } from '../../diagram/geometry/index.ts';
import type { Edit, Point } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import type { KeyPress, KeyRow } from '../keys/index.ts';
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

const TEXTS = { group: 'Texts and frames' } as const;

const ARROWS = Object.keys(STEPS);

/** Those of chosen annotations come before those of blocks and wires. */
export const ANNOTATION_KEYS: readonly KeyRow[] = [
  { ...TEXTS, keys: ['t'], does: 'write a text', act: () => beginText(null) },
  { ...TEXTS, keys: ['b'], does: 'a frame around the selected blocks', act: () => beginFrame() },
  { ...TEXTS, keys: ['Enter'], does: 'write the selected one anew', act: onChosen(rewrite) },
  {
    ...TEXTS,
    keys: [' '],
    does: 'add the one in focus to the selection, or take it out',
    act: onChosen(toggleFocused),
  },
  {
    ...TEXTS,
    keys: ARROWS,
    does: 'move it by one square; a frame with all that stands in it',
    act: onChosen((chosen, { key }) => moveChosen(chosen, STEPS[key], 1)),
  },
  {
    ...TEXTS,
    keys: ARROWS.map(key => `Shift+${key}`),
    does: 'move it by five squares',
    act: onChosen((chosen, { key }) => moveChosen(chosen, STEPS[key], LONG_MOVE)),
  },
  {
    ...TEXTS,
    keys: ARROWS.map(key => `Alt+${key}`),
    does: 'make it narrower, wider, lower, higher',
    act: onChosen((_, { key }) => STEPS[key] !== undefined && sizeChosen(STEPS[key])),
  },
  {
    ...TEXTS,
    keys: ['Delete', 'Backspace', 'Shift+Delete', 'Shift+Backspace'],
    does: 'remove it, with the blocks and wires selected beside it',
    act: onChosen(removeChosen),
  },
];

/** Takes every plain key while a text's field is about to open: what is typed meanwhile is meant for it and must not place blocks. */
export function isForOpeningField({ key, altKey, ctrlKey, metaKey }: KeyPress): boolean {
  if (altKey || ctrlKey || metaKey || (store.getState().view.annotating ?? null) === null) return false;
  if (key === 'Escape') actions.annotate(null);
  return true;
}

type OnChosen = (chosen: ReadonlySet<string>, press: KeyPress) => boolean;

function onChosen(act: OnChosen): KeyRow['act'] {
  return press => {
    const chosen = chosenAnnotations();
    return chosen.size > 0 && act(chosen, press);
  };
}

function rewrite(chosen: ReadonlySet<string>): boolean {
  const [id] = chosen;
  return id !== undefined && beginRewriting(focusedAnnotation() ?? id);
}

function moveChosen(chosen: ReadonlySet<string>, step: Point | undefined, squares: number): boolean {
  if (step === undefined) return false;
  const [x, y] = step;
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
