import { useMemo, useState } from 'react';
import { useEnvelope } from '../answers/index.ts';
import { cutChosen } from '../commands/cut-chosen.ts';
import type { SavedPlot } from '../plots/index.ts';
import { PanelEmpty, PanelPending, ShortChoice } from '../results/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { BodePlot } from './BodePlot.tsx';
import { type BodeContent, channelContent, cutContent } from './bode-content.ts';
import { CutTable } from './CutTable.tsx';

const model = (state: State) => state.results.derivation?.model ?? null;
const frequency = (state: State) => state.results.frequency;
const answers = (state: State) => state.results.cuts;
const chosenWires = (state: State) => state.selection.wires.size;
const chosenBlocks = (state: State) => state.selection.blocks.size;

/** What is shown of the answers: the channel, or the loop at a cut by its port. */
const CHANNEL = 'channel';

/** Magnitude and phase of the channel or of the loop at a cut, then every cut's margins. */
export function FrequencyView({ onSave }: { readonly onSave: (plot: SavedPlot) => void }) {
  const cuts = useStore(answers)?.cuts ?? [];
  const [wanted, setWanted] = useState(CHANNEL);
  const known = cuts.map(({ to, name }) => ({ id: to.join(':'), label: name }));
  const shown = known.some(({ id }) => id === wanted) ? wanted : CHANNEL;
  return (
    <>
      {known.length > 0 && (
        <ShortChoice
          label="Response of"
          choices={[{ id: CHANNEL, label: 'input to output' }, ...known]}
          selected={shown}
          onSelect={setWanted}
        />
      )}
      <Plot shown={shown} onSave={onSave} />
      <CutButton />
      {cuts.length > 0 && (
        <CutTable cuts={cuts} onRemove={({ to }) => actions.edit({ kind: 'removeCut', to }, 'Took the cut out.')} />
      )}
    </>
  );
}

function Plot({ shown, onSave }: { readonly shown: string; readonly onSave: (plot: SavedPlot) => void }) {
  const known = useStore(model);
  const answer = useStore(frequency);
  const envelope = useEnvelope('magnitude');
  const cut = useStore(answers)?.cuts.find(({ to }) => to.join(':') === shown);
  const content = useMemo((): BodeContent | null => {
    if (cut !== undefined) return cut.outcome.ok ? cutContent(cut.name, cut.outcome.value) : null;
    if (known === null || answer === null) return null;
    const { input, output } = answer.channel;
    return channelContent(
      known.inputs[input]?.name ?? '',
      known.outputs[output]?.name ?? '',
      answer.response,
      envelope,
    );
  }, [cut, known, answer, envelope]);
  if (content !== null) return <BodePlot content={content} onSave={onSave} />;
  if (cut !== undefined && !cut.outcome.ok) return <PanelEmpty>{cut.outcome.problems[0]?.message}</PanelEmpty>;
  if (known !== null && (known.inputs.length === 0 || known.outputs.length === 0)) {
    return <PanelEmpty>Needs an input and an output on the sheet.</PanelEmpty>;
  }
  return <PanelPending label="Frequency response" />;
}

function CutButton() {
  const wires = useStore(chosenWires);
  const blocks = useStore(chosenBlocks);
  const isOne = wires === 1 && blocks === 0;
  return (
    <p className="cut-line">
      <button type="button" className="button" disabled={!isOne} onClick={cutChosen}>
        Cut the selected wire
      </button>
      <span>
        {isOne ? 'Key C on the sheet does the same; again takes it out.' : 'Select one wire on the sheet first.'}
      </span>
    </p>
  );
}
