/** Going from wire to wire by key, so that bending, signs and inserting need no mouse. */

import type { Wire } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { shownTitle } from '../sheet/block-sentence.ts';
import { actions, store } from '../store/index.ts';
import { chosenWires } from './bend-chosen.ts';

/**
 * Selects the next wire at a block, in document order and round again.
 *
 * @param block  null while a wire is selected: then the wires at both its ends are gone through.
 */
export function chooseNextWire(block: string | null): boolean {
  const { wires } = store.getState().document.diagram;
  const [current] = chosenWires();
  const ends = new Set(block === null ? [current?.from[0], current?.to[0]] : [block]);
  const around = wires.filter(({ from, to }) => ends.has(from[0]) || ends.has(to[0]));
  const next = around[current === undefined ? 0 : (around.indexOf(current) + 1) % around.length];
  if (next === undefined) return false;
  actions.select({ blocks: new Set(), wires: new Set([wireKey(next)]) });
  actions.notify(`${wireSentence(next)}.`);
  return true;
}

/** `Wire from gain K_p to integrator q`. */
function wireSentence({ from, to }: Wire): string {
  const { blocks } = store.getState().document.diagram;
  const title = (id: string): string => {
    const found = blocks.find(candidate => candidate.id === id);
    return found === undefined ? id : shownTitle(found);
  };
  return `Wire from ${title(from[0])} to ${title(to[0])}`;
}
