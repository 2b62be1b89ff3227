/**
 * Asks the worker after each change that can change the model, a parameter's movement under the hand included, and for the
 * other channel when one is chosen. Moving a block or writing a note asks nothing.
 */

import workerAddress from 'virtual:derivation-worker';
import type { Diagram } from '../../diagram/index.ts';
import { isSameModel } from '../../diagram/index.ts';
import { openLine } from '../../worker/index.ts';
import { actions, type State, store } from '../store/index.ts';
import { chosenChannel } from './chosen-channel.ts';

const line = openLine(() => new Worker(workerAddress, { type: 'module', name: 'derivation' }), {
  answer: actions.takeAnswer,
  dead: actions.stopResults,
});

/** Makes a file of the drawing on screen, in the worker. */
export const makeFile = line.file;

export function followDocument(): void {
  ask(store.getState());
  store.subscribe((now, before) => {
    if (now.live !== before.live) {
      // What was shown while it moved was perhaps derived in doubles: when the hand lets go, the answer is exact again.
      ask(now);
    } else if (now.document !== before.document) {
      if (needsDerivation(before.document.diagram, now.document.diagram)) ask(now);
    } else if (now.view.input !== before.view.input || now.view.output !== before.view.output) {
      line.chooseChannel(now.document.revision, chosenChannel(now));
    }
  });
}

function needsDerivation(before: Diagram, now: Diagram): boolean {
  return before !== now && (before.cuts !== now.cuts || !isSameModel(before, now));
}

function ask(state: State): void {
  const { document, live } = state;
  const channel = chosenChannel(state);
  if (live === null) line.derive(document.revision, document.diagram, channel);
  else line.derive(live.revision, live.diagram, channel, true);
}
