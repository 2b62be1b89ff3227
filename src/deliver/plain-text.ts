/**
 * The model as an aligned table for the clipboard: the system matrix with its names, A and B over C and D, read in any face
 * of one width. Title above, initial state (where it is not zero) and the caution below.
 */

import { toFraction } from '../algebra/index.ts';
import { formulaText } from '../algebra/symbolic/index.ts';
import { CAUTION } from './caution.ts';
import { printedRows } from './entries.ts';
import type { ModelContext } from './format.ts';
import { oneLine, wrapped } from './one-line.ts';

const CAUTION_WIDTH = 100;
const GAP = '  ';

/** The table; lines end in LF, columns are aligned to the right, a bar parts states from inputs. */
export function writePlainText(context: ModelContext): string {
  const { model } = context.derivation;
  const rows = printedRows(context, { formula: formulaText, fraction: toFraction, decimal: String });
  const states = model.states.map(({ name }) => oneLine(name));
  const header = ['', ...states, '|', ...model.inputs.map(({ name }) => oneLine(name))];
  const record = (label: string, left: readonly string[] = [], right: readonly string[] = []) =>
    [label, ...left, '|', ...right] as const;
  const upper = states.map((name, i) => record(`d/dt ${name}`, rows.A[i], rows.B[i]));
  const lower = model.outputs.map(({ name }, i) => record(oneLine(name), rows.C[i], rows.D[i]));
  const widths = header.map((_, column) =>
    Math.max(...[header, ...upper, ...lower].map(cells => lengthOf(cells[column]))),
  );
  const line = (cells: readonly string[]) =>
    cells
      .map((cell, i) => aligned(cell, widths[i] ?? 0, i))
      .join(GAP)
      .trimEnd();
  const parting = '-'.repeat(widths.reduce((sum, width) => sum + width + GAP.length, -GAP.length));
  return [
    ...(oneLine(model.title) === '' ? [] : [oneLine(model.title), '']),
    line(header),
    ...upper.map(line),
    parting,
    ...lower.map(line),
    '',
    ...initialStateLines(states, model.initialState),
    ...(rows.note === null ? [] : [rows.note, '']),
    ...wrapped(CAUTION, CAUTION_WIDTH),
    '',
  ].join('\n');
}

function initialStateLines(states: readonly string[], values: readonly number[]): string[] {
  if (values.every(value => value === 0)) return [];
  return [`At time zero: ${states.map((name, i) => `${name} = ${values[i] ?? 0}`).join(', ')}`, ''];
}

/** Labels to the left, entries to the right. */
function aligned(cell: string, width: number, column: number): string {
  const padding = ' '.repeat(Math.max(0, width - lengthOf(cell)));
  return column === 0 ? cell + padding : padding + cell;
}

/** In code points, as most faces of one width draw them. */
function lengthOf(cell = ''): number {
  return Array.from(cell).length;
}
