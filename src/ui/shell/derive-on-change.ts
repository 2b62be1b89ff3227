/**
 * Asks the worker after each change that can change the model, a parameter's movement under the hand included, and for the
 * other channel when one is chosen. Moving a block or writing a note asks nothing.
 */

import type { Diagram } from '../../diagram/index.ts';
import { isSameModel } from '../../diagram/index.ts';
import { derivationLine } from '../answers/index.ts';
import { type State, store } from '../store/index.ts';
import { chosenChannel } from './chosen-channel.ts';

export function followDocument(): void {
  ask(store.getState());
  store.subscribe((now, before) => {
    if (now.live !== before.live) {
      // What was shown while it moved was perhaps derived in doubles: when the hand lets go, the answer is exact again.
      ask(now);
    } else if (now.document !== before.document) {
      if (needsDerivation(before.document.diagram, now.document.diagram)) ask(now);
    } else if (now.view.input !== before.view.input || now.view.output !== before.view.output) {
      derivationLine.chooseChannel(now.document.revision, chosenChannel(now));
    }
  });
}

function needsDerivation(before: Diagram, now: Diagram): boolean {
  const isAsked = before.cuts !== now.cuts || before.requirements !== now.requirements;
  return before !== now && (isAsked || !isSameModel(before, now));
}

function ask(state: State): void {
  const { document, live } = state;
  const channel = chosenChannel(state);
  if (live === null) derivationLine.derive(document.revision, document.diagram, channel);
  else derivationLine.derive(live.revision, live.diagram, channel, true);
}
