/** An empty sheet in one action; what was open stays in the list of drawings. */

import { emptyDiagram } from '../../diagram/index.ts';
import { actions } from '../store/index.ts';
import { newKey } from './new-key.ts';

export function openEmptySheet(): void {
  actions.openDrawing(emptyDiagram(), newKey(), 'An empty sheet. Write a block, or drag a part onto it.');
}
