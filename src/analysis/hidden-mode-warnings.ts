/** The `hidden-mode` warnings of the model file: which poles no transfer function shows, why, and in which blocks. */

import type { EchelonBasis } from '../algebra/index.ts';
import type { StateSpace } from '../compile/index.ts';
import type { Warning } from '../problem/index.ts';
import { type Effort, type ExactModel, exactModel } from './exact-model.ts';
import type { Root } from './poles.ts';
import { distinguishable, type HiddenMode, hiddenModes, reachable } from './structure.ts';

/** Decimal digits of a pole in a message: enough to find it in the table of poles. */
const DIGITS = 6;

/**
 * One warning for each hidden pole, complex pairs together; its blocks are those of the states that the inputs do not reach
 * freely, or that the outputs cannot tell apart, in document order. Empty where the model is too large to decide.
 */
export function hiddenModeWarnings(model: StateSpace, effort: Effort = 'ordinary'): readonly Warning[] {
  const exact = exactModel(model, effort);
  const modes = hiddenModes(model, effort);
  if (exact === null || modes === null) return [];
  return modes
    .filter(({ im }) => im >= 0)
    .map(mode => ({ code: 'hidden-mode', blocks: concernedBlocks(model, exact, mode), message: messageFor(mode) }));
}

function messageFor(mode: HiddenMode): string {
  const pole = mode.im === 0 ? `pole ${figure(mode.re)}` : `pole pair ${pairText(mode)}`;
  const times = mode.multiplicity === 1 ? '' : ` (${mode.multiplicity} times)`;
  const consequence = mode.re >= 0 ? ' It does not decay: check it before relying on any transfer function.' : '';
  return `The ${pole}${times} appears in no transfer function: ${reason(mode)}.${consequence}`;
}

function reason({ isUncontrollable, isUnobservable }: HiddenMode): string {
  if (isUncontrollable && isUnobservable) return 'no input reaches it and no output shows it';
  if (isUncontrollable) return 'no input reaches it';
  return isUnobservable ? 'no output shows it' : 'no input and output share it';
}

function pairText({ re, im }: Root): string {
  return re === 0 ? `± ${figure(im)} j` : `${figure(re)} ± ${figure(im)} j`;
}

function figure(x: number): string {
  return String(Number(x.toPrecision(DIGITS))).replace('-', '−');
}

/** Blocks of the states that take part in a combination which is not reached, or which is not seen. */
function concernedBlocks(model: StateSpace, exact: ExactModel, mode: HiddenMode): readonly string[] {
  const n = model.states.length;
  const involved = new Set<number>();
  const isNeither = !mode.isUncontrollable && !mode.isUnobservable;
  if (mode.isUncontrollable || isNeither) addComplement(reachable(exact), n, involved);
  if (mode.isUnobservable || isNeither) addComplement(distinguishable(exact), n, involved);
  return [...new Set(model.states.filter((_, i) => involved.has(i)).map(({ block }) => block))];
}

/** States with a nonzero entry in some vector orthogonal to the basis: the free columns and the pivots they depend on. */
function addComplement({ pivots, rows }: EchelonBasis, n: number, involved: Set<number>): void {
  const isPivot = new Set(pivots);
  for (let column = 0; column < n; column++) {
    if (isPivot.has(column)) continue;
    involved.add(column);
    rows.forEach((row, i) => {
      if (row[column]?.n !== 0n) involved.add(pivots[i] ?? column);
    });
  }
}
