/** The commands at the sheet's upper left that have no other button: fit, arrange, find, zoom. */

import { useReactFlow } from 'reactflow';
import { beginFrame, beginText } from '../annotations/annotation-commands.ts';
import { arrangeChosen } from '../commands/arrange-chosen.ts';
import { actions } from '../store/index.ts';
import { focusSheet } from './focus-block.ts';
import { glideView, zoomedAbout } from './glide-view.ts';
import { useFit } from './useFit.ts';

const MILLISECONDS = 160;

const ZOOM_STEP = 1.2;

export function SheetToolbar() {
  const flow = useReactFlow();
  const fitDrawing = useFit();
  const zoomBy = (factor: number) => {
    const { width, height } = document.querySelector('.sheet')?.getBoundingClientRect() ?? new DOMRect();
    glideView(flow, zoomedAbout(flow.getViewport(), [width / 2, height / 2], factor), MILLISECONDS);
  };
  const arrange = () => {
    void arrangeChosen().then(isWhole => isWhole && fitDrawing(true));
    focusSheet();
  };
  return (
    <div className="sheet-toolbar" role="toolbar" aria-label="Sheet">
      <button
        type="button"
        aria-keyshortcuts="Z"
        title="Fit the drawing to the sheet: Z"
        onClick={() => fitDrawing(true)}
      >
        Fit
      </button>
      <button type="button" aria-keyshortcuts="L" title="Arrange the selected blocks, or all: L" onClick={arrange}>
        Arrange
      </button>
      <button
        type="button"
        aria-keyshortcuts="Control+F"
        title="Find a block by name, value or parameter: Ctrl+F"
        onClick={() => actions.openFinding(true)}
      >
        Find
      </button>
      <button type="button" aria-keyshortcuts="T" title="Write a text on the sheet: T" onClick={() => beginText(null)}>
        Text
      </button>
      <button type="button" aria-keyshortcuts="B" title="Frame the selected blocks: B" onClick={beginFrame}>
        Frame
      </button>
      <button type="button" aria-label="Zoom out" title="Zoom out" onClick={() => zoomBy(1 / ZOOM_STEP)}>
        −
      </button>
      <button type="button" aria-label="Zoom in" title="Zoom in" onClick={() => zoomBy(ZOOM_STEP)}>
        +
      </button>
    </div>
  );
}
