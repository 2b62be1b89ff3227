/**
 * The live slice: a parameter's value while the hand moves it. The drawing with that value is derived and shown, the
 * document stays as it was until the hand lets go; then it becomes one edit.
 */

import { type Diagram, editDiagram } from '../../diagram/index.ts';
import type { DocumentSlice } from './document.ts';

export interface LiveSlice {
  /** The parameter that moves. */
  readonly name: string;
  readonly value: string;
  /** The document with that value. */
  readonly diagram: Diagram;
  /** Movements so far. */
  readonly movement: number;
  /** Grows with each movement and stays below the document's next revision. */
  readonly revision: number;
}

/** The slice after one more movement; null where the document has no such parameter. */
export function moved(
  { diagram, revision }: DocumentSlice,
  before: LiveSlice | null,
  name: string,
  value: string,
): LiveSlice | null {
  const result = editDiagram(diagram, { kind: 'setParameter', name, value });
  if (!result.ok) return null;
  const movement = (before?.movement ?? 0) + 1;
  return { name, value, diagram: result.value, movement, revision: revision + movement / (movement + 1) };
}
