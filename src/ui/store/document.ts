/**
 * The document slice: the diagram on screen, what came before it and what was undone. Undo keeps documents, which share
 * all that did not change; a drag is one edit.
 */

import type { Diagram, Edit } from '../../diagram/index.ts';
import { blockTitleAtStart, editDiagram, quantityFields } from '../../diagram/index.ts';
import { parseExpression } from '../../expression/index.ts';
import { type Problem, problem } from '../../problem/index.ts';

export interface DocumentSlice {
  readonly diagram: Diagram;
  /** Key under which it is kept on the device. */
  readonly key: string;
  /** Grows with every change of the document. */
  readonly revision: number;
  readonly past: readonly Diagram[];
  readonly future: readonly Diagram[];
}

/** Undo goes back this far; older documents are let go. */
const HISTORY_LIMIT = 500;

/** The slice after an edit, or the problems that refused it; an edit that changes nothing is no step. */
export function edited(
  slice: DocumentSlice,
  edit: Edit,
):
  | { readonly ok: true; readonly slice: DocumentSlice }
  | { readonly ok: false; readonly problems: readonly Problem[] } {
  const result = editDiagram(slice.diagram, edit);
  if (!result.ok) return result;
  const fault = writtenFault(result.value, edit);
  if (fault !== null) return { ok: false, problems: [fault] };
  return { ok: true, slice: result.value === slice.diagram ? slice : advanced(slice, result.value) };
}

/** What is no expression in the text that the edit brings; a name nobody has defined yet may still be. */
function writtenFault(diagram: Diagram, edit: Edit): Problem | null {
  switch (edit.kind) {
    case 'setField': {
      const block = diagram.blocks.find(({ id }) => id === edit.id);
      if (block === undefined || !quantityFields(block).some(({ field }) => field === edit.field)) return null;
      return textFault(edit.value, blockTitleAtStart(block), { blocks: [edit.id] });
    }
    case 'setParameter':
      return edit.value === undefined ? null : parameterFault(edit.name, edit.value);
    case 'addParameter':
      return parameterFault(edit.parameter.name, edit.parameter.value);
    default:
      return null;
  }
}

function parameterFault(name: string, value: string): Problem | null {
  return textFault(value, `Parameter ${name}`, { parameter: name });
}

function textFault(text: string, title: string, concerns: Parameters<typeof problem>[2]): Problem | null {
  const parsed = parseExpression(text);
  if (parsed.ok) return null;
  const { code, message } = parsed.problems[0] ?? { code: 'bad-expression', message: 'is no expression' };
  return problem(code, `${title}: ${message}`, concerns);
}

/** The slice with `diagram` as its newest document and the former one to go back to. */
export function advanced(slice: DocumentSlice, diagram: Diagram): DocumentSlice {
  return {
    key: slice.key,
    diagram,
    revision: slice.revision + 1,
    past: [...slice.past, slice.diagram].slice(-HISTORY_LIMIT),
    future: [],
  };
}

/** One step back; the same slice where there is none. */
export function undone(slice: DocumentSlice): DocumentSlice {
  const diagram = slice.past.at(-1);
  if (diagram === undefined) return slice;
  return {
    key: slice.key,
    diagram,
    revision: slice.revision + 1,
    past: slice.past.slice(0, -1),
    future: [slice.diagram, ...slice.future],
  };
}

/** One step forward again; the same slice where there is none. */
export function redone(slice: DocumentSlice): DocumentSlice {
  const [diagram, ...future] = slice.future;
  if (diagram === undefined) return slice;
  return { key: slice.key, diagram, revision: slice.revision + 1, past: [...slice.past, slice.diagram], future };
}

/** A drawing just opened: nothing to undo. */
export function opened(slice: DocumentSlice, diagram: Diagram, key: string): DocumentSlice {
  return { key, diagram, revision: slice.revision + 1, past: [], future: [] };
}
