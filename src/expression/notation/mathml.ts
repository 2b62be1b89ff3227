/**
 * Names and expressions as presentation MathML (MathML Core). Every piece of text is escaped; each function returns exactly
 * one element, without the `math` element around it, so that pieces can be put into tables.
 */

import type { CallNode } from '../expression.ts';
import type { FunctionName } from '../functions.ts';
import { parseExpression } from '../parse.ts';
import { isOneLetter, type Letters, type NamePart, nameParts, shown } from './name-parts.ts';
import { notate, type Writer } from './notate.ts';

/** An expression with stacked fractions; text that is none as `mtext`. */
export function toMathML(text: string): string {
  const parsed = parseExpression(text);
  return parsed.ok ? row(notate(parsed.value, WRITER)) : `<mtext>${escapeXml(text)}</mtext>`;
}

/** A name with its subscripts and Greek letters. */
export function nameToMathML(name: string): string {
  const [first, ...others] = nameParts(name).map(partElement);
  return others.length === 0 ? (first ?? '<mrow></mrow>') : row([first ?? '', ...others].join(operator('.')));
}

/** The `math` element around pieces that stand alone. */
export function mathElement(content: string, display: 'inline' | 'block' = 'inline'): string {
  return `<math xmlns="http://www.w3.org/1998/Math/MathML" display="${display}">${content}</math>`;
}

const row = (content: string) => `<mrow>${content}</mrow>`;
const operator = (sign: string) => `<mo>${escapeXml(sign)}</mo>`;

// biome-ignore lint/suspicious/noControlCharactersInRegex: XML does not allow them
const CONTROL = /[\u0000-\u001f\u007f-\u009f]/g;
const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Text with the characters of mark-up escaped; control characters become spaces. */
export function escapeXml(text: string): string {
  return text.replace(CONTROL, ' ').replace(/[&<>"']/g, character => ENTITIES[character] ?? '');
}

function partElement({ base, lowered }: NamePart): string {
  // One letter is italic by itself; a word is upright, as MathML has it for more than one character.
  const element = isOneLetter(base) ? `<mi>${escapeXml(shown(base))}</mi>` : identifier(shown(base));
  if (lowered.length === 0) return element;
  return `<msub>${element}${row(lowered.map(loweredElement).join(operator(',')))}</msub>`;
}

const identifier = (text: string) => `<mi mathvariant="normal">${escapeXml(text)}</mi>`;

function loweredElement(piece: Letters): string {
  return /^\d+$/.test(piece.typed) ? `<mn>${piece.typed}</mn>` : identifier(shown(piece));
}

/** Between factors that need no sign (U+2062), and between a function and its arguments (U+2061). */
const INVISIBLE_TIMES = operator('\u2062');
const APPLY = operator('\u2061');

const WRITER: Writer<string> = {
  isStacked: true,
  literal: ({ mantissa, power }) => {
    if (power === null) return `<mn>${mantissa ?? '1'}</mn>`;
    const exponent = power.startsWith('-')
      ? row(`${operator('\u2212')}<mn>${power.slice(1)}</mn>`)
      : `<mn>${power}</mn>`;
    const ten = `<msup><mn>10</mn>${exponent}</msup>`;
    return mantissa === null ? ten : `<mn>${mantissa}</mn>${operator('\u22c5')}${ten}`;
  },
  name: nameToMathML,
  negative: operand => `<mo form="prefix">\u2212</mo>${operand}`,
  sum: (left, sign, right) => `${left}${operator(sign === '+' ? '+' : '\u2212')}${right}`,
  product: (left, right, isDotted) => `${left}${isDotted ? operator('\u22c5') : INVISIBLE_TIMES}${right}`,
  quotient: (above, below) => `<mfrac>${row(above)}${row(below)}</mfrac>`,
  power: (base, exponent) => `<msup>${row(base)}${row(exponent)}</msup>`,
  call: callElement,
  parentheses: inside => row(`${operator('(')}${inside}${operator(')')}`),
};

const PRINTED: Partial<Record<FunctionName, string>> = {
  log10: '<msub><mi>log</mi><mn>10</mn></msub>',
  asin: '<mi>arcsin</mi>',
  acos: '<mi>arccos</mi>',
  atan: '<mi>arctan</mi>',
};

function callElement(node: CallNode, values: readonly string[]): string {
  const inside = values.join(operator(','));
  if (node.function === 'sqrt') return `<msqrt>${inside}</msqrt>`;
  if (node.function === 'abs') return row(`${operator('|')}${inside}${operator('|')}`);
  const name = PRINTED[node.function] ?? `<mi>${node.function}</mi>`;
  return `${name}${APPLY}${row(`${operator('(')}${inside}${operator(')')}`)}`;
}
