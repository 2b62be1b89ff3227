/** Keys on the sheet: handed to the commands while the focus is on it, or nowhere in particular. */

import { useEffect } from 'react';
import { isForOpeningField } from '../annotations/annotation-keys.ts';
import { isDoneBy, isTextField } from '../keys/index.ts';
import { SHEET_KEYS } from './all-sheet-keys.ts';
import { useFit } from './useFit.ts';

export function useSheetKeys(): void {
  const fitDrawing = useFit();
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.defaultPrevented || isTextField(event.target) || !isOnSheet(event.target)) return;
      if (isForOpeningField(event) || isDoneBy(SHEET_KEYS, event, () => fitDrawing(true))) event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [fitDrawing]);
}

/** Whether keys and the clipboard are meant for the sheet. */
export function isOnSheet(target: EventTarget | null): boolean {
  if (document.querySelector('dialog[open]') !== null) return false;
  return target === document.body || (target instanceof Element && target.closest('.sheet') !== null);
}
