/** Polynomials and transfer functions as LaTeX for the clipboard and as words for a screen reader. */

import { isOne } from './polynomial-markup.ts';
import type { Magnitude, Term } from './polynomial-terms.ts';

/** `37.5\, s + 30`. */
export function polynomialLatex(terms: readonly Term[], variable: string): string {
  return joinTerms(terms, { plus: ' + ', minus: ' - ', leadingMinus: '-' }, ({ magnitude, power }) => {
    const powers = power === 0 ? '' : power === 1 ? variable : `${variable}^{${power}}`;
    return [magnitudeLatex(magnitude), powers].filter(part => part !== '').join(' ');
  });
}

/** `\frac{37.5 s + 30}{s^{2} + 1}`, the numerator alone over one. */
export function quotientLatex(numerator: readonly Term[], denominator: readonly Term[], variable: string): string {
  const top = polynomialLatex(numerator, variable);
  return isOne(denominator) ? top : `\\frac{${top}}{${polynomialLatex(denominator, variable)}}`;
}

/** `s to the 4 plus 24 s cubed minus 5 over 16`. */
export function polynomialWords(terms: readonly Term[], variable: string): string {
  return joinTerms(terms, { plus: ' plus ', minus: ' minus ', leadingMinus: 'minus ' }, ({ magnitude, power }) =>
    [magnitudeWords(magnitude), powerWords(variable, power)].filter(part => part !== '').join(' '),
  );
}

/** `37.5 s plus 30, over, s squared plus 1`; the pauses part numerator from denominator. */
export function quotientWords(numerator: readonly Term[], denominator: readonly Term[], variable: string): string {
  const top = polynomialWords(numerator, variable);
  return isOne(denominator) ? top : `${top}, over, ${polynomialWords(denominator, variable)}`;
}

interface Signs {
  readonly plus: string;
  readonly minus: string;
  readonly leadingMinus: string;
}

function joinTerms(terms: readonly Term[], signs: Signs, write: (term: Term) => string): string {
  return terms
    .map((term, index) => {
      const leading = term.isNegative ? signs.leadingMinus : '';
      const sign = index === 0 ? leading : term.isNegative ? signs.minus : signs.plus;
      return sign + write(term);
    })
    .join('');
}

function magnitudeLatex(magnitude: Magnitude): string {
  switch (magnitude.kind) {
    case 'one':
      return '';
    case 'fraction':
      return `\\frac{${magnitude.numerator}}{${magnitude.denominator}}`;
    case 'figure': {
      const { mantissa, exponent } = magnitude.figure;
      const digits = mantissa === '∞' ? '\\infty' : mantissa;
      return exponent === null ? digits : `${digits} \\times 10^{${exponent}}`;
    }
    default:
      return magnitude satisfies never;
  }
}

function magnitudeWords(magnitude: Magnitude): string {
  switch (magnitude.kind) {
    case 'one':
      return '';
    case 'fraction':
      return `${magnitude.numerator} over ${magnitude.denominator}`;
    case 'figure': {
      const { mantissa, exponent } = magnitude.figure;
      const digits = mantissa === '∞' ? 'infinity' : mantissa;
      if (exponent === null) return digits;
      return `${digits} times 10 to the ${exponent < 0 ? 'minus ' : ''}${Math.abs(exponent)}`;
    }
    default:
      return magnitude satisfies never;
  }
}

function powerWords(variable: string, power: number): string {
  if (power === 0) return '';
  if (power === 1) return variable;
  if (power === 2) return `${variable} squared`;
  return power === 3 ? `${variable} cubed` : `${variable} to the ${power}`;
}
