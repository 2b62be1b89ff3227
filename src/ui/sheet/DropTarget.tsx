/** The wire that the block in hand would go into if it were let go here, drawn broad. */

import { ViewportPortal } from 'reactflow';
import { wireKey } from '../../diagram/routing/index.ts';
import { wireAt } from '../commands/insert-in-wire.ts';
import { canStandInWire, isWired } from '../commands/splice.ts';
import { type State, useStore } from '../store/index.ts';
import { shownSheet } from './shown-sheet.ts';
import { wirePath } from './wire-path.ts';

export function DropTarget() {
  const path = useStore(targetPath);
  if (path === null) return null;
  return (
    <ViewportPortal>
      <svg className="drop-target" aria-hidden="true">
        <path d={path} />
      </svg>
    </ViewportPortal>
  );
}

/** Path data of the target wire; null unless one free block is held over a wire. */
function targetPath({ held, document }: State): string | null {
  if (held?.size !== 1) return null;
  const [id, at] = [...held][0] ?? ['', [0, 0] as const];
  const block = document.diagram.blocks.find(candidate => candidate.id === id);
  if (block === undefined || !canStandInWire(block) || isWired(document.diagram, id)) return null;
  const wire = wireAt(at, id);
  if (wire === null) return null;
  const { sheet, routes } = shownSheet();
  const place = sheet.wires.findIndex(shown => wireKey(shown) === wireKey(wire));
  return wirePath(routes.wires[place]?.points ?? []);
}
