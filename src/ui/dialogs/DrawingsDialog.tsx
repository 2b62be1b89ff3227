/** The drawings kept on the device: open one, start an empty sheet or the worked drawing, bring in a file, remove one. */

import { useEffect, useRef, useState } from 'react';
import { emptyDiagram, readDiagram, startingDrawing } from '../../diagram/index.ts';
import { type KeptDrawing, keptDrawings, readKept, removeKept } from '../../storage/index.ts';
import { newKey } from '../shell/new-key.ts';
import { openFile } from '../shell/open-file.ts';
import { actions, store } from '../store/index.ts';
import { Dialog } from './Dialog.tsx';

export function DrawingsDialog() {
  return (
    <Dialog title="Drawings">
      <NewDrawing />
      <h3>Kept on this device</h3>
      <KeptList />
    </Dialog>
  );
}

function NewDrawing() {
  const file = useRef<HTMLInputElement>(null);
  return (
    <div className="dialog-choices">
      <button
        type="button"
        className="button button-main"
        onClick={() => openAndClose(emptyDiagram(), 'An empty sheet. Write a block, or drag a part onto it.')}
      >
        Empty sheet
      </button>
      <button
        type="button"
        className="button"
        onClick={() => openAndClose(startingDrawing(), 'The worked drawing, as a new drawing of your own.')}
      >
        Worked drawing
      </button>
      <button type="button" className="button" onClick={() => file.current?.click()}>
        Open a file…
      </button>
      <input
        ref={file}
        type="file"
        className="unseen"
        tabIndex={-1}
        aria-label="Drawing's file"
        accept=".json,application/json"
        onChange={async event => {
          const chosen = event.currentTarget.files?.[0];
          if (chosen !== undefined && (await openFile(chosen))) actions.openDialog(null);
        }}
      />
    </div>
  );
}

function openAndClose(diagram: Parameters<typeof actions.openDrawing>[0], said: string): void {
  actions.openDrawing(diagram, newKey(), said);
  actions.openDialog(null);
}

function KeptList() {
  const [list, setList] = useState<readonly KeptDrawing[] | string | null>(null);
  const reload = () => void keptDrawings().then(answer => setList(answer.ok ? answer.value : answer.message));
  useEffect(reload, []);
  if (list === null) return <p>Reading…</p>;
  if (typeof list === 'string') return <p role="alert">{list}</p>;
  if (list.length === 0) return <p>None yet. A drawing is kept as soon as it changes.</p>;
  return (
    <table className="dialog-table" aria-label="Drawings kept on this device">
      <thead>
        <tr>
          <th scope="col">title</th>
          <th scope="col">blocks</th>
          <th scope="col">changed</th>
          <td />
        </tr>
      </thead>
      <tbody>
        {list.map(line => (
          <KeptRow key={line.key} line={line} onRemoved={reload} />
        ))}
      </tbody>
    </table>
  );
}

function KeptRow({ line, onRemoved }: { readonly line: KeptDrawing; readonly onRemoved: () => void }) {
  const isOpen = store.getState().document.key === line.key;
  const title = line.title || 'untitled';
  return (
    <tr>
      <th scope="row">{title}</th>
      <td>{line.blocks}</td>
      <td>{line.changed.slice(0, 16).replace('T', ' ')} UTC</td>
      <td>
        {isOpen ? (
          'open now'
        ) : (
          <>
            <button type="button" className="button" aria-label={`Open ${title}`} onClick={() => void open(line)}>
              Open
            </button>
            <button
              type="button"
              className="button"
              aria-label={`Remove ${title}`}
              onClick={() => void removeKept(line.key).then(onRemoved)}
            >
              Remove
            </button>
          </>
        )}
      </td>
    </tr>
  );
}

async function open(line: KeptDrawing): Promise<void> {
  const kept = await readKept(line.key);
  if (!kept.ok) return actions.notify(kept.message, 'refused');
  const read = kept.value === null ? null : readDiagram(kept.value);
  if (read === null || !read.ok) return actions.notify(`${line.title} cannot be read.`, 'refused');
  actions.openDrawing(read.value, line.key, `Opened ${line.title || 'untitled'}.`);
  actions.openDialog(null);
}
