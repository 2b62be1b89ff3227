/** The step response of the chosen channel, under the tab Time; and what stands there while there is none. */

import { useMemo } from 'react';
import type { ChannelAnswer } from '../../worker/index.ts';
import { useEnvelope } from '../answers/index.ts';
import { StepPlot } from '../plots/index.ts';
import { PanelEmpty, PanelPending } from '../results/index.ts';
import { type State, useStore } from '../store/index.ts';
import { savePlot } from './save-plot.ts';
import { stepContentOf } from './step-content-of.ts';

const model = (state: State) => state.results.derivation?.model ?? null;
const channel = (state: State) => state.results.channel;

export function StepView() {
  const known = useStore(model);
  const answer = useStore(channel);
  const envelope = useEnvelope('step');
  const content = useMemo(() => {
    const content = known === null || answer === null ? null : stepContentOf(known, answer);
    return content === null ? null : { ...content, envelope };
  }, [known, answer, envelope]);
  return content === null ? <ChannelAbsent answer={answer} /> : <StepPlot content={content} onSave={savePlot} />;
}

/** Why there is no channel to show: none in the drawing, or the answer is on its way. */
export function ChannelAbsent({ answer }: { readonly answer: ChannelAnswer | null }) {
  const known = useStore(model);
  if (answer?.step.status === 'not-computed') return <PanelEmpty>{answer.step.reason}</PanelEmpty>;
  if (known !== null && (known.inputs.length === 0 || known.outputs.length === 0)) {
    return <PanelEmpty>Needs an input and an output on the sheet.</PanelEmpty>;
  }
  return <PanelPending label="Step response" />;
}
