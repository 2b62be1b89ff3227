/** The transfer functions of all channels, one after the other: what the picker would show one at a time. */

import { Fragment } from 'react';
import { useAnswer } from '../answers/index.ts';
import { MathName } from '../figures/index.ts';
import { PanelEmpty, PanelPending } from '../results/index.ts';
import { type State, useStore } from '../store/index.ts';
import { TransferView } from './TransferView.tsx';

const notation = (state: State) => state.view.notation;

export function TransferMatrixTab() {
  const shown = useStore(notation);
  const { answer } = useAnswer('transfer-matrix', null);
  if (answer === null) return <PanelPending label="Transfer functions" />;
  const channels = answer.entries.flat();
  const states = answer.states?.flat() ?? null;
  if (channels.length === 0) return <PanelEmpty>Needs an input and an output on the sheet.</PanelEmpty>;
  return (
    <dl className="transfer-matrix">
      {channels.map((found, k) => (
        <div key={`${found.input} ${found.output}`}>
          <dt>
            <MathName name={found.input} /> → <MathName name={found.output} />
          </dt>
          <dd>
            <TransferView answer={found} notation={shown} />
            {states !== null && <ChannelStates names={states[k] ?? []} />}
          </dd>
        </div>
      ))}
    </dl>
  );
}

/** The states that the input reaches and that show in the output. */
function ChannelStates({ names }: { readonly names: readonly string[] }) {
  if (names.length === 0) return <p className="channel-states">No state takes part.</p>;
  return (
    <p className="channel-states">
      states that take part:{' '}
      {names.map((name, k) => (
        <Fragment key={name}>
          {k > 0 && ', '}
          <MathName name={name} />
        </Fragment>
      ))}
    </p>
  );
}
