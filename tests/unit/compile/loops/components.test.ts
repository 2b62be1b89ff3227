import { expect, test } from 'vitest';
import { type Graph, stronglyConnectedComponents } from '../../../../src/compile/loops/index.ts';

function graphOf(edges: readonly (readonly number[])[]): Graph {
  const start = [0];
  const target: number[] = [];
  for (const targets of edges) {
    target.push(...targets);
    start.push(target.length);
  }
  return { nodes: edges.length, start, target, offset: 0 };
}

function componentsOf(edges: readonly (readonly number[])[]): number[][] {
  const graph = graphOf(edges);
  const roots = edges.map((_, node) => node);
  const { count, start, member } = stronglyConnectedComponents(graph, roots);
  return Array.from({ length: count }, (_, c) => [...member.slice(start[c], start[c + 1])].sort((a, b) => a - b));
}

test('each component comes after those that its edges lead to', () => {
  expect(componentsOf([[1], [2], []])).toEqual([[2], [1], [0]]);
});

test('nodes on a cycle are one component', () => {
  expect(componentsOf([[1], [2], [0, 3], []])).toEqual([[3], [0, 1, 2]]);
});

test('interlocked cycles are one component, cycles joined one way are two', () => {
  expect(componentsOf([[1], [2, 3], [0], [4], [5], [3, 6], [6]])).toEqual([[6], [3, 4, 5], [0, 1, 2]]);
});

test('targets below the offset are no edges', () => {
  const graph: Graph = { nodes: 2, start: [0, 2, 3], target: [0, 4, 1], offset: 3 };
  const { count, member } = stronglyConnectedComponents(graph, [0, 1]);
  expect(count).toBe(2);
  expect([...member]).toEqual([1, 0]);
});

test('only what the roots reach is visited', () => {
  const { count, member } = stronglyConnectedComponents(graphOf([[1], [], [0]]), [1]);
  expect([count, ...member]).toEqual([1, 1]);
});

test('a chain of 200,000 nodes closed to a ring needs no deep stack', () => {
  const n = 200_000;
  const graph: Graph = {
    nodes: n,
    start: Int32Array.from({ length: n + 1 }, (_, v) => v),
    target: Int32Array.from({ length: n }, (_, v) => (v + 1) % n),
    offset: 0,
  };
  expect(stronglyConnectedComponents(graph, [0]).count).toBe(1);
});
