/** One parameter: its name (renamed wherever it is used), value or expression of others, unit, slider and note. */

import { formatUnit, MathName, RaisedText } from '../figures/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { formatValue } from './format-value.ts';
import { ParameterSlider } from './ParameterSlider.tsx';
import { parameterUse } from './parameter-use.ts';
import { plainNumber } from './slider-range.ts';
import { TextField } from './TextField.tsx';

export function ParameterRow({ name }: { readonly name: string }) {
  const parameter = useStore((state: State) => state.document.diagram.parameters.find(p => p.name === name));
  const moving = useStore((state: State) => (state.live?.name === name ? state.live.value : null));
  const value = useStore((state: State) => state.results.values.parameters[name]);
  const isUnused = useStore((state: State) => parameterUse(state.document.diagram).unused.has(name));
  const fault = useStore((state: State) => state.results.problems.find(({ parameter: at }) => at === name)?.message);
  if (parameter === undefined) return null;
  const { unit = '', note = '', range } = parameter;
  const written = moving ?? parameter.value;
  const number = plainNumber(written);
  const set = (field: 'value' | 'unit' | 'note') => (text: string) =>
    actions.edit({ kind: 'setParameter', name, [field]: text });
  return (
    <tr>
      <th scope="row">
        <TextField
          label={`Name of parameter ${name}`}
          text={name}
          className="title-block-field title-block-name"
          shown={<MathName name={name} />}
          onCommit={to => actions.edit({ kind: 'renameParameter', from: name, to }, `${name} is now ${to} everywhere.`)}
        />
        {isUnused && <span className="title-block-aside">unused</span>}
      </th>
      <td>
        <TextField label={`Value of ${name}`} text={written} fault={fault} onCommit={set('value')} />
        <ComputedValue written={written} value={value} />
      </td>
      <td>
        <TextField
          label={`Unit of ${name}`}
          text={unit}
          shown={<RaisedText text={formatUnit(unit)} />}
          onCommit={set('unit')}
        />
      </td>
      <td>
        {number !== null && (
          <ParameterSlider name={name} value={number} unit={unit} range={range} isMoving={moving !== null} />
        )}
      </td>
      <td>
        <TextField
          label={`Note on ${name}`}
          text={note}
          className="title-block-field title-block-note"
          onCommit={set('note')}
        />
      </td>
      <td>
        <button
          type="button"
          className="quiet title-block-remove"
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
  if (value === undefined || plainNumber(written) !== null) return null;
  return <span className="title-block-aside">= {formatValue(value)}</span>;
}
