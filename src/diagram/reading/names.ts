/**
 * Names that would stand for two things: states over the whole drawing, inputs and outputs on each sheet (format.md, Blocks).
 * The states of a transfer function are known only once its order is, so that they are compared when the model is derived.
 */

import { DEFAULT_DELAY_ORDER } from '../limits.ts';
import { blockTitle, displayName } from '../titles.ts';
import type { Block, Diagram, Sheet } from '../types.ts';
import { note, pathOf, type Reading, type SheetPlace, TOP_SHEET } from './reading.ts';

/** The block that bears a name, and where it stands. */
interface Bearer {
  readonly block: Block;
  readonly place: SheetPlace;
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
    const bearer = { block, place };
    if (block.kind === 'input') noteClash(fullName(bearer), 'inputs', bearer, inputs, reading);
    else if (block.kind === 'output') noteClash(fullName(bearer), 'outputs', bearer, outputs, reading);
    else if (block.kind === 'group') {
      const inside = { ids: [...place.ids, block.id], names: [...place.names, displayName(block)] };
      noteOnSheet(block.sheet, inside, states, reading);
    } else {
      for (const state of stateNames(bearer)) noteClash(state, 'states', bearer, states, reading);
    }
  }
}

/** The block's name with those of the groups around it. */
function fullName({ block, place }: Bearer): string {
  return place.names.length === 0 ? displayName(block) : [...place.names, displayName(block)].join('.');
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
  const paths = [other, bearer].map(({ block, place }) => pathOf(place, block.id));
  const titles = [other, bearer].map(one => blockTitle({ ...one.block, name: fullName(one) }));
  const [first, second] = titles.map((title, i) => `${title} (${paths[i] ?? ''})`);
  const message = `Two ${what} have the name ${name}: ${first} and ${second}. Rename one.`;
  note(reading, 'duplicate-name', message, { blocks: [...new Set(paths)] });
}

/** The names of the states that a block is known to bring; none where that takes its order. */
function stateNames(bearer: Bearer): readonly string[] {
  const { block } = bearer;
  switch (block.kind) {
    case 'integrator':
      return [fullName(bearer)];
    case 'state-model':
      return numbered(fullName(bearer), block.A.length);
    case 'delay':
      return numbered(fullName(bearer), block.order ?? DEFAULT_DELAY_ORDER);
    default:
      return [];
  }
}

function numbered(name: string, count: number): string[] {
  return Array.from({ length: count }, (_, i) => `${name}_${i + 1}`);
}
