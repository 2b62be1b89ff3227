/** Copy, cut and paste on the sheet, by key or by the browser's own menu. */

import { useEffect } from 'react';
import { copyChosen, cutChosen, pasteText } from '../commands/clipboard.ts';
import { isTextField } from '../keys/index.ts';
import { pointerPlace } from './pointer.ts';
import { isOnSheet } from './useSheetKeys.ts';

export function useClipboard(): void {
  useEffect(() => {
    const take = (event: ClipboardEvent, text: () => string | null) => {
      if (!isForSheet(event)) return;
      const taken = text();
      if (taken === null || event.clipboardData === null) return;
      event.clipboardData.setData('text/plain', taken);
      event.preventDefault();
    };
    const onCopy = (event: ClipboardEvent) => take(event, copyChosen);
    const onCut = (event: ClipboardEvent) => take(event, cutChosen);
    const onPaste = (event: ClipboardEvent) => {
      if (!isForSheet(event)) return;
      void pasteText(event.clipboardData?.getData('text/plain') ?? '', pointerPlace());
      event.preventDefault();
    };
    document.addEventListener('copy', onCopy);
    document.addEventListener('cut', onCut);
    document.addEventListener('paste', onPaste);
    return () => {
      document.removeEventListener('copy', onCopy);
      document.removeEventListener('cut', onCut);
      document.removeEventListener('paste', onPaste);
    };
  }, []);
}

/** Text that is marked on the page is copied as text. */
function isForSheet({ target }: ClipboardEvent): boolean {
  return !isTextField(target) && isOnSheet(target) && String(window.getSelection()) === '';
}
