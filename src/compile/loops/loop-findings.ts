/** Algebraic loops in the words of the screen: what is refused, what is warned of. */

import { type Problem, problem, type Warning } from '../../problem/index.ts';
import { type FlatDrawing, titleOf } from '../flatten/index.ts';

/** Blocks that a message lists; a loop of more is told by its number. */
const BLOCKS_LISTED = 8;

/** A few units in the last place of 1: smaller distances are lost in the rounding of the coefficients. */
const SMALLEST_SHOWN = 2 ** -50;

/** The refusal of a loop whose joint system is singular. `blocks` are indices in document order. */
export function loopWithoutSolution(drawing: FlatDrawing, blocks: readonly number[]): Problem {
  return problem(
    'loop-without-solution',
    `The algebraic loop through ${listTitles(drawing, blocks)} has no unique solution. ` +
      'Change a gain or put an integrator in it.',
    { blocks: pathsOf(drawing, blocks) },
  );
}

/**
 * The warning for a loop that small changes of its gains leave without solution.
 *
 * @param distance  The relative change that does, as `relativeDistanceToSingular` gives it.
 */
export function nearlySingularLoop(drawing: FlatDrawing, blocks: readonly number[], distance: number): Warning {
  const figure = distance < SMALLEST_SHOWN ? 'less than 1e-15' : distance.toExponential(0);
  return {
    code: 'nearly-singular-loop',
    blocks: pathsOf(drawing, blocks),
    message:
      `The algebraic loop through ${listTitles(drawing, blocks)} is nearly without a solution: ` +
      `changing its gains by ${figure} of their values can take it away. Check the gains.`,
  };
}

/** Paths of the blocks. */
export function pathsOf({ blocks }: FlatDrawing, indices: readonly number[]): string[] {
  return indices.map(b => blocks[b]!.path);
}

/** `gain a, gain b and summing point c`; blocks on the boundary of a group are left out where others are there. */
export function listTitles({ blocks }: FlatDrawing, indices: readonly number[]): string {
  const inside = indices.filter(b => blocks[b]!.role !== 'boundary');
  return listed((inside.length > 0 ? inside : indices).map(b => titleOf(blocks[b]!)));
}

function listed(titles: readonly string[]): string {
  if (titles.length > BLOCKS_LISTED) {
    const left = titles.length - BLOCKS_LISTED;
    return `${titles.slice(0, BLOCKS_LISTED).join(', ')} and ${left} more block${left === 1 ? '' : 's'}`;
  }
  return titles.length < 2 ? titles.join() : `${titles.slice(0, -1).join(', ')} and ${titles.at(-1)}`;
}
