/** Names and expressions as LaTeX for maths mode. Nothing but letters, digits and our own commands gets through unescaped. */

import type { CallNode } from '../expression.ts';
import type { FunctionName } from '../functions.ts';
import { greekCommand } from '../greek.ts';
import { parseExpression } from '../parse.ts';
import { isOneLetter, type Letters, nameParts } from './name-parts.ts';
import { notate, type Writer } from './notate.ts';

/** An expression with stacked fractions; text that is none as `\text{…}`. */
export function toLatex(text: string): string {
  const parsed = parseExpression(text);
  return parsed.ok ? notate(parsed.value, WRITER) : `\\text{${escapeLatex(text)}}`;
}

/** A name with its subscripts and Greek letters: `omega_n` is `\omega_{\mathrm{n}}`. */
export function nameToLatex(name: string): string {
  return nameParts(name)
    .map(({ base, lowered }) => {
      const below = lowered.map(lettersBelow).join(',');
      return below === '' ? letters(base) : `${letters(base)}_{${below}}`;
    })
    .join('.');
}

function letters(piece: Letters): string {
  const command = greekCommand(piece.typed);
  if (command !== null) return command;
  return isOneLetter(piece) ? piece.typed : `\\mathrm{${escapeLatex(piece.typed)}}`;
}

function lettersBelow(piece: Letters): string {
  const command = greekCommand(piece.typed);
  return command ?? (/^\d+$/.test(piece.typed) ? piece.typed : `\\mathrm{${escapeLatex(piece.typed)}}`);
}

const ESCAPED: Readonly<Record<string, string>> = {
  '\\': '\\textbackslash{}',
  '~': '\\textasciitilde{}',
  '^': '\\textasciicircum{}',
};

// biome-ignore lint/suspicious/noControlCharactersInRegex: they are what is taken out
const CONTROL = /[\u0000-\u001f\u007f-\u009f\u2028\u2029]/g;

/** Text with LaTeX's own characters escaped. */
export function escapeLatex(text: string): string {
  return text.replace(CONTROL, ' ').replace(/[\\~^{}$&#_%]/g, character => ESCAPED[character] ?? `\\${character}`);
}

const WRITER: Writer<string> = {
  isStacked: true,
  literal: ({ mantissa, power }) => {
    if (power === null) return mantissa ?? '1';
    return mantissa === null ? `10^{${power}}` : `${mantissa} \\cdot 10^{${power}}`;
  },
  name: nameToLatex,
  negative: operand => `-${operand}`,
  sum: (left, operator, right) => `${left} ${operator} ${right}`,
  product: (left, right, isDotted) => `${left} ${isDotted ? '\\cdot' : '\\,'} ${right}`,
  quotient: (above, below) => `\\frac{${above}}{${below}}`,
  power: (base, exponent) => `${base}^{${exponent}}`,
  call: callLatex,
  parentheses: inside => `\\left(${inside}\\right)`,
};

const COMMANDS: Partial<Record<FunctionName, string>> = {
  log10: '\\log_{10}',
  asin: '\\arcsin',
  acos: '\\arccos',
  atan: '\\arctan',
  atan2: '\\operatorname{atan2}',
};

function callLatex(node: CallNode, values: readonly string[]): string {
  const inside = values.join(', ');
  if (node.function === 'sqrt') return `\\sqrt{${inside}}`;
  if (node.function === 'abs') return `\\left|${inside}\\right|`;
  return `${COMMANDS[node.function] ?? `\\${node.function}`}\\left(${inside}\\right)`;
}
