/**
 * The gain between two nodes of a signal-flow graph: the sum of path products, each times its cofactor, over the determinant of
 * the loops (the gain formula of Mason 1956, Proc. IRE 44, "Feedback theory: further properties of signal flow graphs").
 * Over any field.
 */

import type { Field } from '../../algebra/index.ts';

/** A path or a loop: the product of its gains and the nodes it visits. */
export interface Walk<T> {
  readonly product: T;
  readonly nodes: ReadonlySet<number>;
}

export interface Gain<T> {
  /** Null where the determinant is zero, or where more sets of loops would have to be gone through than allowed. */
  readonly value: T | null;
  readonly determinant: T | null;
  /** For each path the determinant of the loops that it does not touch. */
  readonly cofactors: readonly (T | null)[];
}

/** Sets of loops that touch no other of their set which one determinant may be summed over. */
const MOST_SETS = 4096;

/** The gain by the formula; loops touch where they share a node. */
export function gainBetween<T>(field: Field<T>, paths: readonly Walk<T>[], loops: readonly Walk<T>[]): Gain<T> {
  const bunches = touchingBunches(loops);
  const determinant = productOf(field, bunches);
  const cofactors = paths.map(path =>
    productOf(
      field,
      bunches.map(bunch => bunch.filter(loop => !touches(loop, path))),
    ),
  );
  if (determinant === null || field.isZero(determinant)) return { value: null, determinant, cofactors };
  let sum = field.zero;
  for (const [k, { product }] of paths.entries()) {
    const cofactor = cofactors[k];
    if (cofactor === null || cofactor === undefined) return { value: null, determinant, cofactors };
    sum = field.add(sum, field.multiply(product, cofactor));
  }
  return { value: field.divide(sum, determinant), determinant, cofactors };
}

/** Whether two walks share a node. */
export function touches(a: Walk<unknown>, b: Walk<unknown>): boolean {
  const [fewer, more] = a.nodes.size < b.nodes.size ? [a.nodes, b.nodes] : [b.nodes, a.nodes];
  for (const node of fewer) if (more.has(node)) return true;
  return false;
}

/** Loops that touch, directly or over others, together: the determinant is the product over such bunches. */
function touchingBunches<T>(loops: readonly Walk<T>[]): readonly (readonly Walk<T>[])[] {
  let bunches: (readonly Walk<T>[])[] = [];
  for (const loop of loops) {
    const joined = bunches.filter(bunch => bunch.some(other => touches(loop, other)));
    bunches = [...bunches.filter(bunch => !joined.includes(bunch)), [...joined.flat(), loop]];
  }
  return bunches;
}

function productOf<T>(field: Field<T>, bunches: readonly (readonly Walk<T>[])[]): T | null {
  let product = field.one;
  for (const bunch of bunches) {
    const own = determinantOf(field, bunch);
    if (own === null) return null;
    product = field.multiply(product, own);
  }
  return product;
}

/** 1 − Σ L + Σ L L′ − …, over the sets of loops of which none touches another. */
function determinantOf<T>(field: Field<T>, loops: readonly Walk<T>[]): T | null {
  let sets = 0;
  const summed = (from: number, product: T, chosen: readonly Walk<T>[]): T | null => {
    sets += 1;
    if (sets > MOST_SETS) return null;
    let sum = product;
    for (let i = from; i < loops.length; i++) {
      const loop = loops[i]!;
      if (chosen.some(other => touches(loop, other))) continue;
      const rest = summed(i + 1, field.negate(field.multiply(product, loop.product)), [...chosen, loop]);
      if (rest === null) return null;
      sum = field.add(sum, rest);
    }
    return sum;
  };
  return summed(0, field.one, []);
}
