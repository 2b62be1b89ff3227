/** How large a block is, from its kind and its text alone: where it stands and what it is joined to do not matter. */

import type { Span } from '../../expression/index.ts';
import { portCounts } from '../port-counts.ts';
import type { Block, GroupBlock } from '../types.ts';
import { textWidth } from './character-widths.ts';
import { blockContent, cutToWidth, TYPE } from './content.ts';
import { portNames } from './port-names.ts';
import { portOffsets } from './ports.ts';
import { type Box, GRID, type Outline } from './types.ts';

export const SUMMING_RADIUS = 14;
export const TERMINAL_RADIUS = 4;

/** Most inputs that a circle takes: one on each side that is not the output's. */
export const CIRCLE_INPUTS = 3;

const NARROWEST = 60;
const LOWEST = 40;
const MARGIN = 8;
const WIDEST_TITLE = 180;

const upToGrid = (length: number): number => Math.ceil(length / GRID) * GRID;

/** The form of a block's frame. */
export function blockOutline(block: Block): Outline {
  switch (block.kind) {
    case 'input':
    case 'output':
      return 'terminal';
    case 'summer':
      return block.signs.length > CIRCLE_INPUTS ? 'stadium' : 'circle';
    default:
      return 'rectangle';
  }
}

/**
 * Width and height of a block's frame. Rectangles are whole grid squares wide and high, so that their edges and ports
 * lie on the grid wherever their centres do; circles are 28 across, terminals 8.
 */
export function blockBox(block: Block): Box {
  switch (block.kind) {
    case 'input':
    case 'output':
      return { width: 2 * TERMINAL_RADIUS, height: 2 * TERMINAL_RADIUS };
    case 'summer':
      return summingBox(block.signs.length);
    case 'integrator':
      return { width: LOWEST, height: LOWEST };
    case 'group':
      return groupBox(block);
    default:
      return contentBox(block);
  }
}

function summingBox(inputs: number): Box {
  const width = 2 * SUMMING_RADIUS;
  if (inputs <= CIRCLE_INPUTS) return { width, height: width };
  return { width, height: spanOf(portOffsets(inputs, false)) + width };
}

function spanOf(offsets: readonly number[]): number {
  return (offsets.at(-1) ?? 0) - (offsets[0] ?? 0);
}

function contentBox(block: Block): Box {
  const content = blockContent(block);
  const { inputs, outputs } = portCounts(block);
  const ports = spanOf(portOffsets(Math.max(inputs, outputs))) + GRID;
  return {
    width: Math.max(NARROWEST, upToGrid(content.width + 2 * MARGIN)),
    height: Math.max(LOWEST, upToGrid(content.height), upToGrid(ports)),
  };
}

/** A group's title as it fits into its frame. */
export function groupTitle(group: GroupBlock): readonly Span[] {
  const spans: readonly Span[] = [{ text: group.name ?? group.id, italic: false, script: 'normal' }];
  return cutToWidth(spans, TYPE.small, WIDEST_TITLE, 'plain');
}

function groupBox(group: GroupBlock): Box {
  const { inputs, outputs } = portNames(group);
  const widest = (names: readonly (readonly Span[])[]): number =>
    Math.max(0, ...names.map(spans => textWidth(spans, TYPE.port, 'math')));
  const title = textWidth(groupTitle(group), TYPE.small, 'plain');
  const names = widest(inputs) + widest(outputs) + 2 * GRID;
  const ports = spanOf(portOffsets(Math.max(inputs.length, outputs.length)));
  return {
    width: Math.max(NARROWEST + GRID, upToGrid(Math.max(title, names) + 2 * MARGIN)),
    height: Math.max(NARROWEST, ports + NARROWEST),
  };
}
