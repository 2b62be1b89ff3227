/** The choice of input and output, wired to the store. */

import { ChannelPicker } from '../results/index.ts';
import { actions, type State, useStore } from '../store/index.ts';

const model = (state: State) => state.results.derivation?.model ?? null;
const channel = (state: State) => state.results.channel;

export function Picker() {
  const known = useStore(model);
  const answer = useStore(channel);
  if (known === null || answer === null) return null;
  return (
    <ChannelPicker
      inputs={known.inputs}
      outputs={known.outputs}
      channel={answer.channel}
      onPick={({ input, output }) =>
        actions.chooseChannel(known.inputs[input]?.name ?? '', known.outputs[output]?.name ?? '')
      }
    />
  );
}
