/**
 * Formulas on one line: the text of format.md's expressions, which reads back as the same function, and the expressions of C
 * and Python, which compute it.
 */

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

/** What one line of notation needs to know. */
interface LineNotation {
  number(value: WrittenNumber): string;
  name(name: string): string;
  /** A base, in parentheses where it needs them, to a power above one; `isProduct` where the result is factors joined by `*`. */
  power(base: string, exponent: number): { readonly text: string; readonly isProduct: boolean };
}

/** Names and atoms spelled for a target; as they are where left out. */
export type NameSpelling = (name: string) => string;

/** The formula as an expression of format.md. Atoms that are more than a name or a call stand in parentheses. */
export function formulaText(formula: Formula): string {
  return lineOf(formula, TEXT);
}

/**
 * The formula as a C expression of doubles: whole numbers as `2.0`, squares and cubes as products, higher powers by `pow`
 * of math.h. A number beyond 1.8e308 overflows.
 */
export function formulaC(formula: Formula, name: NameSpelling = ownText): string {
  return lineOf(formula, {
    number: value => {
      const text = scientific(value);
      return /[.e]/.test(text) ? text : `${text}.0`;
    },
    name: atom => inParenthesesUnlessPlain(name(atom)),
    power: (base, exponent) =>
      exponent <= LONGEST_C_PRODUCT
        ? { text: new Array<string>(exponent).fill(base).join('*'), isProduct: true }
        : { text: `pow(${withoutParentheses(base)}, ${exponent}.0)`, isProduct: false },
  });
}

/** The formula as a Python 3 expression, powers by `**`; quotients of whole numbers are true divisions there. */
export function formulaPython(formula: Formula, name: NameSpelling = ownText): string {
  return lineOf(formula, {
    number: scientific,
    name: atom => inParenthesesUnlessPlain(name(atom)),
    power: (base, exponent) => ({ text: `${base}**${exponent}`, isProduct: false }),
  });
}

/** Above this a power is a call. */
const LONGEST_C_PRODUCT = 3;

const ownText: NameSpelling = name => name;

const TEXT: LineNotation = {
  number: scientific,
  name: inParenthesesUnlessPlain,
  power: (base, exponent) => ({ text: `${base}^${exponent}`, isProduct: false }),
};

function scientific(value: WrittenNumber): string {
  const { digits, powerOfTen } = numberParts(value);
  return powerOfTen === 0 ? digits : `${digits}e${powerOfTen}`;
}

const PLAIN_HEAD = /^(?:[A-Za-z_][A-Za-z0-9_.]*)?/;

/** The text of an atom as a factor may hold it: a name or one call as it is, anything else in parentheses. */
export function inParenthesesUnlessPlain(text: string): string {
  const rest = text.slice(PLAIN_HEAD.exec(text)?.[0].length ?? 0);
  return rest === '' || isOneGroup(rest) ? text : `(${text})`;
}

/** Whether a text is parentheses that open at its start and close at its end only. */
function isOneGroup(text: string): boolean {
  let depth = 0;
  for (let k = 0; k < text.length; k++) {
    if (text.charAt(k) === '(') depth++;
    if (text.charAt(k) === ')') depth--;
    if (depth === 0) return k === text.length - 1 && k > 0;
  }
  return false;
}

function withoutParentheses(text: string): string {
  return isOneGroup(text) ? text.slice(1, -1) : text;
}

function lineOf({ sign, numerator, denominator }: Formula, notation: LineNotation): string {
  const isDivided = itemCount(denominator) > 0;
  const sum = loneSum(numerator);
  const above =
    sum === null
      ? productLine(numerator, notation).text
      : sign < 0 || isDivided
        ? `(${sumLine(sum, notation)})`
        : sumLine(sum, notation);
  const minus = sign < 0 ? '-' : '';
  if (!isDivided) return minus + above;
  const below = productLine(denominator, notation);
  return `${minus}${above}/${below.factors > 1 ? `(${below.text})` : below.text}`;
}

/** Items joined by `*`, sums in parentheses, and how many factors the text has side by side. */
function productLine(
  { number, powers, sums }: WrittenProduct,
  notation: LineNotation,
): { readonly text: string; readonly factors: number } {
  const items: { readonly text: string; readonly isProduct: boolean }[] = [];
  const bases = [
    ...powers.map(({ name, exponent }) => ({ base: notation.name(name), exponent })),
    ...sums.map(({ terms, exponent }) => ({ base: `(${sumLine(terms, notation)})`, exponent })),
  ];
  if (!isWrittenOne(number) || bases.length === 0) items.push({ text: notation.number(number), isProduct: false });
  for (const { base, exponent } of bases) {
    items.push(exponent === 1 ? { text: base, isProduct: false } : notation.power(base, exponent));
  }
  const factors = items.length + (items.some(({ isProduct }) => isProduct) ? 1 : 0);
  return { text: items.map(({ text }) => text).join('*'), factors };
}

function sumLine(terms: WrittenSum, notation: LineNotation): string {
  return terms
    .map(({ sign, number, powers }, k) => {
      const { text } = productLine({ number, powers, sums: [] }, notation);
      const joint = k === 0 ? (sign < 0 ? '-' : '') : sign < 0 ? ' - ' : ' + ';
      return joint + text;
    })
    .join('');
}
