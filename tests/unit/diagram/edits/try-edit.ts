/** Making an edit in a test: the result, with what holds for every edit checked on the way. */

import { expect } from 'vitest';
import { type Diagram, type Edit, editDiagram, readDiagram, writeDiagram } from '../../../../src/diagram/index.ts';
import { problemsOf, valueOf } from '../../results.ts';

/** The diagram after the edit; the original is left as it was, and the result survives a file. */
export function edited(diagram: Diagram, edit: Edit): Diagram {
  const before = writeDiagram(diagram);
  const after = valueOf(editDiagram(diagram, JSON.parse(JSON.stringify(edit))));
  expect(writeDiagram(diagram)).toBe(before);
  expect(valueOf(readDiagram(writeDiagram(after)))).toEqual(after);
  return after;
}

/** The messages that refuse an edit; the original is left as it was. */
export function refusals(diagram: Diagram, edit: Edit): string[] {
  const before = writeDiagram(diagram);
  const messages = problemsOf(editDiagram(diagram, edit));
  expect(writeDiagram(diagram)).toBe(before);
  return messages;
}

/** Whether the edit changes nothing and says so by returning the very same document. */
export function changesNothing(diagram: Diagram, edit: Edit): boolean {
  return valueOf(editDiagram(diagram, edit)) === diagram;
}
