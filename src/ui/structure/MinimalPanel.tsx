/** The minimal model: its matrix, what each of its states is in those of the drawing, and the way to hand it over. */

import { useId, useState } from 'react';
import type { MinimalModel } from '../../analysis/minimal/index.ts';
import type { StateSpace } from '../../compile/index.ts';
import { type SavedFormat, saveFormat } from '../dialogs/hand-over.ts';
import { MathName } from '../figures/index.ts';
import { SystemMatrix } from '../results/index.ts';
import { type State, useStore } from '../store/index.ts';
import { CombinationView } from './CombinationView.tsx';

const notation = (state: State) => state.view.notation;

interface MinimalPanelProps {
  readonly minimal: MinimalModel;
  readonly whole: StateSpace;
  readonly formats: readonly SavedFormat[];
}

export function MinimalPanel({ minimal, whole, formats }: MinimalPanelProps) {
  const { model, change, losesInitialState } = minimal;
  const chosen = useStore(notation);
  const heading = useId();
  return (
    <section aria-labelledby={heading}>
      <h3 className="structure-heading" id={heading}>
        Minimal model
      </h3>
      <SystemMatrix model={model} notation={chosen === 'decimals' ? 'decimals' : 'fractions'} />
      {model.states.length > 0 && (
        <dl className="structure-change" aria-label="Change of state">
          {change.map((row, k) => (
            <div key={model.states[k]?.name}>
              <dt>
                <MathName name={model.states[k]?.name ?? ''} />
              </dt>
              <dd>
                {'= '}
                <CombinationView
                  terms={row.flatMap((factor, i) =>
                    factor.n === 0n ? [] : [{ name: whole.states[i]?.name ?? '', factor }],
                  )}
                />
              </dd>
            </div>
          ))}
        </dl>
      )}
      {losesInitialState && (
        <p className="structure-sentence">
          The initial state holds something that no input reaches: the answer of this model to it is another one.
        </p>
      )}
      <SaveChoice formats={formats} />
    </section>
  );
}

function SaveChoice({ formats }: { readonly formats: readonly SavedFormat[] }) {
  const [id, setId] = useState(formats[0]?.id ?? '');
  const chosen = useStore(notation);
  const format = formats.find(each => each.id === id);
  return (
    <p className="structure-save">
      <label>
        Format{' '}
        <select className="channel-picker-select" value={id} onChange={event => setId(event.currentTarget.value)}>
          {formats.map(each => (
            <option key={each.id} value={each.id}>
              {each.label}
            </option>
          ))}
        </select>
      </label>{' '}
      <button
        type="button"
        className="button"
        onClick={() => format !== undefined && void saveFormat(format, chosen, true)}
      >
        Save the minimal model
      </button>
    </p>
  );
}
