/** The head of the title block: title, revision, date and author in its ruled fields, notes folded away under them. */

import { actions, type State, useStore } from '../store/index.ts';
import { TextField } from './TextField.tsx';

const revision = (state: State) => state.document.diagram.revision ?? '';
const date = (state: State) => state.document.diagram.date ?? '';
const author = (state: State) => state.document.diagram.author ?? '';
const notes = (state: State) => state.document.diagram.notes ?? '';

type Field = 'revision' | 'date' | 'author' | 'notes';

const set = (field: Field) => (text: string) => actions.edit({ kind: 'setTitleFields', [field]: text });

export function TitleFields() {
  return (
    <div className="title-block-issue">
      <TextField label="Revision" text={useStore(revision)} placeholder="rev" onCommit={set('revision')} />
      <TextField label="Date" text={useStore(date)} placeholder="date" onCommit={set('date')} />
      <TextField label="Author" text={useStore(author)} placeholder="author" onCommit={set('author')} />
    </div>
  );
}

export function TitleNotes() {
  const text = useStore(notes);
  return (
    <details className="title-block-notes">
      <summary>{text === '' ? 'notes' : `notes: ${text.split('\n', 1)[0]}`}</summary>
      <textarea
        key={text}
        aria-label="Notes on the drawing"
        rows={3}
        defaultValue={text}
        onBlur={event => set('notes')(event.currentTarget.value)}
        onKeyDown={event => {
          if (event.key !== 'Escape') return;
          event.currentTarget.value = text;
          event.currentTarget.blur();
        }}
      />
    </details>
  );
}
