/**
 * Changing one sheet of a drawing, however deep in groups, while everything else keeps its identity. A group's ports are its
 * sheet's inputs and outputs in order, so that the wires at the group follow when those change.
 */

import { ok, problem, type Result } from '../../problem/index.ts';
import { portCounts } from '../port-counts.ts';
import { keepSame } from '../quantities.ts';
import type { Block, GroupBlock, PortReference, Sheet, Wire } from '../types.ts';
import type { SheetPath } from './edit.ts';

/** The drawing with the sheet at `path` changed; the same object where it is not. `missing-block` where a group is gone. */
export function changeSheet<S extends Sheet>(
  root: S,
  path: SheetPath,
  change: (sheet: Sheet) => Result<Sheet>,
): Result<S> {
  const [id, ...inner] = path;
  if (id === undefined) return withSheet(root, change(root));
  const group = root.blocks.find(block => block.id === id);
  if (group?.kind !== 'group') {
    return { ok: false, problems: [problem('missing-block', `There is no group ${id} here any more. Go up a sheet.`)] };
  }
  const sheet = changeSheet(group.sheet, inner, change);
  if (!sheet.ok) return sheet;
  if (sheet.value === group.sheet) return ok(root);
  return ok(withGroup(root, group, { ...group, sheet: sheet.value }));
}

function withSheet<S extends Sheet>(root: S, sheet: Result<Sheet>): Result<S> {
  if (!sheet.ok) return sheet;
  const { blocks, wires, annotations } = sheet.value;
  if (blocks === root.blocks && wires === root.wires && annotations === root.annotations) return ok(root);
  const changed = { ...root, blocks, wires, ...(annotations === undefined ? {} : { annotations }) };
  if (annotations === undefined) Reflect.deleteProperty(changed, 'annotations');
  return ok(changed);
}

/** The sheet with a group in its new form, the wires at it led to the ports' new numbers or gone with their ports. */
function withGroup<S extends Sheet>(sheet: S, before: GroupBlock, after: GroupBlock): S {
  const blocks = sheet.blocks.map(block => (block === before ? after : block));
  const inputs = newPortNumbers(before.sheet, after.sheet, 'input');
  const outputs = newPortNumbers(before.sheet, after.sheet, 'output');
  if (inputs === null && outputs === null) return { ...sheet, blocks };
  const wires = sheet.wires.flatMap(wire => {
    const from = movedPort(wire.from, before.id, outputs);
    const to = movedPort(wire.to, before.id, inputs);
    if (from === null || to === null) return [];
    return from === wire.from && to === wire.to ? [wire] : [{ ...wire, from, to }];
  });
  return { ...sheet, blocks, wires };
}

/** The new number of each old port, −1 where it is gone; null where all stay. */
function newPortNumbers(before: Sheet, after: Sheet, kind: 'input' | 'output'): readonly number[] | null {
  const ids = ({ blocks }: Sheet) => blocks.filter(block => block.kind === kind).map(({ id }) => id);
  const places = new Map(ids(after).map((id, port) => [id, port]));
  const numbers = ids(before).map(id => places.get(id) ?? -1);
  return numbers.every((number, port) => number === port) ? null : numbers;
}

function movedPort(port: PortReference, group: string, numbers: readonly number[] | null): PortReference | null {
  if (numbers === null || port[0] !== group) return port;
  const number = numbers[port[1]] ?? -1;
  if (number < 0) return null;
  return number === port[1] ? port : [group, number];
}

/** The sheet with some blocks changed; the same object where none is. */
export function mapBlocks(sheet: Sheet, change: (block: Block) => Block): Sheet {
  const blocks = keepSame(sheet.blocks, change);
  return blocks === sheet.blocks ? sheet : { ...sheet, blocks };
}

/** The sheet with a block in its new form; wires at ports that it no longer has are gone. */
export function replaceBlock(sheet: Sheet, before: Block, after: Block): Sheet {
  if (before === after) return sheet;
  const { inputs, outputs } = portCounts(after);
  const stays = ({ from, to }: Wire) =>
    (from[0] !== after.id || from[1] < outputs) && (to[0] !== after.id || to[1] < inputs);
  return {
    ...sheet,
    blocks: sheet.blocks.map(block => (block === before ? after : block)),
    wires: sheet.wires.every(stays) ? sheet.wires : sheet.wires.filter(stays),
  };
}
