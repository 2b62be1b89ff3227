/**
 * Eigenvalues of real matrices by the double-shift QR iteration. Values only: poles of models that are not exact or too
 * large for the exact route.
 *
 * Francis 1961/62, Comput. J. 4; Martin, Peters & Wilkinson 1970, Numer. Math. 14, procedure hqr, whose exceptional shifts
 * at the 10th and 20th iteration and limit of 30 an eigenvalue are kept.
 */

import { balance } from './balance.ts';
import { irreducibleBlocks, submatrix } from './components.ts';
import { copyMatrix, type DenseMatrix } from './dense-matrix.ts';
import { hessenbergForm } from './hessenberg.ts';

/** n eigenvalues, complex pairs side by side with exactly conjugate values, the positive imaginary part first. */
export interface Eigenvalues {
  readonly re: Float64Array;
  readonly im: Float64Array;
}

const MOST_ITERATIONS = 30; // hqr

/**
 * Eigenvalues of A (n × n, finite), irreducible block by irreducible block, in the order of the blocks; null where the
 * iteration does not converge. Backward stable: exact for some A + E with ‖E‖ a small multiple of ε ‖balanced A‖. O(n³).
 */
export function eigenvalues(A: DenseMatrix): Eigenvalues | null {
  const re = new Float64Array(A.rows);
  const im = new Float64Array(A.rows);
  let filled = 0;
  for (const block of irreducibleBlocks(A)) {
    const part = hessenbergEigenvalues(hessenbergForm(balance(submatrix(A, block, block)).A));
    if (part === null) return null;
    re.set(part.re, filled);
    im.set(part.im, filled);
    filled += block.length;
  }
  return { re, im };
}

/** Eigenvalues of an upper Hessenberg H (n × n), in the order in which they stand on its diagonal; null as above. */
function hessenbergEigenvalues(H: DenseMatrix): Eigenvalues | null {
  const n = H.rows;
  const h = copyMatrix(H).data;
  const values = { re: new Float64Array(n), im: new Float64Array(n) };
  const norm = hessenbergNorm(h, n);
  let shifted = 0; // the sum of the exceptional shifts
  let last = n - 1;
  let iterations = 0;
  while (last >= 0) {
    const first = lastSmallSubdiagonal(h, n, last, norm);
    if (first === last) {
      values.re[last] = h[last * n + last]! + shifted;
      last -= 1;
      iterations = 0;
    } else if (first === last - 1) {
      setPair(values, h, n, last, shifted);
      last -= 2;
      iterations = 0;
    } else {
      if (iterations === MOST_ITERATIONS) return null;
      shifted += sweepOnce(h, n, first, last, iterations);
      iterations += 1;
    }
  }
  return values;
}

function hessenbergNorm(h: Float64Array, n: number): number {
  let sum = 0;
  for (let i = 0; i < n; i++) for (let j = Math.max(0, i - 1); j < n; j++) sum += Math.abs(h[i * n + j]!);
  return sum;
}

/** The largest l ≤ last whose subdiagonal entry (l, l − 1) is negligible beside its diagonal neighbours; it is set to zero. */
function lastSmallSubdiagonal(h: Float64Array, n: number, last: number, norm: number): number {
  for (let l = last; l > 0; l--) {
    const beside = Math.abs(h[(l - 1) * n + l - 1]!) + Math.abs(h[l * n + l]!);
    const entry = Math.abs(h[l * n + l - 1]!);
    if (entry <= Number.EPSILON * (beside === 0 ? norm : beside)) {
      h[l * n + l - 1] = 0;
      return l;
    }
  }
  return 0;
}

/** The two eigenvalues of the block that ends at `last`. */
function setPair({ re, im }: Eigenvalues, h: Float64Array, n: number, last: number, shifted: number): void {
  const x = h[last * n + last]!;
  const y = h[(last - 1) * n + last - 1]!;
  const w = h[last * n + last - 1]! * h[(last - 1) * n + last]!;
  const p = (y - x) / 2;
  const discriminant = p * p + w;
  const root = Math.sqrt(Math.abs(discriminant));
  if (discriminant >= 0) {
    const far = p + (p < 0 ? -root : root);
    re[last - 1] = x + shifted + far;
    re[last] = far === 0 ? re[last - 1]! : x + shifted - w / far;
    return;
  }
  re[last - 1] = re[last] = x + shifted + p;
  im[last - 1] = root;
  im[last] = -root;
}

/** One implicit double-shift sweep on rows first … last; returns the exceptional shift subtracted before it, mostly 0. */
function sweepOnce(h: Float64Array, n: number, first: number, last: number, iterations: number): number {
  let x = h[last * n + last]!;
  let y = h[(last - 1) * n + last - 1]!;
  let w = h[last * n + last - 1]! * h[(last - 1) * n + last]!;
  let shift = 0;
  if (iterations === 10 || iterations === 20) {
    shift = x;
    for (let i = 0; i <= last; i++) h[i * n + i]! -= shift;
    const size = Math.abs(h[last * n + last - 1]!) + Math.abs(h[(last - 1) * n + last - 2]!);
    x = y = 0.75 * size; // hqr
    w = -0.4375 * size * size; // hqr
  }
  const start = startOfBulge(h, n, first, last, { x, y, w });
  for (let i = start.row + 2; i <= last; i++) {
    h[i * n + i - 2] = 0;
    if (i > start.row + 2) h[i * n + i - 3] = 0;
  }
  chaseBulge(h, n, first, last, start);
  return shift;
}

/** Where a sweep starts, and the direction (p, q, r) of the first column of the twice shifted matrix, its sum of sizes 1. */
interface BulgeStart {
  readonly row: number;
  readonly p: number;
  readonly q: number;
  readonly r: number;
}

/** The lowest row at which two consecutive subdiagonal entries are small enough together to start; shifts have sum x + y, product x y − w. */
function startOfBulge(
  h: Float64Array,
  n: number,
  first: number,
  last: number,
  { x, y, w }: { readonly x: number; readonly y: number; readonly w: number },
): BulgeStart {
  for (let row = last - 2; ; row--) {
    const z = h[row * n + row]!;
    const dx = x - z;
    const dy = y - z;
    let p = (dx * dy - w) / h[(row + 1) * n + row]! + h[row * n + row + 1]!;
    let q = h[(row + 1) * n + row + 1]! - z - dx - dy;
    let r = h[(row + 2) * n + row + 1]!;
    const size = Math.abs(p) + Math.abs(q) + Math.abs(r);
    p /= size;
    q /= size;
    r /= size;
    if (row === first) return { row, p, q, r };
    const left = Math.abs(h[row * n + row - 1]!) * (Math.abs(q) + Math.abs(r));
    const around = Math.abs(h[(row - 1) * n + row - 1]!) + Math.abs(z) + Math.abs(h[(row + 1) * n + row + 1]!);
    if (left <= Number.EPSILON * Math.abs(p) * around) return { row, p, q, r };
  }
}

/** I − (1, q, r)ᵀ (x, y, z), the reflection of one step; without a third row r and z are zero. */
interface Reflection {
  readonly x: number;
  readonly y: number;
  readonly z: number;
  readonly q: number;
  readonly r: number;
}

function chaseBulge(h: Float64Array, n: number, first: number, last: number, start: BulgeStart): void {
  let { row, p, q, r } = start;
  let size = 0;
  for (let k = row; k < last; k++) {
    if (k > row) {
      p = h[k * n + k - 1]!;
      q = h[(k + 1) * n + k - 1]!;
      r = k < last - 1 ? h[(k + 2) * n + k - 1]! : 0;
      size = Math.abs(p) + Math.abs(q) + Math.abs(r);
      if (size === 0) continue;
      p /= size;
      q /= size;
      r /= size;
    }
    const length = Math.sqrt(p * p + q * q + r * r);
    const s = p < 0 ? -length : length;
    if (k > row) h[k * n + k - 1] = -s * size;
    else if (first !== row) h[k * n + k - 1]! *= -1;
    const reflection = { x: (p + s) / s, y: q / s, z: r / s, q: q / (p + s), r: r / (p + s) };
    reflectBulgeRows(h, n, k, last, reflection);
    reflectBulgeColumns(h, n, k, first, last, reflection);
  }
}

/** Rows k, k + 1 and k + 2, columns k … last. */
function reflectBulgeRows(h: Float64Array, n: number, k: number, last: number, reflection: Reflection): void {
  const { x, y, z, q, r } = reflection;
  const hasThird = k < last - 1;
  const [a, b, c] = [k * n, (k + 1) * n, (k + 2) * n];
  for (let j = k; j <= last; j++) {
    let sum = h[a + j]! + q * h[b + j]!;
    if (hasThird) {
      sum += r * h[c + j]!;
      h[c + j]! -= sum * z;
    }
    h[b + j]! -= sum * y;
    h[a + j]! -= sum * x;
  }
}

/** Columns k, k + 1 and k + 2, rows first … k + 3. */
function reflectBulgeColumns(
  h: Float64Array,
  n: number,
  k: number,
  first: number,
  last: number,
  { x, y, z, q, r }: Reflection,
): void {
  const hasThird = k < last - 1;
  const bottom = Math.min(last, k + 3);
  for (let i = first; i <= bottom; i++) {
    const at = i * n + k;
    let sum = x * h[at]! + y * h[at + 1]!;
    if (hasThird) {
      sum += z * h[at + 2]!;
      h[at + 2]! -= sum * r;
    }
    h[at + 1]! -= sum * q;
    h[at]! -= sum;
  }
}
