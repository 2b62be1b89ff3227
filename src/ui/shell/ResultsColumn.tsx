/** The results beside the sheet: the system matrix always in view, then time response, poles and zeros, transfer function. */

import { Panel, PanelPending, ProblemList, ShortChoice } from '../results/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { AnswerPanels } from './AnswerPanels.tsx';
import { goTo } from './go-to.ts';
import { MatrixView } from './MatrixView.tsx';

const derivation = (state: State) => state.results.derivation;
const poles = (state: State) => state.results.poles;
const problems = (state: State) => state.results.problems;
const status = (state: State) => state.results.status;
const notation = (state: State) => state.view.notation;

const NOTATIONS = [
  { id: 'fractions', label: 'exact' },
  { id: 'decimals', label: 'decimals' },
  { id: 'symbols', label: 'symbols' },
] as const;

export function ResultsColumn() {
  const isFailed = useStore(status) === 'failed';
  const found = useStore(problems);
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls has to be reached by key
    <section className="results" aria-label="Results" tabIndex={0}>
      {isFailed ? (
        <Panel title="No model yet">
          <ProblemList problems={found} onPick={goTo} />
        </Panel>
      ) : (
        <>
          <MatrixPanel />
          <WarningPanel />
          <AnswerPanels />
        </>
      )}
    </section>
  );
}

function MatrixPanel() {
  const known = useStore(derivation);
  const shown = useStore(notation);
  const choice = <ShortChoice label="Entries as" choices={NOTATIONS} selected={shown} onSelect={actions.setNotation} />;
  return (
    <Panel title="System matrix" aside={choice}>
      {known === null ? <PanelPending label="System matrix" /> : <MatrixView model={known.model} notation={shown} />}
    </Panel>
  );
}

function WarningPanel() {
  const derived = useStore(derivation)?.warnings ?? [];
  const hidden = useStore(poles)?.warnings ?? [];
  const warnings = [...derived, ...hidden];
  if (warnings.length === 0) return null;
  return (
    <Panel title={warnings.length === 1 ? 'Warning' : 'Warnings'}>
      <ProblemList problems={warnings} severity="warning" onPick={goTo} />
    </Panel>
  );
}
