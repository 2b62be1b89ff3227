/**
 * The sheet as it stands under the hand: the document's blocks, those being dragged where the hand has them, with their
 * geometry, the wires' routes and the branch dots.
 */

import { useMemo, useRef } from 'react';
import { type SheetGeometry, sheetGeometry } from '../../diagram/geometry/index.ts';
import type { Point, Sheet } from '../../diagram/index.ts';
import { type Routes, rerouteMoved, routeWires } from '../../diagram/routing/index.ts';
import { type State, useStore } from '../store/index.ts';

export interface PlacedSheet {
  readonly sheet: Sheet;
  readonly geometry: SheetGeometry;
  readonly routes: Routes;
}

const diagram = (state: State) => state.document.diagram;
const held = (state: State) => state.held;

export function usePlacedSheet(): PlacedSheet {
  const document = useStore(diagram);
  const moved = useStore(held);
  const before = useRef<PlacedSheet | null>(null);
  return useMemo(() => {
    const sheet = moved === null ? document : withHeld(document, moved);
    const geometry = sheetGeometry(sheet);
    const former = before.current;
    const routes =
      former === null ? routeWires(sheet, geometry) : rerouteMoved(former.routes, former.sheet, sheet, geometry);
    const placed = { sheet, geometry, routes };
    before.current = placed;
    return placed;
  }, [document, moved]);
}

function withHeld(sheet: Sheet, moved: ReadonlyMap<string, Point>): Sheet {
  const blocks = sheet.blocks.map(block => {
    const at = moved.get(block.id);
    return at === undefined ? block : { ...block, at };
  });
  return { blocks, wires: sheet.wires };
}
