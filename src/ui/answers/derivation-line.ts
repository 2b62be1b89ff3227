/** The page's one line to the derivation worker; its answers go to the store. */

import workerAddress from 'virtual:derivation-worker';
import { openLine } from '../../worker/index.ts';
import { actions } from '../store/index.ts';

export const derivationLine = openLine(() => new Worker(workerAddress, { type: 'module', name: 'derivation' }), {
  answer: actions.takeAnswer,
  dead: actions.stopResults,
});
