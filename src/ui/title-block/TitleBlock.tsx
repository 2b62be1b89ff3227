/** The title block in the sheet's corner, as engineering drawings have it, with the parameter table above its foot. */

import './title-block.css';
import { actions, type State, useStore } from '../store/index.ts';
import { NewParameter } from './NewParameter.tsx';
import { ParameterRow } from './ParameterRow.tsx';
import { TextField } from './TextField.tsx';

const folded = (state: State) => state.view.folded;
const parameters = (state: State) => state.document.diagram.parameters;
const title = (state: State) => state.document.diagram.title;
const revision = (state: State) => state.document.diagram.revision ?? '';
const date = (state: State) => state.document.diagram.date ?? '';

export function TitleBlock() {
  const isFolded = useStore(folded);
  return (
    <section className="title-block" aria-label="Title block">
      <TitleRow isFolded={isFolded} />
      {!isFolded && <ParameterTable />}
    </section>
  );
}

function TitleRow({ isFolded }: { readonly isFolded: boolean }) {
  const text = useStore(title);
  const rev = useStore(revision);
  const day = useStore(date);
  return (
    <div className="title-block-row">
      <span className="title-block-title">{text || 'untitled'}</span>
      {!isFolded && (
        <span className="title-block-issue">
          <TextField
            label="Revision"
            text={rev}
            placeholder="rev"
            onCommit={value => actions.edit({ kind: 'setTitleFields', revision: value })}
          />
          <TextField
            label="Date"
            text={day}
            placeholder="date"
            onCommit={value => actions.edit({ kind: 'setTitleFields', date: value })}
          />
        </span>
      )}
      <button
        type="button"
        className="quiet"
        aria-expanded={!isFolded}
        onClick={() => actions.foldTitleBlock(!isFolded)}
      >
        {isFolded ? 'unfold' : 'fold'}
      </button>
    </div>
  );
}

function ParameterTable() {
  const rows = useStore(parameters);
  return (
    <div className="title-block-scroll">
      <table className="title-block-table" aria-label="Parameters">
        <thead>
          <tr>
            <th scope="col">parameter</th>
            <th scope="col">value</th>
            <th scope="col">unit</th>
            <th scope="col">note</th>
            <td />
          </tr>
        </thead>
        <tbody>
          {rows.map(({ name }) => (
            <ParameterRow key={name} name={name} />
          ))}
        </tbody>
      </table>
      <NewParameter />
    </div>
  );
}
