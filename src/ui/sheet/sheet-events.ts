/** What React Flow reports of the hand, turned into selection, a live drag, and edits when it ends. */

import type { EdgeChange, NodeChange, ReactFlowProps } from 'reactflow';
import { snap } from '../../diagram/geometry/index.ts';
import type { Point } from '../../diagram/index.ts';
import { actions, store } from '../store/index.ts';
import { focusSheet } from './focus-block.ts';
import { withHand } from './load-hand.ts';
import type { BlockFlowNode } from './useSheetNodes.ts';
import type { WireFlowEdge } from './useSheetWires.ts';
import { wireOf } from './wire-of.ts';

type Events = Pick<
  ReactFlowProps<BlockFlowNode, WireFlowEdge>,
  | 'onNodesChange'
  | 'onEdgesChange'
  | 'onNodeDragStop'
  | 'onSelectionDragStop'
  | 'onConnect'
  | 'onConnectEnd'
  | 'onNodeDoubleClick'
  | 'onEdgeClick'
  | 'onEdgeDoubleClick'
  | 'onPaneClick'
>;

/** Stable: React Flow draws everything again when a callback is a new one. */
export const SHEET_EVENTS: Events = {
  onNodesChange: changes => {
    takeSelection(changes, 'blocks');
    takeDrag(changes);
  },
  onEdgesChange: (changes: EdgeChange<WireFlowEdge>[]) => takeSelection(changes, 'wires'),
  onNodeDragStop: (event, node) => dropHeld(node.id, event.altKey),
  onSelectionDragStop: (event, nodes) => dropHeld(nodes[0]?.id, event.altKey),
  onConnect: connection => withHand(hand => hand.connect(connection)),
  onConnectEnd: (event, state) => withHand(hand => hand.dropDrawnWire(event, state)),
  onNodeDoubleClick: (_, node) => actions.editFields(node.id),
  onEdgeClick: () => focusSheet(),
  onEdgeDoubleClick: (_, edge) => {
    const wire = wireOf(edge);
    if (wire !== undefined) withHand(hand => hand.straightenWires([wire]));
  },
  onPaneClick: () => {
    actions.editFields(null);
    actions.beginWritingAt(null);
    focusSheet();
  },
};

function takeSelection(
  changes: readonly (NodeChange<BlockFlowNode> | EdgeChange<WireFlowEdge>)[],
  part: 'blocks' | 'wires',
): void {
  const before = store.getState().selection;
  const chosen = new Set(before[part]);
  for (const change of changes) {
    if (change.type !== 'select') continue;
    if (change.selected) chosen.add(change.id);
    else chosen.delete(change.id);
  }
  const isSame = chosen.size === before[part].size && [...chosen].every(id => before[part].has(id));
  if (!isSame) actions.select({ ...before, [part]: chosen });
}

/** Everything in hand moves by the same squares: those that put the first of it on the grid. */
function takeDrag(changes: readonly NodeChange<BlockFlowNode>[]): void {
  const { held, document } = store.getState();
  const places = new Map(document.diagram.blocks.map(({ id, at }) => [id, at]));
  const moved = new Map(held);
  let shift: Point | null = null;
  for (const change of changes) {
    if (change.type !== 'position' || change.dragging !== true || change.position === undefined) continue;
    const start = places.get(change.id);
    if (start === undefined) continue;
    shift ??= squaresBetween(start, change.position);
    moved.set(change.id, [start[0] + shift[0], start[1] + shift[1]]);
  }
  if (shift !== null && !isSamePlaces(held, moved)) actions.hold(moved);
}

function squaresBetween([x, y]: Point, to: { readonly x: number; readonly y: number }): Point {
  const [snappedX, snappedY] = snap([to.x, to.y]);
  return [snappedX - x, snappedY - y];
}

function isSamePlaces(a: ReadonlyMap<string, Point> | null, b: ReadonlyMap<string, Point>): boolean {
  if (a?.size !== b.size) return false;
  return [...b].every(([id, [x, y]]) => a.get(id)?.[0] === x && a.get(id)?.[1] === y);
}

/**
 * Ends a drag: everything held moves by what the block under the hand moved, as one edit. A single block goes into the wire it
 * is let go on, and out of its own wires where it was pulled.
 */
function dropHeld(id: string | undefined, isPulled: boolean): void {
  const { held, document } = store.getState();
  const block = document.diagram.blocks.find(candidate => candidate.id === id);
  const to = block === undefined ? undefined : held?.get(block.id);
  const from = block?.at;
  if (held !== null && block !== undefined && to !== undefined && from !== undefined) {
    const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
    const isMoved = dx !== 0 || dy !== 0;
    const { annotations } = store.getState().selection;
    if (isMoved && annotations !== undefined && annotations.size > 0 && held.has(block.id)) {
      void import('../annotations/annotation-commands.ts').then(({ moveTogether }) =>
        moveTogether(annotations, new Set(held.keys()), [dx, dy]),
      );
    } else if (isMoved && held.size > 1) {
      actions.edit({ kind: 'moveBlocks', ids: [...held.keys()], dx, dy });
    } else if (isMoved) {
      return withHand(hand => {
        hand.dropBlock(block, [dx, dy], isPulled);
        actions.hold(null);
      });
    }
  }
  actions.hold(null);
}
