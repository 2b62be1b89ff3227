/** What is said of a trace, as text: for the line under the matrix, where names are then set as mathematics, and for the ear. */

import type { StateSpace } from '../../compile/index.ts';
import type { EntryEnd, EntryPlace, Trace, TracedStep, TracedValue, TracedWalk } from '../../compile/trace/index.ts';
import { figureOf, figureText, formatFraction, isWritableFraction } from '../figures/index.ts';

type Traced = Extract<Trace, { readonly outcome: 'traced' }>;

/** `5/4`, or a decimal where the fraction is too long to be read or decimals are asked for. */
export function numberText({ exact }: TracedValue, isDecimal = false): string {
  if (!isDecimal && isWritableFraction(exact)) return formatFraction(exact);
  const figure = figureOf(exact);
  return `${figure.isRounded ? '≈ ' : ''}${figureText(figure)}`;
}

/** The expression where there is one that says more than the number; null else. */
export function symbolsOf(value: TracedValue): string | null {
  const { symbols } = value;
  return symbols === null || !/[A-Za-z]/.test(symbols) ? null : symbols;
}

/** `1/J = 5/4`, or the number alone. */
export function valueText(value: TracedValue): string {
  const symbols = symbolsOf(value);
  return symbols === null ? numberText(value) : `${symbols} = ${numberText(value)}`;
}

/** `the derivative of omega`, `output F`. */
export function endText({ kind, name }: EntryEnd): string {
  switch (kind) {
    case 'derivative':
      return `the derivative of ${name}`;
    case 'output':
      return `output ${name}`;
    case 'input':
      return `input ${name}`;
    case 'state':
      return name;
    default:
      return kind satisfies never;
  }
}

/** How the value comes about: `one path`, `2 paths over the determinant of 1 loop`, `no path leads there`. */
export function waysText({ paths, loops }: Traced): string {
  if (paths.length === 0) return 'no path leads there';
  const ways = paths.length === 1 ? 'one path' : `${paths.length} paths`;
  if (loops.length === 0) return paths.length === 1 ? ways : `the sum of ${ways}`;
  return `${ways} over the determinant of ${loops.length === 1 ? 'one loop' : `${loops.length} loops`}`;
}

/** `T → summing point → 1/J → integrator omega`: from the column's signal along the blocks. */
export function stepsOf(from: EntryEnd, walk: TracedWalk): readonly TracedStep[] {
  const own = walk.blocks[0] === from.block ? walk.steps.slice(1) : walk.steps;
  const start: TracedStep = { word: '', math: from.name };
  return own.length === 0 ? [start, ...walk.steps] : [start, ...own];
}

function stepText({ word, math }: TracedStep): string {
  return [word, math].filter(part => part !== '').join(' ');
}

/** Everything in one sentence, as a screen reader is to say it. */
export function spokenTrace(trace: Trace): string {
  const entry = `${endText(trace.to)} from ${endText(trace.from)}`;
  if (trace.outcome === 'not-traced') return `${entry}: ${trace.reason}`;
  const [first, ...others] = trace.paths;
  const steps = first === undefined ? '' : `: ${stepsOf(trace.from, first).map(stepText).join(', then ')}`;
  const more = others.length === 0 ? '' : `, and ${others.length} more`;
  return `${entry}: ${valueText(trace.value)}, ${waysText(trace)}${steps}${more}.`;
}

/** Entries that are listed for a block or wire; of more, the number is told. */
export const MOST_LISTED = 12;

/** `no entries`, `1 entry`, `3 entries`. */
export function entryCount(count: number): string {
  return count === 1 ? '1 entry' : `${count === 0 ? 'no' : count} entries`;
}

/** What a block or wire takes part in, as a screen reader is to say it; `title` begins the sentence. */
export function spokenPart(
  title: string,
  { states, inputs, outputs }: StateSpace,
  entries: readonly EntryPlace[],
): string {
  const start = `${title} takes part in ${entryCount(entries.length)}`;
  if (entries.length === 0) return `${start}.`;
  const rows = [...states, ...outputs];
  const columns = [...states, ...inputs];
  const listed = entries.slice(0, MOST_LISTED).map(({ row, column }) => {
    const to = rows[row]?.name ?? '';
    return `${row < states.length ? `the derivative of ${to}` : `output ${to}`} from ${columns[column]?.name ?? ''}`;
  });
  const more = entries.length - listed.length;
  return `${start}: ${listed.join(', ')}${more > 0 ? ` and ${more} more` : ''}.`;
}
