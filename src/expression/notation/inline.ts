/** Names and expressions as one typeset line: pieces of text, italic or upright, on the line, lowered or raised. */

import type { CallNode } from '../expression.ts';
import type { FunctionName } from '../functions.ts';
import { parseExpression } from '../parse.ts';
import { isOneLetter, type NamePart, nameParts, shown } from './name-parts.ts';
import { notate, type Writer } from './notate.ts';

/** A piece of a typeset line. */
export interface Span {
  readonly text: string;
  readonly italic: boolean;
  readonly script: 'normal' | 'sub' | 'sup';
}

const upright = (text: string, script: Span['script'] = 'normal'): Span => ({ text, italic: false, script });

/** Between factors that need no sign. */
const THIN_SPACE = '\u2009';
const MINUS = '\u2212';

/** A name with its subscripts lowered and its Greek letters in place; groups in front of it upright, as typed. */
export function nameSpans(name: string): readonly Span[] {
  return nameParts(name).flatMap((part, i) => [...(i === 0 ? [] : [upright('.')]), ...partSpans(part)]);
}

function partSpans({ base, lowered }: NamePart): readonly Span[] {
  const line: Span = { text: shown(base), italic: isOneLetter(base), script: 'normal' };
  return lowered.length === 0 ? [line] : [line, upright(lowered.map(shown).join(','), 'sub')];
}

/** An expression on one line, `1/J` with its stroke; text that is none as typed. */
export function inlineMath(text: string): readonly Span[] {
  const parsed = parseExpression(text);
  return parsed.ok ? joined(notate(parsed.value, WRITER)) : [upright(text)];
}

/** Neighbours of one look as one span. */
function joined(spans: readonly Span[]): readonly Span[] {
  const result: Span[] = [];
  for (const span of spans) {
    const last = result.at(-1);
    const isAlike = last !== undefined && last.italic === span.italic && last.script === span.script;
    if (isAlike) result[result.length - 1] = { ...last, text: last.text + span.text };
    else result.push(span);
  }
  return result;
}

type Line = readonly Span[];

const WRITER: Writer<Line> = {
  isStacked: false,
  literal: ({ mantissa, power }) => {
    if (power === null) return [upright(mantissa ?? '1')];
    const ten = [upright('10'), upright(power.replace('-', MINUS), 'sup')];
    return mantissa === null ? ten : [upright(`${mantissa}\u00b7`), ...ten];
  },
  name: nameSpans,
  negative: operand => [upright(MINUS), ...operand],
  sum: (left, operator, right) => [...left, upright(operator === '+' ? ' + ' : ` ${MINUS} `), ...right],
  product: (left, right, isDotted) => [...left, upright(isDotted ? '\u00b7' : THIN_SPACE), ...right],
  quotient: (above, below) => [...above, upright('/'), ...below],
  power: (base, exponent) => [...base, ...exponent.map(raised)],
  call: callLine,
  parentheses: inside => [upright('('), ...inside, upright(')')],
};

/** A raised span; what is lowered or raised in it already is marked as one types it, since a line has one step up only. */
function raised(span: Span): Span {
  const mark = span.script === 'sub' ? '_' : span.script === 'sup' ? '^' : '';
  return { ...span, text: mark + span.text, script: 'sup' };
}

/** Functions whose sign in print is not the name that is typed (ISO 80000-2). */
const PRINTED: Partial<Record<FunctionName, Line>> = {
  log10: [upright('log'), upright('10', 'sub')],
  asin: [upright('arcsin')],
  acos: [upright('arccos')],
  atan: [upright('arctan')],
};

function callLine(node: CallNode, values: readonly Line[], isAtom: readonly boolean[]): Line {
  const inside = values.flatMap((value, i) => (i === 0 ? value : [upright(', '), ...value]));
  if (node.function === 'abs') return [upright('|'), ...inside, upright('|')];
  const name = node.function === 'sqrt' ? [upright('√')] : (PRINTED[node.function] ?? [upright(node.function)]);
  if (node.function === 'sqrt' && isAtom[0] === true) return [...name, ...inside];
  return [...name, upright('('), ...inside, upright(')')];
}
