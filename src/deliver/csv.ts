/**
 * The model as one table of comma-separated values (RFC 4180: CRLF, every record as long as the first). It is the system
 * matrix with its names: A and B over C and D, then the initial state, the title and the caution.
 *
 * Entries are always decimals: a spreadsheet reads 1/2 as a date. Each cell that holds a text of the user begins with a word
 * of ours, so that none of them can begin as a formula does (= + - @); a cell that begins with a minus is a number.
 */

import { CAUTION } from './caution.ts';
import { numericRows } from './entries.ts';
import type { ModelContext } from './format.ts';
import { oneLine } from './one-line.ts';

/** The table; lines end in CRLF, numbers are the shortest decimals that give the double back. */
export function writeCsv({ derivation: { model } }: ModelContext): string {
  const rows = numericRows(model);
  const columns = [
    ...model.states.map(({ name }) => `state ${name}`),
    ...model.inputs.map(({ name }) => `input ${name}`),
  ];
  const records = [
    ['row', ...columns],
    ...model.states.map(({ name }, i) => [`derivative of ${name}`, ...numbers(rows.A[i]), ...numbers(rows.B[i])]),
    ...model.outputs.map(({ name }, i) => [`output ${name}`, ...numbers(rows.C[i]), ...numbers(rows.D[i])]),
    ['initial state', ...numbers(model.initialState)],
    [`title: ${oneLine(model.title)}`],
    [`caution: ${CAUTION}`],
  ];
  const width = columns.length + 1;
  return records.map(record => `${padded(record, width).map(field).join(',')}\r\n`).join('');
}

function numbers(values: readonly number[] = []): string[] {
  return values.map(String);
}

function padded(record: readonly string[], width: number): string[] {
  return [...record, ...new Array<string>(width - record.length).fill('')];
}

/** Quoted where RFC 4180 asks for it: a comma, a quote or a line break inside. */
function field(text: string): string {
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
}
