/** The states whose equations a block takes part in, found along the wires of the top sheet. */

import { holdsState } from '../../diagram/geometry/index.ts';
import { type Block, displayName, type Sheet } from '../../diagram/index.ts';

export interface BlockStates {
  /** Names of blocks with states whose output reaches this block's input without passing another state. */
  readonly carries: readonly string[];
  /** Names of blocks with states whose input this block's output reaches without passing another state. */
  readonly drives: readonly string[];
}

/** Both lists in document order. A block that holds a state itself counts as carried. */
export function statesOfBlock(sheet: Sheet, id: string): BlockStates {
  const blocks = new Map(sheet.blocks.map(block => [block.id, block]));
  const back = neighbours(sheet, 'back');
  const on = neighbours(sheet, 'on');
  const own = blocks.get(id);
  const isState = own !== undefined && holdsState(own);
  const carries = isState ? new Set([id]) : statesFrom(id, back, blocks);
  const drives = statesFrom(id, on, blocks);
  const named = (ids: ReadonlySet<string>) => sheet.blocks.filter(block => ids.has(block.id)).map(displayName);
  return { carries: named(carries), drives: named(drives) };
}

type Neighbours = ReadonlyMap<string, readonly string[]>;

function neighbours({ wires }: Sheet, way: 'on' | 'back'): Neighbours {
  const map = new Map<string, string[]>();
  for (const { from, to } of wires) {
    const [here, there] = way === 'on' ? [from[0], to[0]] : [to[0], from[0]];
    const list = map.get(here) ?? [];
    list.push(there);
    map.set(here, list);
  }
  return map;
}

function statesFrom(id: string, next: Neighbours, blocks: ReadonlyMap<string, Block>): ReadonlySet<string> {
  const states = new Set<string>();
  const seen = new Set([id]);
  const waiting = [...(next.get(id) ?? [])];
  for (let here = waiting.pop(); here !== undefined; here = waiting.pop()) {
    const block = blocks.get(here);
    if (block !== undefined && holdsState(block)) {
      states.add(here);
      continue;
    }
    if (seen.has(here)) continue;
    seen.add(here);
    waiting.push(...(next.get(here) ?? []));
  }
  return states;
}
