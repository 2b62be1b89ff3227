/** Reference cases by name, as text of a drawing and what is expected of it. */

import { readFileSync } from 'node:fs';

interface ReferenceCase {
  readonly diagram: object;
  readonly expect: Readonly<Record<string, unknown>>;
  readonly variants?: readonly { readonly set: Readonly<Record<string, string>>; readonly expect: object }[];
}

export function referenceCase(name: string): ReferenceCase {
  return JSON.parse(readFileSync(new URL(`../../reference/cases/${name}.json`, import.meta.url), 'utf8'));
}

/** The drawing of a reference case as the text of a file. */
export function drawingOf(name: string): string {
  return JSON.stringify(referenceCase(name).diagram);
}
