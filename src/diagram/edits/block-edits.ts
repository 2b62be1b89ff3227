/** Edits of blocks: adding, moving, removing, naming, ordering. Each takes the sheet and returns it changed. */

import * as v from 'valibot';
import { fail, ok, type Problem, problem, type Result } from '../../problem/index.ts';
import { FARTHEST_PLACE, LONGEST_NAME } from '../limits.ts';
import { blockSchemas, whatIsWrong } from '../reading/index.ts';
import { blockTitleAtStart, displayName } from '../titles.ts';
import type { Block, Point, PortReference, Sheet, Wire } from '../types.ts';
import type {
  AddBlock,
  AddBlocks,
  MirrorBlocks,
  MoveBlocks,
  PlaceBlocks,
  RemoveBlocks,
  RemoveBlocksHealing,
  RenameBlock,
  ReorderBlock,
} from './edit.ts';
import { freshIdAmong, freshNameAmong } from './fresh.ts';
import { mapBlocks } from './sheets.ts';

/** The blocks of the ids, or a problem that names what is gone. */
export function blocksOf(sheet: Sheet, ids: readonly string[]): Result<ReadonlySet<Block>> {
  const known = new Map(sheet.blocks.map(block => [block.id, block]));
  const found = new Set<Block>();
  for (const id of ids) {
    const block = known.get(id);
    if (block === undefined) return fail(goneBlock(id));
    found.add(block);
  }
  return ok(found);
}

/** The block of the id, or a problem that it is gone. */
export function blockOf(sheet: Sheet, id: string): Result<Block> {
  const block = sheet.blocks.find(candidate => candidate.id === id);
  return block === undefined ? fail(goneBlock(id)) : ok(block);
}

const goneBlock = (id: string): Problem =>
  problem('missing-block', `There is no block ${id} on this sheet. Choose one that is there.`, { blocks: [id] });

/** Whether a block's own fields are as a file may have them. */
function fieldsFault(block: Block): Problem | null {
  const parsed = v.safeParse(blockSchemas[block.kind], block);
  if (parsed.success) return null;
  const message = `${blockTitleAtStart(block)}: ${whatIsWrong(parsed.issues[0])}`;
  return problem('bad-value', message, { blocks: [block.id] });
}

/** Adds a block whose id and name are its own. */
export function addBlock(sheet: Sheet, { block }: AddBlock): Result<Sheet> {
  const fault = fieldsFault(block);
  if (fault !== null) return fail(fault);
  if (sheet.blocks.some(({ id }) => id === block.id)) {
    const message = `${blockTitleAtStart(block)}: the sheet has a block with the id ${block.id}. Choose another id.`;
    return fail(problem('duplicate-id', message, { blocks: [block.id] }));
  }
  return ok({ ...sheet, blocks: [...sheet.blocks, block] });
}

/** Adds copies under ids and names that nothing on the sheet bears. */
export function addBlocks(sheet: Sheet, { blocks, wires, dx = 0, dy = 0 }: AddBlocks): Result<Sheet> {
  if (blocks.length === 0) return ok(sheet);
  const taken = new Set(sheet.blocks.flatMap(block => [block.id, displayName(block)]));
  const ids = new Map<string, string>();
  const copies: Block[] = [];
  for (const block of blocks) {
    const id = freshIdAmong(taken, block.id);
    taken.add(id);
    ids.set(block.id, id);
    const copy =
      block.name === undefined ? { ...block, id } : { ...block, id, name: freshNameAmong(taken, block.name) };
    taken.add(displayName(copy));
    copies.push(moved(copy, dx, dy));
  }
  const fault = copies.map(fieldsFault).find(found => found !== null);
  if (fault !== undefined) return fail(fault);
  const copied = wires.flatMap(wire => copiedWire(wire, ids, dx, dy));
  if (copied.some(({ via }) => via?.some(isTooFar))) return fail(tooFar());
  return ok({ ...sheet, blocks: [...sheet.blocks, ...copies], wires: [...sheet.wires, ...copied] });
}

function copiedWire(wire: Wire, ids: ReadonlyMap<string, string>, dx: number, dy: number): readonly Wire[] {
  const [from, to] = [ids.get(wire.from[0]), ids.get(wire.to[0])];
  if (from === undefined || to === undefined) return [];
  const ends = { from: [from, wire.from[1]], to: [to, wire.to[1]] } satisfies Pick<Wire, 'from' | 'to'>;
  return [movedWire({ ...wire, ...ends }, dx, dy)];
}

const movedPoint = ([x, y]: Point, dx: number, dy: number): Point => [x + dx, y + dy];

function moved(block: Block, dx: number, dy: number): Block {
  return block.at === undefined || (dx === 0 && dy === 0) ? block : { ...block, at: movedPoint(block.at, dx, dy) };
}

function movedWire(wire: Wire, dx: number, dy: number): Wire {
  if (wire.via === undefined || (dx === 0 && dy === 0)) return wire;
  return { ...wire, via: wire.via.map(point => movedPoint(point, dx, dy)) };
}

/** Whether a place is outside the paper, or no place at all. */
export function isTooFar([x, y]: Point): boolean {
  return !(Math.abs(x) <= FARTHEST_PLACE && Math.abs(y) <= FARTHEST_PLACE);
}

/** The problem of a place outside the paper. */
export function tooFar(): Problem {
  return problem('bad-value', `The sheet ends ${FARTHEST_PLACE} units from its middle. Move it less far.`);
}

/** Moves blocks by (dx, dy); a block that has no place yet stays without. */
export function moveBlocks(sheet: Sheet, { ids, dx, dy }: MoveBlocks): Result<Sheet> {
  const blocks = blocksOf(sheet, ids);
  if (!blocks.ok) return blocks;
  if (dx === 0 && dy === 0) return ok(sheet);
  const isMoved = new Set(ids);
  const changed = mapBlocks(sheet, block => (isMoved.has(block.id) ? moved(block, dx, dy) : block));
  if (changed.blocks.some(({ id, at }) => isMoved.has(id) && at !== undefined && isTooFar(at))) return fail(tooFar());
  const wires = changed.wires.map(wire =>
    isMoved.has(wire.from[0]) && isMoved.has(wire.to[0]) ? movedWire(wire, dx, dy) : wire,
  );
  if (wires.some(({ via }) => via?.some(isTooFar))) return fail(tooFar());
  return ok({ ...changed, wires: wires.every((wire, i) => wire === sheet.wires[i]) ? sheet.wires : wires });
}

/** Puts blocks where they are told. */
export function placeBlocks(sheet: Sheet, { places }: PlaceBlocks): Result<Sheet> {
  const blocks = blocksOf(
    sheet,
    places.map(([id]) => id),
  );
  if (!blocks.ok) return blocks;
  if (places.some(([, at]) => isTooFar(at))) return fail(tooFar());
  const wanted = new Map(places);
  return ok(
    mapBlocks(sheet, block => {
      const at = wanted.get(block.id);
      const isThere = at === undefined || (block.at?.[0] === at[0] && block.at[1] === at[1]);
      return isThere ? block : { ...block, at };
    }),
  );
}

/** Removes blocks and every wire that starts or ends at one of them. */
export function removeBlocks(sheet: Sheet, { ids }: RemoveBlocks): Result<Sheet> {
  const blocks = blocksOf(sheet, ids);
  if (!blocks.ok) return blocks;
  if (blocks.value.size === 0) return ok(sheet);
  return ok(without(sheet, new Set(ids)));
}

function without(sheet: Sheet, ids: ReadonlySet<string>): Sheet {
  const stays = ({ from, to }: Wire) => !ids.has(from[0]) && !ids.has(to[0]);
  return {
    ...sheet,
    blocks: sheet.blocks.filter(({ id }) => !ids.has(id)),
    wires: sheet.wires.every(stays) ? sheet.wires : sheet.wires.filter(stays),
  };
}

/** Removes blocks; the wires that left one start at what fed the lowest of its wired inputs. */
export function removeBlocksHealing(sheet: Sheet, { ids }: RemoveBlocksHealing): Result<Sheet> {
  const blocks = blocksOf(sheet, ids);
  if (!blocks.ok) return blocks;
  if (blocks.value.size === 0) return ok(sheet);
  const gone = new Set(ids);
  const feeds = new Map<string, Wire>();
  for (const wire of sheet.wires) {
    const known = feeds.get(wire.to[0]);
    if (known === undefined || wire.to[1] < known.to[1]) feeds.set(wire.to[0], wire);
  }
  const wires = sheet.wires.flatMap(wire => {
    if (gone.has(wire.to[0])) return [];
    if (!gone.has(wire.from[0])) return [wire];
    const from = sourceBefore(wire.from, gone, feeds);
    return from === null ? [] : [{ from, to: wire.to }];
  });
  return ok({ ...sheet, blocks: sheet.blocks.filter(({ id }) => !gone.has(id)), wires });
}

/** The first output port upstream that stays; null where there is none or the way goes round in a circle. */
function sourceBefore(
  port: PortReference,
  gone: ReadonlySet<string>,
  feeds: ReadonlyMap<string, Wire>,
): PortReference | null {
  let source: PortReference | undefined = port;
  for (const passed = new Set<string>(); source !== undefined && gone.has(source[0]); ) {
    if (passed.has(source[0])) return null;
    passed.add(source[0]);
    source = feeds.get(source[0])?.from;
  }
  return source ?? null;
}

/** Turns blocks round. */
export function mirrorBlocks(sheet: Sheet, { ids }: MirrorBlocks): Result<Sheet> {
  const blocks = blocksOf(sheet, ids);
  if (!blocks.ok) return blocks;
  return ok(mapBlocks(sheet, block => (blocks.value.has(block) ? mirrored(block) : block)));
}

function mirrored(block: Block): Block {
  if (block.mirrored !== true) return { ...block, mirrored: true };
  const { mirrored: _, ...plain } = block;
  return plain;
}

/** Moves a block in the order of states, inputs and outputs. */
export function reorderBlock(sheet: Sheet, { id, before }: ReorderBlock): Result<Sheet> {
  const block = blockOf(sheet, id);
  if (!block.ok) return block;
  const others = sheet.blocks.filter(other => other !== block.value);
  const place = before === null ? others.length : others.findIndex(other => other.id === before);
  if (before !== null && place < 0) return before === id ? ok(sheet) : fail(goneBlock(before));
  const blocks = [...others.slice(0, place), block.value, ...others.slice(place)];
  return ok(blocks.every((other, i) => other === sheet.blocks[i]) ? sheet : { ...sheet, blocks });
}

// biome-ignore lint/suspicious/noControlCharactersInRegex: they are what a name must not hold
const CONTROL_CHARACTER = /[\u0000-\u001f\u007f-\u009f\u2028\u2029]/;

/** The name without the spaces around it, or why it is none. */
export function checkedName(name: string): Result<string> {
  const trimmed = name.trim();
  if (CONTROL_CHARACTER.test(trimmed))
    return fail(problem('bad-value', 'A name stands on one line. Take out the breaks.'));
  if (trimmed.length <= LONGEST_NAME) return ok(trimmed);
  return fail(problem('bad-value', `A name has at most ${LONGEST_NAME} characters. Write a shorter one.`));
}

/** Gives a block its display name; its id and a blank name mean the same. */
export function renameBlock(sheet: Sheet, { id, name }: RenameBlock): Result<Sheet> {
  const block = blockOf(sheet, id);
  if (!block.ok) return block;
  const checked = checkedName(name);
  if (!checked.ok) return checked;
  const isPlain = checked.value === '' || checked.value === id;
  if (displayName(block.value) === (isPlain ? id : checked.value)) return ok(sheet);
  const { name: _, ...plain } = block.value;
  const renamed = isPlain ? plain : { ...plain, name: checked.value };
  return ok(mapBlocks(sheet, other => (other === block.value ? renamed : other)));
}
