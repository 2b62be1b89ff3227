/**
 * Every block of a sheet as it stands among the others: summing points and terminals turn their ports towards what they
 * are joined to, as they are drawn by hand. Routes and drawings are made from this; it promises the same answer
 * whatever order the wires come in, and unchanged ports for whatever does not move.
 */

import type { Block, Sheet, SummerBlock } from '../types.ts';
import { blockBox, blockOutline, CIRCLE_INPUTS, SUMMING_RADIUS, TERMINAL_RADIUS } from './block-box.ts';
import { blockLabels } from './labels.ts';
import { portOffsets, rectanglePorts } from './ports.ts';
import type { BlockGeometry, PortPlace, SheetGeometry, Side } from './types.ts';

interface Neighbours {
  readonly blocks: ReadonlyMap<string, Block>;
  /** What feeds input port `port` of a block, by `block:port`. */
  readonly sources: ReadonlyMap<string, Block>;
  /** The input ports that a block feeds. */
  readonly targets: ReadonlyMap<string, readonly { readonly block: Block; readonly port: number }[]>;
}

function neighbours(sheet: Sheet): Neighbours {
  const blocks = new Map(sheet.blocks.map(block => [block.id, block]));
  const sources = new Map<string, Block>();
  const targets = new Map<string, { block: Block; port: number }[]>();
  for (const { from, to } of sheet.wires) {
    const source = blocks.get(from[0]);
    const target = blocks.get(to[0]);
    if (source === undefined || target === undefined) continue;
    sources.set(`${to[0]}:${to[1]}`, source);
    const list = targets.get(source.id) ?? [];
    list.push({ block: target, port: to[1] });
    targets.set(source.id, list);
  }
  return { blocks, sources, targets };
}

/** Geometry of every block of the sheet, in block order. A block without a place counts as standing at the origin. */
export function sheetGeometry(sheet: Sheet): SheetGeometry {
  const around = neighbours(sheet);
  return new Map(sheet.blocks.map(block => [block.id, placedGeometry(block, around)]));
}

/** Of blocks that turn no port towards their neighbours: the same for as long as the block is the same object. */
const ownGeometry = new WeakMap<Block, BlockGeometry>();

function placedGeometry(block: Block, around: Neighbours): BlockGeometry {
  if (block.kind === 'input' || block.kind === 'summer') return geometryOf(block, around);
  const before = ownGeometry.get(block);
  if (before !== undefined) return before;
  const geometry = geometryOf(block, around);
  ownGeometry.set(block, geometry);
  return geometry;
}

function geometryOf(block: Block, around: Neighbours): BlockGeometry {
  const box = blockBox(block);
  const outline = blockOutline(block);
  const ports = portPlaces(block, around);
  return { outline, box, ...ports, labels: blockLabels(block, box, ports) };
}

function portPlaces(
  block: Block,
  around: Neighbours,
): { readonly inputs: readonly PortPlace[]; readonly outputs: readonly PortPlace[] } {
  switch (block.kind) {
    case 'input':
      return { inputs: [], outputs: [inputTerminalPort(block, around)] };
    case 'output':
      return { inputs: [placeOn(block.mirrored ? 'right' : 'left', TERMINAL_RADIUS)], outputs: [] };
    case 'summer':
      return {
        inputs: summingInputs(block, around),
        outputs: [placeOn(block.mirrored ? 'left' : 'right', SUMMING_RADIUS)],
      };
    default:
      return rectanglePorts(block, blockBox(block));
  }
}

function placeOn(side: Side, radius: number): PortPlace {
  const x = side === 'left' ? -radius : side === 'right' ? radius : 0;
  const y = side === 'top' ? -radius : side === 'bottom' ? radius : 0;
  return { x, y, side };
}

/** A disturbance that stands straight above or below its summing point enters it straight, as it does on paper. */
function inputTerminalPort(block: Block, around: Neighbours): PortPlace {
  const ahead = placeOn(block.mirrored ? 'left' : 'right', TERMINAL_RADIUS);
  const targets = around.targets.get(block.id) ?? [];
  const only = targets[0];
  if (targets.length !== 1 || only === undefined || only.block.kind !== 'summer') return ahead;
  const [x, y] = block.at ?? [0, 0];
  const [targetX, targetY] = only.block.at ?? [0, 0];
  if (x !== targetX || only.block.signs.length > CIRCLE_INPUTS) return ahead;
  const side = summingInputs(only.block, around)[only.port]?.side;
  if (side === 'top' && y < targetY) return placeOn('bottom', TERMINAL_RADIUS);
  if (side === 'bottom' && y > targetY) return placeOn('top', TERMINAL_RADIUS);
  return ahead;
}

/**
 * A circle's first input lies against its output; each further one on top where its source stands higher than the
 * summing point, else at the bottom. Of two that want the same, the one that wants it more has it, the second rather
 * than the third. More inputs than a circle has sides for lie one under the other.
 */
function summingInputs(block: SummerBlock, around: Neighbours): readonly PortPlace[] {
  const front: Side = block.mirrored ? 'right' : 'left';
  const count = block.signs.length;
  if (count > CIRCLE_INPUTS) {
    const x = block.mirrored ? SUMMING_RADIUS : -SUMMING_RADIUS;
    return portOffsets(count, false).map(y => ({ x, y, side: front }));
  }
  const sides: Side[] = [front];
  if (count > 1) {
    const second = wantedSide(block, 1, around);
    const third = count > 2 ? wantedSide(block, 2, around) : NOT_WANTED;
    const first = third.strength > second.strength ? opposite(third.side) : second.side;
    sides.push(first, opposite(first));
  }
  return sides.slice(0, count).map(side => placeOn(side, SUMMING_RADIUS));
}

type Flank = 'top' | 'bottom';

/** How much a port wants its side: 0 nothing is joined to it, 1 its source stands level with it, 2 higher or lower. */
interface Wanted {
  readonly side: Flank;
  readonly strength: 0 | 1 | 2;
}

const NOT_WANTED: Wanted = { side: 'bottom', strength: 0 };

function opposite(side: Flank): Flank {
  return side === 'top' ? 'bottom' : 'top';
}

/**
 * Top or bottom by where the source stands. From its own height the way back of a feedback is drawn underneath, the way
 * ahead of a feedforward on top.
 */
function wantedSide(block: SummerBlock, port: number, around: Neighbours): Wanted {
  const source = around.sources.get(`${block.id}:${port}`);
  if (source === undefined) return NOT_WANTED;
  const [x, y] = block.at ?? [0, 0];
  const [sourceX, sourceY] = source.at ?? [0, 0];
  if (sourceY !== y) return { side: sourceY < y ? 'top' : 'bottom', strength: 2 };
  const isBehind = block.mirrored ? sourceX > x : sourceX < x;
  return { side: isBehind ? 'top' : 'bottom', strength: 1 };
}
