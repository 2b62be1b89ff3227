/** The system matrix in the chosen notation; in symbols once the worker has derived them, and as numbers until then. */

import type { StateSpace } from '../../compile/index.ts';
import { useAnswer } from '../answers/index.ts';
import { PanelEmpty, SystemMatrix } from '../results/index.ts';
import type { ViewSlice } from '../store/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { TraceOfPointed } from './TraceOfPointed.tsx';
import { useMatrixPointing } from './useMatrixPointing.ts';

const expanded = (state: State) => state.view.expanded;
const isMoving = (state: State) => state.live !== null;
/** A name in a value: a letter that is not the e of a number. */
const USES_A_NAME = /(?:^|[^0-9.A-Za-z_])[A-Za-z]/;
const hasDerived = (state: State) => state.document.diagram.parameters.some(({ value }) => USES_A_NAME.test(value));

interface MatrixViewProps {
  readonly model: StateSpace;
  readonly notation: ViewSlice['notation'];
}

export function MatrixView({ model, notation }: MatrixViewProps) {
  return (
    <>
      {notation === 'symbols' ? <SymbolMatrix model={model} /> : <NumberMatrix model={model} notation={notation} />}
      <TraceOfPointed model={model} />
    </>
  );
}

function NumberMatrix({
  model,
  notation,
}: {
  readonly model: StateSpace;
  readonly notation: 'fractions' | 'decimals';
}) {
  return <SystemMatrix model={model} notation={notation} {...useMatrixPointing(model)} />;
}

function SymbolMatrix({ model }: { readonly model: StateSpace }) {
  const isExpanded = useStore(expanded);
  const pointing = useMatrixPointing(model);
  // Symbols are the same whatever value a parameter has: while one moves nothing is asked.
  const isStill = !useStore(isMoving);
  const { answer, isPending } = useAnswer('symbols', { expanded: isExpanded, channel: null }, isStill);
  const rows = answer?.rows ?? null;
  const fits = rows !== null && rows.length === model.states.length + model.outputs.length;
  return (
    <>
      <SystemMatrix model={model} notation="fractions" symbols={fits ? rows : null} {...pointing} />
      {answer !== null && answer.note !== '' && <PanelEmpty>{answer.note}</PanelEmpty>}
      {answer === null && !isPending && <PanelEmpty>No symbols for this model.</PanelEmpty>}
      <ExpandChoice isExpanded={isExpanded} />
    </>
  );
}

/** Only where the drawing has parameters that are made of others. */
function ExpandChoice({ isExpanded }: { readonly isExpanded: boolean }) {
  if (!useStore(hasDerived)) return null;
  return (
    <label className="expand-choice">
      <input
        type="checkbox"
        checked={isExpanded}
        onChange={event => actions.setExpanded(event.currentTarget.checked)}
      />{' '}
      write derived parameters out
    </label>
  );
}
