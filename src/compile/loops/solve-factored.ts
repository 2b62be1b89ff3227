/** Right-hand sides of one algebraic loop through its factors. */

import type { Arithmetic, Numbers } from '../quantities/index.ts';
import type { LoopFactors } from './factor-loop.ts';

/**
 * Solves for several right-hand sides at once.
 *
 * @param rightHandSides  n × width, row-major; overwritten by the reduced right-hand sides.
 * @returns               n × width, row-major: row i holds unknown i.
 */
export function solveFactored<T>(
  arithmetic: Arithmetic<T>,
  { size, operations, pivots }: LoopFactors<T>,
  rightHandSides: Numbers<T>,
  width: number,
): Numbers<T> {
  const { field } = arithmetic;
  for (const { target, source, factor } of operations) {
    subtractMultiple(field, rightHandSides, target * width, rightHandSides, source * width, factor, width);
  }
  const solution = arithmetic.allocate(size * width);
  for (let k = pivots.length - 1; k >= 0; k--) {
    const { row, column, value, columns, values } = pivots[k]!;
    columns.forEach((other, i) => {
      subtractMultiple(field, rightHandSides, row * width, solution, other * width, values[i]!, width);
    });
    for (let c = 0; c < width; c++) {
      const entry = rightHandSides[row * width + c]!;
      if (!field.isZero(entry)) solution[column * width + c] = field.divide(entry, value);
    }
  }
  return solution;
}

function subtractMultiple<T>(
  field: Arithmetic<T>['field'],
  into: Numbers<T>,
  intoAt: number,
  from: Numbers<T>,
  fromAt: number,
  factor: T,
  width: number,
): void {
  for (let c = 0; c < width; c++) {
    const entry = from[fromAt + c]!;
    if (field.isZero(entry)) continue;
    into[intoAt + c] = field.subtract(into[intoAt + c]!, field.multiply(factor, entry));
  }
}
