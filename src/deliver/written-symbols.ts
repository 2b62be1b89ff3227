/** Formulas with the parameters' names as they are printed, for files and for the screen: LaTeX and MathML. */

import {
  type Formula,
  formulaLatex,
  formulaMathML,
  formulaOf,
  formulaText,
  type SymbolicPolynomial,
} from '../algebra/symbolic/index.ts';
import { toLatex, toMathML } from '../expression/index.ts';

/** A formula as one MathML element, without the enclosing `math`. */
export function symbolMathml(formula: Formula): string {
  return formulaMathML(formula, name => inOwnParentheses(name, toMathML(name), bracketedMathml));
}

/** A formula in LaTeX, without delimiters. */
export function symbolLatex(formula: Formula): string {
  return formulaLatex(formula, name => inOwnParentheses(name, toLatex(name), bracketedLatex));
}

/** A parameter, or an irrational part as it was written; parentheses that it came with stay. */
function inOwnParentheses(name: string, written: string, bracketed: (text: string) => string): string {
  return name.startsWith('(') ? bracketed(written) : written;
}

const bracketedMathml = (mathml: string) => `<mrow><mo>(</mo>${mathml}<mo>)</mo></mrow>`;
const bracketedLatex = (latex: string) => `\\left(${latex}\\right)`;

/** A polynomial in s whose coefficients are polynomials in the parameters, in three notations. */
export interface WrittenPolynomial {
  /** Reads back as an expression of format.md. */
  readonly text: string;
  readonly latex: string;
  /** One element, without the enclosing `math`. */
  readonly mathml: string;
  /** The terms one by one, each with its sign in front: where the whole is too wide, lines are broken between them. */
  readonly terms: readonly string[];
}

const ONE_POLYNOMIAL: SymbolicPolynomial = { variables: [], exponents: [], coefficients: [1n] };

interface Term extends Omit<WrittenPolynomial, 'terms'> {
  readonly isNegative: boolean;
}

/** Descending powers; a coefficient that is a sum stands in parentheses, one that is 1 is left out before a power. */
export function writtenPolynomial(
  coefficients: readonly SymbolicPolynomial[],
  declared: readonly string[],
): WrittenPolynomial {
  const terms = coefficients.flatMap((coefficient, k): Term[] => {
    const formula = formulaOf({ numerator: coefficient, denominator: ONE_POLYNOMIAL }, { declared });
    return formulaText(formula) === '0' ? [] : [termOf(formula, coefficients.length - 1 - k)];
  });
  if (terms.length === 0) return { text: '0', latex: '0', mathml: '<mn>0</mn>', terms: ['<mn>0</mn>'] };
  const signed = (notation: 'text' | 'latex' | 'mathml', [lead, minus, plus]: readonly [string, string, string]) =>
    terms.map((term, k) => (term.isNegative ? (k === 0 ? lead : minus) : k === 0 ? '' : plus) + term[notation]);
  const inMathml = signed('mathml', ['<mo>−</mo>', '<mo>−</mo>', '<mo>+</mo>']);
  return {
    text: signed('text', ['-', ' - ', ' + ']).join(''),
    latex: signed('latex', ['-', ' - ', ' + ']).join(''),
    mathml: `<mrow>${inMathml.join('')}</mrow>`,
    terms: inMathml,
  };
}

/** Whether a coefficient is a sum and nothing beside it; it has no denominator. */
function isLoneSum({ numerator: { number, powers, sums } }: Formula): boolean {
  const isOne = number.integer === 1n && number.decimals === 0;
  return isOne && powers.length === 0 && sums.length === 1 && sums[0]?.exponent === 1;
}

/** A coefficient times a power of s, its sign apart. */
function termOf(formula: Formula, power: number): Term {
  const isNegative = formula.sign < 0;
  const positive: Formula = { ...formula, sign: 1 };
  const text = formulaText(positive);
  const needsBrackets = isLoneSum(formula) && (power > 0 || isNegative);
  const coefficient = {
    text: needsBrackets ? `(${text})` : text,
    latex: needsBrackets ? bracketedLatex(symbolLatex(positive)) : symbolLatex(positive),
    mathml: needsBrackets ? bracketedMathml(symbolMathml(positive)) : symbolMathml(positive),
  };
  if (power === 0) return { isNegative, ...coefficient };
  const s = {
    text: power === 1 ? 's' : `s^${power}`,
    latex: power === 1 ? 's' : `s^{${power}}`,
    mathml: power === 1 ? '<mi>s</mi>' : `<msup><mi>s</mi><mn>${power}</mn></msup>`,
  };
  if (text === '1') return { isNegative, ...s };
  return {
    isNegative,
    text: `${coefficient.text}*${s.text}`,
    latex: `${coefficient.latex} \\, ${s.latex}`,
    mathml: `${coefficient.mathml}<mo>&#x2062;</mo>${s.mathml}`,
  };
}
