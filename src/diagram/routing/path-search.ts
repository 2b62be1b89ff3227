/**
 * The cheapest way on the grid from a net's tree to a port: A* (Hart, Nilsson & Raphael 1968) over (node, direction of
 * travel), so that bends have a price. Lengths are dearer close to blocks, labels and parallel wires; a wire of another net
 * may only be crossed straight. Promises the same way for the same grid.
 */

import { CheapestFirst } from './cheapest-first.ts';
import { BLOCKED, LABEL, NEAR, type SheetGrid, TIGHT } from './sheet-grid.ts';

/** Prices in units of length on free paper, found by looking at drawings. */
export const PRICES = {
  bend: 24,
  crossing: 50,
  near: 1.5,
  tight: 8,
  label: 6,
  crowded: 1.4,
  offGrid: 1.02,
  offMiddle: 0.0004,
} as const;

/** Direction of travel. */
export type Axis = 'horizontal' | 'vertical';

/** Where a way may begin, with what it costs to begin there. */
export interface Beginning {
  readonly node: number;
  readonly axis: Axis;
  readonly cost: number;
}

export interface SearchQuestion {
  readonly beginnings: readonly Beginning[];
  readonly goal: number;
  /** Direction in which the goal is entered; null where either will do. */
  readonly goalAxis: Axis | null;
  /** Number of the net that is routed. */
  readonly net: number;
  /** Nodes of the net itself, which a way leaves and never meets again. */
  readonly own: ReadonlySet<number>;
  /** Columns and rows between which the way is sought. */
  readonly window: { readonly left: number; readonly right: number; readonly top: number; readonly bottom: number };
  /** Where vertical pieces rather lie, where it makes no other difference; null for anywhere. */
  readonly middle: number | null;
  /** What the remaining length counts for over itself: 1 finds the cheapest way, more of it finds a good one sooner (Pohl 1970). */
  readonly haste: number;
  /** Steps after which the search is given up. */
  readonly patience: number;
}

/** Room for searches on one grid; its arrays are used again and again. */
export interface Searcher {
  readonly grid: SheetGrid;
  readonly costs: Float64Array;
  readonly parents: Int32Array;
  /** Number of the search that wrote the entry; negative once the entry is settled. */
  readonly marks: Int32Array;
  readonly weights: Float64Array;
  readonly queue: CheapestFirst;
  search: number;
}

/** Prepares searches on a grid. State 2 · node is travel along the row, 2 · node + 1 along the column. */
export function searcher(grid: SheetGrid): Searcher {
  const states = 2 * grid.surroundings.length;
  const weights = new Float64Array(8);
  for (let code = 0; code < 8; code += 1) {
    const level = code & 3;
    const base = level === TIGHT ? PRICES.tight : level === NEAR ? PRICES.near : level === BLOCKED ? Infinity : 1;
    weights[code] = code & LABEL ? base * PRICES.label : base;
  }
  return {
    grid,
    costs: new Float64Array(states),
    parents: new Int32Array(states),
    marks: new Int32Array(states),
    weights,
    queue: new CheapestFirst(),
    search: 0,
  };
}

/** Nodes of the cheapest way from a beginning to the goal, both included; `none` where the window holds no way. */
export function cheapestWay(space: Searcher, question: SearchQuestion): readonly number[] | 'none' | 'given-up' {
  const search = new Search(space, question);
  return search.run();
}

/** One search: the inner loop of the router, so plain loops over typed arrays. */
class Search {
  private readonly space: Searcher;
  private readonly question: SearchQuestion;
  private readonly mark: number;
  private readonly goalX: number;
  private readonly goalY: number;

  constructor(space: Searcher, question: SearchQuestion) {
    this.space = space;
    this.question = question;
    space.search += 1;
    this.mark = space.search;
    space.queue.clear();
    this.goalX = space.grid.xs[question.goal % space.grid.columns]!;
    this.goalY = space.grid.ys[Math.floor(question.goal / space.grid.columns)]!;
  }

  run(): readonly number[] | 'none' | 'given-up' {
    const { queue, marks } = this.space;
    const { beginnings, goal, goalAxis, patience } = this.question;
    for (const { node, axis, cost } of beginnings) this.reach(2 * node + (axis === 'vertical' ? 1 : 0), cost, -1);
    for (let steps = 0; steps < patience; steps += 1) {
      const state = queue.pop();
      if (state < 0) return 'none';
      if (marks[state] === -this.mark) continue;
      marks[state] = -this.mark;
      const axis = state & 1;
      if (state >> 1 === goal && (goalAxis === null || (goalAxis === 'vertical') === (axis === 1)))
        return this.way(state);
      this.expand(state);
    }
    return 'given-up';
  }

  private way(last: number): readonly number[] {
    const nodes: number[] = [];
    for (let state = last; state >= 0; state = this.space.parents[state]!) {
      if (nodes.at(-1) !== state >> 1) nodes.push(state >> 1);
    }
    return nodes.reverse();
  }

  private expand(state: number): void {
    const { grid, costs } = this.space;
    const node = state >> 1;
    const column = node % grid.columns;
    const row = (node - column) / grid.columns;
    const { left, right, top, bottom } = this.question.window;
    const across = state & 1 ? grid.horizontalNet[node]! : grid.verticalNet[node]!;
    if (across === 0 || across === this.question.net) this.reach(state ^ 1, costs[state]! + PRICES.bend, state);
    if (state & 1) {
      if (row > top) this.step(state, node - grid.columns, row, row - 1, column);
      if (row < bottom) this.step(state, node + grid.columns, row, row + 1, column);
    } else {
      if (column > left) this.step(state, node - 1, column, column - 1, row);
      if (column < right) this.step(state, node + 1, column, column + 1, row);
    }
  }

  /** One piece further along the direction of travel, from line `from` to line `to`, on line `lane`. */
  private step(state: number, next: number, from: number, to: number, lane: number): void {
    const { grid, weights, costs } = this.space;
    const { net, own, goal, middle } = this.question;
    const vertical = (state & 1) === 1;
    const along = vertical ? grid.verticalNet[next]! : grid.horizontalNet[next]!;
    if (along !== 0 && along !== net) return;
    const there = grid.surroundings[next]!;
    if ((there & 3) === BLOCKED && next !== goal) return;
    if (own.has(next) && next !== goal) return;
    const lines = vertical ? grid.ys : grid.xs;
    const lanes = vertical ? grid.xs : grid.ys;
    const position = lanes[lane]!;
    let weight = Math.max(weights[there]!, weights[grid.surroundings[state >> 1]!]!);
    if (weight === Infinity) weight = PRICES.tight;
    if ((vertical ? grid.verticalCrowd : grid.horizontalCrowd)[next] === 1) weight *= PRICES.crowded;
    if (position % 20 !== 0) weight *= PRICES.offGrid;
    if (vertical && middle !== null) weight *= 1 + PRICES.offMiddle * Math.abs(position - middle);
    const across = vertical ? grid.horizontalNet[next]! : grid.verticalNet[next]!;
    const crossing = across !== 0 && across !== net ? PRICES.crossing : 0;
    this.reach(2 * next + (state & 1), costs[state]! + weight * Math.abs(lines[to]! - lines[from]!) + crossing, state);
  }

  private reach(state: number, cost: number, parent: number): void {
    const { marks, costs, parents, queue } = this.space;
    if (marks[state] === -this.mark) return;
    if (marks[state] === this.mark && costs[state]! <= cost) return;
    marks[state] = this.mark;
    costs[state] = cost;
    parents[state] = parent;
    queue.push(state, cost + this.leastRemaining(state));
  }

  /** What the rest costs at least: its length and the bends that no way can avoid. */
  private leastRemaining(state: number): number {
    const { grid } = this.space;
    const node = state >> 1;
    const column = node % grid.columns;
    const dx = Math.abs(grid.xs[column]! - this.goalX);
    const dy = Math.abs(grid.ys[(node - column) / grid.columns]! - this.goalY);
    const { goalAxis } = this.question;
    const axis = (state & 1) === 1 ? 'vertical' : 'horizontal';
    const aside = axis === 'vertical' ? dx : dy;
    let bends = aside > 0 ? 1 : 0;
    if (goalAxis !== null) bends = goalAxis === axis ? 2 * bends : 1;
    return this.question.haste * (dx + dy) + PRICES.bend * bends;
  }
}
