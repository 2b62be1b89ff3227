/** What React Flow reports of the hand, turned into selection, a live drag, and edits when it ends. */

import type { Connection, Edge, EdgeChange, FinalConnectionState, Node, NodeChange, ReactFlowProps } from 'reactflow';
import type { PortReference } from '../../diagram/index.ts';
import { actions, store } from '../store/index.ts';
import { connectBlocks } from './connect-blocks.ts';
import { focusSheet } from './focus-block.ts';
import type { BlockFlowNode } from './useSheetNodes.ts';
import type { WireFlowEdge } from './useSheetWires.ts';

type Events = Pick<
  ReactFlowProps<BlockFlowNode, WireFlowEdge>,
  | 'onNodesChange'
  | 'onEdgesChange'
  | 'onNodeDragStop'
  | 'onSelectionDragStop'
  | 'onConnect'
  | 'onConnectEnd'
  | 'onReconnect'
  | 'onNodeDoubleClick'
  | 'onEdgeClick'
  | 'onPaneClick'
>;

/** Stable: React Flow draws everything again when a callback is a new one. */
export const SHEET_EVENTS: Events = {
  onNodesChange: changes => {
    takeSelection(changes, 'blocks');
    takeDrag(changes);
  },
  onEdgesChange: (changes: EdgeChange<WireFlowEdge>[]) => takeSelection(changes, 'wires'),
  onNodeDragStop: (_, node) => dropHeld(node),
  onSelectionDragStop: (_, nodes) => dropHeld(nodes[0]),
  onConnect: connection => connect(connection),
  onConnectEnd: (_, state) => connectToBody(state),
  onReconnect: (edge, connection) => moveEnd(edge, connection),
  onNodeDoubleClick: (_, node) => actions.editFields(node.id),
  onEdgeClick: () => focusSheet(),
  onPaneClick: () => {
    actions.editFields(null);
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

function takeDrag(changes: readonly NodeChange<BlockFlowNode>[]): void {
  const held = new Map(store.getState().held);
  let isChanged = false;
  for (const change of changes) {
    if (change.type !== 'position' || change.dragging !== true || change.position === undefined) continue;
    const { x, y } = change.position;
    const former = held.get(change.id);
    if (former !== undefined && former[0] === x && former[1] === y) continue;
    held.set(change.id, [x, y]);
    isChanged = true;
  }
  if (isChanged) actions.hold(held);
}

/** Ends a drag: everything held moves by what the block under the hand moved, as one edit. */
function dropHeld(node: Node | undefined): void {
  const { held, document } = store.getState();
  const to = node === undefined ? undefined : held?.get(node.id);
  const from = document.diagram.blocks.find(({ id }) => id === node?.id)?.at;
  if (held !== null && to !== undefined && from !== undefined) {
    const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
    if (dx !== 0 || dy !== 0) actions.edit({ kind: 'moveBlocks', ids: [...held.keys()], dx, dy });
  }
  actions.hold(null);
}

function connect({ source, sourceHandle, target, targetHandle }: Connection): void {
  connectBlocks([source, portOf(sourceHandle)], [target, portOf(targetHandle)]);
}

/** A wire let go over a block's body goes to its first open port. */
function connectToBody({ isValid, fromHandle, toHandle, toNode }: FinalConnectionState): void {
  if (isValid === true || toHandle !== null || toNode === null || fromHandle === null) return;
  const here: PortReference = [fromHandle.nodeId, portOf(fromHandle.id ?? null)];
  if (fromHandle.type === 'source') connectBlocks(here, [toNode.id, null]);
  else connectBlocks([toNode.id, 0], here);
}

function moveEnd(edge: Edge, connection: Connection): void {
  actions.edit({
    kind: 'moveWireEnd',
    to: [edge.target, portOf(edge.targetHandle)],
    newFrom: [connection.source, portOf(connection.sourceHandle)],
    newTo: [connection.target, portOf(connection.targetHandle)],
  });
}

/** The port's number in a handle's id, `in:2`. */
function portOf(handle: string | null | undefined): number {
  return Number(handle?.split(':')[1] ?? 0);
}
