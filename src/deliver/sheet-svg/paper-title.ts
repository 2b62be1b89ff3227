/**
 * The title block of a printed sheet: the data fields of ISO 7200:2004 that a drawing holds (title, document type, revision
 * index, date of issue, creator; the list from memory), its notes, and the parameter table above them.
 */

import { annotationDrawing, textHeight, textWidth } from '../../diagram/geometry/index.ts';
import type { Diagram } from '../../diagram/index.ts';
import { oneLine } from '../one-line.ts';
import { element } from './markup.ts';
import { shapeMarkup, textMarkup } from './shape-markup.ts';
import { parameterTable, type TitleBlock } from './title-block.ts';

/** As wide as ISO 7200:2004 has it, 180 mm (from memory), at a quarter of a millimetre a unit. */
const PAPER_TITLE_WIDTH = 720;

const ROW = 44;
const PADDING = 8;
const LABEL_SIZE = 9;
const TEXT_SIZE = 14;
const TITLE_SIZE = 18;

/** A field with its small label over it. */
interface Field {
  readonly label: string;
  readonly text: string;
  /** Left edge and width, units. */
  readonly x: number;
  readonly width: number;
}

/** The title block in units of a quarter of a millimetre, wider than 180 mm only where its table is. */
export function paperTitle(diagram: Diagram): TitleBlock {
  const table = parameterTable(diagram.parameters, PAPER_TITLE_WIDTH);
  const { width } = table;
  const notes = notesMarkup(diagram.notes ?? '', width, table.height);
  const top = table.height + notes.height;
  const height = top + 2 * ROW;
  const at = (share: number): number => Math.round(width * share);
  const title = { label: 'Title', text: oneLine(diagram.title) || 'untitled', x: 0, width };
  const issue: readonly Field[] = [
    { label: 'Document type', text: 'Block diagram', x: 0, width: at(0.24) },
    { label: 'Created by', text: diagram.author ?? '', x: at(0.24), width: at(0.36) },
    { label: 'Revision', text: diagram.revision ?? '', x: at(0.6), width: at(0.16) },
    { label: 'Date of issue', text: diagram.date ?? '', x: at(0.76), width: width - at(0.76) },
  ];
  const lines = [top, top + ROW].map(y => `M0 ${y}H${width}`);
  const columns = issue.slice(1).map(({ x }) => `M${x} ${top + ROW}V${height}`);
  const markup = [
    element('rect', { class: 'ink paper line', x: 0, y: 0, width, height }),
    table.markup,
    notes.markup,
    element('path', { class: 'ink thin', d: [...lines, ...columns].join('') }),
    fieldMarkup(title, top, TITLE_SIZE),
    ...issue.map(field => fieldMarkup(field, top + ROW, TEXT_SIZE)),
  ];
  return { width, height, markup: markup.join('') };
}

const plain = (text: string) => [{ text, italic: false, script: 'normal' as const }];

function fieldMarkup({ label, text, x, width }: Field, top: number, size: number): string {
  const place = { kind: 'text', x: x + PADDING, anchor: 'start', face: 'plain' } as const;
  const room = width - 2 * PADDING;
  const spans = plain(oneLine(text));
  const fitted = Math.min(size, (size * room) / Math.max(1, textWidth(spans, size, 'plain')));
  return (
    textMarkup({ ...place, y: top + LABEL_SIZE + 4, size: LABEL_SIZE, role: 'caption', spans: plain(label) }) +
    (text === '' ? '' : textMarkup({ ...place, y: top + ROW - 10, size: fitted, role: 'title', spans }))
  );
}

/** The notes in as many lines as they take, under a rule; of no height where there are none. */
function notesMarkup(notes: string, width: number, top: number): { readonly height: number; readonly markup: string } {
  if (notes === '') return { height: 0, markup: '' };
  const room = width - 2 * PADDING;
  const lines = annotationDrawing({ id: 'notes', kind: 'text', at: [0, 0], size: [room, ROW], text: notes });
  const label = textMarkup({
    kind: 'text',
    x: PADDING,
    y: top + LABEL_SIZE + 4,
    anchor: 'start',
    size: LABEL_SIZE,
    face: 'plain',
    role: 'caption',
    spans: plain('Notes'),
  });
  const inset = LABEL_SIZE + PADDING;
  const text = element('g', { transform: `translate(${PADDING} ${top + inset})` }, lines.map(shapeMarkup).join(''));
  const rule = top === 0 ? '' : element('path', { class: 'ink thin', d: `M0 ${top}H${width}` });
  return { height: inset + textHeight(notes, room) + PADDING, markup: rule + label + text };
}
