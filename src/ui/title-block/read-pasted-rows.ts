/**
 * Rows of a spreadsheet to parameters: name, value, unit and note in columns, with tabs between them or commas (RFC 4180
 * quotes). A head row that says `name` or `parameter` is passed over. One bad row refuses them all, by its number.
 */

import type { Diagram, Edit } from '../../diagram/index.ts';
import { onOneLine, parameterNameFault, parseExpression } from '../../expression/index.ts';

export interface PastedRow {
  /** Counted from 1 as in what was pasted. */
  readonly row: number;
  readonly name: string;
  readonly value: string;
  readonly unit: string;
  readonly note: string;
}

export type PastedRows =
  | { readonly ok: true; readonly rows: readonly PastedRow[] }
  | { readonly ok: false; readonly message: string };

/** Whether a text is rows of cells rather than something for one field. */
export function isTable(text: string): boolean {
  return /[\t\n]/.test(text.trim());
}

/** The rows, or what is wrong with the first bad one. */
export function readPastedRows(text: string): PastedRows {
  const rows: PastedRow[] = [];
  for (const [i, line] of text.split(/\r\n|\r|\n/).entries()) {
    if (line.trim() === '') continue;
    const [name = '', value = '', unit = '', note = ''] = cellsOf(line);
    if (rows.length === 0 && /^(?:name|parameter)$/i.test(name)) continue;
    const row = { row: i + 1, name, value, unit, note };
    const fault = faultOf(row, rows);
    if (fault !== null) {
      return { ok: false, message: `Row ${row.row}, ${onOneLine(name) || 'no name'}: ${fault} Nothing was pasted.` };
    }
    rows.push(row);
  }
  return rows.length === 0 ? { ok: false, message: 'There are no parameters to paste.' } : { ok: true, rows };
}

function faultOf({ name, value }: PastedRow, earlier: readonly PastedRow[]): string | null {
  const fault = parameterNameFault(name);
  if (fault !== null) return fault;
  const before = earlier.find(row => row.name === name);
  if (before !== undefined) return `Row ${before.row} has this name too.`;
  if (value === '') return 'It has no value. Write name, value, unit and note in columns.';
  const parsed = parseExpression(value);
  return parsed.ok ? null : (parsed.problems[0]?.message ?? `"${value}" is not an expression.`);
}

function cellsOf(line: string): readonly string[] {
  if (line.includes('\t')) return line.split('\t').map(unquoted);
  const cells: string[] = [];
  let start = 0;
  let isQuoted = false;
  for (const [i, character] of [...line.split(''), ','].entries()) {
    if (character === '"') isQuoted = !isQuoted;
    if ((character !== ',' || isQuoted) && i < line.length) continue;
    cells.push(unquoted(line.slice(start, i)));
    start = i + 1;
  }
  return cells;
}

function unquoted(cell: string): string {
  const text = cell.trim();
  return /^".*"$/.test(text) ? text.slice(1, -1).replaceAll('""', '"').trim() : text;
}

/** The edits that add or change parameters as the rows say; an empty unit or note leaves what is there. */
export function editsOfRows({ parameters }: Diagram, rows: readonly PastedRow[]): readonly Edit[] {
  const known = new Set(parameters.map(({ name }) => name));
  return rows.map(({ name, value, unit, note }) => {
    const texts = { value, ...(unit === '' ? {} : { unit }), ...(note === '' ? {} : { note }) };
    if (known.has(name)) return { kind: 'setParameter', name, ...texts };
    return { kind: 'addParameter', parameter: { name, ...texts } };
  });
}

/** What the edits did, in a sentence. */
export function pastedSentence(edits: readonly Edit[]): string {
  const added = edits.filter(({ kind }) => kind === 'addParameter').length;
  const changed = edits.length - added;
  if (changed === 0) return `${counted(added)} added.`;
  return added === 0 ? `${counted(changed)} updated.` : `${counted(added)} added, ${changed} updated.`;
}

const counted = (count: number) => (count === 1 ? '1 parameter' : `${count} parameters`);
