/** The model as one C file (C99): a function that fills A, B, C and D from a structure of parameters. Needs math.h alone. */

import { formulaC } from '../../algebra/symbolic/index.ts';
import { CAUTION } from '../caution.ts';
import type { ModelContext } from '../format.ts';
import { oneLine, wrapped } from '../one-line.ts';
import { cLanguage } from './expression-code.ts';
import { cNames } from './legal-names.ts';
import { type CodeParameter, entryCode, type ModelCode, modelCode, textCode } from './model-code.ts';

const WIDTH = 100;
const KEYS = ['A', 'B', 'C', 'D'] as const;

/** Text of the source, ended by a line feed. A matrix without rows or columns is left out: C has no arrays of length zero. */
export function writeC(context: ModelContext): string {
  const code = modelCode(context);
  const { model, given, derived, note } = code;
  const spelled = cNames([...given, ...derived].map(({ name }) => name));
  const nameOf = (name: string) => spelled.get(name) ?? name;
  const isGiven = new Set(given.map(({ name }) => name));
  const valueOf = (name: string) => (isGiven.has(name) ? `p->${nameOf(name)}` : nameOf(name));
  return [
    ...comment([model.title || 'Untitled', note, "x' = A x + B u, y = C x + D u.", CAUTION]),
    '#include <math.h>',
    '',
    `enum { STATE_COUNT = ${model.states.length}, INPUT_COUNT = ${model.inputs.length}, OUTPUT_COUNT = ${model.outputs.length} };`,
    '',
    ...comment([
      `states: ${listOf(model.states)}`,
      `inputs: ${listOf(model.inputs)}`,
      `outputs: ${listOf(model.outputs)}`,
    ]),
    ...initialState(model.initialState),
    ...structure(given, nameOf),
    ...matricesFunction(code, nameOf, valueOf),
    '',
  ].join('\n');
}

function initialState(values: readonly number[]): readonly string[] {
  if (values.length === 0) return [];
  return [`const double initial_state[STATE_COUNT] = { ${values.map(cNumber).join(', ')} };`, ''];
}

/** The parameters, and the values that they have in the drawing. */
function structure(given: readonly CodeParameter[], nameOf: (name: string) => string): readonly string[] {
  if (given.length === 0) return [];
  const fields = given.map(each => `    double ${nameOf(each.name)};${remark(each)}`);
  const values = given.map(({ name, double }) => `    .${nameOf(name)} = ${cNumber(double)},`);
  return ['struct parameters {', ...fields, '};', '', 'const struct parameters as_drawn = {', ...values, '};', ''];
}

function matricesFunction(
  code: ModelCode,
  nameOf: (name: string) => string,
  valueOf: (name: string) => string,
): readonly string[] {
  const language = cLanguage(valueOf);
  const entries = entryCode(code, formula => formulaC(formula, name => textCode(name, language)), cNumber);
  const filled = KEYS.filter(key => (entries[key][0]?.length ?? 0) > 0);
  const shapes = {
    A: '[STATE_COUNT][STATE_COUNT]',
    B: '[STATE_COUNT][INPUT_COUNT]',
    C: '[OUTPUT_COUNT][STATE_COUNT]',
    D: '[OUTPUT_COUNT][INPUT_COUNT]',
  };
  const takes = [
    ...(code.given.length > 0 ? ['const struct parameters *p'] : []),
    ...filled.map(key => `double ${key}${shapes[key]}`),
  ];
  const derived = code.derived.map(
    each => `    const double ${nameOf(each.name)} = ${textCode(each.value, language)};${remark(each)}`,
  );
  // What only other derived parameters use, or nothing, is no fault of the source.
  const used = code.derived.map(({ name }) => `    (void)${nameOf(name)};`);
  const lines = filled.flatMap(key =>
    entries[key].flatMap((row, i) => row.map((entry, j) => `    ${key}[${i}][${j}] = ${entry};`)),
  );
  return [
    ...comment(['Fills the matrices: rows as states and outputs, columns as states and inputs.']),
    `void matrices(${takes.length === 0 ? 'void' : takes.join(', ')})`,
    '{',
    ...(code.given.length > 0 ? ['    (void)p;'] : []),
    ...derived,
    ...used,
    ...lines,
    '}',
  ];
}

function remark({ unit, note }: CodeParameter): string {
  const text = safe([unit, note].filter(part => part !== undefined && part !== '').join(': '));
  return text === '' ? '' : ` /* ${text} */`;
}

function comment(paragraphs: readonly string[]): readonly string[] {
  const lines = paragraphs.filter(paragraph => paragraph !== '').flatMap(paragraph => wrapped(safe(paragraph), WIDTH));
  return ['/*', ...lines.map(line => ` * ${line}`), ' */'];
}

/** Text that neither ends nor opens a comment, and is no trigraph or line to be continued. */
function safe(text: string): string {
  return oneLine(text).replaceAll('*/', '* /').replaceAll('/*', '/ *').replaceAll('??', '? ?').replace(/\\$/, '');
}

function listOf(signals: readonly { readonly name: string }[]): string {
  return signals.length === 0 ? 'none' : signals.map(({ name }) => name).join(', ');
}

/** The shortest decimal that reads back as the double, as a double's literal. */
function cNumber(value: number): string {
  const text = String(value);
  return /[.e]/.test(text) ? text : `${text}.0`;
}
