/** Curves as comma-separated values (RFC 4180): time, then a column for each curve, every number as the shortest that reads back. */

import type { StepCurve } from '../plots/index.ts';

/** @param curves  All over the times of the first; a value that is none is an empty cell. */
export function responseCsv(output: string, curves: readonly StepCurve[]): string {
  const [first] = curves;
  if (first === undefined) return '';
  const names = curves.map(({ label }) => (curves.length > 1 ? `${output} ${label}` : output));
  const rows = Array.from({ length: first.time.length }, (_, k) => [
    String(first.time[k] ?? ''),
    ...curves.map(({ values }) => (Number.isFinite(values[k] ?? Number.NaN) ? String(values[k]) : '')),
  ]);
  return [['t', ...names].map(cell).join(','), ...rows.map(row => row.join(','))].map(line => `${line}\r\n`).join('');
}

/** In quotes where it holds what would part it, and with a space in front of what a spreadsheet would compute. */
function cell(text: string): string {
  const safe = /^[=+\-@]/.test(text) ? ` ${text}` : text;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
