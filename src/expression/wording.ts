/** The sentences that refusals of this folder share. They name no block: the caller knows it and puts it in front. */

import { type Problem, problem } from '../problem/index.ts';

/** Longest text that a message repeats; more would push the advice off the line. */
const LONGEST_QUOTE = 60;

// biome-ignore lint/suspicious/noControlCharactersInRegex: they are what is taken out
const CONTROL_CHARACTERS = /[\u0000-\u001f\u007f-\u009f\u2028\u2029]/g;

/** The text on one line, cut off where it is long; control characters become spaces. */
export function onOneLine(text: string): string {
  const line = text.slice(0, LONGEST_QUOTE + 1).replace(CONTROL_CHARACTERS, ' ');
  return line.length <= LONGEST_QUOTE ? line : `${line.slice(0, LONGEST_QUOTE - 1)}…`;
}

/** `onOneLine` in quotation marks. */
export function quote(text: string): string {
  return `"${onOneLine(text)}"`;
}

/** Whether `quote` shows all of it. */
export function isQuotedWhole(text: string): boolean {
  return text.length <= LONGEST_QUOTE;
}

/** Longest name or number that advice repeats. */
const LONGEST_WORD = 24;

/** A name or number of the text as advice repeats it, cut off where it is long. */
export function word(text: string): string {
  return text.length <= LONGEST_WORD ? text : `${text.slice(0, LONGEST_WORD - 1)}…`;
}

/** `"2 k" is not an expression. Write 2*k.` */
export function notAnExpression(text: string, advice: string): Problem {
  return problem('bad-expression', `${quote(text)} is not an expression. ${advice}`);
}
