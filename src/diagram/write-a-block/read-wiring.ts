/**
 * `@sum` in the write-a-block line wires what was placed last to a block that is there already; `@sum-` and `@sum+` say with
 * which sign a summing point takes it. So a loop is closed without leaving the keys.
 */

import type { Edit } from '../edits/index.ts';
import { portCounts } from '../port-counts.ts';
import { displayName } from '../titles.ts';
import type { Block, PortReference, Sheet } from '../types.ts';

export interface WrittenWiring {
  /** The block's name or id. */
  readonly to: string;
  /** Null where none is written. */
  readonly sign: '+' | '-' | null;
}

const MOST_SIGNS = 16;

/** The wiring that a line asks for; null where it writes something else. */
export function readWiring(written: string): WrittenWiring | null {
  const [, to, sign] = /^@\s*([A-Za-z][A-Za-z0-9_.]*)\s*([+-]?)$/.exec(written.trim()) ?? [];
  if (to === undefined) return null;
  return { to, sign: sign === '+' || sign === '-' ? sign : null };
}

/** The block that is meant: by its name, else by its id; null where there is none. */
export function wiredBlock({ blocks }: Sheet, { to }: WrittenWiring): Block | null {
  return (
    blocks.find(block => displayName(block) === to && portCounts(block).inputs > 0) ??
    blocks.find(({ id }) => id === to) ??
    null
  );
}

/**
 * The edits that wire `from` to the block's next open port: at a summing point one that has the written sign already, else
 * an open one that takes it on, else a new one. Null where every port is taken.
 */
export function wiringEdits(sheet: Sheet, from: PortReference, block: Block, sign: '+' | '-' | null): Edit[] | null {
  const taken = new Set(sheet.wires.filter(({ to }) => to[0] === block.id).map(({ to }) => to[1]));
  const open = Array.from({ length: portCounts(block).inputs }, (_, port) => port).filter(port => !taken.has(port));
  const connect = (port: number): Edit => ({ kind: 'connect', from, to: [block.id, port] });
  const [first] = open;
  if (block.kind !== 'summer') return first === undefined ? null : [connect(first)];
  const { signs } = block;
  const fitting = open.find(port => sign === null || signs[port] === sign);
  if (fitting !== undefined) return [connect(fitting)];
  if (first === undefined && signs.length >= MOST_SIGNS) return null;
  const port = first ?? signs.length;
  const value = `${signs.slice(0, port)}${sign ?? '+'}${signs.slice(port + 1)}`;
  return [{ kind: 'setField', id: block.id, field: 'signs', value }, connect(port)];
}
