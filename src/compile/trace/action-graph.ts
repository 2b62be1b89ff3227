/**
 * The drawing as a signal-flow graph (Mason 1953, Proc. IRE 41): what every state's derivative, signal and output is made of, one
 * branch for each coefficient of a block's law and each port it reads. Made from the laws alone; the elimination has no part
 * in it. A block that differentiates reads the time derivative of a signal, which is a node of its own, one level up.
 */

import type { Rational } from '../../algebra/index.ts';
import { type FlatDrawing, OPEN } from '../flatten/index.ts';
import type { Contribution } from '../kinds/index.ts';

/** The `level`-th derivative of a state, an external input or a signal, by its number; an output has level 0. */
export interface ActionNode {
  readonly kind: 'state' | 'input' | 'signal' | 'output';
  readonly index: number;
  readonly level: number;
}

/** Which coefficient of the block's law a branch carries; `unit` is a 1 that no block has written. */
export interface Coefficient {
  readonly from: 'A' | 'B' | 'C' | 'D' | 'derivatives' | 'unit';
  readonly row: number;
  readonly column: number;
}

export interface Branch {
  readonly from: number;
  readonly to: number;
  /** Index of the block whose law it is part of. */
  readonly block: number;
  /** Input port of the flat drawing through which it enters the block; null where it begins in the block. */
  readonly port: number | null;
  readonly coefficient: Coefficient;
  readonly gain: Rational;
}

export interface ActionGraph {
  readonly nodes: readonly ActionNode[];
  readonly branches: readonly Branch[];
  /** For each node the numbers of the branches that end or begin there. */
  readonly incoming: readonly (readonly number[])[];
  readonly outgoing: readonly (readonly number[])[];
  /** Nodes that were not opened, since every further derivative would need another: a differentiation that acts as a lag. */
  readonly endless: ReadonlySet<number>;
  /** The number of a node, −1 where nothing needs it. */
  numberOf(node: ActionNode): number;
  /** For each state and each input the index of the block it belongs to. */
  readonly stateBlocks: readonly number[];
  readonly inputBlocks: readonly number[];
}

/**
 * The graph of everything that a state's derivative or an output needs. Branches of gain zero are left out, except those of
 * gains, which may have any other value. Linear in the coefficients for each level of differentiation.
 *
 * @param contributions  One for each block; null for external inputs and outputs.
 */
export function actionGraph(
  drawing: FlatDrawing,
  contributions: readonly (Contribution<Rational> | null)[],
): ActionGraph {
  const builder = new GraphBuilder(drawing, contributions);
  builder.stateOwners.forEach((_, index) => {
    builder.reach({ kind: 'state', index, level: 1 });
  });
  builder.outputBlocks.forEach((_, index) => {
    builder.reach({ kind: 'output', index, level: 0 });
  });
  builder.openAll();
  return builder.finished();
}

class GraphBuilder {
  readonly stateOwners: number[] = [];
  readonly outputBlocks: number[] = [];
  private readonly drawing: FlatDrawing;
  private readonly contributions: readonly (Contribution<Rational> | null)[];
  private readonly inputBlocks: number[] = [];
  private readonly firstState: number[] = [];
  private readonly inputOfBlock = new Map<number, number>();
  private readonly signalOwners: number[] = [];
  private readonly nodes: ActionNode[] = [];
  private readonly numbers = new Map<string, number>();
  private readonly branches: Branch[] = [];
  private readonly endless = new Set<number>();
  /** Derivatives above this can only come of a differentiation that feeds itself: each block raises the level once. */
  private readonly highestLevel: number;

  constructor(drawing: FlatDrawing, contributions: readonly (Contribution<Rational> | null)[]) {
    this.drawing = drawing;
    this.contributions = contributions;
    drawing.blocks.forEach(({ block, role }, b) => {
      const own = contributions[b];
      this.firstState.push(this.stateOwners.length);
      own?.states.forEach(() => {
        this.stateOwners.push(b);
      });
      for (let s = drawing.signalStart[b]!; s < drawing.signalStart[b + 1]!; s++) this.signalOwners.push(b);
      if (role !== 'external') return;
      if (block.kind === 'output') this.outputBlocks.push(b);
      if (block.kind === 'input') this.inputOfBlock.set(b, this.inputBlocks.push(b) - 1);
    });
    this.highestLevel = contributions.reduce((sum, own) => sum + (own?.derivatives.length ?? 0), 1);
  }

  /** The node's number, a new one where it is met for the first time. */
  reach(node: ActionNode): number {
    const key = keyOf(node);
    const before = this.numbers.get(key);
    if (before !== undefined) return before;
    const number = this.nodes.push(node) - 1;
    this.numbers.set(key, number);
    return number;
  }

  openAll(): void {
    for (let number = 0; number < this.nodes.length; number++) {
      const node = this.nodes[number]!;
      if (node.level > this.highestLevel) this.endless.add(number);
      else this.open(node, number);
    }
  }

  finished(): ActionGraph {
    const { nodes, branches, endless, numbers } = this;
    const incoming: number[][] = nodes.map(() => []);
    const outgoing: number[][] = nodes.map(() => []);
    branches.forEach(({ from, to }, k) => {
      incoming[to]!.push(k);
      outgoing[from]!.push(k);
    });
    return {
      ...{ nodes, branches, incoming, outgoing, endless },
      numberOf: node => numbers.get(keyOf(node)) ?? -1,
      stateBlocks: this.stateOwners,
      inputBlocks: this.inputBlocks,
    };
  }

  private open({ kind, index, level }: ActionNode, to: number): void {
    switch (kind) {
      case 'state':
        return level === 0 ? undefined : this.openState(index, level, to);
      case 'signal':
        return this.openSignal(index, level, to);
      case 'output':
        return this.read(this.outputBlocks[index]!, 0, 0, to, UNIT, ONE);
      case 'input':
        return undefined;
      default:
        return kind satisfies never;
    }
  }

  private openState(state: number, level: number, to: number): void {
    const b = this.stateOwners[state]!;
    const own = this.contributions[b]!;
    const row = state - this.firstState[b]!;
    own.A[row]?.forEach((gain, column) => {
      this.readState(b, column, level - 1, to, { from: 'A', row, column }, gain);
    });
    own.B[row]?.forEach((gain, column) => {
      this.read(b, column, level - 1, to, { from: 'B', row, column }, gain);
    });
  }

  private openSignal(signal: number, level: number, to: number): void {
    const b = this.signalOwners[signal]!;
    const own = this.contributions[b];
    if (own === null || own === undefined) {
      const from = this.reach({ kind: 'input', index: this.inputOfBlock.get(b)!, level });
      this.branches.push({ from, to, block: b, port: null, coefficient: UNIT, gain: ONE });
      return;
    }
    const row = signal - this.drawing.signalStart[b]!;
    own.C[row]?.forEach((gain, column) => {
      this.readState(b, column, level, to, { from: 'C', row, column }, gain);
    });
    own.D[row]?.forEach((gain, column) => {
      this.read(b, column, level, to, { from: 'D', row, column }, gain);
    });
    own.derivatives.forEach((gain, column) => {
      this.read(b, 0, level + 1 + column, to, { from: 'derivatives', row, column }, gain);
    });
  }

  private readState(
    b: number,
    column: number,
    level: number,
    to: number,
    coefficient: Coefficient,
    gain: Rational,
  ): void {
    if (gain.n === 0n) return;
    const from = this.reach({ kind: 'state', index: this.firstState[b]! + column, level });
    this.branches.push({ from, to, block: b, port: null, coefficient, gain });
  }

  private read(b: number, input: number, level: number, to: number, coefficient: Coefficient, gain: Rational): void {
    const { blocks, inputStart, source } = this.drawing;
    const port = inputStart[b]! + input;
    const signal = source[port]!;
    if (signal === OPEN || (gain.n === 0n && blocks[b]!.block.kind !== 'gain')) return;
    const from = this.reach({ kind: 'signal', index: signal, level });
    this.branches.push({ from, to, block: b, port, coefficient, gain });
  }
}

const ONE: Rational = { n: 1n, d: 1n };
const UNIT: Coefficient = { from: 'unit', row: 0, column: 0 };

function keyOf({ kind, index, level }: ActionNode): string {
  return `${kind} ${index} ${level}`;
}

/** The nodes that branches lead to from the given ones, those included; backwards those that lead to them. */
export function reachedFrom(
  graph: ActionGraph,
  start: readonly number[],
  way: 'forwards' | 'backwards',
): ReadonlySet<number> {
  const found = new Set(start);
  for (const node of found) {
    const next = way === 'forwards' ? graph.outgoing[node]! : graph.incoming[node]!;
    for (const k of next) found.add(way === 'forwards' ? graph.branches[k]!.to : graph.branches[k]!.from);
  }
  return found;
}
