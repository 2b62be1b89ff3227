/** What a block or wire that is pointed at is called. */

import { type Block, blockTitle, type Sheet } from '../../diagram/index.ts';
import { type PointedPart, store } from '../store/index.ts';

/** `Gain K_p`, `The wire from gain K_p to integrator q`. */
export function partTitle(part: PointedPart): string {
  const { diagram } = store.getState().document;
  if ('block' in part) return capital(titleOn(diagram, part.block));
  const { sheet: around, block, port } = part.wire;
  const sheet = sheetAt(diagram, around);
  const wire = sheet?.wires.find(({ to }) => to[0] === block && to[1] === port);
  if (sheet === null || wire === undefined) return 'The wire';
  return `The wire from ${titleOn(sheet, wire.from[0])} to ${titleOn(sheet, wire.to[0])}`;
}

function titleOn(sheet: Sheet, path: string): string {
  const at = path.lastIndexOf('.');
  const inner = sheetAt(sheet, path.slice(0, Math.max(0, at)));
  const block = inner?.blocks.find(({ id }) => id === path.slice(at + 1));
  return block === undefined ? path : shownTitle(block);
}

function shownTitle(block: Block): string {
  return block.kind === 'gain' && block.name === undefined ? `gain ${block.gain}` : blockTitle(block);
}

/** The sheet inside the groups that the path names, '' the sheet itself; null where there is none. */
function sheetAt(sheet: Sheet, path: string): Sheet | null {
  if (path === '') return sheet;
  let inner = sheet;
  for (const id of path.split('.')) {
    const group = inner.blocks.find(block => block.id === id);
    if (group?.kind !== 'group') return null;
    inner = group.sheet;
  }
  return inner;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}
