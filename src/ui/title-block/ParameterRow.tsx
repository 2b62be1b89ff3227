/** One parameter: its name (renamed wherever it is used), value or expression of others, unit and note. */

import { MathName } from '../figures/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { formatValue } from './format-value.ts';
import { TextField } from './TextField.tsx';

export function ParameterRow({ name }: { readonly name: string }) {
  const parameter = useStore((state: State) => state.document.diagram.parameters.find(p => p.name === name));
  const value = useStore((state: State) => state.results.values.parameters[name]);
  if (parameter === undefined) return null;
  const set = (field: 'value' | 'unit' | 'note') => (text: string) =>
    actions.edit({ kind: 'setParameter', name, [field]: text });
  return (
    <tr>
      <th scope="row" className="title-block-named">
        <TextField
          label={`Name of parameter ${name}`}
          text={name}
          className="title-block-field title-block-name"
          onCommit={to => actions.edit({ kind: 'renameParameter', from: name, to }, `${name} is now ${to} everywhere.`)}
        />
        <span className="title-block-shown" aria-hidden="true">
          <MathName name={name} />
        </span>
      </th>
      <td className="title-block-value">
        <TextField label={`Value of ${name}`} text={parameter.value} onCommit={set('value')} />
        <ComputedValue written={parameter.value} value={value} />
      </td>
      <td>
        <TextField label={`Unit of ${name}`} text={parameter.unit ?? ''} onCommit={set('unit')} />
      </td>
      <td>
        <TextField
          label={`Note on ${name}`}
          text={parameter.note ?? ''}
          className="title-block-field title-block-note"
          onCommit={set('note')}
        />
      </td>
      <td>
        <button
          type="button"
          className="quiet"
          aria-label={`Remove parameter ${name}`}
          onClick={() => actions.edit({ kind: 'removeParameter', name }, `Parameter ${name} removed.`)}
        >
          ×
        </button>
      </td>
    </tr>
  );
}

/** What an expression comes to, where it is not a plain number. */
function ComputedValue({ written, value }: { readonly written: string; readonly value: number | undefined }) {
  if (value === undefined || Number(written) === value) return null;
  return <span className="title-block-computed">= {formatValue(value)}</span>;
}
