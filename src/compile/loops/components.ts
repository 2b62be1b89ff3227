/**
 * Strongly connected components of a sparse graph: the loops of a drawing. Without recursion, so that a chain of 100,000
 * blocks needs no deep stack.
 */

/** Node v has the edges target[k] for start[v] ≤ k < start[v + 1]. A target below `offset` is none; others count from it. */
export interface Graph {
  readonly nodes: number;
  readonly start: ArrayLike<number>;
  readonly target: ArrayLike<number>;
  readonly offset: number;
}

/** Component c holds member[i] for start[c] ≤ i < start[c + 1]. */
export interface Components {
  readonly count: number;
  readonly start: Int32Array;
  readonly member: Int32Array;
}

/**
 * The components, each after all those that its members' edges lead to: with edges from a signal to what it depends on,
 * the order in which signals can be resolved. Only nodes that the roots reach are visited.
 *
 * @param roots  Where the search starts, in this order.
 * Tarjan 1972, SIAM J. Comput. 1, with an explicit stack. Linear in nodes and edges.
 */
export function stronglyConnectedComponents(graph: Graph, roots: ArrayLike<number>): Components {
  const search = newSearch(graph);
  for (let i = 0; i < roots.length; i++) {
    if (search.order[roots[i]!] === 0) visitFrom(search, roots[i]!);
  }
  return {
    count: search.components,
    start: search.componentStart.slice(0, search.components + 1),
    member: search.member.slice(0, search.placed),
  };
}

interface Search {
  readonly graph: Graph;
  /** When a node was first met, counted from 1; 0 before, `DONE` once its component is complete. */
  readonly order: Int32Array;
  /** Smallest `order` that the node is known to reach. */
  readonly low: Int32Array;
  /** Path from the root to the node in hand, and the next edge of each node on it. */
  readonly path: Int32Array;
  readonly nextEdge: Int32Array;
  /** Nodes met whose component is not complete. */
  readonly pending: Int32Array;
  pendingCount: number;
  met: number;
  readonly member: Int32Array;
  placed: number;
  readonly componentStart: Int32Array;
  components: number;
}

const DONE = 0x7fffffff;

function newSearch(graph: Graph): Search {
  const buffer = (length: number) => new Int32Array(length);
  const n = graph.nodes;
  return {
    graph,
    order: buffer(n),
    low: buffer(n),
    path: buffer(n),
    nextEdge: buffer(n),
    pending: buffer(n),
    pendingCount: 0,
    met: 0,
    member: buffer(n),
    placed: 0,
    componentStart: buffer(n + 1),
    components: 0,
  };
}

function visitFrom(search: Search, root: number): void {
  const { graph, order, low, path, nextEdge } = search;
  path[0] = root;
  let depth = 1;
  meet(search, root);
  while (depth > 0) {
    const node = path[depth - 1]!;
    if (nextEdge[node]! < graph.start[node + 1]!) {
      const target = graph.target[nextEdge[node]!]! - graph.offset;
      nextEdge[node]! += 1;
      if (target < 0) continue;
      if (order[target] === 0) {
        path[depth] = target;
        depth += 1;
        meet(search, target);
      } else if (order[target]! < low[node]!) low[node] = order[target]!;
    } else {
      depth -= 1;
      if (depth > 0 && low[node]! < low[path[depth - 1]!]!) low[path[depth - 1]!] = low[node]!;
      if (low[node] === order[node]) completeComponent(search, node);
    }
  }
}

function meet(search: Search, node: number): void {
  search.met += 1;
  search.order[node] = search.met;
  search.low[node] = search.met;
  search.nextEdge[node] = search.graph.start[node]!;
  search.pending[search.pendingCount] = node;
  search.pendingCount += 1;
}

function completeComponent(search: Search, root: number): void {
  let node: number;
  do {
    search.pendingCount -= 1;
    node = search.pending[search.pendingCount]!;
    search.order[node] = DONE;
    search.member[search.placed] = node;
    search.placed += 1;
  } while (node !== root);
  search.components += 1;
  search.componentStart[search.components] = search.placed;
}
