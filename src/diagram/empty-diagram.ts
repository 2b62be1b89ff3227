/** The drawing before anything is drawn. */

import type { Diagram } from './types.ts';

/** An empty sheet; its matrices are empty too. */
export function emptyDiagram(title = ''): Diagram {
  return { format: 'poleward-diagram', version: 1, title, parameters: [], blocks: [], wires: [] };
}
