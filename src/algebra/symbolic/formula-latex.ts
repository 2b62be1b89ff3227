/** Formulas in LaTeX mathematics: fractions by \frac, factors side by side, sums in brackets that grow. */

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

/**
 * The formula in LaTeX, without delimiters.
 *
 * @param name  LaTeX of a parameter or atom; by default one letter is itself, a name is upright with underscores escaped,
 * and what is more than a name or a call stands in brackets.
 */
export function formulaLatex(formula: Formula, name: NameSpelling = uprightName): string {
  const { sign, numerator, denominator } = formula;
  const minus = sign < 0 ? '-' : '';
  const sum = loneSum(numerator);
  if (itemCount(denominator) === 0) {
    if (sum === null) return minus + productLatex(numerator, name);
    return sign < 0 ? `-${bracketed(sum, name)}` : sumLatex(sum, name);
  }
  return `${minus}\\frac{${wholeLatex(numerator, name)}}{${wholeLatex(denominator, name)}}`;
}

function uprightName(name: string): string {
  if (/^[A-Za-z]$/.test(name)) return name;
  return `\\mathrm{${inParenthesesUnlessPlain(name).replace(/[_^%#&$]/g, '\\$&')}}`;
}

/** A product that stands alone above or below a bar: a lone sum needs no brackets. */
function wholeLatex(product: WrittenProduct, name: NameSpelling): string {
  const sum = loneSum(product);
  return sum === null ? productLatex(product, name) : sumLatex(sum, name);
}

function productLatex({ number, powers, sums }: WrittenProduct, name: NameSpelling): string {
  const items = [
    ...powers.map(power => powerLatex(name(power.name), power.exponent)),
    ...sums.map(({ terms, exponent }) => powerLatex(bracketed(terms, name), exponent)),
  ];
  if (!isWrittenOne(number) || items.length === 0) items.unshift(numberLatex(number));
  return items.join(' \\, ');
}

function powerLatex(base: string, exponent: number): string {
  return exponent === 1 ? base : `{${base}}^{${exponent}}`;
}

function numberLatex(value: WrittenNumber): string {
  const { digits, powerOfTen } = numberParts(value);
  if (powerOfTen === 0) return digits;
  return digits === '1' ? `10^{${powerOfTen}}` : `${digits} \\cdot 10^{${powerOfTen}}`;
}

function bracketed(terms: WrittenSum, name: NameSpelling): string {
  return `\\left(${sumLatex(terms, name)}\\right)`;
}

function sumLatex(terms: WrittenSum, name: NameSpelling): string {
  return terms
    .map(({ sign, number, powers }, k) => {
      const joint = k === 0 ? (sign < 0 ? '-' : '') : sign < 0 ? ' - ' : ' + ';
      return joint + productLatex({ number, powers, sums: [] }, name);
    })
    .join('');
}
