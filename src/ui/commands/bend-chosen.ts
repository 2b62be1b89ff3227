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
  const said = 'Bent the wire. A double press on it, or R, lets it find its own way again.';
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

/** Selects the next wire at the block that is chosen, or at the block that the selected wire ends at; false without one. */
export function chooseNextWire(block: string | null): boolean {
  const { wires } = store.getState().document.diagram;
  const [current] = chosenWires();
  const at = block ?? null;
  const around = wires.filter(({ from, to }) =>
    at === null
      ? current !== undefined && (to[0] === current.to[0] || from[0] === current.to[0])
      : from[0] === at || to[0] === at,
  );
  if (around.length === 0) return false;
  const place = current === undefined ? -1 : around.indexOf(current);
  const next = around[(place + 1) % around.length];
  if (next === undefined) return false;
  actions.select({ blocks: new Set(), wires: new Set([wireKey(next)]) });
  actions.notify(
    `Wire from ${next.from[0]} to ${next.to[0]}: arrows bend it, + and - set its sign at a summing point.`,
  );
  return true;
}
