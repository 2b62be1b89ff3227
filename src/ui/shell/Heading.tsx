/** The line at the top: the drawing's title, when it was kept, and what can be done with the whole drawing. */

import { actions, type State, useStore } from '../store/index.ts';
import { KeptMark } from './KeptMark.tsx';
import { openEmptySheet } from './open-empty-sheet.ts';
import { shareLink } from './share-link.ts';

const title = (state: State) => state.document.diagram.title;
const hasPast = (state: State) => state.document.past.length > 0;
const hasFuture = (state: State) => state.document.future.length > 0;

export function Heading() {
  const canUndo = useStore(hasPast);
  const canRedo = useStore(hasFuture);
  return (
    <header className="heading">
      <h1 className="heading-mark">POLEWARD</h1>
      <TitleField />
      <KeptMark />
      <div className="heading-buttons" role="toolbar" aria-label="Drawing">
        <button type="button" className="button" disabled={!canUndo} onClick={actions.undo}>
          Undo
        </button>
        <button type="button" className="button" disabled={!canRedo} onClick={actions.redo}>
          Redo
        </button>
        <button type="button" className="button" onClick={openEmptySheet}>
          Empty sheet
        </button>
        <button type="button" className="button" onClick={() => actions.openDialog('drawings')}>
          Drawings
        </button>
        <button type="button" className="button" onClick={() => actions.openDialog('export')}>
          Export…
        </button>
        <button type="button" className="button button-main" onClick={() => void shareLink()}>
          Share link
        </button>
      </div>
    </header>
  );
}

function TitleField() {
  const text = useStore(title);
  return (
    <input
      key={text}
      className="heading-title"
      aria-label="Title of the drawing"
      defaultValue={text}
      placeholder="untitled"
      maxLength={200}
      onKeyDown={event => {
        if (event.key === 'Enter') event.currentTarget.blur();
        if (event.key === 'Escape') event.currentTarget.value = text;
      }}
      onBlur={event => {
        if (event.currentTarget.value !== text)
          actions.edit({ kind: 'setTitleFields', title: event.currentTarget.value });
      }}
    />
  );
}
