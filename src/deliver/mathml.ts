/**
 * The model as presentation MathML (W3C, MathML Core): ẋ = A x + B u and y = C x + D u, an equation a row, with the names in
 * their places. Title and caution stand in a comment.
 */

import { toFraction } from '../algebra/index.ts';
import type { SignalName, StateSpace } from '../compile/index.ts';
import { mathElement, nameToMathML, toMathML } from '../expression/index.ts';
import { CAUTION } from './caution.ts';
import { type Printer, printedRows } from './entries.ts';
import type { ModelContext } from './format.ts';
import type { MatrixRows } from './matrix-rows.ts';
import { oneLine } from './one-line.ts';
import { symbolMathml } from './written-symbols.ts';

/** The d of a derivative is upright (ISO 80000-2). */
const UPRIGHT_D = '<mi mathvariant="normal">d</mi>';
const DERIVATIVE = `<mfrac>${UPRIGHT_D}<mrow>${UPRIGHT_D}<mi>t</mi></mrow></mfrac>`;

/** One `math` element; its equations are the rows of a table, those without an entry left out. */
export function writeMathml(context: ModelContext): string {
  const { model } = context.derivation;
  const { note, ...rows } = printedRows(context, PRINTER);
  const lines = equations(model, rows).map(equation => `<mtr><mtd>${row(...equation)}</mtd></mtr>`);
  const comment = oneLine(`${model.title} ${note ?? ''} ${CAUTION}`).replace(/-(?=-)/g, '- ');
  return `<!-- ${comment} -->\n${mathElement(`<mtable displaystyle="true">\n${lines.join('\n')}\n</mtable>`, 'block')}\n`;
}

function equations(model: StateSpace, { A, B, C, D }: MatrixRows<string>): string[][] {
  const { states, inputs, outputs, initialState } = model;
  const x = column(states.map(mathmlNameOf));
  const u = column(inputs.map(mathmlNameOf));
  const all: string[][] = [];
  if (states.length > 0) all.push([DERIVATIVE, x, operator('='), ...sum(term(A, x), term(B, u))]);
  if (outputs.length > 0) all.push([column(outputs.map(mathmlNameOf)), operator('='), ...sum(term(C, x), term(D, u))]);
  if (initialState.some(value => value !== 0)) {
    const start = `<msub>${x}${row('<mi>t</mi>', operator('='), '<mn>0</mn>')}</msub>`;
    all.push([start, operator('='), column(initialState.map(mathmlDecimal))]);
  }
  return all;
}

const mathmlNameOf = ({ name }: SignalName) => nameToMathML(name);

/** A matrix before its vector; nothing where it has no column. */
function term(rows: MatrixRows<string>['A'], vector: string): readonly string[] {
  return (rows[0]?.length ?? 0) === 0 ? [] : [matrix(rows), vector];
}

function sum(left: readonly string[], right: readonly string[]): string[] {
  if (left.length === 0 && right.length === 0) return ['<mn>0</mn>'];
  const plus = left.length > 0 && right.length > 0 ? [operator('+')] : [];
  return [...left, ...plus, ...right];
}

function column(entries: readonly string[]): string {
  return matrix(entries.map(entry => [entry]));
}

function matrix(rows: MatrixRows<string>['A']): string {
  const body = rows.map(entries => `<mtr>${entries.map(entry => `<mtd>${entry}</mtd>`).join('')}</mtr>`);
  return row('<mo>[</mo>', `<mtable>${body.join('')}</mtable>`, '<mo>]</mo>');
}

function row(...items: readonly string[]): string {
  return `<mrow>${items.join('')}</mrow>`;
}

function operator(sign: string): string {
  return `<mo>${sign}</mo>`;
}

function mathmlDecimal(value: number): string {
  return toMathML(String(value));
}

const PRINTER: Printer<string> = {
  formula: symbolMathml,
  fraction: value => toMathML(toFraction(value)),
  decimal: mathmlDecimal,
};
