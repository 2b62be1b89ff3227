/** The tab Structure: what is reached and shown, hidden modes with their states, what each state is good for, the minimal model. */

import './structure.css';
import { useEffect, useMemo, useState } from 'react';
import type { StructureReport } from '../../analysis/minimal/index.ts';
import type { StateSpace } from '../../compile/index.ts';
import { useAnswer } from '../answers/index.ts';
import { PanelEmpty, PanelPending } from '../results/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { HiddenModes } from './HiddenModes.tsx';
import { MinimalPanel } from './MinimalPanel.tsx';
import { StateTable } from './StateTable.tsx';
import { structureSentence } from './structure-words.ts';

const model = (state: State) => state.results.derivation?.model ?? null;

export function StructureTab() {
  const shown = useStore(model);
  const [withMinimal, setWithMinimal] = useState(false);
  const { answer, problems } = useAnswer('structure', { withMinimal });
  const [problem] = problems;
  useHiddenMarks(answer?.report ?? null, shown);
  if (problem !== undefined) return <PanelEmpty>{problem.message}</PanelEmpty>;
  // An answer of a drawing with other states than those on screen is about to be replaced.
  if (answer === null || shown?.states.length !== answer.report.states) return <PanelPending label="Structure" />;
  const { report, minimal, formats } = answer;
  return (
    <div className="structure">
      <p className="structure-sentence">
        {structureSentence(report)}
        {report.standsIn && ' Decided for the doubles that stand in for irrational or rounded values.'}
      </p>
      <HiddenModes report={report} model={shown} />
      {report.states > 0 && <StateTable report={report} model={shown} />}
      {report.minimal < report.states && !withMinimal && (
        <button type="button" className="button" onClick={() => setWithMinimal(true)}>
          Show the minimal model
        </button>
      )}
      {minimal !== null && report.minimal < report.states && (
        <MinimalPanel minimal={minimal} whole={shown} formats={formats} />
      )}
    </div>
  );
}

/** Marks the blocks of hidden modes on the sheet while the tab is open. */
function useHiddenMarks(report: StructureReport | null, shown: StateSpace | null): void {
  const blocks = useMemo(() => {
    const states = new Set(report?.modes?.flatMap(mode => mode.states));
    return shown?.states.filter((_, i) => states.has(i)).map(({ block }) => block) ?? [];
  }, [report, shown]);
  useEffect(() => {
    actions.markHidden(blocks);
    return () => actions.markHidden([]);
  }, [blocks]);
}
