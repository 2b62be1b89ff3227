/** What the analyses answered for the model on screen: the tabs, poles and zeros, transfer function. */

import { PoleMap } from '../plots/index.ts';
import { Panel, PanelEmpty, PanelPending, PoleTable } from '../results/index.ts';
import { type State, useStore } from '../store/index.ts';
import { ChannelAbsent } from './ChannelAbsent.tsx';
import { Picker } from './Picker.tsx';
import { ResponsePanel } from './ResponsePanel.tsx';
import { savePlot } from './save-plot.ts';
import { TransferView } from './TransferView.tsx';

const poles = (state: State) => state.results.poles;
const channel = (state: State) => state.results.channel;
const notation = (state: State) => state.view.notation;

export function AnswerPanels() {
  return (
    <>
      <ResponsePanel />
      <PolesPanel />
      <TransferPanel />
    </>
  );
}

function PolesPanel() {
  const answer = useStore(poles);
  if (answer === null) {
    return (
      <Panel title="Poles and zeros">
        <PanelPending label="Poles" />
      </Panel>
    );
  }
  const { poles: found, zeros, hidden } = answer;
  const knownZeros = zeros.route === 'not-computed' ? null : zeros.zeros;
  return (
    <Panel title="Poles and zeros">
      {found.route === 'not-converged' ? (
        <PanelEmpty>The eigenvalue iteration did not converge for this model.</PanelEmpty>
      ) : (
        <div className="results-poles">
          <PoleMap poles={found.poles} zeros={knownZeros} onSave={savePlot} tableId="pole-table" />
          <PoleTable
            id="pole-table"
            poles={found.poles}
            zeros={knownZeros}
            route={found.route}
            standsIn={found.route === 'certified' && found.standsIn}
            hidden={hidden ?? []}
          />
        </div>
      )}
      {zeros.route === 'not-computed' && <PanelEmpty>{zeros.reason}</PanelEmpty>}
    </Panel>
  );
}

function TransferPanel() {
  const answer = useStore(channel);
  const shown = useStore(notation);
  return (
    <Panel title="Transfer function" aside={<Picker />}>
      {answer === null ? <ChannelAbsent /> : <TransferView answer={answer.transferFunction} notation={shown} />}
    </Panel>
  );
}
