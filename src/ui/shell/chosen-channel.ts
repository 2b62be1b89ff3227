/** The input and output chosen by name, as positions in the diagram's own order; the first of each where none is chosen or it is gone. */

import { displayName } from '../../diagram/index.ts';
import type { Channel } from '../../worker/index.ts';
import type { State } from '../store/index.ts';

export function chosenChannel({ document, view }: State): Channel {
  const names = (kind: 'input' | 'output') =>
    document.diagram.blocks.filter(block => block.kind === kind).map(displayName);
  return {
    input: Math.max(0, names('input').indexOf(view.input ?? '')),
    output: Math.max(0, names('output').indexOf(view.output ?? '')),
  };
}
