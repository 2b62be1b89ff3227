/** The modes that no transfer function shows, why, and the states that take part in each. */

import type { StructuralMode, StructureReport } from '../../analysis/minimal/index.ts';
import type { StateSpace } from '../../compile/index.ts';
import { RaisedText } from '../figures/index.ts';
import { PanelEmpty } from '../results/index.ts';
import { actions } from '../store/index.ts';
import { NameList } from './NameList.tsx';
import { modeReason, modeText } from './structure-words.ts';

interface HiddenModesProps {
  readonly report: StructureReport;
  readonly model: StateSpace;
}

export function HiddenModes({ report: { modes }, model }: HiddenModesProps) {
  if (modes === null) return <PanelEmpty>The hidden poles could not be separated from one another.</PanelEmpty>;
  if (modes.length === 0) return null;
  return (
    <table className="structure-table" aria-label="Hidden modes">
      <thead>
        <tr>
          <th scope="col">hidden mode</th>
          <th scope="col">why</th>
          <th scope="col">states that take part</th>
          <th scope="col">
            <span className="visually-hidden">on the drawing</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {modes.map(mode => (
          <ModeRow key={`${mode.re} ${mode.im}`} mode={mode} model={model} />
        ))}
      </tbody>
    </table>
  );
}

function ModeRow({ mode, model }: { readonly mode: StructuralMode; readonly model: StateSpace }) {
  const states = mode.states.map(state => model.states[state]);
  const blocks = states.flatMap(state => (state === undefined ? [] : [state.block.split('.', 1)[0] ?? state.block]));
  return (
    <tr>
      <th scope="row">
        <RaisedText text={modeText(mode)} />
        {mode.re >= 0 && <small>does not decay</small>}
      </th>
      <td>{modeReason(mode)}</td>
      <td>
        <NameList names={states.map(state => state?.name ?? '')} />
        {!mode.isOwn && <small>together with the other hidden modes of no short factor</small>}
      </td>
      <td>
        <button
          type="button"
          className="quiet"
          aria-label={`Select the blocks of ${modeText(mode)}`}
          onClick={() => actions.selectBlocks(blocks)}
        >
          select
        </button>
      </td>
    </tr>
  );
}
