/**
 * A drawing that differentiates, as differential and algebraic equations: ξ̇ = … for the states ξ, the differentiated
 * signals among them, with their derivatives w as unknowns, and one constraint 0 = … for each w.
 */

import type { Field } from '../../algebra/index.ts';
import type { Equations, RowStore } from '../equations/index.ts';
import type { Arithmetic } from '../quantities/index.ts';

/** Coefficients by column; zeros are not kept. */
export type Row<T> = Map<number, T>;

/**
 * Columns: the n + q states ξ (those of the equations, then one for each differentiated signal v), then the q derivatives
 * w, then the m inputs, then their first derivatives, their second, and so on.
 */
export interface Descriptor<T> {
  readonly arithmetic: Arithmetic<T>;
  readonly states: number;
  readonly differentiated: number;
  readonly inputs: number;
  /** ξ̇_i by the column of ξ_i; a state that a constraint has removed is no longer in it. */
  readonly motion: Map<number, Row<T>>;
  /** Each is to be zero. */
  constraints: Row<T>[];
  readonly outputs: readonly Row<T>[];
}

/** The equations as reduced to knowns, v̇ = w added, and 0 = (what v is) − v as constraints. */
export function descriptorOf<T>(equations: Equations<T>, reduced: RowStore<T>): Descriptor<T> {
  const { arithmetic } = equations;
  const { field } = arithmetic;
  const [n, q, m] = [equations.states.length, equations.differentiated.length, equations.inputs.length];
  const row = (i: number): Row<T> => {
    const entries: Row<T> = new Map();
    for (let k = reduced.start[i]!; k < reduced.start[i + 1]!; k++) {
      const known = reduced.column[k]!;
      entries.set(known < n ? known : known + q, reduced.values[k]!); // the states v stand between
    }
    return entries;
  };
  const motion = new Map<number, Row<T>>();
  for (let i = 0; i < n; i++) motion.set(i, row(i));
  const constraints: Row<T>[] = [];
  for (let k = 0; k < q; k++) {
    motion.set(n + k, new Map([[n + q + k, field.one]]));
    constraints.push(row(n + k).set(n + k, field.negate(field.one)));
  }
  const outputs = equations.outputs.map((_, o) => row(n + q + o));
  return { arithmetic, states: n, differentiated: q, inputs: m, motion, constraints, outputs };
}

/** First column of the derivatives w. */
export function firstDerivative<T>({ states, differentiated }: Descriptor<T>): number {
  return states + differentiated;
}

/** First column of the inputs, their derivatives behind. */
export function firstInput<T>({ states, differentiated }: Descriptor<T>): number {
  return states + 2 * differentiated;
}

/** Adds factor × other to a row. */
export function addMultiple<T>(arithmetic: Arithmetic<T>, row: Row<T>, other: Row<T>, factor: T): void {
  const { field } = arithmetic;
  for (const [column, value] of other) {
    const change = field.multiply(factor, value);
    const before = row.get(column);
    const after = before === undefined ? change : arithmetic.sum(before, change);
    if (field.isZero(after)) row.delete(column);
    else row.set(column, after);
  }
}

/** Puts `replacement` in the place of a column, in one row. */
export function substitute<T>(arithmetic: Arithmetic<T>, row: Row<T>, column: number, replacement: Row<T>): void {
  const factor = row.get(column);
  if (factor === undefined) return;
  row.delete(column);
  addMultiple(arithmetic, row, replacement, factor);
}

/** The row's columns as a function of one of them: −(rest) / coefficient. */
export function solvedFor<T>(field: Field<T>, row: Row<T>, column: number): Row<T> {
  const coefficient = row.get(column);
  if (coefficient === undefined) throw new Error('a row solved for a column that it does not hold');
  const factor = field.negate(field.divide(field.one, coefficient));
  const solved: Row<T> = new Map();
  for (const [other, value] of row) if (other !== column) solved.set(other, field.multiply(factor, value));
  return solved;
}
