/** The tolerance of every parameter, to be written: `10 %`, or an amount in the parameter's unit. */

import { useState } from 'react';
import { formatUnit, MathName, RaisedText } from '../figures/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { TextField } from '../title-block/TextField.tsx';

const parameters = (state: State) => state.document.diagram.parameters;

export function ToleranceTable() {
  const all = useStore(parameters);
  const count = all.filter(({ tolerance }) => tolerance !== undefined).length;
  // Open at first where there is none; from then on as the hand has it.
  const [isOpen, setOpen] = useState(count === 0);
  return (
    <details className="tolerance-table" open={isOpen} onToggle={event => setOpen(event.currentTarget.open)}>
      <summary>
        {count === 0 ? 'No parameter has a tolerance yet' : `Tolerances: ${count} of ${all.length} parameters have one`}
      </summary>
      <table className="requirement-table" aria-label="Tolerances">
        <thead>
          <tr>
            <th scope="col">parameter</th>
            <th scope="col">value</th>
            <th scope="col">plus or minus</th>
          </tr>
        </thead>
        <tbody>
          {all.map(({ name, value, unit = '', tolerance = '' }) => (
            <tr key={name}>
              <th scope="row">
                <MathName name={name} />
              </th>
              <td>
                {value} <RaisedText text={formatUnit(unit)} />
              </td>
              <td>
                <TextField
                  label={`Tolerance of ${name}`}
                  text={tolerance}
                  placeholder="10 %"
                  className="field tolerance-field"
                  onCommit={text => actions.edit({ kind: 'setParameter', name, tolerance: text })}
                />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}
