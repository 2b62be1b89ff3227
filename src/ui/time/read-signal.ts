/** A recorded signal from a text file: two columns, time and value, with commas, semicolons or tabs between them. */

import type { RecordedSignal } from './time-draft.ts';

export type ReadSignal =
  | { readonly ok: true; readonly signal: RecordedSignal }
  | { readonly ok: false; readonly message: string };

/** Rows that are read. */
const MOST_ROWS = 20_000;

/**
 * The samples of the file; a first row that holds no numbers is passed over, and so are blank ones and columns after the second. Times
 * must not go back; two rows of one time are a jump.
 */
export function readSignal(name: string, text: string): ReadSignal {
  const time: number[] = [];
  const values: number[] = [];
  for (const [i, line] of text.split(/\r\n|\r|\n/).entries()) {
    if (line.trim() === '') continue;
    const cells = cellsOf(line);
    const [t, value] = [numberOf(cells[0]), numberOf(cells[1])];
    if (t === null || value === null) {
      if (time.length === 0 && i === 0) continue;
      return refuse(`${name}, row ${i + 1}: it does not hold a time and a value.`);
    }
    if (t < (time.at(-1) ?? Number.NEGATIVE_INFINITY)) {
      return refuse(`${name}, row ${i + 1}: its time ${t} lies before the one above. Sort the rows by time.`);
    }
    if (time.length >= MOST_ROWS) return refuse(`${name} has more than ${MOST_ROWS} rows. Leave some out.`);
    time.push(t);
    values.push(value);
  }
  if (time.length < 2) return refuse(`${name} has fewer than two rows with a time and a value.`);
  // The signal begins with the first sample: its time is t = 0.
  const start = time[0] ?? 0;
  return { ok: true, signal: { name, time: time.map(t => t - start), values } };
}

function refuse(message: string): ReadSignal {
  return { ok: false, message };
}

/** Semicolons and tabs part cells wherever there are any; then a comma in a number is its decimal sign. */
function cellsOf(line: string): readonly string[] {
  if (/[;\t]/.test(line)) return line.split(/[;\t]/).map(cell => cell.trim().replace(',', '.'));
  return line.split(',').map(cell => cell.trim());
}

function numberOf(cell: string | undefined): number | null {
  const text = (cell ?? '').replace(/^"(.*)"$/, '$1');
  const value = text === '' ? Number.NaN : Number(text);
  return Number.isFinite(value) ? value : null;
}
