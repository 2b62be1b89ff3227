/**
 * Asks the worker after each change that can change the model, and for the other channel when one is chosen. Moving a
 * block or writing a note asks nothing.
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
    if (now.document !== before.document) {
      if (needsDerivation(before.document.diagram, now.document.diagram)) ask(now);
    } else if (now.view.input !== before.view.input || now.view.output !== before.view.output) {
      line.chooseChannel(now.document.revision, chosenChannel(now));
    }
  });
}

function needsDerivation(before: Diagram, now: Diagram): boolean {
  return before !== now && !isSameModel(before, now);
}

function ask(state: State): void {
  line.derive(state.document.revision, state.document.diagram, chosenChannel(state));
}
