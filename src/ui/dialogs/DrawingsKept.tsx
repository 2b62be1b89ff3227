/** The list of kept drawings with pictures, searched by title, and under it the bin. */

import { useEffect, useState } from 'react';
import {
  type BinnedDrawing,
  binnedDrawings,
  bringBack,
  type KeptDrawing,
  keptDrawings,
  readKept,
  removeForGood,
  removeKept,
} from '../../storage/index.ts';
import { store } from '../store/index.ts';
import { DrawingPicture, diagramOf } from './DrawingPicture.tsx';
import { duplicateKept, openKept, renameKept } from './drawings-kept.ts';

interface Lists {
  readonly kept: readonly KeptDrawing[];
  readonly bin: readonly BinnedDrawing[];
}

export function DrawingsKept() {
  const [lists, setLists] = useState<Lists | string | null>(null);
  const [search, setSearch] = useState('');
  const reload = () => void readLists().then(setLists);
  useEffect(reload, []);
  if (lists === null) return <p>Reading…</p>;
  if (typeof lists === 'string') return <p role="alert">{lists}</p>;
  const found = lists.kept.filter(({ title }) => title.toLowerCase().includes(search.trim().toLowerCase()));
  const shown = found.toSorted((a, b) => b.changed.localeCompare(a.changed));
  return (
    <>
      <label className="drawings-search">
        Search by title <input type="search" value={search} onChange={event => setSearch(event.target.value)} />
      </label>
      {shown.length === 0 && (
        <p>{search === '' ? 'None yet. A drawing is kept as soon as it changes.' : 'None with that in its title.'}</p>
      )}
      <table className="dialog-table drawings-table" aria-label="Drawings kept on this device">
        <tbody>
          {shown.map(line => (
            <KeptRow key={`${line.key} ${line.title}`} line={line} onChanged={reload} />
          ))}
        </tbody>
      </table>
      {lists.bin.length > 0 && (
        <>
          <h3>Removed, kept for 30 days</h3>
          <ul className="drawings-bin">
            {lists.bin.map(line => (
              <li key={line.key}>
                {line.title || 'untitled'}{' '}
                <button
                  type="button"
                  className="button"
                  aria-label={`Bring back ${line.title || 'untitled'}`}
                  onClick={() => void bringBack(line).then(reload)}
                >
                  Bring back
                </button>{' '}
                <button
                  type="button"
                  className="button"
                  aria-label={`Remove for good: ${line.title || 'untitled'}`}
                  onClick={() => void removeForGood(line.key).then(reload)}
                >
                  Remove for good
                </button>
              </li>
            ))}
          </ul>
        </>
      )}
    </>
  );
}

async function readLists(): Promise<Lists | string> {
  const kept = await keptDrawings();
  const bin = await binnedDrawings();
  if (!kept.ok) return kept.message;
  return bin.ok ? { kept: kept.value, bin: bin.value } : bin.message;
}

function KeptRow({ line, onChanged }: { readonly line: KeptDrawing; readonly onChanged: () => void }) {
  const isOpen = store.getState().document.key === line.key;
  const title = line.title || 'untitled';
  const action = (label: string, work: () => Promise<unknown>) => (
    <button
      type="button"
      className="button"
      aria-label={`${label} ${title}`}
      onClick={() => void work().then(onChanged)}
    >
      {label}
    </button>
  );
  return (
    <tr>
      <td>
        <DrawingPicture source={() => readKept(line.key).then(answer => diagramOf(answer.ok ? answer.value : null))} />
      </td>
      <td>
        <input
          className="drawings-title"
          aria-label={`Title of ${title}`}
          defaultValue={line.title}
          maxLength={200}
          onKeyDown={event => {
            if (event.key === 'Enter') event.currentTarget.blur();
          }}
          onBlur={event => {
            if (event.target.value !== line.title) void renameKept(line, event.target.value).then(onChanged);
          }}
        />
        <div className="dialog-caution">
          {line.blocks} blocks, changed {line.changed.slice(0, 16).replace('T', ' ')} UTC
        </div>
      </td>
      <td>
        {isOpen ? <span className="drawings-open">open now</span> : action('Open', () => openKept(line))}
        {action('Duplicate', () => duplicateKept(line))}
        {!isOpen && action('Remove', () => removeKept(line))}
      </td>
    </tr>
  );
}
