/** Whether a change of the document can change the model: moving a block or writing a note cannot. */

import type { Block, Diagram, Sheet } from './types.ts';

/** Fields that the model does not know. */
const DRAWING_ONLY: ReadonlySet<string> = new Set(['at', 'mirrored', 'note', 'sheet']);

/**
 * Whether two documents have the same model: title, parameters, blocks in order with their names and values, and what is
 * wired to what in order. Places, notes, bend points and wire names do not count. Linear, and quick where parts are shared.
 */
export function isSameModel(a: Diagram, b: Diagram): boolean {
  if (a === b) return true;
  return a.title === b.title && haveSameParameters(a, b) && haveSameSheet(a, b);
}

function haveSameParameters({ parameters: a }: Diagram, { parameters: b }: Diagram): boolean {
  if (a === b) return true;
  return everyPair(a, b, (x, y) => x.name === y.name && x.value === y.value && x.tolerance === y.tolerance);
}

/** Recursion is as deep as groups are: at most 32. */
function haveSameSheet(a: Sheet, b: Sheet): boolean {
  if (a === b) return true;
  if (a.blocks !== b.blocks && !everyPair(a.blocks, b.blocks, haveSameBlock)) return false;
  if (a.wires === b.wires) return true;
  return everyPair(a.wires, b.wires, (x, y) => samePort(x.from, y.from) && samePort(x.to, y.to));
}

const samePort = (a: readonly [string, number], b: readonly [string, number]) => a[0] === b[0] && a[1] === b[1];

function haveSameBlock(a: Block, b: Block): boolean {
  if (a === b) return true;
  const [fields, others] = [modelFields(a), modelFields(b)];
  if (JSON.stringify(fields) !== JSON.stringify(others)) return false;
  return a.kind !== 'group' || (b.kind === 'group' && haveSameSheet(a.sheet, b.sheet));
}

function modelFields(block: Block): readonly (readonly [string, unknown])[] {
  return Object.entries(block)
    .filter(([key]) => !DRAWING_ONLY.has(key))
    .sort(([a], [b]) => (a < b ? -1 : 1));
}

function everyPair<T>(a: readonly T[], b: readonly T[], isSame: (x: T, y: T) => boolean): boolean {
  return (
    a.length === b.length &&
    a.every((x, i) => {
      const y = b[i];
      return y !== undefined && isSame(x, y);
    })
  );
}
