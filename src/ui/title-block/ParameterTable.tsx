/** The parameter table: declared order or by name, filtered, with what is missing; rows of a spreadsheet are pasted in. */

import './parameter-table.css';
import { type ClipboardEvent, useMemo, useState } from 'react';
import { actions, type State, store, useStore } from '../store/index.ts';
import { MissingParameters } from './MissingParameters.tsx';
import { NewParameter } from './NewParameter.tsx';
import { ParameterRow } from './ParameterRow.tsx';
import { editsOfRows, isTable, pastedSentence, readPastedRows } from './read-pasted-rows.ts';
import { type ParameterOrder, shownParameters } from './shown-parameters.ts';

/** From this many parameters on they can be filtered. */
const MANY = 12;

const parameters = (state: State) => state.document.diagram.parameters;

export function ParameterTable() {
  const all = useStore(parameters);
  const [order, setOrder] = useState<ParameterOrder>('declared');
  const [filter, setFilter] = useState('');
  const isMany = all.length > MANY;
  const names = useMemo(() => shownParameters(all, order, isMany ? filter : ''), [all, order, filter, isMany]);
  return (
    <div className="title-block-scroll" onPaste={pasteRows}>
      {isMany && (
        <div className="title-block-filter">
          <input
            type="search"
            className="title-block-field"
            aria-label="Filter parameters"
            placeholder="filter by name, unit or note"
            value={filter}
            onChange={event => setFilter(event.currentTarget.value)}
          />
          <span role="status">
            {names.length} of {all.length}
          </span>
        </div>
      )}
      <table className="title-block-table" aria-label="Parameters">
        <thead>
          <tr>
            <th scope="col" aria-sort={order === 'name' ? 'ascending' : 'none'}>
              <button
                type="button"
                className="quiet"
                title={order === 'name' ? 'Back to the order of the drawing' : 'Sort by name'}
                onClick={() => setOrder(order === 'name' ? 'declared' : 'name')}
              >
                parameter {order === 'name' && <span aria-hidden="true">↓</span>}
              </button>
            </th>
            <th scope="col">value</th>
            <th scope="col">unit</th>
            <th scope="col">slider</th>
            <th scope="col">note</th>
            <td />
          </tr>
        </thead>
        <tbody>
          {names.map(name => (
            <ParameterRow key={name} name={name} />
          ))}
        </tbody>
      </table>
      <MissingParameters />
      <NewParameter />
    </div>
  );
}

function pasteRows(event: ClipboardEvent<HTMLElement>): void {
  const text = event.clipboardData.getData('text/plain');
  if (!isTable(text)) return;
  event.preventDefault();
  const read = readPastedRows(text);
  if (!read.ok) return actions.notify(read.message, 'refused');
  const edits = editsOfRows(store.getState().document.diagram, read.rows);
  actions.editTogether(edits, pastedSentence(edits));
}
