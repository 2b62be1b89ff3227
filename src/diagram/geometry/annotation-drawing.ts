/**
 * How an annotation is drawn, relative to its upper left corner: a text in lines that fit its width, a frame with its title
 * under the upper edge. Names with a lowered part and arithmetic between backquotes are set as they are on blocks.
 */

import { inlineMath, nameSpans, type Span } from '../../expression/index.ts';
import type { Annotation } from '../types.ts';
import { textWidth } from './character-widths.ts';
import { cutToWidth, TYPE } from './content.ts';
import { GRID, type Rectangle, type Shape, type TextShape } from './types.ts';

/** Type size of a text, between that of symbols and the dense one; its lines stand a square apart. */
const TEXT_SIZE = 15;

/** Paper between a frame and its title. */
const TITLE_INSET = 8;

/** The edge by which a frame is taken hold of, as high as its title. */
export const FRAME_TITLE = GRID;

/** What an annotation is drawn of; the lines of a frame are dashed and dotted where they are inked. */
export function annotationDrawing({ kind, size: [width, height], text }: Annotation): readonly Shape[] {
  switch (kind) {
    case 'text':
      return textLines(text, width).map((spans, line) => written(spans, TEXT_SIZE, 0, GRID * line + TEXT_SIZE, 'name'));
    case 'frame': {
      const title = cutToWidth(mathInWords(text.replaceAll(/\s+/g, ' ')), TYPE.dense, width - 2 * TITLE_INSET);
      const corners = [
        [0, 0],
        [width, 0],
        [width, height],
        [0, height],
        [0, 0],
      ] as const;
      return [
        { kind: 'line', points: corners, ink: 'thin' },
        written(text === '' ? [] : title, TYPE.dense, TITLE_INSET, FRAME_TITLE - 4, 'caption'),
      ];
    }
    default:
      return kind satisfies never;
  }
}

function written(spans: readonly Span[], size: number, x: number, y: number, role: TextShape['role']): TextShape {
  return { kind: 'text', x, y, anchor: 'start', size, face: 'math', role, spans };
}

/** The height that a text takes in a width, whole squares, one at least. */
export function textHeight(text: string, width: number): number {
  return GRID * Math.max(1, textLines(text, width).length);
}

/** The area that an annotation takes: its own, and below it what its text does not fit into. */
export function annotationArea({ kind, at: [left, top], size: [width, height], text }: Annotation): Rectangle {
  const needed = kind === 'text' ? Math.max(height, textHeight(text, width)) : height;
  return { left, top, right: left + width, bottom: top + needed };
}

/** The lines of a text: broken where it is, and between words where a line is full (first fit). */
function textLines(text: string, width: number): readonly (readonly Span[])[] {
  return text.split(/\r\n|[\n\r\u2028\u2029]/).flatMap(paragraph => paragraphLines(paragraph, width));
}

function paragraphLines(paragraph: string, width: number): readonly (readonly Span[])[] {
  const words = paragraph.match(/(?:`[^`]+`|\S)+/g) ?? [];
  const lines: Span[][] = [[]];
  let taken = 0;
  for (const word of words) {
    for (const piece of brokenWord(mathInWords(word), width)) {
      const line = lines.at(-1) ?? [];
      const extent = textWidth(piece, TEXT_SIZE, 'math');
      if (line.length > 0 && taken + SPACE_WIDTH + extent > width) {
        lines.push([...piece]);
        taken = extent;
      } else {
        taken += (line.length > 0 ? SPACE_WIDTH : 0) + extent;
        line.push(...(line.length > 0 ? [SPACE] : []), ...piece);
      }
    }
  }
  return lines;
}

const upright = (text: string): Span => ({ text, italic: false, script: 'normal' });
const SPACE = upright(' ');
const SPACE_WIDTH = textWidth([SPACE], TEXT_SIZE, 'math');

/** A word that is wider than a line in as many pieces as it takes; set mathematics stays whole. */
function brokenWord(spans: readonly Span[], width: number): readonly (readonly Span[])[] {
  const [only, ...others] = spans;
  if (only === undefined || others.length > 0 || textWidth(spans, TEXT_SIZE, 'math') <= width) return [spans];
  const pieces: string[] = [];
  let piece = '';
  for (const character of only.text) {
    if (piece !== '' && textWidth([{ ...only, text: piece + character }], TEXT_SIZE, 'math') > width) {
      pieces.push(piece);
      piece = '';
    }
    piece += character;
  }
  return [...pieces, piece].map(text => [{ ...only, text }]);
}

/** `K_p` as a name, what stands between backquotes as arithmetic, all else as typed. */
function mathInWords(text: string): readonly Span[] {
  return text.split(/(`[^`]+`|[A-Za-z][A-Za-z0-9]*_[A-Za-z0-9]+)/).flatMap((part, place) => {
    if (part === '') return [];
    if (place % 2 === 0) return [upright(part)];
    return part.startsWith('`') ? inlineMath(part.slice(1, -1)) : nameSpans(part);
  });
}
