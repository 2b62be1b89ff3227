/** What stands in place of a channel's answer: that there is none in the drawing, or that it is on its way. */

import { PanelEmpty, PanelPending } from '../results/index.ts';
import { type State, useStore } from '../store/index.ts';

const model = (state: State) => state.results.derivation?.model ?? null;

export function ChannelAbsent() {
  const known = useStore(model);
  if (known !== null && (known.inputs.length === 0 || known.outputs.length === 0)) {
    return <PanelEmpty>Needs an input and an output on the sheet.</PanelEmpty>;
  }
  return <PanelPending label="Transfer function" />;
}
