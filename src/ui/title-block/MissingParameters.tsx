/** Names that the drawing uses and nobody has defined, each with a button that makes it a parameter. */

import { MathName } from '../figures/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { parameterUse } from './parameter-use.ts';

const missing = (state: State) => parameterUse(state.document.diagram).missing;

export function MissingParameters() {
  const names = useStore(missing);
  if (names.length === 0) return null;
  return (
    <ul className="title-block-missing" aria-label="Missing parameters">
      {names.map(name => (
        <li key={name}>
          <MathName name={name} /> is used and not defined
          <button
            type="button"
            className="quiet"
            aria-label={`Add parameter ${name} with value 1`}
            onClick={() =>
              actions.edit({ kind: 'addParameter', parameter: { name, value: '1' } }, `Parameter ${name} added.`)
            }
          >
            add
          </button>
        </li>
      ))}
    </ul>
  );
}
