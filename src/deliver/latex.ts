/**
 * The model as LaTeX: ẋ = A x + B u and y = C x + D u with the names in their places. Plain arrays, no package needed, and no
 * limit on the number of columns. Title and caution stand in comments.
 */

import { toFraction } from '../algebra/index.ts';
import type { SignalName, StateSpace } from '../compile/index.ts';
import { nameToLatex, toLatex } from '../expression/index.ts';
import { CAUTION } from './caution.ts';
import { type Printer, printedRows } from './entries.ts';
import type { ModelContext } from './format.ts';
import type { MatrixRows } from './matrix-rows.ts';
import { oneLine, wrapped } from './one-line.ts';
import { symbolLatex } from './written-symbols.ts';

const COMMENT_WIDTH = 100;

/** Two displayed equations and, where it is not zero, the initial state; an equation without a row is left out. */
export function writeLatex(context: ModelContext): string {
  const { model } = context.derivation;
  const { note, ...rows } = printedRows(context, PRINTER);
  const comments = [oneLine(model.title), note ?? '', CAUTION];
  return [
    ...comments
      .filter(comment => comment !== '')
      .flatMap(comment => wrapped(comment, COMMENT_WIDTH))
      .map(line => `% ${line}`),
    ...equations(model, rows).flatMap(equation => ['\\[', ...equation, '\\]']),
    '',
  ].join('\n');
}

function equations(model: StateSpace, { A, B, C, D }: MatrixRows<string>): string[][] {
  const { states, inputs, outputs, initialState } = model;
  const x = column(states.map(latexNameOf));
  const u = column(inputs.map(latexNameOf));
  const all: string[][] = [];
  if (states.length > 0) all.push(['\\frac{\\mathrm{d}}{\\mathrm{d}t}', x, '=', ...sum(term(A, x), term(B, u))]);
  if (outputs.length > 0) all.push([column(outputs.map(latexNameOf)), '=', ...sum(term(C, x), term(D, u))]);
  if (initialState.some(value => value !== 0)) all.push([`${x}_{t=0}`, '=', column(initialState.map(latexDecimal))]);
  return all;
}

const latexNameOf = ({ name }: SignalName) => nameToLatex(name);

/** A matrix before its vector; null where it has no column. */
function term(rows: MatrixRows<string>['A'], vector: string): string | null {
  return (rows[0]?.length ?? 0) === 0 ? null : `${array(rows, 'r')}\n${vector}`;
}

function sum(left: string | null, right: string | null): string[] {
  const terms = [left, right].filter(each => each !== null);
  return terms.length === 0 ? ['0'] : [terms.join('\n+\n')];
}

function column(entries: readonly string[]): string {
  return array(
    entries.map(entry => [entry]),
    'c',
  );
}

function array(rows: MatrixRows<string>['A'], alignment: 'r' | 'c'): string {
  const body = rows.map(row => `  ${row.join(' & ')} \\\\`);
  const columns = alignment.repeat(rows[0]?.length ?? 0);
  return [`\\left[\\begin{array}{${columns}}`, ...body, '\\end{array}\\right]'].join('\n');
}

function latexDecimal(value: number): string {
  return toLatex(String(value));
}

const PRINTER: Printer<string> = {
  formula: symbolLatex,
  fraction: value => toLatex(toFraction(value)),
  decimal: latexDecimal,
};
