/** The four matrices written out, whatever their entries are. */

/** A n × n, B n × m, C p × n, D p × m, row by row. */
export interface MatrixRows<T> {
  readonly A: readonly (readonly T[])[];
  readonly B: readonly (readonly T[])[];
  readonly C: readonly (readonly T[])[];
  readonly D: readonly (readonly T[])[];
}

/** The same done to each of the four. */
export function mapMatrices<S, T>(
  { A, B, C, D }: { readonly A: S; readonly B: S; readonly C: S; readonly D: S },
  turn: (matrix: S) => T,
): { readonly A: T; readonly B: T; readonly C: T; readonly D: T } {
  return { A: turn(A), B: turn(B), C: turn(C), D: turn(D) };
}
