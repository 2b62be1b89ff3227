/** The model as a Python 3 module: a function of the parameters that returns A, B, C and D as NumPy arrays. */

import { formulaPython } from '../../algebra/symbolic/index.ts';
import { CAUTION } from '../caution.ts';
import type { ModelContext } from '../format.ts';
import { oneLine, wrapped } from '../one-line.ts';
import { pythonLanguage } from './expression-code.ts';
import { pythonNames } from './legal-names.ts';
import { type CodeParameter, entryCode, type ModelCode, modelCode, textCode } from './model-code.ts';

const WIDTH = 100;

/** Text of the module, ended by a line feed. Where there are no formulas the function takes no parameters. */
export function writePython(context: ModelContext): string {
  const code = modelCode(context);
  const { model, given, derived, note } = code;
  const spelled = pythonNames([...given, ...derived].map(({ name }) => name));
  const nameOf = (name: string) => spelled.get(name) ?? name;
  const body = bodyOf(code, nameOf);
  const needsMath = body.some(line => line.includes('math.'));
  const names = (label: string, signals: readonly { readonly name: string }[]) =>
    `${label} = (${signals.map(({ name }) => `${quoted(name)},`).join(' ')})`;
  return [
    `"""${docText([model.title || 'Untitled', note, "x' = A x + B u, y = C x + D u.", CAUTION])}`,
    '"""',
    '',
    ...(needsMath ? ['import math', ''] : []),
    'import numpy as np',
    '',
    names('STATES', model.states),
    names('INPUTS', model.inputs),
    names('OUTPUTS', model.outputs),
    `INITIAL_STATE = np.array([${model.initialState.map(pythonNumber).join(', ')}], dtype=float)`,
    '',
    '',
    ...signature(given, nameOf),
    ...body,
    '',
  ].join('\n');
}

/** One parameter a line with its value as drawn, its unit and note beside it. */
function signature(given: readonly CodeParameter[], nameOf: (name: string) => string): readonly string[] {
  if (given.length === 0) return ['def matrices():'];
  const lines = given.map(each => `    ${nameOf(each.name)}=${pythonNumber(each.double)},${remark(each)}`);
  return ['def matrices(', '    *,', ...lines, '):'];
}

function remark({ unit, note }: CodeParameter): string {
  const text = oneLine([unit, note].filter(part => part !== undefined && part !== '').join(': '));
  return text === '' ? '' : `  # ${text}`;
}

function bodyOf(code: ModelCode, nameOf: (name: string) => string): readonly string[] {
  const language = pythonLanguage(nameOf);
  const derived = code.derived.map(
    each => `    ${nameOf(each.name)} = ${textCode(each.value, language)}${remark(each)}`,
  );
  const entries = entryCode(code, formula => formulaPython(formula, name => textCode(name, language)), pythonNumber);
  const { states, inputs, outputs } = code.model;
  const shapes = {
    A: [states.length, states.length],
    B: [states.length, inputs.length],
    C: [outputs.length, states.length],
    D: [outputs.length, inputs.length],
  } as const;
  const arrays = (['A', 'B', 'C', 'D'] as const).flatMap(key => {
    const rows = entries[key].map(row => `                [${row.join(', ')}],`);
    return [
      '        np.array(',
      '            [',
      ...rows,
      '            ],',
      '            dtype=float,',
      `        ).reshape(${shapes[key].join(', ')}),`,
    ];
  });
  return [
    '    """A, B, C and D, rows as STATES and OUTPUTS, columns as STATES and INPUTS."""',
    ...derived,
    '    return (',
    ...arrays,
    '    )',
  ];
}

/** The shortest decimal that reads back as the double, so that nothing is lost. */
function pythonNumber(value: number): string {
  return Number.isFinite(value) ? String(value) : 'float("nan")';
}

function quoted(text: string): string {
  return JSON.stringify(text);
}

function docText(paragraphs: readonly string[]): string {
  return paragraphs
    .filter(paragraph => paragraph !== '')
    .map(paragraph => wrapped(oneLine(paragraph).replaceAll('\\', '\\\\').replaceAll('"', '\\"'), WIDTH).join('\n'))
    .join('\n\n');
}
