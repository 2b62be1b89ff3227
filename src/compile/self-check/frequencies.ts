/** Where in the complex plane the two are compared. */

import { entryAt, type SparseMatrix } from '../../algebra/index.ts';
import type { Complex } from './complex.ts';

/** Directions off both axes, from the whole-number right triangles 3-4-5, 4-3-5 and 7-24-25. */
const DIRECTIONS = [
  { re: 0.6, im: 0.8 },
  { re: 0.8, im: 0.6 },
  { re: 0.28, im: 0.96 },
];

/** Spread of the three where the model has but one rate; no ratio of small whole numbers, as rates in drawings often are. */
const SPREAD = [Math.SQRT1_2, Math.sqrt(1.3), Math.sqrt(5)];

/**
 * Three frequencies in the right half plane, rad/s: at the middle, the upper quartile and the fastest of the model's rates.
 * Rates are |A_ii| and √|A_ij A_ji|, which do not depend on the units of the states; 1 where there are none. Slower ones
 * would drive long chains of integrators out of the range of doubles.
 */
export function testFrequencies(A: SparseMatrix<number>): Complex[] {
  const rates: number[] = [];
  for (let i = 0; i < A.rows; i++) {
    for (let k = A.rowStart[i]!; k < A.rowStart[i + 1]!; k++) {
      const j = A.column[k]!;
      const rate = Math.sqrt(Math.abs(A.values[k]!)) * Math.sqrt(Math.abs(entryAt(A, j, i, 0)));
      if (rate !== 0 && Number.isFinite(rate)) rates.push(rate);
    }
  }
  rates.sort((a, b) => a - b);
  const quantile = (share: number) => rates[Math.floor(share * (rates.length - 1))] ?? 1;
  const chosen = [quantile(0.5), quantile(0.75), quantile(1)];
  return DIRECTIONS.map(({ re, im }, k) => {
    const size = chosen[k]! * SPREAD[k]!;
    return { re: re * size, im: im * size };
  });
}
