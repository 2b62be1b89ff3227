/** Drawings: an empty sheet, a file, what is kept on the device, versions of what is on screen, worked drawings. */

import './drawings.css';
import { useRef } from 'react';
import { emptyDiagram, workedDrawings } from '../../diagram/index.ts';
import { newKey } from '../shell/new-key.ts';
import { openFile } from '../shell/open-file.ts';
import { actions } from '../store/index.ts';
import { Dialog } from './Dialog.tsx';
import { DrawingPicture } from './DrawingPicture.tsx';
import { DrawingsKept } from './DrawingsKept.tsx';
import { DrawingVersions } from './DrawingVersions.tsx';

export function DrawingsDialog() {
  return (
    <Dialog title="Drawings">
      <NewDrawing />
      <h3>Kept on this device</h3>
      <DrawingsKept />
      <h3>Versions of the drawing on screen</h3>
      <DrawingVersions />
      <h3>Worked drawings to start from</h3>
      <WorkedDrawings />
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

function WorkedDrawings() {
  return (
    <div className="drawings-worked">
      {workedDrawings().map(({ trade, diagram }) => (
        <button
          key={trade}
          type="button"
          className="button"
          onClick={() => openAndClose(diagram, `${diagram.title}, as a new drawing of your own.`)}
        >
          <DrawingPicture source={diagram} />
          <strong>{diagram.title}</strong>
          <div>{trade}</div>
        </button>
      ))}
    </div>
  );
}
