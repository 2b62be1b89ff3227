/** Keys that count wherever the focus is, but in a field that has its own: undo, redo, export. */

import { useEffect } from 'react';
import { actions } from '../store/index.ts';

export function usePageKeys(): void {
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey || isTextField(event.target) || isInDialog(event.target))
        return;
      const key = event.key.toLowerCase();
      if (key === 'z' && !event.shiftKey) actions.undo();
      else if (key === 'y' || (key === 'z' && event.shiftKey)) actions.redo();
      else if (key === 'e') actions.openDialog('export');
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, []);
}

/** Whether keys typed at the target belong to it; a slider has no text to undo. */
export function isTextField(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement &&
    !(target instanceof HTMLInputElement && target.type === 'range') &&
    (target.isContentEditable || ['INPUT', 'TEXTAREA', 'SELECT'].includes(target.tagName))
  );
}

/** Whether a dialog is over the page: its own keys count then. */
export function isInDialog(target: EventTarget | null): boolean {
  return target instanceof Element && target.closest('dialog') !== null;
}
