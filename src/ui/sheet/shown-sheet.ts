/** The sheet as last drawn, for commands that have to know where its wires run. Written by the sheet, read between pictures. */

import type { Sheet } from '../../diagram/index.ts';
import type { Routes } from '../../diagram/routing/index.ts';

interface ShownSheet {
  readonly sheet: Sheet;
  readonly routes: Routes;
}

let current: ShownSheet = { sheet: { blocks: [], wires: [] }, routes: { wires: [], dots: [] } };

export function shownSheet(): ShownSheet {
  return current;
}

export function setShownSheet(shown: ShownSheet): void {
  current = shown;
}
