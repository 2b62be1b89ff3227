/** What the analyses answered for the model on screen: step response, poles and zeros, transfer function. */

import { lazy, Suspense, useMemo, useState } from 'react';
import type { ChannelAnswer, Notation } from '../../worker/index.ts';
import { saveFile } from '../dialogs/save-file.ts';
import { TransferFunction } from '../figures/index.ts';
import { PoleMap, type SavedPlot, StepPlot } from '../plots/index.ts';
import { ChannelPicker, Panel, PanelEmpty, PanelPending, PoleTable, TabPanel, TabStrip } from '../results/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { stepContentOf } from './step-content-of.ts';

const model = (state: State) => state.results.derivation?.model ?? null;
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

function Picker() {
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

const TABS = [
  { id: 'time', label: 'Time' },
  { id: 'frequency', label: 'Frequency' },
] as const;

type TabId = (typeof TABS)[number]['id'];

const FrequencyView = lazy(() => import('../frequency/index.ts').then(room => ({ default: room.FrequencyView })));

function ResponsePanel() {
  const [tab, setTab] = useState<TabId>('time');
  return (
    <Panel title={tab === 'time' ? 'Step response' : 'Frequency response'} aside={<Picker />}>
      <TabStrip name="response" label="Response over" tabs={TABS} selected={tab} onSelect={setTab} />
      <TabPanel name="response" id={tab}>
        {tab === 'time' ? (
          <StepView />
        ) : (
          <Suspense fallback={<PanelPending label="Frequency response" />}>
            <FrequencyView onSave={savePlot} />
          </Suspense>
        )}
      </TabPanel>
    </Panel>
  );
}

function StepView() {
  const known = useStore(model);
  const answer = useStore(channel);
  const content = useMemo(
    () => (known === null || answer === null ? null : stepContentOf(known, answer)),
    [known, answer],
  );
  return content === null ? <ChannelAbsent answer={answer} /> : <StepPlot content={content} onSave={savePlot} />;
}

/** Why there is no channel to show: none in the drawing, or the answer is on its way. */
function ChannelAbsent({ answer }: { readonly answer: ChannelAnswer | null }) {
  const known = useStore(model);
  if (answer?.step.status === 'not-computed') return <PanelEmpty>{answer.step.reason}</PanelEmpty>;
  if (known !== null && (known.inputs.length === 0 || known.outputs.length === 0)) {
    return <PanelEmpty>Needs an input and an output on the sheet.</PanelEmpty>;
  }
  return <PanelPending label="Step response" />;
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
  const { poles: found, zeros } = answer;
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
      {answer === null ? (
        <ChannelAbsent answer={null} />
      ) : (
        <TransferView answer={answer.transferFunction} notation={shown} />
      )}
    </Panel>
  );
}

interface TransferViewProps {
  readonly answer: ChannelAnswer['transferFunction'];
  readonly notation: Notation;
}

function TransferView({ answer, notation }: TransferViewProps) {
  if (answer.route === 'not-computed') return <PanelEmpty>{answer.reason}</PanelEmpty>;
  return <TransferFunction {...answer.exact} notation={notation} />;
}

function savePlot({ name, svg }: SavedPlot): void {
  saveFile(name, new Blob([svg], { type: 'image/svg+xml' }));
  actions.notify(`Saved ${name}.`);
}
