/**
 * Names that would stand for two things: states over the whole drawing, inputs and outputs on each sheet (format.md, Blocks).
 * The states of a transfer function are known only once its order is, so that they are compared when the model is derived.
 */

import { DEFAULT_DELAY_ORDER } from '../limits.ts';
import { blockTitle } from '../titles.ts';
import type { Block, Diagram, Sheet } from '../types.ts';
import { note, pathOf, type Reading, type SheetPlace, TOP_SHEET } from './reading.ts';

interface Bearer {
  /** The block's title with the names of the groups around it. */
  readonly title: string;
  readonly path: string;
}

/** Notes each name that two states, two inputs of a sheet or two outputs of a sheet bear. Linear in the names. */
export function noteNameClashes(diagram: Diagram, reading: Reading): void {
  noteOnSheet(diagram, TOP_SHEET, new Map(), reading);
}

/** Recursion is as deep as groups are: at most 32. */
function noteOnSheet(sheet: Sheet, place: SheetPlace, states: Map<string, Bearer>, reading: Reading): void {
  const inputs = new Map<string, Bearer>();
  const outputs = new Map<string, Bearer>();
  for (const block of sheet.blocks) {
    const full = [...place.names, block.name ?? block.id].join('.');
    const bearer = { title: blockTitle({ ...block, name: full }), path: pathOf(place, block.id) };
    if (block.kind === 'input') noteClash(full, 'inputs', bearer, inputs, reading);
    else if (block.kind === 'output') noteClash(full, 'outputs', bearer, outputs, reading);
    else if (block.kind === 'group') {
      const inside = { ids: [...place.ids, block.id], names: [...place.names, block.name ?? block.id] };
      noteOnSheet(block.sheet, inside, states, reading);
    } else {
      for (const state of stateNames(block, full)) noteClash(state, 'states', bearer, states, reading);
    }
  }
}

function noteClash(
  name: string,
  what: 'states' | 'inputs' | 'outputs',
  bearer: Bearer,
  seen: Map<string, Bearer>,
  reading: Reading,
): void {
  const other = seen.get(name);
  if (other === undefined) {
    seen.set(name, bearer);
    return;
  }
  const blocks = other.path === bearer.path ? [bearer.path] : [other.path, bearer.path];
  const message = `Two ${what} have the name ${name}: ${other.title} (${other.path}) and ${bearer.title} (${bearer.path}). Rename one.`;
  note(reading, 'duplicate-name', message, { blocks });
}

/** The names of the states that a block is known to bring; none where that takes its order. */
function stateNames(block: Block, name: string): readonly string[] {
  switch (block.kind) {
    case 'integrator':
      return [name];
    case 'state-model':
      return numbered(name, block.A.length);
    case 'delay':
      return numbered(name, block.order ?? DEFAULT_DELAY_ORDER);
    default:
      return [];
  }
}

function numbered(name: string, count: number): string[] {
  return Array.from({ length: count }, (_, i) => `${name}_${i + 1}`);
}
