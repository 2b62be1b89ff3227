/**
 * Folding blocks into a group and unfolding it again. Both leave every transfer function as it was: a group is its sheet, drawn elsewhere.
 */

import { fail, ok, problem, type Result } from '../../problem/index.ts';
import { blockTitleAtStart, displayName } from '../titles.ts';
import type { Annotation, Block, GroupBlock, Point, PortReference, Sheet, Wire } from '../types.ts';
import { blockOf, blocksOf } from './block-edits.ts';
import type { FoldBlocks, UnfoldGroup } from './edit.ts';
import { freshIdAmong } from './fresh.ts';

/** Sheet units: between the inner blocks and the terminals beside them, and between terminals. */
const BESIDE = 120;
const APART = 40;
const GRID = 20;

const portKey = ([block, port]: PortReference) => `${block}:${port}`;

/** Puts blocks into a group that stands where they stood; each signal that crosses the border gets one port. */
export function foldBlocks(sheet: Sheet, { ids, name }: FoldBlocks): Result<Sheet> {
  const blocks = blocksOf(sheet, ids);
  if (!blocks.ok) return blocks;
  const inside = sheet.blocks.filter(block => blocks.value.has(block));
  const [first] = inside;
  if (first === undefined) return fail(problem('bad-value', 'Choose the blocks that are to be folded into a group.'));
  const terminal = inside.find(({ kind }) => kind === 'input' || kind === 'output');
  if (terminal !== undefined) {
    const message = `${blockTitleAtStart(terminal)}: inputs and outputs of a sheet stay outside a group. Leave it out.`;
    return fail(problem('bad-value', message, { blocks: [terminal.id] }));
  }
  const isInside = new Set(inside.map(({ id }) => id));
  const id = freshIdAmong(new Set(sheet.blocks.map(block => block.id)), name ?? 'group');
  const border = borderOf(sheet, isInside);
  const inner = innerSheet(sheet, inside, border);
  const at = middleOf(inside);
  const group: GroupBlock = {
    id,
    kind: 'group',
    ...(name === undefined || name === id || name.trim() === '' ? {} : { name: name.trim() }),
    ...(at === null ? {} : { at }),
    sheet: inner,
  };
  return ok({
    ...sheet,
    blocks: sheet.blocks.flatMap(block => (block === first ? [group] : isInside.has(block.id) ? [] : [block])),
    wires: outerWires(sheet, isInside, id, border),
  });
}

/** Signals that cross the border of a group, each with its wires in document order. */
interface Border {
  /** By the output port outside that feeds them. */
  readonly entering: ReadonlyMap<string, readonly Wire[]>;
  /** By the output port inside that they leave. */
  readonly leaving: ReadonlyMap<string, readonly Wire[]>;
}

function borderOf({ wires }: Sheet, isInside: ReadonlySet<string>): Border {
  const entering = new Map<string, Wire[]>();
  const leaving = new Map<string, Wire[]>();
  for (const wire of wires) {
    const [starts, ends] = [isInside.has(wire.from[0]), isInside.has(wire.to[0])];
    if (starts === ends) continue;
    const crossing = ends ? entering : leaving;
    crossing.set(portKey(wire.from), [...(crossing.get(portKey(wire.from)) ?? []), wire]);
  }
  return { entering, leaving };
}

function innerSheet(sheet: Sheet, inside: readonly Block[], { entering, leaving }: Border): Sheet {
  const taken = new Set(inside.map(({ id }) => id));
  const bounds = boundsOf(inside);
  const rows = (column: 'left' | 'right') => terminalRows(bounds, column);
  const place = { input: rows('left'), output: rows('right') };
  const inputs: Block[] = [];
  const outputs: Block[] = [];
  const wires: Wire[] = [];
  for (const crossing of entering.values()) {
    const terminal = terminalFor('input', sheet, crossing, taken, place.input(heightOf(inside, crossing, 'to')));
    inputs.push(terminal);
    for (const { to, name } of crossing)
      wires.push({ from: [terminal.id, 0], to, ...(name === undefined ? {} : { name }) });
  }
  for (const crossing of leaving.values()) {
    const terminal = terminalFor('output', sheet, crossing, taken, place.output(heightOf(inside, crossing, 'from')));
    outputs.push(terminal);
    const [first] = crossing;
    if (first !== undefined) wires.push({ from: first.from, to: [terminal.id, 0] });
  }
  const isInside = new Set(inside.map(({ id }) => id));
  const kept = sheet.wires.filter(({ from, to }) => isInside.has(from[0]) && isInside.has(to[0]));
  return { blocks: [...inputs, ...inside, ...outputs], wires: [...kept, ...wires] };
}

function terminalFor(
  kind: 'input' | 'output',
  { blocks }: Sheet,
  [first]: readonly Wire[],
  taken: Set<string>,
  at: Point | null,
): Block {
  const source = blocks.find(({ id }) => id === first?.from[0]);
  const called = first?.name ?? (source === undefined ? kind : displayName(source));
  const id = freshIdAmong(taken, called);
  taken.add(id);
  return { id, kind, ...(called === id ? {} : { name: called }), ...(at === null ? {} : { at }) };
}

interface Bounds {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

function boundsOf(blocks: readonly Block[]): Bounds | null {
  const places = blocks.flatMap(({ at }) => (at === undefined ? [] : [at]));
  if (places.length === 0) return null;
  const [xs, ys] = [places.map(([x]) => x), places.map(([, y]) => y)];
  return { left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys) };
}

function middleOf(blocks: readonly Block[]): Point | null {
  const bounds = boundsOf(blocks);
  if (bounds === null) return null;
  const onGrid = (a: number, b: number) => Math.round((a + b) / 2 / GRID) * GRID;
  return [onGrid(bounds.left, bounds.right), onGrid(bounds.top, bounds.bottom)];
}

/** Places for terminals in a column: at the height that is wished for, or below those that are there. */
function terminalRows(bounds: Bounds | null, column: 'left' | 'right'): (wished: number | null) => Point | null {
  const taken: number[] = [];
  return wished => {
    if (bounds === null) return null;
    let y = wished ?? bounds.top;
    while (taken.some(other => Math.abs(other - y) < APART)) y += APART;
    taken.push(y);
    return [column === 'left' ? bounds.left - BESIDE : bounds.right + BESIDE, y];
  };
}

/** The height of the first inner block at a crossing signal. */
function heightOf(inside: readonly Block[], [first]: readonly Wire[], end: 'from' | 'to'): number | null {
  const block = inside.find(({ id }) => id === first?.[end][0]);
  return block?.at?.[1] ?? null;
}

/** The outer wires: those that entered end at the group's inputs, one for each signal; those that left begin at its outputs. */
function outerWires(
  { wires }: Sheet,
  isInside: ReadonlySet<string>,
  id: string,
  { entering, leaving }: Border,
): Wire[] {
  const inputs = [...entering.keys()];
  const outputs = [...leaving.keys()];
  return wires.flatMap((wire): Wire[] => {
    const [starts, ends] = [isInside.has(wire.from[0]), isInside.has(wire.to[0])];
    const key = portKey(wire.from);
    const name = wire.name === undefined ? {} : { name: wire.name };
    if (starts && ends) return [];
    if (!starts && !ends) return [wire];
    if (starts) return [{ from: [id, outputs.indexOf(key)], to: wire.to, ...name }];
    const isFirst = entering.get(key)?.[0] === wire;
    return isFirst ? [{ from: wire.from, to: [id, inputs.indexOf(key)], ...name }] : [];
  });
}

/** Puts what a group holds back onto the sheet, where the group stood. */
export function unfoldGroup(sheet: Sheet, { id }: UnfoldGroup): Result<Sheet> {
  const found = blockOf(sheet, id);
  if (!found.ok) return found;
  const group = found.value;
  if (group.kind !== 'group') {
    const message = `${blockTitleAtStart(group)} is no group. Only a group can be unfolded.`;
    return fail(problem('bad-value', message, { blocks: [id] }));
  }
  if (goesInCircle(sheet, group)) {
    const message = `${blockTitleAtStart(group)}: a signal goes straight through it and back into it, which no wire can do. Break that loop first.`;
    return fail(problem('bad-value', message, { blocks: [id] }));
  }
  const inner = group.sheet;
  const held = inner.blocks.filter(({ kind }) => kind !== 'input' && kind !== 'output');
  const outside = sheet.blocks.filter(block => block !== group);
  const ids = newIds(held, outside);
  const shift = shiftOf(group, held);
  const names = new Set(outside.map(displayName));
  const blocks = held.map(block => unfolded(block, ids, names, displayName(group), shift));
  const wires = [...joinedWires(sheet, group, ids), ...innerWires(inner, ids, shift)];
  const annotations = [...(sheet.annotations ?? []), ...movedAnnotations(sheet, inner, shift)];
  return ok({
    ...sheet,
    blocks: sheet.blocks.flatMap(block => (block === group ? blocks : [block])),
    wires,
    ...(annotations.length === 0 ? {} : { annotations }),
  });
}

/** Whether a signal that an input of the group hands straight to an output comes back to that input by wires alone. */
function goesInCircle({ wires }: Sheet, { id, sheet }: GroupBlock): boolean {
  const terminals = (kind: 'input' | 'output') =>
    sheet.blocks.filter(block => block.kind === kind).map(block => block.id);
  const [inputs, outputs] = [terminals('input'), terminals('output')];
  // For each input the input whose signal it is given through the group itself; −1 where it is another signal.
  const before = inputs.map((_, port) => {
    const from = wires.find(({ to }) => to[0] === id && to[1] === port)?.from;
    if (from?.[0] !== id) return -1;
    const inner = sheet.wires.find(({ to }) => to[0] === outputs[from[1]])?.from[0];
    return inner === undefined ? -1 : inputs.indexOf(inner);
  });
  return before.some((_, start) => {
    let port = start;
    for (let step = 0; step <= before.length && port >= 0; step++) port = before[port] ?? -1;
    return port >= 0;
  });
}

/** Ids on the outer sheet by those inside; an id that is taken there gets a number. */
function newIds(held: readonly Block[], outside: readonly Block[]): ReadonlyMap<string, string> {
  const taken = new Set(outside.map(({ id }) => id));
  const ids = new Map<string, string>();
  for (const { id } of held) {
    const fresh = freshIdAmong(taken, id);
    taken.add(fresh);
    ids.set(id, fresh);
  }
  return ids;
}

function shiftOf({ at }: GroupBlock, held: readonly Block[]): Point {
  const middle = middleOf(held);
  return at === undefined || middle === null ? [0, 0] : [at[0] - middle[0], at[1] - middle[1]];
}

/** The block by its outer id; it loses the group's prefix unless its name is taken outside. */
function unfolded(
  block: Block,
  ids: ReadonlyMap<string, string>,
  names: Set<string>,
  prefix: string,
  [dx, dy]: Point,
): Block {
  const id = ids.get(block.id) ?? block.id;
  const called = displayName(block);
  const name = names.has(called) ? `${prefix}.${called}` : called;
  names.add(name);
  const { name: _, ...rest } = block;
  const at = block.at === undefined ? {} : { at: [block.at[0] + dx, block.at[1] + dy] as const };
  // The kind's own fields come along in `rest`.
  return { ...rest, id, ...(name === id ? {} : { name }), ...at } as Block;
}

function innerWires({ blocks, wires }: Sheet, ids: ReadonlyMap<string, string>, [dx, dy]: Point): Wire[] {
  const isTerminal = new Set(blocks.filter(({ kind }) => kind === 'input' || kind === 'output').map(({ id }) => id));
  return wires.flatMap((wire): Wire[] => {
    if (isTerminal.has(wire.from[0]) || isTerminal.has(wire.to[0])) return [];
    const via = wire.via?.map(([x, y]): Point => [x + dx, y + dy]);
    return [
      { ...wire, from: renamed(wire.from, ids), to: renamed(wire.to, ids), ...(via === undefined ? {} : { via }) },
    ];
  });
}

const renamed = ([block, port]: PortReference, ids: ReadonlyMap<string, string>): PortReference => [
  ids.get(block) ?? block,
  port,
];

/** The outer wires, those at the group led on to what its terminals were joined to; a terminal that led nowhere ends them. */
function joinedWires(sheet: Sheet, group: GroupBlock, ids: ReadonlyMap<string, string>): Wire[] {
  const terminals = (kind: 'input' | 'output') => group.sheet.blocks.filter(block => block.kind === kind);
  const inputs = terminals('input').map(({ id }) => id);
  const outputs = terminals('output').map(({ id }) => id);
  const feeds = new Map(sheet.wires.map(wire => [portKey(wire.to), wire]));
  const innerFeeds = new Map(group.sheet.wires.map(wire => [portKey(wire.to), wire.from]));

  /** Where a signal that leaves the group at an output comes from, on the outer sheet; null where from nowhere. */
  const sourceOf = (port: number, passed: ReadonlySet<number>): PortReference | null => {
    const from = innerFeeds.get(portKey([outputs[port] ?? '', 0]));
    if (from === undefined) return null;
    const through = inputs.indexOf(from[0]);
    return through < 0 ? renamed(from, ids) : outerSource(through, passed);
  };
  /** What feeds an input of the group; a group that feeds itself straight through leads in a circle. */
  const outerSource = (input: number, passed: ReadonlySet<number>): PortReference | null => {
    const wire = feeds.get(portKey([group.id, input]));
    if (wire === undefined || passed.has(input)) return null;
    return wire.from[0] === group.id ? sourceOf(wire.from[1], new Set([...passed, input])) : wire.from;
  };

  const outer = sheet.wires.flatMap((wire): Wire[] => {
    if (wire.to[0] === group.id) return [];
    if (wire.from[0] !== group.id) return [wire];
    const from = sourceOf(wire.from[1], new Set());
    return from === null ? [] : [{ from, to: wire.to, ...(wire.name === undefined ? {} : { name: wire.name }) }];
  });
  const entering = group.sheet.wires.flatMap((wire): Wire[] => {
    const input = inputs.indexOf(wire.from[0]);
    if (input < 0 || outputs.includes(wire.to[0])) return [];
    const from = outerSource(input, new Set());
    const name = wire.name === undefined ? {} : { name: wire.name };
    return from === null ? [] : [{ from, to: renamed(wire.to, ids), ...name }];
  });
  return [...outer, ...entering];
}

function movedAnnotations(sheet: Sheet, inner: Sheet, [dx, dy]: Point): Annotation[] {
  const taken = new Set((sheet.annotations ?? []).map(({ id }) => id));
  return (inner.annotations ?? []).map(annotation => {
    const id = freshIdAmong(taken, annotation.id);
    taken.add(id);
    return { ...annotation, id, at: [annotation.at[0] + dx, annotation.at[1] + dy] };
  });
}
