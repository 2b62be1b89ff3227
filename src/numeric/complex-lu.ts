/**
 * Linear systems with complex coefficients by Gaussian elimination with partial pivoting: the direct solution at one
 * complex frequency, against which faster routes are checked.
 */

/** Rows × columns, real and imaginary parts row-major. */
export interface ComplexMatrix {
  readonly rows: number;
  readonly columns: number;
  readonly re: Float64Array;
  readonly im: Float64Array;
}

/** The rows × columns complex matrix of zeros. */
export function zeroComplexMatrix(rows: number, columns: number): ComplexMatrix {
  return { rows, columns, re: new Float64Array(rows * columns), im: new Float64Array(rows * columns) };
}

/** A⁻¹ B for A n × n and B n × m, null where a pivot is exactly zero. Neither argument is changed. O(n³ + n² m). */
export function solveComplex(A: ComplexMatrix, B: ComplexMatrix): ComplexMatrix | null {
  const n = A.rows;
  const a = { ...A, re: A.re.slice(), im: A.im.slice() };
  const b = { ...B, re: B.re.slice(), im: B.im.slice() };
  for (let k = 0; k < n; k++) {
    const pivot = largestInColumn(a, k);
    if (a.re[pivot * n + k] === 0 && a.im[pivot * n + k] === 0) return null;
    swapRows(a, pivot, k);
    swapRows(b, pivot, k);
    for (let i = k + 1; i < n; i++) {
      const [re, im] = quotient(a.re[i * n + k]!, a.im[i * n + k]!, a.re[k * n + k]!, a.im[k * n + k]!);
      if (re === 0 && im === 0) continue;
      subtractRow(a, i, k, re, im, k + 1);
      subtractRow(b, i, k, re, im, 0);
    }
  }
  substituteBack(a, b);
  return b;
}

function substituteBack(a: ComplexMatrix, b: ComplexMatrix): void {
  const n = a.rows;
  const m = b.columns;
  for (let i = n - 1; i >= 0; i--) {
    for (let k = i + 1; k < n; k++) subtractRow(b, i, k, a.re[i * n + k]!, a.im[i * n + k]!, 0);
    for (let j = 0; j < m; j++) {
      const at = i * m + j;
      [b.re[at], b.im[at]] = quotient(b.re[at]!, b.im[at]!, a.re[i * n + i]!, a.im[i * n + i]!);
    }
  }
}

function largestInColumn({ rows: n, columns, re, im }: ComplexMatrix, k: number): number {
  let best = k;
  let size = -1;
  for (let i = k; i < n; i++) {
    const candidate = Math.abs(re[i * columns + k]!) + Math.abs(im[i * columns + k]!);
    if (candidate > size) {
      best = i;
      size = candidate;
    }
  }
  return best;
}

function swapRows({ columns, re, im }: ComplexMatrix, a: number, b: number): void {
  if (a === b) return;
  for (let j = 0; j < columns; j++) {
    const [p, q] = [a * columns + j, b * columns + j];
    [re[p], re[q]] = [re[q]!, re[p]!];
    [im[p], im[q]] = [im[q]!, im[p]!];
  }
}

/** Row i ← row i − (re + j·im) · row k from column `from` on. */
function subtractRow(M: ComplexMatrix, i: number, k: number, re: number, im: number, from: number): void {
  if (re === 0 && im === 0) return;
  for (let j = from; j < M.columns; j++) {
    const [x, y] = [M.re[k * M.columns + j]!, M.im[k * M.columns + j]!];
    M.re[i * M.columns + j]! -= re * x - im * y;
    M.im[i * M.columns + j]! -= re * y + im * x;
  }
}

/** (a + jb) / (c + jd) without needless overflow (R. L. Smith 1962, Commun. ACM 5, algorithm 116). */
export function quotient(a: number, b: number, c: number, d: number): readonly [number, number] {
  if (Math.abs(c) >= Math.abs(d)) {
    const ratio = d / c;
    const divisor = c + d * ratio;
    return [(a + b * ratio) / divisor, (b - a * ratio) / divisor];
  }
  const ratio = c / d;
  const divisor = c * ratio + d;
  return [(a * ratio + b) / divisor, (b * ratio - a) / divisor];
}
