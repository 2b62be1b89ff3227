/** Whose a typed key is: that of a text field or a dialog, or the page's. */

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
