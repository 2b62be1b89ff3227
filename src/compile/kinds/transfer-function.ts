/** y = N(s) / D(s) u. */

import type { TransferFunctionBlock } from '../../diagram/index.ts';
import { combine, fail, ok, problem, type Result } from '../../problem/index.ts';
import type { PolynomialReading, QuantityReader } from '../quantities/index.ts';
import { companionForm } from './companion-form.ts';
import type { Contribution } from './contribution.ts';

/** A transfer function's law: companion form; improper ones differentiate their input. */
export function transferFunction<T>(block: TransferFunctionBlock, reader: QuantityReader<T>): Result<Contribution<T>> {
  const polynomials = combine([reader.polynomial(block.numerator), reader.polynomial(block.denominator)]);
  if (!polynomials.ok) return polynomials;
  const [numerator, denominator] = polynomials.value;
  if (numerator === undefined || denominator === undefined) throw new Error('two polynomials were read');
  if (denominator.coefficients.length === 0) {
    return fail(problem('division-by-zero', `its denominator ${block.denominator} is zero. Give it another value.`));
  }
  return ok({
    ...companionForm(reader.arithmetic.field, numerator.coefficients, denominator.coefficients),
    lowered: [...lowering('numerator', numerator), ...lowering('denominator', denominator)],
  });
}

function lowering<T>(which: string, { coefficients, lowered }: PolynomialReading<T>): string[] {
  if (lowered === 0) return [];
  const order = coefficients.length - 1;
  const left = order < 0 ? 'it is zero' : `its order is ${order}, not ${order + lowered}`;
  return [`the ${which}’s leading coefficient comes out as zero, so ${left}.`];
}
