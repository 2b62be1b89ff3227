/**
 * Text to tokens, the first step of parsing. Knows the characters of format.md and nothing else; what it cannot read it
 * refuses with what to write instead.
 */

import { fail, ok, problem, type Result } from '../problem/index.ts';
import { GREEK_LETTERS } from './greek.ts';
import { notAnExpression } from './wording.ts';

/** A piece of the text from `start` up to `end`, in UTF-16 units. */
export interface Token {
  readonly kind: 'number' | 'name' | 'operator' | '(' | ')' | ',';
  readonly text: string;
  readonly start: number;
  readonly end: number;
}

/** Most characters of one expression (format.md). */
export const LONGEST_EXPRESSION = 10_000;

const PIECE = /([ \t\r\n]+)|((?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?)|([A-Za-z][A-Za-z0-9_]*)|([-+*/^])|([(),])/y;

/** The tokens in order, white space left out; a refusal where the text is empty, too long or holds another character. */
export function tokens(text: string): Result<readonly Token[]> {
  if (text.length > LONGEST_EXPRESSION) return fail(tooLong(text));
  const found: Token[] = [];
  let start = 0;
  while (start < text.length) {
    PIECE.lastIndex = start;
    const match = PIECE.exec(text);
    if (match === null) return fail(strangeCharacter(text, start));
    const end = PIECE.lastIndex;
    const token = tokenOf(match, start, end);
    if (token !== null) found.push(token);
    start = end;
  }
  return found.length > 0
    ? ok(found)
    : fail(problem('bad-expression', 'Nothing is written here. Write a number or a formula.'));
}

function tokenOf(match: RegExpExecArray, start: number, end: number): Token | null {
  const [text, space, number, name, operator] = match;
  if (space !== undefined) return null;
  if (number !== undefined) return { kind: 'number', text, start, end };
  if (name !== undefined) return { kind: 'name', text, start, end };
  if (operator !== undefined) return { kind: 'operator', text, start, end };
  return { kind: text === '(' ? '(' : text === ')' ? ')' : ',', text, start, end };
}

function tooLong(text: string) {
  const advice = `It is ${text.length} characters long, the limit is 10000. Define parts of it as parameters.`;
  return notAnExpression(text, advice);
}

/** What to write for characters that people paste from elsewhere. */
const WRITE_INSTEAD: ReadonlyMap<string, string> = new Map([
  ...['−', '–', '—'].map(sign => [sign, '-'] as const),
  ...['×', '·', '⋅', '∙'].map(sign => [sign, '*'] as const),
  ...['÷', '∕', '⁄'].map(sign => [sign, '/'] as const),
  ['²', '^2'],
  ['³', '^3'],
  ['√', 'sqrt( )'],
  ...[...GREEK_LETTERS].map(([name, letter]) => [letter, name] as const),
]);

function strangeCharacter(text: string, at: number) {
  const code = text.codePointAt(at) ?? 0;
  const character = String.fromCodePoint(code);
  const instead = WRITE_INSTEAD.get(character);
  if (instead !== undefined) return notAnExpression(text, `Write ${instead} for ${character}.`);
  if (character === '_') return notAnExpression(text, 'A name begins with a letter.');
  const isVisible = code > 0x20 && code < 0x7f;
  const shown = isVisible ? character : `The character U+${code.toString(16).toUpperCase().padStart(4, '0')}`;
  return notAnExpression(text, `${shown} has no meaning in it. Take it out.`);
}
