/** From the text of a block's fields to the elements that a derivation runs over. */

export {
  type Arithmetic,
  doubleArithmetic,
  type Numbers,
  type NumericArithmetic,
  rationalArithmetic,
} from './arithmetic.ts';
export { type IrrationalBlock, type IrrationalFinding, irrationalFindings } from './irrational.ts';
export { type Account, meteredRationals } from './metered-rationals.ts';
export {
  type NumericReader,
  numericReader,
  type PolynomialReading,
  type QuantityReader,
} from './reader.ts';
