/**
 * The action paths from one node of a signal-flow graph to another and the loops they can meet, each listed once, up to a stated
 * number: there may be exponentially many.
 */

import type { ActionGraph } from './action-graph.ts';

/** How much is listed before it is given up. */
export interface ListingLimits {
  readonly paths: number;
  readonly loops: number;
  /** Branches that the searches may follow together. */
  readonly steps: number;
}

/** More than a reader takes in, and a few milliseconds of search. */
export const LISTING_LIMITS: ListingLimits = { paths: 64, loops: 64, steps: 200_000 };

/** Branches in order, by their numbers. */
export type BranchList = readonly number[];

export type Listing =
  | { readonly complete: true; readonly paths: readonly BranchList[]; readonly loops: readonly BranchList[] }
  | { readonly complete: false; readonly met: keyof ListingLimits };

/**
 * Every path from `source` to `sink` that visits no node twice, and every loop among `within`, no node twice either, by search
 * in depth (loops as Tiernan 1970, Comm. ACM 13, each from its smallest node). Branches of gain zero are not followed. In the
 * order of the branches.
 *
 * @param within  The nodes that some way from source to sink passes.
 */
export function pathsAndLoops(
  graph: ActionGraph,
  source: number,
  sink: number,
  within: ReadonlySet<number>,
  limits: ListingLimits = LISTING_LIMITS,
): Listing {
  if (!within.has(source)) return { complete: true, paths: [], loops: [] };
  const search: Search = { graph, within, stepsLeft: limits.steps };
  const paths = walksTo(search, source, sink, -1, limits.paths);
  if (paths === null) return { complete: false, met: search.stepsLeft < 0 ? 'steps' : 'paths' };
  const loops: BranchList[] = [];
  for (const start of [...within].sort((a, b) => a - b)) {
    const found = walksTo(search, start, start, start - 1, limits.loops - loops.length);
    if (found === null) return { complete: false, met: search.stepsLeft < 0 ? 'steps' : 'loops' };
    loops.push(...found);
  }
  return { complete: true, paths, loops };
}

interface Search {
  readonly graph: ActionGraph;
  readonly within: ReadonlySet<number>;
  stepsLeft: number;
}

/** All walks of at least one branch over nodes above `floor`, none twice but for the ends; null beyond `most` or the steps. */
function walksTo(search: Search, source: number, sink: number, floor: number, most: number): BranchList[] | null {
  const { graph, within } = search;
  const walks: BranchList[] = [];
  const walk: number[] = [];
  const next: number[] = [0];
  const nodes: number[] = [source];
  const visited = new Set([source]);
  while (nodes.length > 0) {
    const node = nodes.at(-1)!;
    const place = next[next.length - 1]!;
    const k = graph.outgoing[node]![place];
    if (k === undefined) {
      nodes.pop();
      next.pop();
      walk.pop();
      visited.delete(node);
      continue;
    }
    next[next.length - 1] = place + 1;
    const { to, gain } = graph.branches[k]!;
    search.stepsLeft -= 1;
    if (search.stepsLeft < 0) return null;
    if (gain.n === 0n || !within.has(to)) continue;
    if (to === sink) {
      if (walks.length === most) return null;
      walks.push([...walk, k]);
    } else if (to > floor && !visited.has(to)) {
      visited.add(to);
      nodes.push(to);
      next.push(0);
      walk.push(k);
    }
  }
  return walks;
}
