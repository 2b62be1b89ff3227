/** Copy, cut, paste and duplicate. What is pasted gets fresh ids and names and is selected, one undo step each. */

import {
  blockRectangle,
  GRID,
  type Rectangle,
  sheetBounds,
  sheetGeometry,
  snap,
} from '../../diagram/geometry/index.ts';
import type { Diagram, Edit, Point, Sheet, Wire } from '../../diagram/index.ts';
import { chosenAnnotations } from '../annotations/annotation-commands.ts';
import { countedThings } from '../annotations/annotation-texts.ts';
import { focusSheet } from '../sheet/focus-block.ts';
import { actions, store } from '../store/index.ts';
import { chosenBlocks, chosenIds } from './chosen-blocks.ts';
import { broughtParameters, clipboardText, readClipboard } from './clipboard-text.ts';

/** How far beside the original a copy goes. */
const ASIDE = 2 * GRID;

/** The chosen blocks as text; null, and said, where none is chosen. */
export function copyChosen(): string | null {
  const ids = chosenIds();
  const annotations = chosenAnnotations();
  if (ids.size + annotations.size === 0) return null;
  actions.notify(`Copied ${countedThings(ids.size, annotations.size)}.`);
  return clipboardText(store.getState().document.diagram, ids, annotations);
}

/** The same, and the blocks are removed. */
export function cutChosen(): string | null {
  const ids = chosenIds();
  const annotations = chosenAnnotations();
  if (ids.size + annotations.size === 0) return null;
  const text = clipboardText(store.getState().document.diagram, ids, annotations);
  const edits: Edit[] = [
    { kind: 'removeBlocks', ids: [...ids] },
    { kind: 'removeAnnotations', ids: [...annotations] },
  ];
  actions.editTogether(edits, `Cut ${countedThings(ids.size, annotations.size)}.`);
  focusSheet();
  return text;
}

/**
 * Adds the blocks that a text holds.
 *
 * @param at  where their middle goes, sheet units; where they were where null; aside of other blocks.
 */
export async function pasteText(text: string, at: Point | null): Promise<boolean> {
  const read = readClipboard(text);
  if (!read.ok) {
    actions.notify(read.problems[0]?.message ?? 'That cannot be pasted.', 'refused');
    return false;
  }
  const { placeUnplaced } = await import('../../diagram/arranging/index.ts');
  const pasted = placeUnplaced(read.value);
  const { missing, kept } = broughtParameters(store.getState().document.diagram.parameters, pasted.parameters);
  const said = [`Pasted ${countedThings(pasted.blocks.length, pasted.annotations?.length ?? 0)}.`];
  if (missing.length > 0) said.push(`Brought ${missing.map(({ name }) => name).join(', ')}.`);
  if (kept.length > 0)
    said.push(`${kept.join(', ')} ${kept.length === 1 ? 'keeps its value' : 'keep their values'} here.`);
  const before: Edit[] = missing.map(parameter => ({ kind: 'addParameter', parameter }));
  return addCopies(pasted, pasted.wires, before, offsetTo(pasted, at), said.join(' '));
}

/** Copies the chosen blocks, with the wires between them, a little beside themselves. */
export function duplicateChosen(): boolean {
  const blocks = chosenBlocks();
  const marked = chosenAnnotations();
  const { wires, annotations: all = [] } = store.getState().document.diagram;
  const annotations = all.filter(({ id }) => marked.has(id));
  if (blocks.length + annotations.length === 0) return false;
  const said = `Duplicated ${countedThings(blocks.length, annotations.length)}.`;
  return addCopies({ blocks, annotations }, wires, [], [ASIDE, ASIDE], said);
}

function addCopies(
  { blocks, annotations = [] }: Pick<Sheet, 'blocks' | 'annotations'>,
  wires: readonly Wire[],
  before: readonly Edit[],
  [dx, dy]: Point,
  said: string,
): boolean {
  const edits: Edit[] = [
    ...before,
    { kind: 'addBlocks', blocks, wires, dx, dy },
    { kind: 'addAnnotations', annotations, dx, dy },
  ];
  if (actions.editTogether(edits, said).length > 0) return false;
  const { diagram } = store.getState().document;
  const last = (items: readonly { readonly id: string }[] = [], count: number) =>
    new Set(items.slice(items.length - count).map(({ id }) => id));
  actions.select({
    blocks: last(diagram.blocks, blocks.length),
    wires: new Set(),
    annotations: last(diagram.annotations, annotations.length),
  });
  return true;
}

/** By how much copies move: onto the point or where they were, then aside as often as it takes to lie on no other block. */
function offsetTo(pasted: Diagram, at: Point | null): Point {
  const bounds = sheetBounds(pasted);
  const start: Point =
    at === null || bounds === null
      ? pasted.blocks.length === 0
        ? [ASIDE, ASIDE]
        : [0, 0]
      : snap([at[0] - (bounds.left + bounds.right) / 2, at[1] - (bounds.top + bounds.bottom) / 2]);
  const own = framesOf(pasted);
  const others = framesOf(store.getState().document.diagram);
  for (let aside = 0; aside < MOST_ASIDE; aside += ASIDE) {
    const [dx, dy] = [start[0] + aside, start[1] + aside];
    if (!own.some(frame => others.some(other => overlap(frame, other, dx, dy)))) return [dx, dy];
  }
  return [start[0] + ASIDE, start[1] + ASIDE];
}

/** Paper is looked for this far; beyond it a copy may lie over others. */
const MOST_ASIDE = 20 * ASIDE;

function framesOf(sheet: Sheet): readonly Rectangle[] {
  const geometry = sheetGeometry(sheet);
  return sheet.blocks.flatMap(block => {
    const placed = geometry.get(block.id);
    return placed === undefined ? [] : [blockRectangle(block, placed)];
  });
}

function overlap(a: Rectangle, b: Rectangle, dx: number, dy: number): boolean {
  return a.left + dx < b.right && b.left < a.right + dx && a.top + dy < b.bottom && b.top < a.bottom + dy;
}
