/** Asks the law of every block; collects all problems before it gives up. */

import type { Problem, Result, Warning } from '../../problem/index.ts';
import { type FlatBlock, titleAtStart } from '../flatten/index.ts';
import type { IrrationalBlock, QuantityReader } from '../quantities/index.ts';
import type { Contribution } from './contribution.ts';
import { contributionOf } from './laws.ts';

export interface BlockReadings<T> {
  /** One for each block; null for external inputs and outputs, which contribute nothing of their own. */
  readonly contributions: readonly (Contribution<T> | null)[];
  /** `order-lowered`, in document order. */
  readonly warnings: readonly Warning[];
  /** Blocks in which something irrational was read, in document order. */
  readonly irrational: readonly IrrationalBlock[];
}

/**
 * The contributions of all blocks, or every problem of their fields with the block's name in front.
 *
 * @param takeIrrational  The irrational texts read since the last call; absent where nobody asks.
 */
export function readContributions<T>(
  blocks: readonly FlatBlock[],
  reader: QuantityReader<T> & { takeIrrational?(): readonly string[] },
): Result<BlockReadings<T>> {
  const contributions: (Contribution<T> | null)[] = [];
  const problems: Problem[] = [];
  const warnings: Warning[] = [];
  const irrational: IrrationalBlock[] = [];
  for (const flat of blocks) {
    const contribution = flat.role === 'external' ? null : contributionOf(flat.block, reader);
    if (contribution === null) contributions.push(null);
    else if (contribution.ok) {
      contributions.push(contribution.value);
      for (const sentence of contribution.value.lowered) warnings.push(orderLowered(flat, sentence));
    } else problems.push(...contribution.problems.map(problem => ofBlock(flat, problem)));
    const texts = reader.takeIrrational?.() ?? [];
    if (texts.length > 0) irrational.push({ path: flat.path, title: titleAtStart(flat), texts });
  }
  return problems.length > 0 ? { ok: false, problems } : { ok: true, value: { contributions, warnings, irrational } };
}

function ofBlock(flat: FlatBlock, problem: Problem): Problem {
  return { ...problem, blocks: [flat.path], message: `${titleAtStart(flat)}: ${problem.message}` };
}

function orderLowered(flat: FlatBlock, sentence: string): Warning {
  return { code: 'order-lowered', blocks: [flat.path], message: `${titleAtStart(flat)}: ${sentence}` };
}
