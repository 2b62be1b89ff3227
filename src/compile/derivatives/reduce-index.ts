/**
 * Index reduction: removes the derivatives w and as many states as constraints bind, until only ξ̇ = … in the remaining
 * states and the inputs with their derivatives is left.
 */

import {
  addMultiple,
  type Descriptor,
  firstDerivative,
  firstInput,
  type Row,
  solvedFor,
  substitute,
} from './descriptor.ts';

/**
 * Reduces in place by the shuffle algorithm (Luenberger 1978, Automatica 14, Time-invariant descriptor systems): constraints
 * are solved for derivatives w as far as they hold any; one without w binds a state, which is removed, and its derivative
 * with respect to time is the new constraint. Exact over an exact field.
 *
 * @returns the columns of w that nothing determines, so that the drawing has no unique solution; empty where it has one.
 */
export function reduceIndex<T>(descriptor: Descriptor<T>): readonly number[] {
  const open = new Set<number>();
  for (let w = firstDerivative(descriptor); w < firstInput(descriptor); w++) open.add(w);
  while (open.size > 0) {
    solveForDerivatives(descriptor, open);
    const bound = descriptor.constraints;
    descriptor.constraints = [];
    for (const constraint of bound) {
      if (!removeState(descriptor, constraint, bound)) return [...open];
    }
  }
  return [];
}

/** Solves constraints for derivatives until none holds one; those solved are gone from everything. */
function solveForDerivatives<T>(descriptor: Descriptor<T>, open: Set<number>): void {
  const { field } = descriptor.arithmetic;
  for (;;) {
    const found = bestPivot(descriptor, descriptor.constraints, column => open.has(column));
    if (found === null) return;
    const { row, column } = found;
    const solved = solvedFor(field, row, column);
    descriptor.constraints = descriptor.constraints.filter(other => other !== row);
    substituteEverywhere(descriptor, descriptor.constraints, column, solved);
    open.delete(column);
  }
}

interface Place<T> {
  readonly row: Row<T>;
  readonly column: number;
}

/** The best pivot among the wanted columns of some rows: over an exact field the first of the shortest. */
function bestPivot<T>(
  { arithmetic: { field } }: Descriptor<T>,
  rows: readonly Row<T>[],
  isWanted: (column: number) => boolean,
): Place<T> | null {
  let best: Place<T> | null = null;
  let bestValue: T | null = null;
  for (const row of rows) {
    for (const column of [...row.keys()].filter(isWanted).sort((a, b) => a - b)) {
      const value = row.get(column)!;
      if (bestValue !== null && !field.isBetterPivot(value, bestValue)) continue;
      best = { row, column };
      bestValue = value;
    }
  }
  return best;
}

/**
 * Removes one state that a constraint without w binds, a differentiated signal rather than a state of the drawing, and
 * adds the constraint's derivative with respect to time; false where it binds none.
 */
function removeState<T>(descriptor: Descriptor<T>, constraint: Row<T>, bound: readonly Row<T>[]): boolean {
  const { arithmetic, states, motion } = descriptor;
  const { field } = arithmetic;
  const pivot =
    bestPivot(descriptor, [constraint], column => column >= states && motion.has(column)) ??
    bestPivot(descriptor, [constraint], column => motion.has(column));
  if (pivot === null) return false;
  const { column } = pivot;
  const solved = solvedFor(field, constraint, column);
  const derivative = new Map(motion.get(column));
  motion.delete(column);
  addMultiple(arithmetic, derivative, timeDerivative(descriptor, solved), field.negate(field.one));
  descriptor.constraints.push(derivative);
  const others = bound.filter(row => row !== constraint);
  substituteEverywhere(descriptor, [...others, ...descriptor.constraints], column, solved);
  return true;
}

/** Of a row in states and inputs: each state's motion, each input's next derivative. */
function timeDerivative<T>(descriptor: Descriptor<T>, row: Row<T>): Row<T> {
  const { arithmetic, motion, inputs } = descriptor;
  const result: Row<T> = new Map();
  for (const [column, value] of row) {
    const own = motion.get(column);
    if (own !== undefined) addMultiple(arithmetic, result, own, value);
    else addMultiple(arithmetic, result, new Map([[column + inputs, arithmetic.field.one]]), value);
  }
  return result;
}

function substituteEverywhere<T>(
  { arithmetic, motion, outputs }: Descriptor<T>,
  constraints: readonly Row<T>[],
  column: number,
  replacement: Row<T>,
): void {
  for (const row of motion.values()) substitute(arithmetic, row, column, replacement);
  for (const row of outputs) substitute(arithmetic, row, column, replacement);
  for (const row of constraints) substitute(arithmetic, row, column, replacement);
}
