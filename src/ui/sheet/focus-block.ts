/** Where the keyboard's focus is on the sheet, and taking it to a block or to the sheet itself. */

import { isTextField } from '../keys/index.ts';

/** Keyboard focus on a block's element, after the next picture has put it there; a field opened meanwhile keeps it. */
export function focusBlock(id: string): void {
  requestAnimationFrame(() => {
    if (isTextField(document.activeElement)) return;
    const node = document.querySelector(`.react-flow__node[data-id="${CSS.escape(id)}"]`);
    if (node instanceof HTMLElement) node.focus({ preventScroll: true });
  });
}

/** The block whose element has the focus, null where none has. */
export function focusedBlock(): string | null {
  const node = document.activeElement?.closest('.react-flow__node');
  return node instanceof HTMLElement ? (node.dataset['id'] ?? null) : null;
}

/** Keyboard focus on the sheet itself. */
export function focusSheet(): void {
  document.querySelector<HTMLElement>('.sheet')?.focus({ preventScroll: true });
}
