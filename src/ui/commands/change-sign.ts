/** Signs by one key: a selected wire's at the summing point it ends at, or a selected summing point's last wired one. */

import type { SummerBlock } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { shownTitle } from '../sheet/block-sentence.ts';
import { actions, store } from '../store/index.ts';
import { chosenBlocks } from './chosen-blocks.ts';
import { lastWiredPort, withSign, withSignTurned } from './signs.ts';

/** Sets the sign of each selected wire that ends at a summing point; false where no such wire is selected. */
export function setSignOfWires(sign: '+' | '-'): boolean {
  const { selection, document } = store.getState();
  const { blocks, wires } = document.diagram;
  const summers = new Map(blocks.flatMap(block => (block.kind === 'summer' ? [[block.id, block]] : [])));
  const signs = new Map<SummerBlock, string>();
  for (const wire of wires) {
    const summer = selection.wires.has(wireKey(wire)) ? summers.get(wire.to[0]) : undefined;
    if (summer !== undefined) signs.set(summer, withSign(signs.get(summer) ?? summer.signs, wire.to[1], sign));
  }
  if (signs.size === 0) return false;
  const titles = [...signs.keys()].map(shownTitle).join(', ');
  actions.editTogether(
    [...signs].map(([{ id }, value]) => ({ kind: 'setField', id, field: 'signs', value })),
    `${sign === '+' ? 'Plus' : 'Minus'} at ${titles}.`,
  );
  return true;
}

/** Turns the sign of the port that was wired last of the one chosen summing point; false where the choice is another. */
export function turnLastSign(): boolean {
  const [summer, ...others] = chosenBlocks();
  if (summer?.kind !== 'summer' || others.length > 0) return false;
  const port = lastWiredPort(store.getState().document.diagram, summer);
  const value = withSignTurned(summer.signs, port);
  const said = `${value[port] === '+' ? 'Plus' : 'Minus'} at input ${port + 1} of ${shownTitle(summer)}.`;
  actions.edit({ kind: 'setField', id: summer.id, field: 'signs', value }, said);
  return true;
}
