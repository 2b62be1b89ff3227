/**
 * A drawing as what is new in it since the one sent before: a large drawing whose parameter moves is not copied to the worker
 * for each of its values. What did not change stays the same object there, by which the derivation knows it.
 */

import type { Block, Diagram } from '../diagram/index.ts';

export interface DiagramChange {
  /** All that is small. */
  readonly rest: Omit<Diagram, 'parameters' | 'blocks' | 'wires'>;
  /** Each null where it is the one sent before. */
  readonly parameters: Diagram['parameters'] | null;
  readonly wires: Diagram['wires'] | null;
  readonly blocks: { readonly all: Diagram['blocks'] } | { readonly some: readonly PlacedBlock[] } | null;
}

/** A block at its place among all. */
type PlacedBlock = readonly [place: number, block: Block];

/** Of so many blocks at most one may have changed for the changed ones to be sent alone. */
const SHARE = 4;

/** @param before  what was sent last; null sends everything. */
export function changeSince(before: Diagram | null, now: Diagram): DiagramChange {
  const { parameters, wires, blocks, ...rest } = now;
  return {
    rest,
    parameters: parameters === before?.parameters ? null : parameters,
    wires: wires === before?.wires ? null : wires,
    blocks: before === null ? { all: blocks } : blocksSince(before.blocks, blocks),
  };
}

function blocksSince(before: Diagram['blocks'], now: Diagram['blocks']): DiagramChange['blocks'] {
  if (before === now) return null;
  if (before.length !== now.length) return { all: now };
  const some = now.flatMap((block, place): PlacedBlock[] => (block === before[place] ? [] : [[place, block]]));
  return some.length * SHARE <= now.length ? { some } : { all: now };
}

/** The drawing again. A change since a drawing that is not there is a bug. */
export function withChange(before: Diagram | null, change: DiagramChange): Diagram {
  const { rest, parameters, wires, blocks } = change;
  const known = (): Diagram => {
    if (before === null) throw new Error('a change came before any drawing');
    return before;
  };
  return {
    ...rest,
    parameters: parameters ?? known().parameters,
    blocks: blocks === null ? known().blocks : 'all' in blocks ? blocks.all : replaced(known().blocks, blocks.some),
    wires: wires ?? known().wires,
  };
}

function replaced(before: Diagram['blocks'], some: readonly PlacedBlock[]): Diagram['blocks'] {
  const blocks = [...before];
  for (const [place, block] of some) blocks[place] = block;
  return blocks;
}
