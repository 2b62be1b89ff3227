/**
 * Blocks as text and back: the clipboard holds a drawing in the file's own format, with the wires between the blocks and the
 * parameters they use, so that it pastes into another window and into a text editor alike.
 */

import {
  type Block,
  type Diagram,
  emptyDiagram,
  type Parameter,
  quantityFields,
  readDiagram,
  writeDiagram,
} from '../../diagram/index.ts';
import { namesIn, parseExpression } from '../../expression/index.ts';
import { fail, ok, problem, type Result } from '../../problem/index.ts';

/** The drawing of these blocks and annotations alone, in document order, as text. */
export function clipboardText(
  diagram: Diagram,
  ids: ReadonlySet<string>,
  annotationIds: ReadonlySet<string> = new Set(),
): string {
  const blocks = diagram.blocks.filter(({ id }) => ids.has(id));
  const wires = diagram.wires.filter(({ from, to }) => ids.has(from[0]) && ids.has(to[0]));
  const annotations = (diagram.annotations ?? []).filter(({ id }) => annotationIds.has(id));
  return writeDiagram({
    ...emptyDiagram(),
    parameters: parametersUsed(diagram, blocks),
    blocks,
    wires,
    ...(annotations.length === 0 ? {} : { annotations }),
  });
}

/** The drawing that a text holds, or a sentence that says why it cannot be pasted. */
export function readClipboard(text: string): Result<Diagram> {
  if (text.trim() === '') return fail(problem('not-a-diagram', 'The clipboard is empty. Copy some blocks first.'));
  const read = readDiagram(text);
  if (!read.ok && /^\s*\{[\s\S]*"poleward-diagram"/.test(text)) return read;
  if (!read.ok)
    return fail(problem('not-a-diagram', 'The clipboard holds no blocks but other text. Copy some blocks first.'));
  return read.value.blocks.length > 0 || read.value.annotations !== undefined
    ? ok(read.value)
    : fail(problem('not-a-diagram', 'The copied drawing is empty. Copy some blocks first.'));
}

/** Parameters that a pasted drawing brings along, and the names it shares with other values on the sheet, which stay. */
export function broughtParameters(
  own: readonly Parameter[],
  pasted: readonly Parameter[],
): { readonly missing: readonly Parameter[]; readonly kept: readonly string[] } {
  const values = new Map(own.map(({ name, value }) => [name, value]));
  return {
    missing: pasted.filter(({ name }) => !values.has(name)),
    kept: pasted.filter(({ name, value }) => values.has(name) && values.get(name) !== value).map(({ name }) => name),
  };
}

/** Parameters that the blocks name, and those that these name in turn, in the drawing's order. */
function parametersUsed({ parameters }: Diagram, blocks: readonly Block[]): readonly Parameter[] {
  const known = new Map(parameters.map(parameter => [parameter.name, parameter]));
  const used = new Set<string>();
  const waiting = blocks.flatMap(namesOfBlock);
  for (let name = waiting.pop(); name !== undefined; name = waiting.pop()) {
    const parameter = known.get(name);
    if (parameter === undefined || used.has(name)) continue;
    used.add(name);
    waiting.push(...namesOfText(parameter.value));
  }
  return parameters.filter(({ name }) => used.has(name));
}

/** Names in a block's expressions, those of a group's blocks included. */
export function namesOfBlock(block: Block): readonly string[] {
  const own = quantityFields(block).flatMap(({ text }) => namesOfText(text));
  return block.kind === 'group' ? [...own, ...block.sheet.blocks.flatMap(namesOfBlock)] : own;
}

function namesOfText(text: string): readonly string[] {
  const parsed = parseExpression(text);
  return parsed.ok ? namesIn(parsed.value) : [];
}
