/**
 * The sheet as it stands under the hand: the document's blocks, those being dragged where the hand has them, with their
 * geometry, the wires' routes and the branch dots.
 */

import { useLayoutEffect, useMemo, useRef } from 'react';
import { type SheetGeometry, sheetGeometry } from '../../diagram/geometry/index.ts';
import type { Point, Sheet } from '../../diagram/index.ts';
import { type Routes, rerouteMoved, routeWires } from '../../diagram/routing/index.ts';
import { type State, useStore } from '../store/index.ts';
import { heldRoutes } from './held-routes.ts';
import { keptGeometry } from './kept-geometry.ts';
import { setShownSheet } from './shown-sheet.ts';

export interface PlacedSheet {
  readonly sheet: Sheet;
  /** The same with nothing in the hand: one object while blocks are dragged. */
  readonly resting: Sheet;
  readonly geometry: SheetGeometry;
  readonly routes: Routes;
}

const blocksOf = (state: State) => state.document.diagram.blocks;
const wiresOf = (state: State) => state.document.diagram.wires;
const held = (state: State) => state.held;

/** Up to so many blocks in hand, on a sheet of so many, wires find their full way in every frame of a drag. */
const FEW_HELD = 3;
const FEW_BLOCKS = 120;

export function usePlacedSheet(): PlacedSheet {
  // Not the document itself: a parameter's new value leaves every block and wire where it is.
  const blocks = useStore(blocksOf);
  const wires = useStore(wiresOf);
  const moved = useStore(held);
  const routed = useRef<PlacedSheet | null>(null);
  const resting = useMemo(() => ({ blocks, wires }), [blocks, wires]);
  const placed = useMemo(() => {
    const sheet = moved === null ? resting : withHeld(resting, moved);
    const former = routed.current;
    const geometry = keptGeometry(former?.geometry, sheetGeometry(sheet));
    if (former === null) return { sheet, resting, geometry, routes: routeWires(sheet, geometry) };
    const isMuch = moved !== null && (moved.size > FEW_HELD || sheet.blocks.length > FEW_BLOCKS);
    const routes = isMuch
      ? heldRoutes(former, { sheet, geometry }, moved)
      : rerouteMoved(former.routes, former.sheet, sheet, geometry);
    return { sheet, resting, geometry, routes, isMuch };
  }, [resting, moved]);
  useLayoutEffect(() => {
    if (!('isMuch' in placed && placed.isMuch)) routed.current = placed;
    setShownSheet(placed);
  }, [placed]);
  return placed;
}

function withHeld(sheet: Sheet, moved: ReadonlyMap<string, Point>): Sheet {
  const blocks = sheet.blocks.map(block => {
    const at = moved.get(block.id);
    return at === undefined ? block : { ...block, at };
  });
  return { blocks, wires: sheet.wires };
}
