/** Wires the block placed last to one that is named in the line, as one undo step with what was done said. */

import { type WrittenWiring, wiredBlock, wiringEdits } from '../../diagram/write-a-block/index.ts';
import { shownTitle } from '../sheet/block-sentence.ts';
import { actions, store } from '../store/index.ts';
import { chainedFrom } from './place-block.ts';

/** Why the wire cannot be, null where it is made; the block it starts at stays selected. */
export function wireToNamed(wiring: WrittenWiring): string | null {
  const { document, view } = store.getState();
  const source = chainedFrom();
  if (source === null) return 'Select the block that the wire starts at first.';
  const target = wiredBlock(document.diagram, wiring);
  if (target === null) return `There is no block ${wiring.to}. Write the name of one on the sheet.`;
  const edits = wiringEdits(document.diagram, [source.id, view.writingAt?.from?.[1] ?? 0], target, wiring.sign);
  if (edits === null) return `Every input of ${shownTitle(target)} is taken. Wire it by hand to take one over.`;
  const problems = actions.editTogether(edits, `Wired ${shownTitle(source)} to ${shownTitle(target)}.`);
  if (problems.length > 0) return problems[0]?.message ?? 'That wire is not possible.';
  actions.beginWritingAt(null);
  actions.selectBlocks([source.id]);
  return null;
}
