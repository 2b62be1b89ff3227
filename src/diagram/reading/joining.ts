/**
 * Whether the parts of a document fit together: ids, wires and names. The stage after shape.ts, and what every edit that
 * could break it is held to.
 */

import { onOneLine, parameterNameFault } from '../../expression/index.ts';
import { portCounts } from '../port-counts.ts';
import { blockTitleAtStart } from '../titles.ts';
import type { Block, Diagram, PortReference, Sheet, Wire } from '../types.ts';
import { noteNameClashes } from './names.ts';
import { note, pathOf, type Reading, type SheetPlace, TOP_SHEET } from './reading.ts';

/** Notes every id, name and wire that format.md does not allow. Linear in the document. */
export function checkJoining(diagram: Diagram, reading: Reading): void {
  checkParameterNames(diagram, reading);
  checkSheet(diagram, TOP_SHEET, reading);
  checkCuts(diagram, reading);
  if (reading.problems.length === 0) noteNameClashes(diagram, reading);
}

function checkParameterNames({ parameters }: Diagram, reading: Reading): void {
  const seen = new Map<string, number>();
  for (const { name } of parameters) {
    const times = (seen.get(name) ?? 0) + 1;
    seen.set(name, times);
    const shown = name === '' ? 'without a name' : onOneLine(name);
    const fault = parameterNameFault(name);
    if (fault !== null) note(reading, 'bad-value', `Parameter ${shown}: ${fault}`, { parameter: name });
    else if (times === 2) {
      const message = `Parameter ${shown}: it is defined more than once. Keep one of the definitions.`;
      note(reading, 'duplicate-name', message, { parameter: name });
    }
  }
}

/** Each cut on a wire, no two on one. */
function checkCuts({ cuts = [], wires }: Diagram, reading: Reading): void {
  const wired = new Set(wires.map(({ to }) => to.join(' ')));
  const taken = new Set<string>();
  cuts.forEach(({ to }, i) => {
    const key = to.join(' ');
    const where = `input ${to[1]} of ${onOneLine(to[0])}`;
    const fault = !wired.has(key)
      ? `no wire leads to ${where}. Put it on a wire.`
      : taken.has(key)
        ? `the wire to ${where} has a cut already. Keep one of them.`
        : null;
    if (fault !== null) note(reading, 'bad-value', `The cut at place ${i + 1}: ${fault}`);
    taken.add(key);
  });
}

/** Recursion is as deep as groups are: at most 32. */
function checkSheet(sheet: Sheet, place: SheetPlace, reading: Reading): void {
  const blocks = new Map<string, Block>();
  const repeated = new Set<string>();
  for (const block of sheet.blocks) {
    if (!blocks.has(block.id)) blocks.set(block.id, block);
    else repeated.add(block.id);
    if (block.kind !== 'group') continue;
    const names = [...place.names, block.name ?? block.id];
    checkSheet(block.sheet, { ids: [...place.ids, block.id], names }, reading);
  }
  for (const id of repeated) {
    const where = place.names.length === 0 ? 'on the sheet' : `in group ${place.names.join('.')}`;
    const message = `More than one block ${where} has the id ${id}. Give each an id of its own.`;
    note(reading, 'duplicate-id', message, { blocks: [pathOf(place, id)] });
  }
  checkWires(sheet.wires, blocks, place, reading);
}

function checkWires(
  wires: readonly Wire[],
  blocks: ReadonlyMap<string, Block>,
  place: SheetPlace,
  reading: Reading,
): void {
  const counts = new Map([...blocks].map(([id, block]) => [id, portCounts(block)]));
  const taken = new Set<string>();
  for (const wire of wires) {
    const ends = [endFault(wire, 'from', blocks, counts, place), endFault(wire, 'to', blocks, counts, place)];
    for (const fault of ends) if (fault !== null) note(reading, ...fault);
    if (ends.some(fault => fault !== null)) continue;
    const key = wire.to.join(' ');
    const target = blocks.get(wire.to[0]);
    if (taken.has(key) && target !== undefined) {
      const message = `${titleWithin(target, place)}: more than one wire leads to its input ${wire.to[1]}. Keep one of them.`;
      note(reading, 'port-taken', message, { blocks: [pathOf(place, target.id)] });
    }
    taken.add(key);
  }
}

type Fault = readonly ['missing-block' | 'missing-port', string, { readonly blocks: readonly string[] }];

function endFault(
  wire: Wire,
  end: 'from' | 'to',
  blocks: ReadonlyMap<string, Block>,
  counts: ReadonlyMap<string, { readonly inputs: number; readonly outputs: number }>,
  place: SheetPlace,
): Fault | null {
  const [id, port] = wire[end];
  const block = blocks.get(id);
  if (block === undefined) {
    const where = place.names.length === 0 ? 'on the sheet' : `in group ${place.names.join('.')}`;
    return [
      'missing-block',
      `${wireTitle(wire)}: there is no block ${onOneLine(id)} ${where}. Correct the id.`,
      { blocks: [] },
    ];
  }
  const count = (end === 'from' ? counts.get(id)?.outputs : counts.get(id)?.inputs) ?? 0;
  if (port < count) return null;
  const has = portsInWords(count, end === 'from' ? 'output' : 'input');
  const message = `${wireTitle(wire)}: ${titleWithin(block, place)} has ${has}. Join another port.`;
  return ['missing-port', message, { blocks: [pathOf(place, id)] }];
}

function portsInWords(count: number, word: 'input' | 'output'): string {
  if (count === 0) return `no ${word}`;
  return count === 1 ? `one ${word}, number 0` : `${count} ${word}s, numbers 0 to ${count - 1}`;
}

/** A wire by its ends, ports as in the file. */
export function wireTitle({ from, to }: { readonly from: PortReference; readonly to: PortReference }): string {
  return `The wire from ${onOneLine(from[0])} (output ${from[1]}) to ${onOneLine(to[0])} (input ${to[1]})`;
}

/** The block's title with the names of the groups around it. */
function titleWithin(block: Block, place: SheetPlace): string {
  return blockTitleAtStart({ ...block, name: [...place.names, block.name ?? block.id].join('.') });
}
