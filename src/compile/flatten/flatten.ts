/**
 * First pass: opens every group, numbers blocks, ports and signals in document order and looks up what feeds each input
 * port. Expects a diagram as `readDiagram` and the edits make it: a wire to a block or port that is not there is a bug.
 */

import { type Diagram, type GroupBlock, type PortReference, portCounts, type Sheet } from '../../diagram/index.ts';
import { type FlatBlock, type FlatDrawing, OPEN, type SimpleBlock } from './flat-drawing.ts';

/** What stands at one id of one sheet: a block's index, or a group by the boundary blocks of its sheet. */
type Place = number | { readonly inputs: readonly number[]; readonly outputs: readonly number[] };

interface OpenedSheet {
  readonly sheet: Sheet;
  readonly places: ReadonlyMap<string, Place>;
}

interface Opening {
  readonly blocks: FlatBlock[];
  readonly sheets: OpenedSheet[];
}

/** The drawing without its groups; blocks of a group come where the group stands. Linear in blocks and wires. */
export function flatten(diagram: Diagram): FlatDrawing {
  const opening: Opening = { blocks: [], sheets: [] };
  openSheet(diagram, { path: '', name: '', depth: 0 }, opening);
  const ports = numberPorts(opening.blocks);
  for (const sheet of opening.sheets) connect(sheet, ports);
  return { blocks: opening.blocks, ...ports };
}

interface Around {
  readonly path: string;
  readonly name: string;
  readonly depth: number;
}

/** Recursion is as deep as groups are: at most 32 (format.md). */
function openSheet(sheet: Sheet, around: Around, opening: Opening): ReadonlyMap<string, Place> {
  const places = new Map<string, Place>();
  for (const block of sheet.blocks) {
    const path = around.path + block.id;
    const name = around.name + (block.name ?? block.id);
    if (block.kind === 'group') {
      places.set(block.id, openGroup(block, { path: `${path}.`, name: `${name}.`, depth: around.depth + 1 }, opening));
    } else {
      places.set(block.id, opening.blocks.length);
      opening.blocks.push({ block, path, name, role: roleOf(block, around.depth) });
    }
  }
  opening.sheets.push({ sheet, places });
  return places;
}

function openGroup(group: GroupBlock, around: Around, opening: Opening): Place {
  const inside = openSheet(group.sheet, around, opening);
  const boundary = (kind: 'input' | 'output') =>
    group.sheet.blocks.filter(block => block.kind === kind).map(block => indexOf(inside, block.id));
  return { inputs: boundary('input'), outputs: boundary('output') };
}

function indexOf(places: ReadonlyMap<string, Place>, id: string): number {
  const place = places.get(id);
  if (typeof place !== 'number') throw new Error(`no block ${id} on its own sheet`);
  return place;
}

function roleOf(block: SimpleBlock, depth: number): FlatBlock['role'] {
  if (block.kind !== 'input' && block.kind !== 'output') return 'inner';
  return depth === 0 ? 'external' : 'boundary';
}

type Ports = Omit<FlatDrawing, 'blocks'>;

function numberPorts(blocks: readonly FlatBlock[]): Ports {
  const inputStart = new Int32Array(blocks.length + 1);
  const signalStart = new Int32Array(blocks.length + 1);
  blocks.forEach(({ block, role }, b) => {
    const { inputs, outputs } = role === 'boundary' ? HANDED_THROUGH : portCounts(block);
    inputStart[b + 1] = (inputStart[b] ?? 0) + inputs;
    signalStart[b + 1] = (signalStart[b] ?? 0) + outputs;
  });
  return { inputStart, signalStart, source: new Int32Array(inputStart[blocks.length] ?? 0).fill(OPEN) };
}

/** A boundary block takes one signal from outside its sheet and gives it inside, or the other way round. */
const HANDED_THROUGH = { inputs: 1, outputs: 1 };

function connect({ sheet, places }: OpenedSheet, { inputStart, signalStart, source }: Ports): void {
  for (const { from, to } of sheet.wires) {
    const port = portAt(places, to, 'inputs', inputStart);
    source[port] = portAt(places, from, 'outputs', signalStart);
  }
}

function portAt(
  places: ReadonlyMap<string, Place>,
  [id, port]: PortReference,
  side: 'inputs' | 'outputs',
  start: Int32Array,
): number {
  const place = places.get(id);
  const isGroup = typeof place === 'object';
  const block = isGroup ? place[side][port] : place;
  const at = block === undefined ? undefined : start[block];
  if (block === undefined || at === undefined) throw new Error(`a wire to ${id}, port ${port}, which is not there`);
  if (isGroup) return at;
  if (at + port >= (start[block + 1] ?? 0)) throw new Error(`a wire to ${id}, port ${port}, which is not there`);
  return at + port;
}
