/** A channel realised from its transfer function alone, in controller companion form: no hidden modes. */

import { divideRationals, multiplyRationals, subtractRationals, toDouble, ZERO } from '../algebra/index.ts';
import { zeroMatrix } from '../numeric/index.ts';
import type { ChannelSystem } from './channel-system.ts';
import type { ReducedFraction } from './transfer-functions.ts';

/** ẋᵢ = xᵢ₊₁, the last row holds minus the monic denominator's coefficients; the fraction is proper. */
export function companionSystem({ numerator, denominator }: ReducedFraction): ChannelSystem {
  const n = denominator.length - 1;
  const A = zeroMatrix(n, n);
  const B = zeroMatrix(n, 1);
  const C = zeroMatrix(1, n);
  const D = zeroMatrix(1, 1);
  const through = numerator.length > n ? divideRationals(numerator[0] ?? ZERO, denominator[0] ?? ZERO) : ZERO;
  D.data[0] = toDouble(through);
  if (n > 0) B.data[n - 1] = 1;
  for (let j = 0; j < n; j++) {
    const coefficient = denominator[n - j] ?? ZERO;
    const above = numerator[numerator.length - 1 - j] ?? ZERO;
    A.data[(n - 1) * n + j] = -toDouble(coefficient);
    C.data[j] = toDouble(subtractRationals(above, multiplyRationals(through, coefficient)));
    if (j + 1 < n) A.data[j * n + j + 1] = 1;
  }
  return { states: Array.from({ length: n }, (_, i) => i), A, B, C, D };
}
