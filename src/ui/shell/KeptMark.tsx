/** When the drawing was last kept on the device, or why it could not be. */

import { writeDiagram } from '../../diagram/index.ts';
import { type State, store, useStore } from '../store/index.ts';

const kept = (state: State) => state.view.kept;

export function KeptMark() {
  const mark = useStore(kept);
  if (mark === null) return <span className="heading-kept" />;
  if ('refused' in mark) {
    return (
      <span className="heading-kept heading-kept-refused">
        not kept: {mark.refused}{' '}
        <button type="button" className="button" onClick={() => void saveDrawing()}>
          Save to a file
        </button>
      </span>
    );
  }
  return <span className="heading-kept">kept {mark.at}</span>;
}

async function saveDrawing(): Promise<void> {
  const { fileName, saveFile } = await import('../dialogs/save-file.ts');
  const { diagram } = store.getState().document;
  saveFile(fileName(diagram.title, 'poleward.json'), new Blob([writeDiagram(diagram)], { type: 'application/json' }));
}
