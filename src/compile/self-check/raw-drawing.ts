/**
 * The drawing as the self-check reads it: blocks, one unknown for each output port, and which unknown feeds which input
 * port. Walks the sheets itself, without the flat drawing that the derivation made.
 */

import type { Block, Diagram, GroupBlock, Sheet } from '../../diagram/index.ts';
import type { Scope } from '../../expression/index.ts';
import { type DeadTime, isImproper, type RawLaw, rawLaw, stateCount } from './raw-laws.ts';

/** A block that is neither a group nor a model's input or output. */
export interface RawBlock {
  readonly law: RawLaw;
  /** Unknown at each input port, −1 where nothing is wired. */
  readonly fedBy: readonly number[];
  /** Unknown of its first output port; the others follow. */
  readonly firstUnknown: number;
  /** Where its states begin among the model's. */
  readonly firstState: number;
}

export interface RawDrawing {
  readonly unknowns: number;
  readonly blocks: readonly RawBlock[];
  readonly states: number;
  /** Unknown of each external input. */
  readonly inputs: readonly number[];
  /** Unknown that each external output reads, −1 where nothing is wired. */
  readonly outputs: readonly number[];
  /** Whether some block differentiates, so that the model's states need not be the drawing's. */
  readonly isImproper: boolean;
}

/** One block while the sheets are read; `fedBy` is filled in by the wires. */
interface Node {
  readonly fedBy: number[];
  readonly firstUnknown: number;
}

/** What a wire may end at: a block, or a group by its boundary blocks. */
type WireEnd = { readonly node: Node } | { readonly inputs: readonly Node[]; readonly outputs: readonly Node[] };

interface Reading {
  readonly scope: Scope;
  readonly deadTimes: DeadTime;
  readonly blocks: RawBlock[];
  unknowns: number;
  states: number;
}

/** Reads a drawing that compile found no fault with. Linear in blocks and wires. */
export function rawDrawing(diagram: Diagram, scope: Scope, deadTimes: DeadTime = 'approximated'): RawDrawing {
  const reading: Reading = { scope, deadTimes, blocks: [], unknowns: 0, states: 0 };
  const ends = readSheet(diagram, reading, true);
  const { unknowns, blocks, states } = reading;
  return {
    unknowns,
    blocks,
    states,
    inputs: nodesOf(diagram, 'input', ends).map(({ firstUnknown }) => firstUnknown),
    outputs: nodesOf(diagram, 'output', ends).map(({ fedBy }) => fedBy[0] ?? -1),
    isImproper: blocks.some(({ law }) => isImproper(law)),
  };
}

function readSheet(sheet: Sheet, reading: Reading, isTop: boolean): ReadonlyMap<string, WireEnd> {
  const ends = new Map<string, WireEnd>();
  for (const block of sheet.blocks) {
    if (block.kind === 'group') ends.set(block.id, readGroup(block, reading));
    else ends.set(block.id, { node: readBlock(block, reading, isTop) });
  }
  for (const { from, to } of sheet.wires) {
    const source = ends.get(from[0]);
    const target = ends.get(to[0]);
    if (source === undefined || target === undefined) throw new Error('a wire to a block that is not there');
    const unknown =
      'node' in source ? source.node.firstUnknown + from[1] : (source.outputs[from[1]]?.firstUnknown ?? -1);
    if ('node' in target) target.node.fedBy[to[1]] = unknown;
    else target.inputs[to[1]]!.fedBy[0] = unknown;
  }
  return ends;
}

function readGroup({ sheet }: GroupBlock, reading: Reading): WireEnd {
  const ends = readSheet(sheet, reading, false);
  return { inputs: nodesOf(sheet, 'input', ends), outputs: nodesOf(sheet, 'output', ends) };
}

function nodesOf(sheet: Sheet, kind: 'input' | 'output', ends: ReadonlyMap<string, WireEnd>): Node[] {
  return sheet.blocks
    .filter(block => block.kind === kind)
    .flatMap(({ id }) => {
      const end = ends.get(id);
      return end !== undefined && 'node' in end ? [end.node] : [];
    });
}

/** The model's own inputs and outputs have no law; on a group's sheet they hand their signal through. */
function readBlock(block: Exclude<Block, GroupBlock>, reading: Reading, isTop: boolean): Node {
  const firstUnknown = reading.unknowns;
  if (isTop && block.kind === 'output') return { fedBy: [-1], firstUnknown };
  if (isTop && block.kind === 'input') {
    reading.unknowns += 1;
    return { fedBy: [], firstUnknown };
  }
  const law = rawLaw(block, reading.scope, reading.deadTimes);
  const { inputs, outputs } = lawPorts(law);
  const node = { law, fedBy: new Array<number>(inputs).fill(-1), firstUnknown, firstState: reading.states };
  reading.blocks.push(node);
  reading.unknowns += outputs;
  reading.states += stateCount(law);
  return node;
}

function lawPorts(law: RawLaw): { readonly inputs: number; readonly outputs: number } {
  switch (law.kind) {
    case 'rational':
    case 'dead-time':
      return { inputs: 1, outputs: 1 };
    case 'static':
      return { inputs: law.gains[0]?.length ?? 0, outputs: law.gains.length };
    case 'matrices':
      return {
        inputs: Math.max(law.B[0]?.length ?? 0, law.D[0]?.length ?? 0),
        outputs: Math.max(law.C.length, law.D.length),
      };
    default:
      return law satisfies never;
  }
}
