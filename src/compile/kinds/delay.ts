/** Dead time y(t) = u(t − T), in the state-space model by its diagonal Padé approximant. */

import { type Field, rational } from '../../algebra/index.ts';
import type { DelayBlock } from '../../diagram/index.ts';
import { fail, ok, problem, type Result } from '../../problem/index.ts';
import type { QuantityReader } from '../quantities/index.ts';
import { companionForm } from './companion-form.ts';
import { type Contribution, memoryless } from './contribution.ts';

/** Order of the approximant where the block gives none (format.md). */
const DEFAULT_ORDER = 2;

/** A dead time's law: the approximant in companion form. A time of zero is unity; a negative one is refused. */
export function delay<T>(block: DelayBlock, reader: QuantityReader<T>): Result<Contribution<T>> {
  const seconds = reader.double(block.time);
  if (!seconds.ok) return seconds;
  if (seconds.value < 0) {
    return fail(problem('bad-value', `its time ${block.time} is negative. Give zero or more seconds.`));
  }
  const time = reader.quantity(block.time);
  if (!time.ok) return time;
  const { field } = reader.arithmetic;
  if (seconds.value === 0 || field.isZero(time.value)) return ok(memoryless([[field.one]]));
  const denominator = padeDenominator(field, time.value, block.order ?? DEFAULT_ORDER);
  const degree = denominator.length - 1;
  const numerator = denominator.map((c, i) => ((degree - i) % 2 === 0 ? c : field.negate(c)));
  return ok(companionForm(field, numerator, denominator));
}

/**
 * Denominator of the [N/N] Padé approximant of exp(−sT), descending powers; the numerator is the same in −s.
 * Coefficient of (sT)^k: (2N − k)! N! / ((2N)! k! (N − k)!) (Padé 1892; Baker & Graves-Morris 1996, Padé Approximants,
 * section 1.2).
 */
function padeDenominator<T>(field: Field<T>, time: T, order: number): T[] {
  const ascending: T[] = [];
  let coefficient = rational(1n);
  let power = field.one;
  for (let k = 0; k <= order; k++) {
    ascending.push(field.multiply(field.fromRational(coefficient), power));
    power = field.multiply(power, time);
    const ratio = rational(BigInt(order - k), BigInt(2 * order - k) * BigInt(k + 1));
    coefficient = rational(coefficient.n * ratio.n, coefficient.d * ratio.d);
  }
  return ascending.reverse();
}
