/** The title block with the parameter table, as an engineering drawing has it in its lower right corner. */

import { type Face, GRID, textWidth } from '../../diagram/geometry/index.ts';
import type { Diagram, Parameter } from '../../diagram/index.ts';
import { nameSpans, type Span } from '../../expression/index.ts';
import { oneLine } from '../one-line.ts';
import { element } from './markup.ts';
import { textMarkup } from './shape-markup.ts';

const ROW = 20;
const HEAD = 28;
const PADDING = 8;
const SIZE = 12;

/** How much wider bold type is than the type that is measured. */
const BOLD = 1.1;

/** Widest text of a column before it is cut, in sheet units. */
const WIDEST = 220;
const WIDEST_TITLE = 400;

/** Parameters shown; the table of a larger drawing says how many more there are. */
const MOST_ROWS = 40;

/** A part of the title block, sheet units. */
export interface TitleBlock {
  readonly width: number;
  readonly height: number;
  /** Markup with the upper left corner at (0, 0). */
  readonly markup: string;
}

interface Cell {
  readonly spans: readonly Span[];
  readonly face: Face;
  readonly isStrong?: boolean;
}

const plain = (text: string, face: Face = 'plain', widest = WIDEST): Cell => ({
  spans: [{ text: cut(oneLine(text), face, widest), italic: false, script: 'normal' }],
  face,
});

function cut(text: string, face: Face, widest: number): string {
  const width = (shown: string): number => textWidth([{ text: shown, italic: false, script: 'normal' }], SIZE, face);
  if (width(text) <= widest) return text;
  const characters = [...text];
  while (characters.length > 0 && width(`${characters.join('')}…`) > widest) characters.pop();
  return `${characters.join('')}…`;
}

const cellWidth = ({ spans, face }: Cell): number => textWidth(spans, SIZE, face) + 2 * PADDING;

/** The title block of a diagram. Its columns are as wide as what stands in them. */
export function titleBlock(diagram: Diagram): TitleBlock {
  const title: Cell = { ...plain(oneLine(diagram.title) || 'untitled', 'plain', WIDEST_TITLE), isStrong: true };
  const issue = plain(issueText(diagram));
  const head = cellWidth(title) * BOLD + GRID + cellWidth(issue);
  const table = parameterTable(diagram.parameters, Math.max(head, 200));
  const { width } = table;
  const height = HEAD + table.height;
  const frame = element('rect', { class: 'ink paper line', x: 0, y: 0, width, height });
  const heading = cellMarkup(title, PADDING, HEAD - 10) + cellMarkup(issue, width - PADDING, HEAD - 10, 'end');
  const under = table.height === 0 ? '' : element('g', { transform: `translate(0 ${HEAD})` }, table.markup);
  return { width, height, markup: frame + heading + under };
}

/** The table of parameters alone, `least` wide or wider, without a frame; of no height where there are none. */
export function parameterTable(parameters: readonly Parameter[], least: number): TitleBlock {
  const rows = parameterRows(parameters);
  const columns = (rows[0] ?? []).map((_, column) => Math.max(...rows.map(row => cellWidth(row[column] ?? plain('')))));
  const table = columns.reduce((sum, width) => sum + width, 0);
  const width = Math.ceil(Math.max(table, least));
  const last = columns.length - 1;
  const widths = columns.map((column, index) => (index === last ? column + width - table : column));
  return { width, height: rows.length * ROW, markup: tableMarkup(rows, widths, width) };
}

function issueText({ revision, date, author }: Diagram): string {
  const parts = [author, revision === undefined || revision === '' ? undefined : `rev ${revision}`, date];
  return parts.filter(part => part !== undefined && part !== '').join(' · ');
}

function parameterRows(parameters: readonly Parameter[]): readonly (readonly Cell[])[] {
  if (parameters.length === 0) return [];
  const hasNotes = parameters.some(({ tolerance, note }) => (tolerance ?? note ?? '') !== '');
  const heading = ['parameter', 'value', 'unit', ...(hasNotes ? ['note'] : [])].map(text => plain(text));
  const rows = parameters.slice(0, MOST_ROWS).map(({ name, value, unit, tolerance, note }) => {
    const remark = [tolerance === undefined ? undefined : `± ${tolerance}`, note].filter(text => text !== undefined);
    const cells = [
      { spans: nameSpans(name), face: 'math' as const },
      plain(value, 'figures'),
      plain(unitText(unit ?? '')),
    ];
    return hasNotes ? [...cells, plain(remark.join(', '))] : cells;
  });
  const more = parameters.length - rows.length;
  return more > 0 ? [heading, ...rows, [plain(`and ${more} more`)]] : [heading, ...rows];
}

/** A unit as it is written on paper: `kg*m^2` as kg·m². */
function unitText(unit: string): string {
  const raised = (_: string, exponent: string): string =>
    [...exponent].map(digit => SUPERSCRIPTS[digit] ?? digit).join('');
  return unit.replaceAll('*', '·').replace(/\^(-?\d+)/g, raised);
}

const SUPERSCRIPTS: Readonly<Record<string, string>> = {
  '-': '⁻',
  '0': '⁰',
  '1': '¹',
  '2': '²',
  '3': '³',
  '4': '⁴',
  '5': '⁵',
  '6': '⁶',
  '7': '⁷',
  '8': '⁸',
  '9': '⁹',
};

function tableMarkup(rows: readonly (readonly Cell[])[], widths: readonly number[], width: number): string {
  const parts: string[] = [];
  rows.forEach((row, index) => {
    const top = index * ROW;
    parts.push(element('path', { class: index === 0 ? 'ink thin' : 'rule', d: `M0 ${top}H${width}` }));
    let x = 0;
    row.forEach((cell, column) => {
      parts.push(cellMarkup(cell, x + PADDING, top + ROW - 6, 'start', index === 0));
      x += widths[column] ?? 0;
    });
  });
  let x = 0;
  for (const column of widths.slice(0, -1)) {
    x += column;
    parts.push(element('path', { class: 'rule', d: `M${x} 0V${rows.length * ROW}` }));
  }
  return parts.join('');
}

function cellMarkup(
  { spans, face, isStrong }: Cell,
  x: number,
  y: number,
  anchor: 'start' | 'end' = 'start',
  isSoft = false,
): string {
  const size = face === 'math' ? SIZE + 2 : SIZE;
  const role = isSoft ? 'caption' : 'title';
  return textMarkup({ kind: 'text', x, y, anchor, size, face, role, spans }, isStrong === true);
}
