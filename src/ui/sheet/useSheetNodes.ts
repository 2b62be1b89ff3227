/** React Flow's nodes, made from the placed sheet; a block that did not change keeps its node. */

import { useMemo, useRef } from 'react';
import { type Node, Position } from 'reactflow';
import type { BlockGeometry, PortPlace, Side } from '../../diagram/geometry/index.ts';
import type { Block } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { type State, useStore } from '../store/index.ts';
import { blockSentence } from './block-sentence.ts';
import type { PlacedSheet } from './usePlacedSheet.ts';

export interface BlockData extends Record<string, unknown> {
  readonly block: Block;
  readonly geometry: BlockGeometry;
  /** Input ports with no wire, ascending; `NONE` itself where all are taken. */
  readonly openPorts: readonly number[];
}

export type BlockFlowNode = Node<BlockData, 'block'>;

export const FLOW_SIDE: Readonly<Record<Side, Position>> = {
  left: Position.Left,
  right: Position.Right,
  top: Position.Top,
  bottom: Position.Bottom,
};

const NONE: readonly number[] = [];

const selected = (state: State) => state.selection.blocks;

/** Side of the square that takes a wire's end; twice the port's own size so that the hand finds it. */
const HANDLE_SIZE = 16;

export function useSheetNodes({ sheet, resting, geometry }: PlacedSheet): BlockFlowNode[] {
  const selection = useStore(selected);
  const before = useRef(new Map<string, BlockFlowNode>());
  return useMemo(() => {
    const taken = new Set(sheet.wires.map(wireKey));
    const nodes = sheet.blocks.map(block => {
      const shape = geometry.get(block.id);
      if (shape === undefined) throw new Error(`block ${block.id} has no geometry`);
      const isSelected = selection.has(block.id);
      const former = before.current.get(block.id);
      const sentence = blockSentence(block, resting);
      const open = openPortsOf(block.id, shape, taken);
      if (
        former?.data.block === block &&
        former.data.geometry === shape &&
        former.data.openPorts.join() === open.join() &&
        former.selected === isSelected &&
        former.ariaLabel === sentence
      ) {
        return former;
      }
      return nodeOf({ block, geometry: shape, openPorts: open }, isSelected, sentence);
    });
    before.current = new Map(nodes.map(node => [node.id, node]));
    return nodes;
  }, [sheet, resting, geometry, selection]);
}

function openPortsOf(id: string, { inputs }: BlockGeometry, taken: ReadonlySet<string>): readonly number[] {
  const open = inputs.map((_, port) => port).filter(port => !taken.has(`${id}:${port}`));
  return open.length === 0 ? NONE : open;
}

function nodeOf(data: BlockData, isSelected: boolean, sentence: string): BlockFlowNode {
  const { block, geometry } = data;
  const { width, height } = geometry.box;
  const [x, y] = block.at ?? [0, 0];
  return {
    id: block.id,
    type: 'block',
    position: { x, y },
    width,
    height,
    measured: { width, height },
    data,
    selected: isSelected,
    ariaLabel: sentence,
    handles: [
      ...geometry.inputs.map((place, port) => flowHandle('target', `in:${port}`, place, geometry)),
      ...geometry.outputs.map((place, port) => flowHandle('source', `out:${port}`, place, geometry)),
    ],
  };
}

function flowHandle(type: 'source' | 'target', id: string, place: PortPlace, { box }: BlockGeometry) {
  return {
    id,
    type,
    position: FLOW_SIDE[place.side],
    x: box.width / 2 + place.x - HANDLE_SIZE / 2,
    y: box.height / 2 + place.y - HANDLE_SIZE / 2,
    width: HANDLE_SIZE,
    height: HANDLE_SIZE,
  };
}
