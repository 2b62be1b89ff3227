/** Everything that is known exactly about the structure of a model: hidden modes with their states, and what each state is good for. */

import { type EchelonBasis, fromRows, invariantSubspace, type Rational, toRows, ZERO } from '../../algebra/index.ts';
import type { StateSpace } from '../../compile/index.ts';
import { type Effort, type ExactModel, exactModel } from '../exact-model.ts';
import { distinguishable, type HiddenMode, hiddenModes, reachable } from '../structure.ts';
import { kalmanChangeOf } from './minimal-model.ts';
import { modeStates } from './mode-states.ts';
import type { RationalRows } from './rational-rows.ts';

/** A hidden mode and the positions of the states that take part in it. */
export interface StructuralMode extends HiddenMode {
  readonly states: readonly number[];
  /** False where the states are those of several modes together. */
  readonly isOwn: boolean;
}

/** A combination of states: positions and factors. */
export type Combination = readonly { readonly state: number; readonly factor: Rational }[];

/** What one state is good for. */
export interface Contribution {
  /** Positions of the inputs that reach it, of the outputs that it shows in. */
  readonly movedBy: readonly number[];
  readonly seenIn: readonly number[];
  /**
   * `kept` as a state of the minimal model, `combined` into some of them, `bound`: a combination of others wherever the inputs lead,
   * `unseen` or `unreached`.
   */
  readonly role: 'kept' | 'combined' | 'bound' | 'unseen' | 'unreached';
  /** The states it is bound to; empty for every other role. */
  readonly boundTo: Combination;
}

export interface StructureReport {
  readonly states: number;
  /** Dimensions of what the inputs reach and of what the outputs tell apart. */
  readonly reached: number;
  readonly seen: number;
  /** Least number of states with the same transfer functions: the McMillan degree. */
  readonly minimal: number;
  readonly standsIn: boolean;
  /** One for a complex pair, the upper one; null where the poles could not be separated. */
  readonly modes: readonly StructuralMode[] | null;
  /** In the order of the states. */
  readonly contributions: readonly Contribution[];
}

/** The report; null where the model has too many states for exact answers. One invariant subspace for each input and output. */
export function structureReport(model: StateSpace, effort: Effort = 'ordinary'): StructureReport | null {
  const exact = exactModel(model, effort);
  if (exact === null) return null;
  const { minimal } = kalmanChangeOf(exact);
  const modes = hiddenModes(model, effort);
  return {
    states: model.states.length,
    reached: reachable(exact).pivots.length,
    seen: distinguishable(exact).pivots.length,
    minimal,
    standsIn: exact.standsIn,
    modes: modes?.filter(({ im }) => im >= 0).map(mode => ({ ...mode, ...modeStates(exact, mode) })) ?? null,
    contributions: contributionsOf(exact),
  };
}

/**
 * The states that take part in each channel, outputs × inputs: those that the input reaches and that show in the output.
 * Null where the model has too many states for exact answers.
 */
export function channelStates(
  model: StateSpace,
  effort: Effort = 'ordinary',
): readonly (readonly (readonly number[])[])[] | null {
  const exact = exactModel(model, effort);
  if (exact === null) return null;
  const { byInput, byOutput } = reaches(exact);
  return byOutput.map(seen => byInput.map(moved => [...moved].filter(state => seen.has(state))));
}

interface Reaches {
  /** For each input the states it reaches, ascending; for each output those that show in it. */
  readonly byInput: readonly ReadonlySet<number>[];
  readonly byOutput: readonly ReadonlySet<number>[];
}

function reaches(exact: ExactModel): Reaches {
  const { A, B, C } = exact.matrices;
  const [rowsOfA, rowsOfB, rowsOfC] = [toRows(A, ZERO), toRows(B, ZERO), toRows(C, ZERO)];
  const n = A.rows;
  const transposedA = sparse(
    Array.from({ length: n }, (_, j) => rowsOfA.map(row => row[j]!)),
    n,
  );
  const column = (entries: readonly Rational[]) =>
    sparse(
      entries.map(entry => [entry]),
      1,
    );
  return {
    byInput: Array.from({ length: B.columns }, (_, j) =>
      statesIn(invariantSubspace(A, column(rowsOfB.map(row => row[j]!))), n),
    ),
    byOutput: rowsOfC.map(row => statesIn(invariantSubspace(transposedA, column(row)), n)),
  };
}

/** The states that some vector of the subspace has a part in, ascending. */
function statesIn({ rows }: EchelonBasis, n: number): ReadonlySet<number> {
  const states = Array.from({ length: n }, (_, i) => i);
  return new Set(states.filter(i => rows.some(row => row[i]!.n !== 0n)));
}

function contributionsOf(exact: ExactModel): Contribution[] {
  const n = exact.matrices.A.rows;
  const { byInput, byOutput } = reaches(exact);
  const { S, minimal } = kalmanChangeOf(exact);
  const { pivots, rows: V } = reachable(exact);
  const kept = S.slice(0, minimal);
  const positions = (sets: readonly ReadonlySet<number>[], state: number) =>
    sets.flatMap((set, k) => (set.has(state) ? [k] : []));
  return Array.from({ length: n }, (_, state): Contribution => {
    const isMoved = V.some(v => v[state]!.n !== 0n);
    const isBound = isMoved && !pivots.includes(state);
    const boundTo = isBound ? pivots.map((pivot, i) => ({ state: pivot, factor: V[i]![state]! })) : [];
    return {
      movedBy: positions(byInput, state),
      seenIn: positions(byOutput, state),
      role: isBound ? 'bound' : isMoved ? roleOf(state, kept) : 'unreached',
      boundTo: boundTo.filter(({ factor }) => factor.n !== 0n),
    };
  });
}

function roleOf(state: number, kept: RationalRows): 'kept' | 'combined' | 'unseen' {
  const own = kept.filter(row => row[state]!.n !== 0n);
  if (own.length === 0) return 'unseen';
  return own.some(row => row.filter(({ n }) => n !== 0n).length === 1) ? 'kept' : 'combined';
}

function sparse(rows: RationalRows, columns: number) {
  return fromRows(rows, columns, ({ n }) => n === 0n);
}
