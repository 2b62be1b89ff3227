/** Keyboard focus on a block's element, after the next picture has put it there. */

export function focusBlock(id: string): void {
  requestAnimationFrame(() => {
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
