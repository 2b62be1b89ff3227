/** Fits whenever another drawing comes onto the sheet, and beside the title block once that is there; never while one works. */

import { useEffect } from 'react';
import { useReactFlow } from 'reactflow';
import { type State, store, useStore } from '../store/index.ts';
import { useFit } from './useFit.ts';

const key = (state: State) => state.document.key;
const hasTitleBlock = (state: State) => state.view.hasTitleBlock;
const isUntouched = () => store.getState().document.past.length === 0;

export function useFitOnOpening(): void {
  const fitDrawing = useFit();
  const drawing = useStore(key);
  const isComplete = useStore(hasTitleBlock);
  const isReady = useReactFlow().viewportInitialized;
  // biome-ignore lint/correctness/useExhaustiveDependencies: it is the change of drawing, or the title block's coming, that asks for a fit
  useEffect(() => {
    if (isReady && isUntouched()) fitDrawing(false);
  }, [drawing, isReady, isComplete, fitDrawing]);
}
