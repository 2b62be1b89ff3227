/**
 * Puts a new block on the sheet: where the hand let it go, else right of the one selected block and wired from it, else in
 * the middle of what is in view; always on a free place. Parameters it names and nobody defined come with it, in one step.
 */

import { GRID, type Rectangle, sheetGeometry, snap } from '../../diagram/geometry/index.ts';
import {
  type Block,
  type Edit,
  freshId,
  type Parameter,
  type Point,
  portCounts,
  type Sheet,
} from '../../diagram/index.ts';
import type { WrittenBlock } from '../../diagram/write-a-block/index.ts';
import { shownTitle } from '../sheet/block-sentence.ts';
import { actions, store } from '../store/index.ts';
import { newParameter, unknownParameters } from './new-parameters.ts';
import { partOf } from './parts.ts';
import { sheetView } from './sheet-view.ts';

/** Columns of blocks stand this far apart, centre to centre. */
const COLUMN = 6 * GRID;

/** Places a part by its id or key; a gain opens its fields at once. */
export function placePart(part: string, at: Point | null): void {
  const found = partOf(part);
  if (found === undefined) return;
  const id = placeBlock(found.block, [], at);
  if (id !== null && found.block.kind !== 'summer') actions.editFields(id);
}

/** Returns the new block's id, null where the edit was refused. */
export function placeBlock(
  written: WrittenBlock,
  names: readonly string[],
  at: Point | null,
  defines?: Parameter,
): string | null {
  const { document, selection, view } = store.getState();
  const sheet = document.diagram;
  const begun = at === null ? view.writingAt : null;
  const [chosen] = selection.blocks.size === 1 ? selection.blocks : [];
  const leading = begun === null ? chosen : begun.from?.[0];
  const source = at === null ? leadingBlock(sheet, leading) : null;
  const id = freshId(sheet, stemOf(written));
  const wanted = at ?? begun?.at ?? (source?.at === undefined ? openPlace(sheet) : besides(source));
  const block: Block = { ...written, id, at: freePlace(sheet, { ...written, id }, snap(wanted)) };
  const unknown = unknownParameters(names);
  const fresh = unknown.filter(name => name !== defines?.name);
  const edits: Edit[] = fresh.map(newParameter);
  if (defines !== undefined) edits.push(definition(defines, unknown.includes(defines.name)));
  edits.push({ kind: 'addBlock', block });
  const isChained = source !== null && portCounts(block).inputs > 0;
  if (isChained) edits.push({ kind: 'connect', from: [source.id, begun?.from?.[1] ?? 0], to: [id, 0] });
  const said = [`Placed ${shownTitle(block)}`];
  if (isChained) said.push(`wired from ${shownTitle(source)}`);
  if (defines !== undefined) said.push(`${defines.name} = ${defines.value}`);
  if (fresh.length > 0)
    said.push(`${fresh.join(', ')} added as ${fresh.length === 1 ? 'a parameter' : 'parameters'} with value 1`);
  if (actions.editTogether(edits, `${said.join(', ')}.`).length > 0) return null;
  actions.beginWritingAt(null);
  actions.selectBlocks([id]);
  sheetView().reveal(block.at ?? wanted);
  return id;
}

/** The block that the next written one is wired from; null where there is none. */
export function chainedFrom(): Block | null {
  const { document, selection, view } = store.getState();
  const [chosen] = selection.blocks.size === 1 ? selection.blocks : [];
  return leadingBlock(document.diagram, view.writingAt === null ? chosen : view.writingAt.from?.[0]);
}

function definition({ name, value }: Parameter, isNew: boolean): Edit {
  return isNew ? { kind: 'addParameter', parameter: { name, value } } : { kind: 'setParameter', name, value };
}

function openPlace({ blocks }: Sheet): Point {
  return blocks.length === 0 ? sheetView().start() : sheetView().centre();
}

function leadingBlock(sheet: Sheet, id: string | undefined): Block | null {
  const block = sheet.blocks.find(candidate => candidate.id === id);
  return block !== undefined && portCounts(block).outputs > 0 ? block : null;
}

function besides({ at = [0, 0], mirrored }: Block): Point {
  return [at[0] + (mirrored === true ? -COLUMN : COLUMN), at[1]];
}

function stemOf(written: WrittenBlock): string {
  const name = written.name ?? '';
  if (/^[A-Za-z][A-Za-z0-9_]*$/.test(name)) return name;
  switch (written.kind) {
    case 'input':
      return 'u';
    case 'output':
      return 'y';
    case 'integrator':
      return 'x';
    case 'gain':
      return 'gain';
    case 'summer':
      return 'sum';
    case 'transfer-function':
      return 'G';
    case 'delay':
      return 'delay';
    case 'differentiator':
      return 'slope';
    case 'limiter':
      return 'limit';
    default:
      return unreachable(written);
  }
}

/** The nearest place at or below the wanted one, a square at a time, where the block touches no other. */
function freePlace(sheet: Sheet, block: Block, [x, y]: Point): Point {
  const geometry = sheetGeometry({ blocks: [...sheet.blocks, { ...block, at: [x, y] }], wires: [] });
  const size = geometry.get(block.id)?.box ?? { width: 0, height: 0 };
  const others = sheet.blocks.flatMap(other => {
    const box = geometry.get(other.id)?.box;
    return box === undefined || other.at === undefined ? [] : [around(other.at, box.width, box.height)];
  });
  let free = y;
  while (others.some(other => overlap(other, around([x, free], size.width, size.height)))) free += GRID;
  return [x, free];
}

function around([x, y]: Point, width: number, height: number): Rectangle {
  const [across, down] = [width / 2 + GRID / 2, height / 2 + GRID / 2];
  return { left: x - across, right: x + across, top: y - down, bottom: y + down };
}

function overlap(a: Rectangle, b: Rectangle): boolean {
  return a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;
}

function unreachable(written: never): never {
  throw new Error(`a written block of no known kind: ${JSON.stringify(written)}`);
}
