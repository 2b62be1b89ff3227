/**
 * The tree that a net's wires make: one trunk from the output port, a branch for each further wire. It remembers for
 * each node the node before it, so a wire's route is read backwards from its end.
 */

import type { Axis, Beginning } from './path-search.ts';

/** Node → node before it on the way from the output port; the first node's is −1. */
export class NetTree {
  private readonly before = new Map<number, number>();

  /** Nodes of the tree, for the search to leave alone. */
  readonly nodes: Set<number> = new Set();

  /** Distance from a node to the closest port of the net, for the nodes that were asked for: it does not change while wires are routed. */
  private readonly portDistances = new Map<number, number>();

  get isEmpty(): boolean {
    return this.nodes.size === 0;
  }

  /**
   * Adds a way; its first node is on the tree, or is the tree's first. Nodes already on it keep what is before them.
   */
  add(way: readonly number[]): void {
    way.forEach((node, index) => {
      if (this.nodes.has(node)) return;
      this.nodes.add(node);
      this.before.set(node, way[index - 1] ?? -1);
    });
  }

  /** Nodes from the output port's end of the tree to `node`. */
  wayTo(node: number): readonly number[] {
    const way: number[] = [];
    for (let at = node; at >= 0; at = this.before.get(at) ?? -1) way.push(at);
    return way.reverse();
  }

  /** What `measured` says of a node, remembered. */
  portDistance(node: number, measured: (node: number) => number): number {
    const known = this.portDistances.get(node);
    if (known !== undefined) return known;
    const distance = measured(node);
    this.portDistances.set(node, distance);
    return distance;
  }

  /** The node before; −1 for the first. */
  nodeBefore(node: number): number {
    return this.before.get(node) ?? -1;
  }
}

/**
 * Every node of a tree from which a branch may leave, with the direction in which the tree comes there.
 *
 * @param root   direction in which the output port is left.
 * @param price  what a branch costs there; infinite where there must be none.
 */
export function branchings(tree: NetTree, root: Axis, price: (node: number) => number): readonly Beginning[] {
  const beginnings: Beginning[] = [];
  for (const node of tree.nodes) {
    const before = tree.nodeBefore(node);
    const cost = price(node);
    if (cost === Number.POSITIVE_INFINITY) continue;
    const axis = before < 0 ? root : Math.abs(node - before) === 1 ? 'horizontal' : 'vertical';
    beginnings.push({ node, axis, cost });
  }
  return beginnings;
}
