/**
 * What the exports of source code are made from: the parameters that the entries use, those that are given and those that are derived
 * from them in an order in which they can be computed, and each entry as an expression. The language only spells them.
 */

import type { Formula } from '../../algebra/symbolic/index.ts';
import type { StateSpace } from '../../compile/index.ts';
import type { Parameter } from '../../diagram/index.ts';
import { evaluateParameters, namesIn, parseExpression } from '../../expression/index.ts';
import { numericRows } from '../entries.ts';
import type { Derived } from '../format.ts';
import { formulasOf } from '../formulas.ts';
import { type MatrixRows, mapMatrices } from '../matrix-rows.ts';
import { type CodeLanguage, expressionCode } from './expression-code.ts';

/** A parameter with the double that its value comes to. */
export interface CodeParameter extends Parameter {
  readonly double: number;
}

export interface ModelCode {
  readonly model: StateSpace;
  /** Parameters with a value of their own, in the drawing's order. */
  readonly given: readonly CodeParameter[];
  /** Parameters whose value uses others, each after those it uses. */
  readonly derived: readonly CodeParameter[];
  /** Entries in the parameters; null where there are no formulas, and `numbers` stand for them. */
  readonly formulas: MatrixRows<Formula> | null;
  readonly numbers: MatrixRows<number>;
  /** What is to be said beside the code; empty where nothing is. */
  readonly note: string;
}

/** The parts of a model as code; where it has no formulas, no parameters and the numbers alone. */
export function modelCode(context: Derived): ModelCode {
  const { diagram, derivation } = context;
  const { model } = derivation;
  const { rows, note } = formulasOf(context);
  const numbers = numericRows(model);
  const values = evaluateParameters(diagram.parameters);
  if (rows === null || !values.ok) return { model, given: [], derived: [], formulas: null, numbers, note };
  const all = diagram.parameters.map(each => ({ ...each, double: values.value.get(each.name)?.double ?? Number.NaN }));
  const usesOf = new Map(all.map(({ name, value }) => [name, usedIn(value)]));
  const isGiven = ({ name }: CodeParameter) => usesOf.get(name)?.length === 0;
  const derived: CodeParameter[] = [];
  const open = new Set(all.filter(each => !isGiven(each)));
  while (open.size > 0) {
    const ready = [...open].filter(({ name }) => ![...open].some(other => usesOf.get(name)?.includes(other.name)));
    if (ready.length === 0) break; // values that exist have no cycle
    for (const each of ready) {
      open.delete(each);
      derived.push(each);
    }
  }
  return { model, given: all.filter(isGiven), derived, formulas: rows, numbers, note };
}

function usedIn(value: string): readonly string[] {
  const parsed = parseExpression(value);
  return parsed.ok ? namesIn(parsed.value).filter(name => name !== 'pi' && name !== 'e') : [];
}

/** A text of format.md in a language: the value of a derived parameter, or an irrational part of a formula. */
export function textCode(text: string, language: CodeLanguage): string {
  const parsed = parseExpression(text);
  // What a model was derived from parses.
  return parsed.ok ? expressionCode(parsed.value, language) : text;
}

/** The entries, each as the language writes it. */
export function entryCode(
  { formulas, numbers }: ModelCode,
  formula: (value: Formula) => string,
  number: (value: number) => string,
): MatrixRows<string> {
  if (formulas === null) return mapMatrices(numbers, rows => rows.map(row => row.map(number)));
  return mapMatrices(formulas, rows => rows.map(row => row.map(formula)));
}
