/** Fits whenever another drawing comes onto the sheet, never while one is worked on. */

import { useEffect } from 'react';
import { useReactFlow } from 'reactflow';
import { type State, useStore } from '../store/index.ts';
import { useFit } from './useFit.ts';

const key = (state: State) => state.document.key;

export function useFitOnOpening(): void {
  const fitDrawing = useFit();
  const drawing = useStore(key);
  const isReady = useReactFlow().viewportInitialized;
  // biome-ignore lint/correctness/useExhaustiveDependencies: it is the change of drawing that asks for a fit
  useEffect(() => {
    if (isReady) fitDrawing(false);
  }, [drawing, isReady, fitDrawing]);
}
