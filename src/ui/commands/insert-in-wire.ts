/** Putting blocks into wires and taking them out: a part let go on a wire, a block dragged onto one, a block pulled out. */

import { GRID, sheetGeometry } from '../../diagram/geometry/index.ts';
import type { Block, Edit, Point, Wire } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { shownTitle } from '../sheet/block-sentence.ts';
import { shownSheet } from '../sheet/shown-sheet.ts';
import { actions, store } from '../store/index.ts';
import { partOf } from '../write-line/parts.ts';
import { placePart } from '../write-line/place-block.ts';
import { chosenBlocks } from './chosen-blocks.ts';
import { canStandInWire, isWired, pullOutEdits, spliceEdits } from './splice.ts';
import { longestMiddle, wireUnder } from './wire-under.ts';

/** How near a wire a block's centre has to be let go to go into it, sheet units. */
const REACH = 0.7 * GRID;

/** The wire that a block whose centre is here would go into; those at the block itself do not count. */
export function wireAt(at: Point, id: string | null): Wire | null {
  const { sheet, routes } = shownSheet();
  const others = sheet.wires.map(({ from, to }, index) =>
    from[0] === id || to[0] === id
      ? { points: [], forced: false }
      : (routes.wires[index] ?? { points: [], forced: false }),
  );
  const wire = wireUnder(sheet, { wires: others, dots: [] }, at, REACH);
  const { wires } = store.getState().document.diagram;
  return wire === null ? null : (wires.find(known => wireKey(known) === wireKey(wire)) ?? null);
}

/** Places a part; on a wire, or while one wire is selected, it goes into that wire, all as one undo step. */
export function placePartInWire(part: string, at: Point | null): void {
  const target = at === null ? selectedWire() : { wire: wireAt(at, null), at };
  const block = partOf(part)?.block;
  if (target?.wire == null || block === undefined || !canStandInWire({ ...block, id: '' })) return placePart(part, at);
  const { wire } = target;
  actions.asOneStep(() => {
    const known = new Set(store.getState().document.diagram.blocks.map(({ id }) => id));
    placePart(part, target.at);
    const placed = store.getState().document.diagram.blocks.find(({ id }) => !known.has(id));
    if (placed !== undefined) actions.editTogether(spliceEdits(wire, placed.id), putInto(placed, wire));
  });
}

/** Moves a block that was dragged: into the wire it is let go on where it is free, out of its wires first where it is pulled. */
export function dropBlock(block: Block, [dx, dy]: Point, isPulled: boolean): void {
  const sheet = store.getState().document.diagram;
  const edits: Edit[] = [{ kind: 'moveBlocks', ids: [block.id], dx, dy }];
  const isFree = isPulled || !isWired(sheet, block.id);
  const [x, y] = block.at ?? [0, 0];
  const wire = isFree && canStandInWire(block) ? wireAt([x + dx, y + dy], block.id) : null;
  if (isPulled) edits.unshift(...pullOutEdits(sheet, block.id));
  if (wire !== null) edits.push(...spliceEdits(wire, block.id));
  const said = wire !== null ? putInto(block, wire) : isPulled ? pulledOut(block) : undefined;
  actions.editTogether(edits, said);
}

/** Takes the chosen blocks out of their wires, which close behind them, and puts them beside. */
export function pullOutChosen(): boolean {
  const blocks = chosenBlocks().filter(({ id }) => isWired(store.getState().document.diagram, id));
  if (blocks.length === 0) return false;
  actions.asOneStep(() => {
    for (const block of blocks) {
      const sheet = store.getState().document.diagram;
      const height = sheetGeometry(sheet).get(block.id)?.box.height ?? 0;
      const dy = Math.ceil((height + GRID) / GRID) * GRID;
      const beside: Edit = { kind: 'moveBlocks', ids: [block.id], dx: 0, dy };
      actions.editTogether([...pullOutEdits(sheet, block.id), beside]);
    }
  });
  actions.notify(blocks.map(pulledOut).join(' '));
  return true;
}

/** The one selected wire and the middle of its longest piece; null where the selection is another. */
function selectedWire(): { readonly wire: Wire; readonly at: Point } | null {
  const { selection, document } = store.getState();
  if (selection.wires.size !== 1 || selection.blocks.size > 0) return null;
  const { routes } = shownSheet();
  const index = document.diagram.wires.findIndex(wire => selection.wires.has(wireKey(wire)));
  const wire = document.diagram.wires[index];
  const at = longestMiddle(routes.wires[index]?.points ?? []);
  return wire === undefined || at === null ? null : { wire, at };
}

function putInto(block: Block, { from, to }: Wire): string {
  const { blocks } = store.getState().document.diagram;
  const title = (id: string): string => {
    const found = blocks.find(other => other.id === id);
    return found === undefined ? id : shownTitle(found);
  };
  return `Put ${shownTitle(block)} into the wire from ${title(from[0])} to ${title(to[0])}.`;
}

const pulledOut = (block: Block): string => `Pulled ${shownTitle(block)} out of its wires.`;
