/** What the newest derivation says about one block: wrong, or in an algebraic loop. */

import type { ResultsSlice, State } from '../store/index.ts';
import { useStore } from '../store/index.ts';

export type BlockMark = 'wrong' | 'loop' | null;

export function useBlockMark(id: string): BlockMark {
  return useStore((state: State) => {
    const { wrong, loop } = markedBlocks(state.results);
    return wrong.has(id) ? 'wrong' : loop.has(id) ? 'loop' : null;
  });
}

interface MarkedBlocks {
  readonly wrong: ReadonlySet<string>;
  readonly loop: ReadonlySet<string>;
}

/** Worked out once for each answer, not once a block. */
const known = new WeakMap<object, MarkedBlocks>();

function markedBlocks({ problems, derivation }: ResultsSlice): MarkedBlocks {
  const answer = derivation ?? problems;
  const before = known.get(answer);
  if (before !== undefined) return before;
  const marked = {
    wrong: new Set(problems.flatMap(({ blocks }) => blocks.map(topOf))),
    loop: new Set(derivation?.loops.flatMap(({ blocks }) => blocks.map(topOf)) ?? []),
  };
  known.set(answer, marked);
  return marked;
}

/** The block of the top sheet that a path leads through. */
function topOf(path: string): string {
  return path.split('.', 1)[0] ?? path;
}
