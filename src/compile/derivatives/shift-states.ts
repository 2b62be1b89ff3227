/** Removes the derivatives of inputs from ξ̇ = A ξ + B u + B₁ u̇ + … by shifting states. */

import type { Arithmetic } from '../quantities/index.ts';
import { addMultiple, type Descriptor, firstInput, type Row } from './descriptor.ts';

/**
 * Shifts in place, from the highest derivative down: with z = ξ − B_k u^(k−1) the term B_k u^(k) is gone from every state's
 * equation and A B_k u^(k−1), C B_k u^(k−1) appear. Every transfer function stays as it is; the derivatives that are left
 * in the outputs are the polynomial part of the transfer matrix.
 *
 * @returns the columns of the states that were shifted, ascending.
 */
export function shiftStates<T>(descriptor: Descriptor<T>): readonly number[] {
  const { arithmetic, motion, outputs, inputs } = descriptor;
  const first = firstInput(descriptor);
  const rows = [...motion.values(), ...outputs];
  const shifted = new Set<number>();
  for (let k = highestDerivative(motion, first, inputs); k >= 1; k--) {
    const from = first + k * inputs;
    const shifts = new Map<number, Row<T>>();
    for (const [state, row] of motion) {
      const shift = takeColumns(row, from, from + inputs, inputs);
      if (shift.size > 0) shifts.set(state, shift);
    }
    for (const row of rows) addShifts(arithmetic, row, shifts);
    for (const state of shifts.keys()) shifted.add(state);
  }
  return [...shifted].sort((a, b) => a - b);
}

/** Order of the highest derivative of an input in the equations of the states. */
function highestDerivative<T>(motion: ReadonlyMap<number, Row<T>>, first: number, inputs: number): number {
  let highest = 0;
  for (const row of motion.values()) {
    for (const column of row.keys())
      if (column >= first) highest = Math.max(highest, Math.floor((column - first) / inputs));
  }
  return highest;
}

/** Takes the columns from ≤ c < to out of a row, each moved to the derivative below. */
function takeColumns<T>(row: Row<T>, from: number, to: number, inputs: number): Row<T> {
  const taken: Row<T> = new Map();
  for (const [column, value] of [...row]) {
    if (column < from || column >= to) continue;
    row.delete(column);
    taken.set(column - inputs, value);
  }
  return taken;
}

/** ξ_i = z_i + shift_i in one row. */
function addShifts<T>(arithmetic: Arithmetic<T>, row: Row<T>, shifts: ReadonlyMap<number, Row<T>>): void {
  for (const [column, value] of [...row]) {
    const shift = shifts.get(column);
    if (shift !== undefined) addMultiple(arithmetic, row, shift, value);
  }
}
