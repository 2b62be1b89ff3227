/** Goes to what a problem or warning names: selects its blocks, or puts the focus on its parameter's value. */

import { actions } from '../store/index.ts';

interface Finding {
  readonly blocks: readonly string[];
  readonly parameter?: string;
}

export function goTo({ blocks, parameter }: Finding): void {
  if (parameter !== undefined) {
    actions.foldTitleBlock(false);
    requestAnimationFrame(() =>
      document.querySelector<HTMLInputElement>(`[aria-label="Value of ${parameter}"]`)?.focus(),
    );
    return;
  }
  actions.selectBlocks(blocks.map(path => path.split('.', 1)[0] ?? path));
}
