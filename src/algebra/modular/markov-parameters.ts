/**
 * Markov parameters of a model modulo a prime, and the numerators that they make with the characteristic polynomial: the inner
 * step of transfer functions and of the zeros of square models.
 */

import { reduce } from './primes.ts';
import { type ModularRows, multiplyModulo } from './scaled-rows.ts';

/**
 * d, cb, cAb, … cAⁿ⁻¹b modulo p, one list for each output.
 *
 * @param system  [A, B; C, D] modulo p with n states.
 * @param input   The column of B and D. O(n · entries).
 */
export function markovParameters(system: ModularRows, n: number, input: number, p: number): Float64Array[] {
  const parameters = Array.from({ length: system.rows - n }, () => new Float64Array(n + 1));
  // The system times the unit vector of the input gives [b; d]; times [Aᵏb; 0] it gives [Aᵏ⁺¹b; CAᵏb].
  const size = Math.max(system.rows, n + input + 1);
  let x: Float64Array = new Float64Array(size);
  let next: Float64Array = new Float64Array(size);
  x[n + input] = 1;
  for (let k = 0; k <= n; k++) {
    multiplyModulo(system, x, next, p);
    for (let i = 0; i < parameters.length; i++) parameters[i]![k] = next[n + i]!;
    next.fill(0, n);
    [x, next] = [next, x];
  }
  return parameters;
}

/**
 * The n + 1 coefficients of scale · f(s) · (h₀ + h₁/s + h₂/s² + …) down to the constant one, modulo p: the numerator over f, of
 * degree n, of the transfer function with Markov parameters h.
 */
export function numeratorModulo(f: Float64Array, h: Float64Array, scale: number, p: number): Float64Array {
  const inverse = 1 / p;
  const product = new Float64Array(f.length);
  for (let power = 0; power < f.length; power++) {
    let sum = 0;
    for (let q = 0; q <= power; q++) {
      sum += f[q]! * h[power - q]!;
      if ((q & 3) === 3) sum = reduce(sum, p, inverse);
    }
    product[power] = reduce(reduce(sum, p, inverse) * scale, p, inverse);
  }
  return product;
}
