/** Keys on the sheet: handed to the commands while the focus is on it, or nowhere in particular. */

import { useEffect } from 'react';
import { annotationKey } from '../annotations/annotation-keys.ts';
import { isTextField } from '../shell/usePageKeys.ts';
import { altKey, commandKey, controlKey } from './command-keys.ts';
import { blockKey, viewKey, writingKey } from './sheet-keys.ts';
import { useFit } from './useFit.ts';

export function useSheetKeys(): void {
  const fitDrawing = useFit();
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.defaultPrevented || isTextField(event.target) || !isOnSheet(event.target)) return;
      if (isDone(event, fitDrawing)) event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [fitDrawing]);
}

/** Whether the key did something. */
function isDone(event: KeyboardEvent, fitDrawing: (glide: boolean) => void): boolean {
  const fitGliding = () => fitDrawing(true);
  if (annotationKey(event)) return true;
  if (event.altKey) return altKey(event);
  if (event.ctrlKey || event.metaKey) return controlKey(event);
  return commandKey(event, fitGliding) || blockKey(event) || writingKey(event.key) || viewKey(event.key, fitGliding);
}

/** Whether keys and the clipboard are meant for the sheet. */
export function isOnSheet(target: EventTarget | null): boolean {
  if (document.querySelector('dialog[open]') !== null) return false;
  return target === document.body || (target instanceof Element && target.closest('.sheet') !== null);
}
