/** The cut on the one selected wire: set, or taken out again. */

import { actions, store } from '../store/index.ts';
import { chosenWires } from './bend-chosen.ts';

/** Whether one wire is selected and nothing else, and so was cut or closed. */
export function cutChosen(): boolean {
  const [wire, ...others] = chosenWires();
  const { selection, document } = store.getState();
  if (wire === undefined || others.length > 0 || selection.blocks.size > 0) return false;
  const [block, port] = wire.to;
  const { cuts = [] } = document.diagram;
  const isCut = cuts.some(({ to }) => to[0] === block && to[1] === port);
  if (isCut) actions.edit({ kind: 'removeCut', to: wire.to }, 'Took the cut out.');
  else actions.edit({ kind: 'addCut', to: wire.to }, 'Cut the wire: its margins are under Frequency.');
  return true;
}
