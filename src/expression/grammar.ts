/**
 * Whether tokens form an expression: the step after tokens.ts and before the tree. It runs through them once, without
 * recursion, so that what reaches the parser is correct, shallow and free of implied products, and every refusal says
 * what to write.
 */

import { fail, ok, type Problem, type Result } from '../problem/index.ts';
import { argumentsOf, FUNCTION_NAMES, type FunctionName, isFunctionName } from './functions.ts';
import { nearestName } from './spelling.ts';
import type { Token } from './tokens.ts';
import { isQuotedWhole, notAnExpression, word } from './wording.ts';

/** Deepest nesting (format.md): open parentheses, and the minus signs and powers waiting for what stands to their right. */
export const DEEPEST_NESTING = 250;

/** One open parenthesis: of a call, with the arguments begun so far, or of a plain group. */
interface Level {
  readonly call: FunctionName | null;
  commas: number;
  /** Minus signs and powers waiting on this level. */
  waiting: number;
}

interface Reading {
  readonly text: string;
  readonly tokens: readonly Token[];
  readonly levels: Level[];
  /** Levels and what waits on them. */
  depth: number;
  expectsOperand: boolean;
  /** Indices of the tokens in front of which a `*` is missing. */
  readonly impliedProducts: number[];
}

/** The tokens themselves where they form an expression. Linear. */
export function checkGrammar(text: string, tokens: readonly Token[]): Result<readonly Token[]> {
  const bottom: Level = { call: null, commas: 0, waiting: 0 };
  const reading: Reading = { text, tokens, levels: [bottom], depth: 0, expectsOperand: true, impliedProducts: [] };
  let problem: Problem | null = null;
  for (let i = 0; i < tokens.length && problem === null; i++) {
    problem = reading.expectsOperand ? operandProblem(reading, i) : operatorProblem(reading, i);
  }
  problem ??= endProblem(reading);
  const products = impliedProductProblem(reading, problem !== null);
  const first = products ?? problem;
  return first === null ? ok(tokens) : fail(first);
}

const topOf = (reading: Reading): Level => {
  const level = reading.levels.at(-1);
  if (level === undefined) throw new Error('the lowest level is never closed');
  return level;
};

const tokenAt = (reading: Reading, i: number): Token | null => reading.tokens[i] ?? null;

function operandProblem(reading: Reading, i: number): Problem | null {
  const token = tokenAt(reading, i);
  if (token === null) return null;
  switch (token.kind) {
    case 'number':
      reading.expectsOperand = false;
      return null;
    case 'name':
      return nameProblem(reading, i, token);
    case '(':
      return openLevel(reading, calledAt(reading, i - 1));
    case 'operator':
      if (token.text === '-') return wait(reading);
      return missingOperand(reading, i, token);
    case ')':
    case ',':
      return missingOperand(reading, i, token);
    default:
      return token.kind satisfies never;
  }
}

/** A name in the place of an operand: a function with its arguments or a parameter. */
function nameProblem(reading: Reading, i: number, token: Token): Problem | null {
  const isCalled = tokenAt(reading, i + 1)?.kind === '(';
  if (!isFunctionName(token.text)) {
    if (isCalled && token.end === tokenAt(reading, i + 1)?.start) {
      const misspelt = misspeltFunction(reading, token.text);
      if (misspelt !== null) return misspelt;
    }
    reading.expectsOperand = false;
    return null;
  }
  if (isCalled) return null; // the parenthesis opens its level
  return notAnExpression(reading.text, `Write what ${token.text} is of in parentheses: ${token.text}(x).`);
}

/** Null where `name` looks like no function; it is then a parameter in front of a parenthesis. */
function misspeltFunction(reading: Reading, name: string): Problem | null {
  if (name.toLowerCase() === 'log') {
    return notAnExpression(reading.text, 'Write ln for the natural logarithm, log10 for the one to base 10.');
  }
  const meant = nearestName(name, FUNCTION_NAMES);
  return meant === null
    ? null
    : notAnExpression(reading.text, `There is no function ${word(name)}. Did you mean ${meant}?`);
}

/** The function whose name token i is; where an operand is awaited, only a function's name can stand in front of a (. */
function calledAt(reading: Reading, i: number): FunctionName | null {
  const token = tokenAt(reading, i);
  return token !== null && isFunctionName(token.text) ? token.text : null;
}

function openLevel(reading: Reading, call: FunctionName | null): Problem | null {
  reading.levels.push({ call, commas: 0, waiting: 0 });
  return deeper(reading);
}

function wait(reading: Reading): Problem | null {
  topOf(reading).waiting += 1;
  return deeper(reading);
}

function deeper(reading: Reading): Problem | null {
  reading.depth += 1;
  if (reading.depth <= DEEPEST_NESTING) return null;
  return notAnExpression(
    reading.text,
    `It is nested more than ${DEEPEST_NESTING} deep. Define parts of it as parameters.`,
  );
}

function missingOperand(reading: Reading, i: number, token: Token): Problem {
  const before = tokenAt(reading, i - 1);
  if (before === null && token.text === '+') return notAnExpression(reading.text, 'Leave out the + in front.');
  if (before === null) return notAnExpression(reading.text, `Something is missing before ${token.text}.`);
  if (token.text === '*' && before.text === '*') return notAnExpression(reading.text, 'Write ^ for a power.');
  if (token.text === '+') return notAnExpression(reading.text, `Leave out the + after ${before.text}.`);
  return notAnExpression(reading.text, `Something is missing between ${word(before.text)} and ${word(token.text)}.`);
}

function operatorProblem(reading: Reading, i: number): Problem | null {
  const token = tokenAt(reading, i);
  const before = tokenAt(reading, i - 1);
  if (token === null || before === null) return null;
  switch (token.kind) {
    case 'number':
      if (before.kind === 'number') return twoNumbers(reading.text, before, token);
      return impliedProduct(reading, i);
    case 'name':
      return impliedProduct(reading, i);
    case '(':
      return impliedProduct(reading, i);
    case 'operator':
      reading.expectsOperand = true;
      if (token.text === '^') return wait(reading);
      settle(reading);
      return null;
    case ',':
      return commaProblem(reading, i, before);
    case ')':
      return closeLevel(reading);
    default:
      return token.kind satisfies never;
  }
}

/** What waited on this level has got all of its right side. */
function settle(reading: Reading): void {
  const level = topOf(reading);
  reading.depth -= level.waiting;
  level.waiting = 0;
}

function twoNumbers(text: string, before: Token, token: Token): Problem {
  if (before.end === token.start) return notAnExpression(text, `${word(before.text + token.text)} is not a number.`);
  return notAnExpression(text, `Write an operator between ${word(before.text)} and ${word(token.text)}.`);
}

/** Notes that a `*` is missing and reads on as if it were there. */
function impliedProduct(reading: Reading, i: number): Problem | null {
  reading.impliedProducts.push(i);
  settle(reading);
  reading.expectsOperand = true;
  return operandProblem(reading, i);
}

function commaProblem(reading: Reading, i: number, before: Token): Problem | null {
  const level = topOf(reading);
  if (level.call !== null) {
    settle(reading);
    level.commas += 1;
    reading.expectsOperand = true;
    return null;
  }
  const after = tokenAt(reading, i + 1);
  if (before.kind === 'number' && after?.kind === 'number') {
    return notAnExpression(reading.text, `Write a decimal point: ${word(`${before.text}.${after.text}`)}.`);
  }
  return notAnExpression(reading.text, 'A comma stands only between the arguments of a function.');
}

function closeLevel(reading: Reading): Problem | null {
  if (reading.levels.length === 1) return notAnExpression(reading.text, 'A ) closes what no ( has opened.');
  settle(reading);
  reading.depth -= 1;
  const level = reading.levels.pop();
  if (level === undefined || level.call === null) return null;
  const count = level.commas + 1;
  const [least, most] = argumentsOf(level.call);
  if (count >= least && count <= most) return null;
  const wanted = least === 1 ? 'one argument' : 'two arguments, separated by a comma';
  return notAnExpression(reading.text, `${level.call} takes ${wanted}.`);
}

function endProblem(reading: Reading): Problem | null {
  const last = reading.tokens.at(-1);
  if (reading.expectsOperand && last !== undefined) {
    return notAnExpression(reading.text, `Something is missing after ${word(last.text)}.`);
  }
  const open = reading.levels.length - 1;
  if (open === 0) return null;
  return notAnExpression(reading.text, open === 1 ? 'A ) is missing at the end.' : `At the end ${open} ) are missing.`);
}

/** Says where the `*` go: in the whole text where that is short and else all right, else between the first two tokens. */
function impliedProductProblem(reading: Reading, isBrokenToo: boolean): Problem | null {
  const [first] = reading.impliedProducts;
  if (first === undefined) return null;
  const { text, tokens } = reading;
  if (!isBrokenToo && isQuotedWhole(text)) return notAnExpression(text, `Write ${withProducts(reading)}.`);
  const [before, after] = [tokens[first - 1], tokens[first]];
  if (before === undefined || after === undefined) return null;
  if (before.kind === 'name' && after.kind === '(') {
    return notAnExpression(
      text,
      `There is no function ${word(before.text)}; for a product write ${word(before.text)}*(.`,
    );
  }
  return notAnExpression(text, `Write ${word(before.text)}*${word(after.text)}.`);
}

function withProducts({ text, tokens, impliedProducts }: Reading): string {
  const missing = new Set(impliedProducts);
  const pieces = tokens.map((token, i) => {
    const next = tokens[i + 1]?.start ?? token.end;
    return token.text + (missing.has(i + 1) ? '*' : text.slice(token.end, next));
  });
  return pieces.join('').replace(/\s+/g, ' ');
}
