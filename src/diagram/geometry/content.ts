/**
 * What stands inside a block's frame, typeset around (0, 0): one line, a stacked fraction, lines of equations, a
 * characteristic. A content knows its size; the frame is fitted around it.
 */

import { inlineMath, type Span } from '../../expression/index.ts';
import type { Block, Point, Quantity } from '../types.ts';
import { textWidth } from './character-widths.ts';
import type { Face, Shape } from './types.ts';

/** Type sizes in sheet units. */
export const TYPE = { symbol: 17, dense: 13, small: 12, port: 11, sign: 15 } as const;

/** Widest line at the full size, and at the dense one before it is cut. */
const FULL_WIDTH = 120;
const DENSE_WIDTH = 180;

export interface Content {
  readonly width: number;
  readonly height: number;
  readonly shapes: readonly Shape[];
}

interface Line {
  readonly spans: readonly Span[];
  readonly size: number;
  readonly width: number;
}

/** The spans that fit into `width`, the last of them cut and closed with an ellipsis where they do not. */
export function cutToWidth(spans: readonly Span[], size: number, width: number, face: Face = 'math'): readonly Span[] {
  if (textWidth(spans, size, face) <= width) return spans;
  const ellipsis: Span = { text: '…', italic: false, script: 'normal' };
  const kept: Span[] = [];
  for (const span of spans) {
    const characters = [...span.text];
    while (characters.length > 0) {
      const whole = { ...span, text: characters.join('') };
      if (textWidth([...kept, whole, ellipsis], size, face) <= width) break;
      characters.pop();
    }
    if (characters.length > 0) kept.push({ ...span, text: characters.join('') });
    if (characters.length < [...span.text].length) break;
  }
  return [...kept, ellipsis];
}

function fittedLine(spans: readonly Span[]): Line {
  const full = textWidth(spans, TYPE.symbol, 'math');
  if (full <= FULL_WIDTH) return { spans, size: TYPE.symbol, width: full };
  const cut = cutToWidth(spans, TYPE.dense, DENSE_WIDTH);
  return { spans: cut, size: TYPE.dense, width: textWidth(cut, TYPE.dense, 'math') };
}

function symbolText({ spans, size }: Line, y: number): Shape {
  return { kind: 'text', x: 0, y, anchor: 'middle', size, face: 'math', role: 'symbol', spans };
}

/** Digits stand two thirds of the type size high, so a third below the centre puts their middle on it. */
const BASELINE = 1 / 3;

function oneLine(spans: readonly Span[]): Content {
  const line = fittedLine(spans);
  const y = Math.round(line.size * BASELINE);
  return { width: line.width, height: line.size * 1.4, shapes: [symbolText(line, y)] };
}

function fraction(above: readonly Span[], below: readonly Span[], roomy: boolean): Content {
  const numerator = fittedLine(above);
  const denominator = fittedLine(below);
  const width = Math.max(numerator.width, denominator.width);
  const bar: readonly Point[] = [
    [-width / 2 - 3, 0],
    [width / 2 + 3, 0],
  ];
  const drop = roomy ? 1 : 0;
  return {
    width: width + 6,
    height: roomy ? 54 : 36,
    shapes: [
      symbolText(numerator, -5 - 2 * drop),
      { kind: 'line', points: bar, ink: 'thin' },
      symbolText(denominator, Math.round(denominator.size * 0.88) + 1 - drop + 2 * drop),
    ],
  };
}

const upright = (text: string, script: Span['script'] = 'normal'): Span => ({ text, italic: false, script });
const italic = (text: string, script: Span['script'] = 'normal'): Span => ({ text, italic: true, script });

/** e raised to −s T, or to −0.5 s where the time is a number. */
function deadTime(time: Quantity): Content {
  const spans = inlineMath(time).map(span => ({ ...span, script: 'sup' as const }));
  const isNumber = /^[\d.]/.test(time.trim());
  const isSum = /[-+/]/.test(time.slice(1));
  const factor = isSum && !isNumber ? [upright('(', 'sup'), ...spans, upright(')', 'sup')] : spans;
  const exponent = isNumber ? [...factor, italic('s', 'sup')] : [italic('s', 'sup'), ...factor];
  return oneLine([italic('e'), upright('−', 'sup'), ...exponent]);
}

function stateEquations(): Content {
  const equation = (left: string, first: string, second: string): readonly Span[] => [
    italic(left),
    upright(' = '),
    upright(first),
    italic('x'),
    upright(' + '),
    upright(second),
    italic('u'),
  ];
  const rows = [equation('ẋ', 'A', 'B'), equation('y', 'C', 'D')].map(spans => ({ spans, size: 15, width: 0 }));
  const width = Math.max(...rows.map(({ spans, size }) => textWidth(spans, size, 'math')));
  return { width, height: 44, shapes: rows.map((row, index) => symbolText(row, index === 0 ? -5 : 15)) };
}

/** The characteristic of a limiter: unity in the middle, level at both ends, on its two axes. */
function limiterCharacteristic(): Content {
  const curve: readonly Point[] = [
    [-16, 10],
    [-8, 10],
    [8, -10],
    [16, -10],
  ];
  const axis = (points: readonly Point[]): Shape => ({ kind: 'line', points, ink: 'thin' });
  return {
    width: 32,
    height: 28,
    shapes: [
      axis([
        [-18, 0],
        [18, 0],
      ]),
      axis([
        [0, -14],
        [0, 14],
      ]),
      { kind: 'line', points: curve, ink: 'line' },
    ],
  };
}

const NOTHING: Content = { width: 0, height: 0, shapes: [] };

function transferFunction(numerator: Quantity, denominator: Quantity): Content {
  if (denominator.trim() === '1') return oneLine(inlineMath(numerator));
  return fraction(inlineMath(numerator), inlineMath(denominator), true);
}

/** Contents by block: blocks never change, and a drag asks for all of them many times a second. */
const contents = new WeakMap<Block, Content>();

/** What stands in the frame of a block; a terminal, a summing point and a group have nothing there. */
export function blockContent(block: Block): Content {
  const known = contents.get(block);
  if (known !== undefined) return known;
  const content = typeset(block);
  contents.set(block, content);
  return content;
}

function typeset(block: Block): Content {
  switch (block.kind) {
    case 'gain':
      return oneLine(inlineMath(block.gain));
    case 'integrator':
      return fraction([upright('1')], [italic('s')], false);
    case 'transfer-function':
      return transferFunction(block.numerator, block.denominator);
    case 'state-model':
      return stateEquations();
    case 'delay':
      return deadTime(block.time);
    case 'differentiator':
      return oneLine([italic('s')]);
    case 'limiter':
      return limiterCharacteristic();
    case 'input':
    case 'output':
    case 'summer':
    case 'group':
      return NOTHING;
    default:
      return block satisfies never;
  }
}
