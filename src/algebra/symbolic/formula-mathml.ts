/** Formulas in presentation MathML (W3C MathML Core): fractions by mfrac, powers by msup, products by invisible times. */

import {
  type Formula,
  isWrittenOne,
  itemCount,
  loneSum,
  numberParts,
  type WrittenNumber,
  type WrittenProduct,
  type WrittenSum,
} from './formula.ts';
import { inParenthesesUnlessPlain, type NameSpelling } from './formula-text.ts';

/** U+2062, which joins factors without a sign. */
const INVISIBLE_TIMES = '<mo>&#x2062;</mo>';
const MINUS = '<mo>&#x2212;</mo>';

/**
 * The formula as one MathML element, without the enclosing `math`.
 *
 * @param name  MathML of a parameter or atom; by default an `mi` of its text, in brackets where it is more than a name
 * or a call.
 */
export function formulaMathML(formula: Formula, name: NameSpelling = identifier): string {
  const { sign, numerator, denominator } = formula;
  const sum = loneSum(numerator);
  const isDivided = itemCount(denominator) > 0;
  if (!isDivided && sum !== null && sign > 0) return row(sumItems(sum, name));
  const magnitude = isDivided
    ? [`<mfrac>${whole(numerator, name)}${whole(denominator, name)}</mfrac>`]
    : sum === null
      ? productItems(numerator, name)
      : bracketedItems(sum, name);
  return row(sign < 0 ? [MINUS, ...magnitude] : magnitude);
}

function identifier(name: string): string {
  const text = inParenthesesUnlessPlain(name);
  return `<mi>${text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;')}</mi>`;
}

/** One element of several; a single one needs no row. */
function row(items: readonly string[]): string {
  return items.length === 1 ? items.join('') : `<mrow>${items.join('')}</mrow>`;
}

function whole(product: WrittenProduct, name: NameSpelling): string {
  const sum = loneSum(product);
  return row(sum === null ? productItems(product, name) : sumItems(sum, name));
}

function productItems({ number, powers, sums }: WrittenProduct, name: NameSpelling): string[] {
  const factors = [
    ...powers.map(power => raised(name(power.name), power.exponent)),
    ...sums.map(({ terms, exponent }) => raised(row(bracketedItems(terms, name)), exponent)),
  ];
  if (!isWrittenOne(number) || factors.length === 0) factors.unshift(row(numberItems(number)));
  return factors.flatMap((factor, k) => (k === 0 ? [factor] : [INVISIBLE_TIMES, factor]));
}

function raised(base: string, exponent: number): string {
  return exponent === 1 ? base : `<msup>${base}<mn>${exponent}</mn></msup>`;
}

function numberItems(value: WrittenNumber): string[] {
  const { digits, powerOfTen } = numberParts(value);
  if (powerOfTen === 0) return [`<mn>${digits}</mn>`];
  const sign = powerOfTen < 0 ? MINUS : '';
  const exponent = `<mrow>${sign}<mn>${Math.abs(powerOfTen)}</mn></mrow>`;
  const power = `<msup><mn>10</mn>${exponent}</msup>`;
  return digits === '1' ? [power] : [`<mn>${digits}</mn>`, '<mo>&#x22C5;</mo>', power];
}

function bracketedItems(terms: WrittenSum, name: NameSpelling): string[] {
  return ['<mo>(</mo>', row(sumItems(terms, name)), '<mo>)</mo>'];
}

function sumItems(terms: WrittenSum, name: NameSpelling): string[] {
  return terms.flatMap(({ sign, number, powers }, k) => {
    const items = productItems({ number, powers, sums: [] }, name);
    if (k === 0) return sign < 0 ? [MINUS, ...items] : items;
    return [sign < 0 ? MINUS : '<mo>+</mo>', ...items];
  });
}
