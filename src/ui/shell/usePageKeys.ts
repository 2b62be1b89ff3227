/** Hands the page's own keys to their commands, but where a field or a dialog takes them. */

import { useEffect } from 'react';
import { isDoneBy, isInDialog, isTextField } from '../keys/index.ts';
import { PAGE_KEYS } from './page-keys.ts';

export function usePageKeys(): void {
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (isTextField(event.target) || isInDialog(event.target)) return;
      if (isDoneBy(PAGE_KEYS, event, () => undefined)) event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, []);
}
