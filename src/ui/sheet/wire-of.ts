/** The document's wire behind one of React Flow's. */

import type { Wire } from '../../diagram/index.ts';
import { wireKey } from '../../diagram/routing/index.ts';
import { store } from '../store/index.ts';

/** Undefined where the wire is gone. */
export function wireOf({ id }: { readonly id: string }): Wire | undefined {
  return store.getState().document.diagram.wires.find(wire => wireKey(wire) === id);
}
