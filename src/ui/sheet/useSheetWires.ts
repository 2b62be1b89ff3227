/** React Flow's edges, made from the placed sheet; a wire whose route did not change keeps its edge. */

import { useMemo, useRef } from 'react';
import type { Edge } from 'reactflow';
import type { Point } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { type State, useStore } from '../store/index.ts';
import { ownPart } from './own-part.ts';
import type { PlacedSheet } from './usePlacedSheet.ts';

export interface WireData extends Record<string, unknown> {
  /** The whole route, which the hand finds. */
  readonly points: readonly Point[];
  /** What is inked of it. */
  readonly own: readonly Point[];
}

export type WireFlowEdge = Edge<WireData, 'wire'>;

const selected = (state: State) => state.selection.wires;

export function useSheetWires({ sheet, routes }: PlacedSheet): WireFlowEdge[] {
  const selection = useStore(selected);
  const before = useRef(new Map<string, WireFlowEdge>());
  return useMemo(() => {
    const inked = new Map<string, (readonly Point[])[]>();
    const edges = sheet.wires.map((wire, index): WireFlowEdge => {
      const id = wireKey(wire);
      const points = routes.wires[index]?.points ?? [];
      const source = wire.from.join(':');
      const earlier = inked.get(source) ?? [];
      const own = ownPart(points, earlier);
      inked.set(source, [...earlier, points]);
      const isSelected = selection.has(id);
      const former = before.current.get(id);
      if (former?.data?.points === points && former.selected === isSelected && isSamePath(former.data.own, own)) {
        return former;
      }
      return {
        id,
        type: 'wire',
        source: wire.from[0],
        sourceHandle: `out:${wire.from[1]}`,
        target: wire.to[0],
        targetHandle: `in:${wire.to[1]}`,
        data: { points, own },
        selected: isSelected,
      };
    });
    before.current = new Map(edges.map(edge => [edge.id, edge]));
    return edges;
  }, [sheet, routes, selection]);
}

function isSamePath(a: readonly Point[], b: readonly Point[]): boolean {
  return a.length === b.length && a.every((point, k) => point[0] === b[k]?.[0] && point[1] === b[k]?.[1]);
}
