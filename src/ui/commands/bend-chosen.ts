/** Bends of wires: set by hand or by key, and taken out again, one undo step each. */

import { GRID, HALF_GRID } from '../../diagram/geometry/index.ts';
import type { Edit, Point, Wire } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { bentVia, piecesOf } from '../sheet/bend-wire.ts';
import { shownSheet } from '../sheet/shown-sheet.ts';
import { actions, store } from '../store/index.ts';

/** Gives a wire its bend points. */
export function bendWire(key: string, via: readonly Point[]): void {
  const wire = store.getState().document.diagram.wires.find(candidate => wireKey(candidate) === key);
  if (wire === undefined) return;
  const said = 'Bent the wire. R takes its bends out.';
  actions.edit({ kind: 'setVia', to: wire.to, via }, said);
}

/** Shifts the longest piece of the one selected wire that can move that way; false where no single wire is selected. */
export function bendChosen([dx, dy]: readonly [number, number]): boolean {
  const [wire, ...others] = chosenWires();
  if (wire === undefined || others.length > 0 || store.getState().selection.blocks.size > 0) return false;
  const { sheet, routes } = shownSheet();
  const points = routes.wires[sheet.wires.findIndex(shown => wireKey(shown) === wireKey(wire))]?.points ?? [];
  const pieces = piecesOf(points).filter(piece => piece.isHorizontal === (dx === 0));
  const longest = pieces.reduce<(typeof pieces)[number] | null>(
    (best, piece) => (best === null || piece.length > best.length ? piece : best),
    null,
  );
  if (longest === null) {
    actions.notify('No piece of this wire can move that way.');
    return true;
  }
  const by = Math.sign(dx + dy) * HALF_GRID;
  const to = longest.middle[longest.isHorizontal ? 1 : 0] + by;
  bendWire(wireKey(wire), bentVia(points, longest, to, GRID));
  return true;
}

/** Lets wires find their own way again. */
export function straightenWires(wires: readonly Wire[]): boolean {
  const bent = wires.filter(({ via }) => via !== undefined && via.length > 0);
  if (wires.length === 0) return false;
  const edits = bent.map(({ to }): Edit => ({ kind: 'setVia', to, via: [] }));
  const said = wires.length === 1 ? 'The wire finds its own way.' : 'The wires find their own way.';
  actions.editTogether(edits, bent.length === 0 ? 'There is no bend to take out.' : said);
  return true;
}

/** The selected wires in document order. */
export function chosenWires(): readonly Wire[] {
  const { selection, document } = store.getState();
  return document.diagram.wires.filter(wire => selection.wires.has(wireKey(wire)));
}
