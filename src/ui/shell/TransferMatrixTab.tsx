/** The transfer functions of all channels, one after the other: what the picker would show one at a time. */

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
  if (channels.length === 0) return <PanelEmpty>Needs an input and an output on the sheet.</PanelEmpty>;
  return (
    <dl className="transfer-matrix">
      {channels.map(found => (
        <div key={`${found.input} ${found.output}`}>
          <dt>
            <MathName name={found.input} /> → <MathName name={found.output} />
          </dt>
          <dd>
            <TransferView answer={found} notation={shown} />
          </dd>
        </div>
      ))}
    </dl>
  );
}
