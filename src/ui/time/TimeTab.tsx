/**
 * The response over time, under the tab Time. A unit step from rest comes with every edit; anything else, and what dead times and
 * limiters make of it, is asked of the worker.
 */

import { useMemo, useState } from 'react';
import type { Response } from '../../worker/index.ts';
import { useAnswer, useEnvelope } from '../answers/index.ts';
import { saveFile } from '../dialogs/save-file.ts';
import { type SavedPlot, type StepContent, StepPlot } from '../plots/index.ts';
import { PanelEmpty, PanelPending } from '../results/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { ClipReport } from './ClipReport.tsx';
import { type KeptCurve, responseContent } from './response-content.ts';
import { responseCsv } from './response-csv.ts';
import { StimulusFields } from './StimulusFields.tsx';
import { stepContentOf } from './step-content-of.ts';
import { FIRST_DRAFT, isPlain, questionOf, type TimeDraft } from './time-draft.ts';
import './time.css';

const model = (state: State) => state.results.derivation?.model ?? null;
const channel = (state: State) => state.results.channel;

interface TimeTabProps {
  readonly onSave: (plot: SavedPlot) => void;
}

/** What is asked while nothing is: the worker is not. */
const NOTHING = { input: 0, outputs: [0], stimulus: { kind: 'none' }, horizon: null, fromInitial: false } as const;

export function TimeTab({ onSave }: TimeTabProps) {
  const known = useStore(model);
  const answer = useStore(channel);
  const envelope = useEnvelope('step');
  const [draft, setDraft] = useState<TimeDraft>(FIRST_DRAFT);
  const [kept, setKept] = useState<readonly KeptCurve[]>([]);
  const outputs = useMemo(
    () => outputsOf(known?.outputs ?? [], answer?.channel.output ?? 0, draft.others),
    [known, answer, draft.others],
  );
  const question = questionOf(draft, answer?.channel.input ?? 0, outputs);
  const isWrong = typeof question === 'string';
  const { answer: response } = useAnswer(
    'response',
    isWrong ? NOTHING : question,
    !isWrong && known !== null && known.outputs.length > 0,
  );
  const content = useMemo(
    () => (isWrong ? null : contentOf({ known, answer, response, draft, kept, outputs })),
    [isWrong, known, answer, response, draft, kept, outputs],
  );
  if (known !== null && (known.outputs.length === 0 || (known.inputs.length === 0 && draft.kind !== 'none'))) {
    return (
      <PanelEmpty>
        Needs an input and an output on the sheet.{' '}
        {known.outputs.length > 0 && (
          <button type="button" className="quiet" onClick={() => setDraft({ ...FIRST_DRAFT, kind: 'none' })}>
            Show the motion from the initial values
          </button>
        )}
      </PanelEmpty>
    );
  }
  const change = (part: Partial<TimeDraft>) => setDraft(before => ({ ...before, ...part }));
  const others = (known?.outputs ?? []).filter((_, i) => i !== (answer?.channel.output ?? 0)).map(({ name }) => name);
  return (
    <>
      <StimulusFields draft={draft} otherOutputs={others} onChange={change} />
      {isWrong && <PanelEmpty>{question}</PanelEmpty>}
      {content === null ? (
        !isWrong && <Absent answer={answer} response={response} />
      ) : (
        <StepPlot
          content={isPlain(draft) ? { ...content, envelope } : content}
          onSave={onSave}
          onHorizon={seconds => change({ horizon: String(seconds) })}
        />
      )}
      <Remarks response={response} />
      {content !== null && <Keeping content={content} kept={kept} onKept={setKept} />}
    </>
  );
}

function outputsOf(
  outputs: readonly { readonly name: string }[],
  chosen: number,
  others: readonly string[],
): readonly number[] {
  const beside = others.map(name => outputs.findIndex(output => output.name === name));
  return [chosen, ...beside.filter(k => k >= 0 && k !== chosen)];
}

interface Known {
  readonly known: ReturnType<typeof model>;
  readonly answer: ReturnType<typeof channel>;
  readonly response: Response | null;
  readonly draft: TimeDraft;
  readonly kept: readonly KeptCurve[];
  readonly outputs: readonly number[];
}

/** The answer that came with the edit where it is what is asked for, and nothing in the drawing makes another one of it. */
function contentOf({ known, answer, response, draft, kept, outputs }: Known): StepContent | null {
  if (known === null || answer === null) return null;
  const isPushed = isPlain(draft) && kept.length === 0 && (response === null || response.actual === null);
  if (isPushed) return stepContentOf(known, answer);
  return response === null ? null : responseContent(known, answer, outputs, response, draft, kept);
}

function Absent({ answer, response }: Pick<Known, 'answer' | 'response'>) {
  if (answer?.step.status === 'not-computed') return <PanelEmpty>{answer.step.reason}</PanelEmpty>;
  if (response !== null && 'reason' in response.linear) return <PanelEmpty>{response.linear.reason}</PanelEmpty>;
  return <PanelPending label="Response" />;
}

/** How dead times and limiters are in the curves, and why they are not where they are not. */
function Remarks({ response }: { readonly response: Response | null }) {
  if (response === null || response.actual === null) return null;
  const { actual, hasDeadTime, hasLimiter } = response;
  const approximated = [hasDeadTime ? 'dead time approximated' : '', hasLimiter ? 'limiters as unity' : ''];
  const linear = `the linear model: ${approximated.filter(part => part !== '').join(', ')}`;
  return (
    <>
      <p className="clip-report">
        {'reason' in actual ? `Shown is ${linear}. ${actual.reason}` : `Dashed: ${linear}.`}
      </p>
      <ClipReport response={response} />
    </>
  );
}

interface KeepingProps {
  readonly content: StepContent;
  readonly kept: readonly KeptCurve[];
  readonly onKept: (kept: readonly KeptCurve[]) => void;
}

/** Keeps the first curve for comparison with those to come, lets go of what is kept, and saves all as a table. */
function Keeping({ content, kept, onKept }: KeepingProps) {
  const [first] = content.curves;
  const keep = () => {
    if (first === undefined) return;
    const label = `kept ${kept.length + 1}`;
    onKept([...kept, { ...first, label, output: content.output }]);
    actions.notify(`Kept the response as ${label}. Change something and compare.`);
  };
  const save = () => {
    const name = `response-${content.output}.csv`;
    saveFile(name, new Blob([responseCsv(content.output, content.curves)], { type: 'text/csv;charset=utf-8' }));
    actions.notify(`Saved ${name}.`);
  };
  return (
    <p className="time-keeping">
      <button type="button" className="plot-save" onClick={keep}>
        Keep for comparison
      </button>
      {kept.length > 0 && (
        <button type="button" className="plot-save" onClick={() => onKept([])}>
          Let go of {kept.length === 1 ? 'the one kept' : `the ${kept.length} kept`}
        </button>
      )}
      <button type="button" className="plot-save" onClick={save}>
        Save as CSV
      </button>
    </p>
  );
}
