/** The judgement over the whole tolerance of the parameters: how many points, a bar while it runs, the worst cases after. */

import { useId, useState } from 'react';
import { DEFAULT_SAMPLES, MOST_SAMPLES, tolerancePlan } from '../../analysis/index.ts';
import { isJudgedDrawing } from '../answers/index.ts';
import { PanelEmpty } from '../results/index.ts';
import { type State, type TolerancesSlice, useStore } from '../store/index.ts';
import { LabelledField } from './LabelledField.tsx';
import { judge, stopJudging } from './run-judgement.ts';
import { ToleranceTable } from './ToleranceTable.tsx';
import { WorstTable } from './WorstTable.tsx';

const diagram = (state: State) => state.document.diagram;
const tolerances = (state: State) => state.tolerances;

/** Seeds that the generator takes. */
const LARGEST_SEED = 2 ** 31 - 2;

export function TolerancePanel() {
  const headingId = useId();
  const drawing = useStore(diagram);
  const judged = useStore(tolerances);
  const [samples, setSamples] = useState(String(DEFAULT_SAMPLES));
  const [seed, setSeed] = useState('1');
  const hasTolerance = drawing.parameters.some(({ tolerance }) => tolerance !== undefined);
  const fault = faultOf(samples, seed);
  const plan = fault === null ? tolerancePlan(drawing, { samples: Number(samples), seed: Number(seed) }) : null;
  const isRunning = judged?.status === 'running';
  return (
    <section className="tolerance-panel" aria-labelledby={headingId}>
      <h3 id={headingId}>Over the tolerances of the parameters</h3>
      {drawing.parameters.length === 0 ? <PanelEmpty>The drawing has no parameters.</PanelEmpty> : <ToleranceTable />}
      {hasTolerance && (
        <>
          <div className="tolerance-choice">
            <LabelledField label="Random points" value={samples} onChange={setSamples} />
            <LabelledField label="Seed" value={seed} onChange={setSeed} />
            {isRunning ? (
              <button type="button" className="button" onClick={stopJudging}>
                Stop
              </button>
            ) : (
              <button
                type="button"
                className="button"
                disabled={plan === null || !plan.ok}
                onClick={() => plan?.ok && void judge(plan.value)}
              >
                Judge {plan?.ok ? `at ${plan.value.points.length} points` : ''}
              </button>
            )}
          </div>
          <p className="requirement-fault" role="alert">
            {fault ?? (plan !== null && !plan.ok ? plan.problems[0]?.message : '')}
          </p>
        </>
      )}
      {judged !== null && <Outcome judged={judged} isCurrent={isJudgedDrawing(judged, drawing)} />}
    </section>
  );
}

function faultOf(samples: string, seed: string): string | null {
  const whole = (text: string) => (/^\d+$/.test(text.trim()) ? Number(text) : Number.NaN);
  if (!(whole(samples) <= MOST_SAMPLES)) return `Random points: write a whole number up to ${MOST_SAMPLES}.`;
  if (!(whole(seed) >= 1 && whole(seed) <= LARGEST_SEED))
    return `Seed: write a whole number from 1 to ${LARGEST_SEED}.`;
  return null;
}

function Outcome({ judged, isCurrent }: { readonly judged: TolerancesSlice; readonly isCurrent: boolean }) {
  const { status, done, plan } = judged;
  const all = plan.points.length;
  switch (status) {
    case 'running':
      return (
        <p className="tolerance-progress">
          <progress max={all} value={done} aria-label="Points judged" /> {done} of {all}
        </p>
      );
    case 'stopped':
      return <PanelEmpty>Stopped before the end.</PanelEmpty>;
    case 'failed':
      return <PanelEmpty>The judgement stopped unexpectedly. Try it with fewer points.</PanelEmpty>;
    case 'finished':
      return (
        <>
          <p role="status">
            {isCurrent ? '' : 'Of the drawing before its last change: judge again. '}
            {all} points, {plan.hasEveryCorner ? 'every corner' : '1,024 random corners'} among them. Points can refute
            a requirement, they do not prove it.
          </p>
          <WorstTable judged={judged} isCurrent={isCurrent} />
        </>
      );
    default:
      return status satisfies never;
  }
}
