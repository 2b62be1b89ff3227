/**
 * The cheapest way on the grid from a net's tree to a port: A* (Hart, Nilsson & Raphael 1968) over (node, direction of
 * travel), so that bends have a price. Lengths are dearer close to blocks, labels and parallel wires; a wire of another
 * net may only be crossed straight. Promises the same way for the same grid.
 */

import { GRID } from '../geometry/index.ts';
import { CheapestFirst } from './cheapest-first.ts';
import {
  BLOCKED,
  LABEL,
  LEVEL_CROWD,
  NEAR,
  type SheetGrid,
  STANDING,
  STUB_END,
  TIGHT,
  UPRIGHT_CROWD,
} from './sheet-grid.ts';

/** Prices in units of length on free paper, found by looking at drawings. */
export const PRICES = {
  bend: 24,
  crossing: 50,
  stubCrossing: 60,
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
  readonly own: Pick<ReadonlySet<number>, 'has'>;
  /** Columns and rows between which the way is sought. */
  readonly window: { readonly left: number; readonly right: number; readonly top: number; readonly bottom: number };
  /** Where vertical pieces rather lie, where it makes no other difference; null for anywhere. */
  readonly middle: number | null;
  /**
   * What the remaining length counts for over itself: 1 finds the cheapest way, more of it finds a good one sooner
   * (Pohl 1970).
   */
  readonly haste: number;
  /** Steps after which the search is given up. */
  readonly patience: number;
}

/** Steps on one grid, some two seconds: a sheet that is too dense to route ends in elbows and not in waiting. */
const MOST_STEPS = 4_000_000;

const BEGUN = 0;
const TURNED = 1;
const ONWARDS = 2;
const BACK = 3;

/** Room for searches on one grid; its arrays are used again and again. */
export interface Searcher {
  readonly grid: SheetGrid;
  readonly costs: Float32Array;
  /** How the state was reached: `BEGUN`, `TURNED`, or by a step onwards or back along the line. */
  readonly origins: Uint8Array;
  /** Number of the search that wrote the entry; negative once the entry is settled. */
  readonly marks: Int32Array;
  /** Prices of a unit of length for level and for upright travel, by what stands at a node. */
  readonly weights: readonly [level: Float64Array, upright: Float64Array];
  readonly queue: CheapestFirst;
  search: number;
  /** Steps that all further searches together may take. */
  stepsLeft: number;
}

/** Prepares searches on a grid. State 2 · node is travel along the row, 2 · node + 1 along the column. */
export function searcher(grid: SheetGrid): Searcher {
  const states = 2 * grid.surroundings.length;
  return {
    grid,
    costs: new Float32Array(states),
    origins: new Uint8Array(states),
    marks: new Int32Array(states),
    weights: [weightsOf(LEVEL_CROWD), weightsOf(UPRIGHT_CROWD)],
    queue: new CheapestFirst(),
    search: 0,
    stepsLeft: MOST_STEPS,
  };
}

/** Price of a unit of length by what stands at a node, for travel that `crowd` marks as crowded. */
function weightsOf(crowd: number): Float64Array {
  return Float64Array.from({ length: 64 }, (_, code) => {
    const standing = code & STANDING;
    const base = standing === NEAR ? PRICES.near : standing === TIGHT || standing === BLOCKED ? PRICES.tight : 1;
    return base * (code & LABEL ? PRICES.label : 1) * (code & crowd ? PRICES.crowded : 1);
  });
}

/** Nodes of the cheapest way from a beginning to the goal, both included; `none` where the window holds no way. */
export function cheapestWay(space: Searcher, question: SearchQuestion): readonly number[] | 'none' | 'given-up' {
  return new Search(space, question).run();
}

/** One search: the inner loop of the router, so plain loops over typed arrays. */
class Search {
  private readonly space: Searcher;
  private readonly question: SearchQuestion;
  private readonly grid: SheetGrid;
  private readonly mark: number;
  private readonly goalX: number;
  private readonly goalY: number;

  constructor(space: Searcher, question: SearchQuestion) {
    this.space = space;
    this.question = question;
    this.grid = space.grid;
    space.search += 1;
    this.mark = space.search;
    space.queue.clear();
    this.goalX = this.grid.xs[question.goal % this.grid.columns]!;
    this.goalY = this.grid.ys[Math.floor(question.goal / this.grid.columns)]!;
  }

  run(): readonly number[] | 'none' | 'given-up' {
    const { queue, marks } = this.space;
    const { beginnings, goal, goalAxis } = this.question;
    const patience = Math.min(this.question.patience, this.space.stepsLeft);
    for (const { node, axis, cost } of beginnings) this.reach(2 * node + (axis === 'vertical' ? 1 : 0), cost, BEGUN);
    for (let steps = 0; steps < patience; steps += 1) {
      const state = queue.pop();
      if (state < 0) return 'none';
      if (marks[state] === -this.mark) continue;
      marks[state] = -this.mark;
      const isThere = state >> 1 === goal && (goalAxis === null || (goalAxis === 'vertical') === ((state & 1) === 1));
      if (isThere) return this.way(state);
      this.space.stepsLeft -= 1;
      this.expand(state);
    }
    return 'given-up';
  }

  private way(last: number): readonly number[] {
    const { origins } = this.space;
    const nodes = [last >> 1];
    for (let state = last; origins[state] !== BEGUN; ) {
      const origin = origins[state]!;
      const stride = 2 * (state & 1 ? this.grid.columns : 1);
      if (origin === TURNED) state ^= 1;
      else state += origin === ONWARDS ? -stride : stride;
      if (origin !== TURNED) nodes.push(state >> 1);
    }
    return nodes.reverse();
  }

  private expand(state: number): void {
    const { grid, space } = this;
    const { net, window } = this.question;
    const node = state >> 1;
    const column = node % grid.columns;
    const row = (node - column) / grid.columns;
    const isUpright = (state & 1) === 1;
    const across = isUpright ? grid.horizontalNet[node]! : grid.verticalNet[node]!;
    if (across === 0 || across === net) this.reach(state ^ 1, space.costs[state]! + PRICES.bend, TURNED);
    if (isUpright) {
      if (row > window.top) this.step(state, node - grid.columns, grid.ys[row]! - grid.ys[row - 1]!, BACK);
      if (row < window.bottom) this.step(state, node + grid.columns, grid.ys[row + 1]! - grid.ys[row]!, ONWARDS);
    } else {
      if (column > window.left) this.step(state, node - 1, grid.xs[column]! - grid.xs[column - 1]!, BACK);
      if (column < window.right) this.step(state, node + 1, grid.xs[column + 1]! - grid.xs[column]!, ONWARDS);
    }
  }

  /** One piece of line further in the direction of travel, to node `next`. */
  private step(state: number, next: number, length: number, origin: number): void {
    const { grid, space } = this;
    const { net, own, goal, middle } = this.question;
    const isUpright = (state & 1) === 1;
    const along = isUpright ? grid.verticalNet[next]! : grid.horizontalNet[next]!;
    if (along !== 0 && along !== net) return;
    const there = grid.surroundings[next]!;
    if (next !== goal && ((there & STANDING) === BLOCKED || own.has(next))) return;
    const weights = space.weights[isUpright ? 1 : 0];
    let weight = Math.max(weights[there]!, weights[grid.surroundings[state >> 1]!]!);
    const lane = isUpright ? grid.xs[next % grid.columns]! : grid.ys[Math.floor(next / grid.columns)]!;
    if (lane % GRID !== 0) weight *= PRICES.offGrid;
    if (isUpright && middle !== null) weight *= 1 + PRICES.offMiddle * Math.abs(lane - middle);
    const across = isUpright ? grid.horizontalNet[next]! : grid.verticalNet[next]!;
    const isCrossing = across !== 0 && across !== net;
    const crossing = isCrossing ? PRICES.crossing + (there & STUB_END ? PRICES.stubCrossing : 0) : 0;
    this.reach(2 * next + (state & 1), space.costs[state]! + weight * length + crossing, origin);
  }

  private reach(state: number, cost: number, origin: number): void {
    const { marks, costs, origins, queue } = this.space;
    if (marks[state] === -this.mark) return;
    if (marks[state] === this.mark && costs[state]! <= cost) return;
    marks[state] = this.mark;
    costs[state] = cost;
    origins[state] = origin;
    queue.push(state, cost + this.leastRemaining(state));
  }

  /** What the rest costs at least: its length and the bends that no way can avoid. */
  private leastRemaining(state: number): number {
    const { grid } = this;
    const { goalAxis, haste } = this.question;
    const node = state >> 1;
    const column = node % grid.columns;
    const dx = Math.abs(grid.xs[column]! - this.goalX);
    const dy = Math.abs(grid.ys[(node - column) / grid.columns]! - this.goalY);
    const isUpright = (state & 1) === 1;
    let bends = (isUpright ? dx : dy) > 0 ? 1 : 0;
    if (goalAxis !== null) bends = (goalAxis === 'vertical') === isUpright ? 2 * bends : 1;
    return haste * (dx + dy) + PRICES.bend * bends;
  }
}
