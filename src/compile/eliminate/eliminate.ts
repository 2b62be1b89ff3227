/**
 * Fourth pass: eliminates the signals, so that what states, differentiated signals and outputs are fed stands in knowns
 * alone. A signal outside loops is substituted, a loop solved as one linear system. Runs over whatever field it is given.
 */

import { copyRow, type Equations, isSameRow, RowAccumulator, RowStore } from '../equations/index.ts';
import {
  inDoubles,
  type LoopSolver,
  loopSolver,
  loopSystem,
  relativeDistanceToSingular,
  type SignalOrder,
} from '../loops/index.ts';
import {
  type Changes,
  changesSince,
  charged,
  type EliminationRecord,
  hasChangedEquation,
  isReached,
  type KeptElimination,
  newRecord,
  spentSoFar,
} from './kept-elimination.ts';

/** An algebraic loop as elimination found it. */
export interface SolvedLoop {
  /** Its signals, ascending. */
  readonly signals: Int32Array;
  /** Over an exact field whether det(I − M) is zero; in doubles whether it could be, within rounding. */
  readonly isSingular: boolean;
  /** `relativeDistanceToSingular`; null where it was not asked for. */
  readonly distance: number | null;
}

export interface Elimination<T> {
  /** The loops in the order of their first signal. */
  readonly loops: readonly SolvedLoop[];
  /** Rows over the knowns: state derivatives, differentiated signals, outputs, in this order. Null where a loop is singular. */
  readonly reduced: RowStore<T> | null;
  /** What the elimination of equations with the same places may start from, once; null where a loop is singular. */
  readonly kept: KeptElimination<T> | null;
}

export interface EliminationOptions<T> {
  /** Whether the distance of each loop to a singular one is measured. */
  readonly measureLoops: boolean;
  /**
   * An earlier elimination over the same arithmetic and order, of equations with the same places. Only what its changed
   * equations reach is done again, with the same result and the same effort counted; it is used up.
   */
  readonly former?: KeptElimination<T> | null;
}

/**
 * Eliminates all signals that something needs; loops among the others are only looked at. Costs the terms of the rows
 * that come out, and for each loop what its elimination fills in. The largest buffer is that of one loop, its signals × the
 * knowns that reach it.
 */
export function eliminate<T>(
  equations: Equations<T>,
  order: SignalOrder,
  { measureLoops, former = null }: EliminationOptions<T>,
): Elimination<T> {
  const work = newWork(equations, order, former);
  const loops: SolvedLoop[] = [];
  let anySingular = false;
  const { components, isLoop, isNeeded } = order;
  for (let c = 0; c < components.count; c++) {
    const members = components.member.subarray(components.start[c], components.start[c + 1]);
    const wanted = isNeeded[c] === 1 && !anySingular;
    if (isLoop[c] === 1) {
      const { distance, solver } = examined(work, c, members, measureLoops);
      const isSolved = solver !== null && (!wanted || resolved(work, c, members, solver));
      loops.push({ signals: members, isSingular: !isSolved, distance });
      if (!isSolved) anySingular = true;
    } else if (wanted) resolved(work, c, members, null);
  }
  loops.sort((a, b) => a.signals[0]! - b.signals[0]!);
  if (anySingular) return { loops, reduced: null, kept: null };
  const reduced = reducedRows(work);
  return { loops, reduced, kept: { ...work.record, equations, reduced } };
}

interface Work<T> {
  readonly equations: Equations<T>;
  /** Signals over the knowns. */
  readonly resolved: RowStore<T>;
  /** For each signal its row in `resolved`. */
  readonly rowOf: Int32Array;
  readonly row: RowAccumulator<T>;
  /** For each signal its place in the loop in hand, −1 outside it. */
  readonly place: Int32Array;
  readonly record: EliminationRecord<T>;
  readonly changes: Changes<T> | null;
}

function newWork<T>(equations: Equations<T>, order: SignalOrder, former: KeptElimination<T> | null): Work<T> {
  const { arithmetic, signals, known, rows } = equations;
  const record = former ?? newRecord(arithmetic, signals, order.components.count, rows.rows);
  return {
    equations,
    resolved: record.resolved,
    rowOf: record.rowOf,
    row: new RowAccumulator(arithmetic, known),
    place: new Int32Array(signals).fill(-1),
    record,
    changes: former === null ? null : changesSince(former, equations),
  };
}

/** The loop's examination, kept where none of its equations has changed. */
function examined<T>(work: Work<T>, c: number, members: Int32Array, measure: boolean) {
  const { record, changes } = work;
  const before = record.examinations.get(c);
  const isKept = before !== undefined && changes !== null && !hasChangedEquation(changes, members);
  const { arithmetic } = work.equations;
  if (isKept) {
    charged(arithmetic, before.cost);
    return before.value;
  }
  const spent = spentSoFar(arithmetic);
  const value = examineLoop(work, members, measure);
  record.examinations.set(c, { value, cost: spentSoFar(arithmetic) - spent });
  return value;
}

/** Gives the members of a component their rows, or leaves them those that they have; false where its loop is singular. */
function resolved<T>(work: Work<T>, c: number, members: Int32Array, solver: LoopSolver<T> | null): boolean {
  const { equations, record, changes, rowOf } = work;
  const { arithmetic } = equations;
  if (changes !== null && !isReached(changes, equations, members)) {
    charged(arithmetic, record.costs[c]!);
    return true;
  }
  const before = changes === null ? null : Int32Array.from(members, signal => rowOf[signal]!);
  const spent = spentSoFar(arithmetic);
  let value = true;
  if (solver === null) resolveSignal(work, members[0]!);
  else value = resolveLoop(work, members, solver);
  record.costs[c] = spentSoFar(arithmetic) - spent;
  before?.forEach((row, i) => {
    const signal = members[i]!;
    if (changes !== null && !isSameRow(arithmetic, work.resolved, row, rowOf[signal]!)) changes.signal[signal] = 1;
  });
  return value;
}

/** Adds the equation's terms up with every signal outside the loop in hand replaced by what it is in knowns. */
function addResolved<T>({ equations, resolved, rowOf, row, place }: Work<T>, equation: number): void {
  const { rows, known } = equations;
  for (let k = rows.start[equation]!; k < rows.start[equation + 1]!; k++) {
    const signal = rows.column[k]! - known;
    if (signal < 0) row.add(rows.column[k]!, rows.values[k]!);
    else if (place[signal] === -1) row.addRow(resolved, rowOf[signal]!, rows.values[k]!);
  }
}

function resolveSignal<T>(work: Work<T>, signal: number): void {
  addResolved(work, signal);
  work.rowOf[signal] = work.row.finishRow(work.resolved);
}

/** The loop's solver, null where it is singular, and how near it is to that. */
function examineLoop<T>(work: Work<T>, members: Int32Array, measure: boolean) {
  const { arithmetic } = work.equations;
  placeMembers(work, members);
  const system = loopSystem(work.equations, members, work.place);
  forgetMembers(work, members);
  const solver = loopSolver(arithmetic, system.matrix);
  const isRounded = arithmetic.field.name === 'double';
  if (solver === null || !(measure || isRounded)) return { solver, distance: null };
  const distance = relativeDistanceToSingular(inDoubles(system, arithmetic.toDouble));
  return { solver: isRounded && distance <= withinRounding(members.length) ? null : solver, distance };
}

function placeMembers<T>({ place }: Work<T>, members: Int32Array): void {
  for (let i = 0; i < members.length; i++) place[members[i]!] = i;
}

function forgetMembers<T>({ place }: Work<T>, members: Int32Array): void {
  for (let i = 0; i < members.length; i++) place[members[i]!] = -1;
}

/** In doubles a loop nearer to a singular one than its n coefficients are rounded cannot be told from it. */
function withinRounding(n: number): number {
  return n * Number.EPSILON;
}

/**
 * Gives each signal of a loop its row over the knowns: (I − M)⁻¹ applied to what comes from outside. False where the loop
 * turns out to be singular.
 */
function resolveLoop<T>(work: Work<T>, members: Int32Array, solver: LoopSolver<T>): boolean {
  const outside = new RowStore(work.equations.arithmetic, members.length, 4 * members.length);
  placeMembers(work, members);
  for (const signal of members) {
    addResolved(work, signal);
    work.row.finishRow(outside);
  }
  forgetMembers(work, members);
  const columns = usedColumns(outside);
  const width = columns.length;
  const solution = solver(writtenOut(work, outside, columns), width);
  if (solution === null) return false;
  members.forEach((signal, i) => {
    for (let c = 0; c < width; c++) work.row.add(columns[c]!, solution[i * width + c]!);
    work.rowOf[signal] = work.row.finishRow(work.resolved);
  });
  return true;
}

function usedColumns<T>(rows: RowStore<T>): Int32Array {
  return Int32Array.from(new Set(rows.column.subarray(0, rows.length)));
}

function writtenOut<T>({ equations }: Work<T>, rows: RowStore<T>, columns: Int32Array) {
  const at = new Map(Array.from(columns, (column, c) => [column, c]));
  const dense = equations.arithmetic.allocate(rows.rows * columns.length);
  for (let i = 0; i < rows.rows; i++) {
    for (let k = rows.start[i]!; k < rows.start[i + 1]!; k++) {
      dense[i * columns.length + at.get(rows.column[k]!)!] = rows.values[k]!;
    }
  }
  return dense;
}

/** The rows behind the signals, over the knowns. */
function reducedRows<T>(work: Work<T>): RowStore<T> {
  const { record, changes } = work;
  const { arithmetic, rows, signals } = work.equations;
  const reduced = new RowStore(arithmetic, rows.rows - signals + 1, work.resolved.length + 16);
  for (let equation = signals; equation < rows.rows; equation++) {
    if (changes !== null && !isReached(changes, work.equations, [equation])) {
      copyRow(changes.reduced, equation - signals, reduced);
      charged(arithmetic, record.rowCosts[equation]!);
      continue;
    }
    const spent = spentSoFar(arithmetic);
    addResolved(work, equation);
    work.row.finishRow(reduced);
    record.rowCosts[equation] = spentSoFar(arithmetic) - spent;
  }
  return reduced;
}
