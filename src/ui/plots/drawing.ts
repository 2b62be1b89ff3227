/** A plot as data: its marks, its size and its words. The screen and the saved file are made from the same one. */

import { nameSpans } from '../../expression/index.ts';
import { element, type Markup, markupText, raisedRuns } from '../figures/index.ts';
import type { Palette } from './palette.ts';

/** CSS pixels. */
export interface Size {
  readonly width: number;
  readonly height: number;
}

/** All of a plot but the inks of the page it stands on. */
export interface Drawing extends Size {
  readonly title: string;
  /** What is to be seen, in a sentence or two. */
  readonly description: string;
  /** Children of the `svg` element, in painting order. */
  readonly marks: readonly Markup[];
  readonly paper: string;
}

/** The SVG namespace (SVG 2, section 5.1). */
const SVG = 'http://www.w3.org/2000/svg';

/** The drawing as a file that stands by itself: UTF-8 text of an SVG 2 document with title, description and paper. */
export function svgFile(drawing: Drawing): string {
  const { width, height, title, description, marks, paper } = drawing;
  const root = element(
    'svg',
    { xmlns: SVG, width, height, viewBox: `0 0 ${width} ${height}` },
    element('title', {}, title),
    element('desc', {}, description),
    element('rect', { width, height, fill: paper }),
    ...marks,
  );
  return `<?xml version="1.0" encoding="UTF-8"?>\n${markupText(root)}\n`;
}

/** `step-r-F.svg`: the words joined, with nothing that some system refuses in a name. */
export function plotFileName(...words: readonly string[]): string {
  const stem = words.map(word => word.replaceAll(/[^A-Za-z0-9_.]+/g, '-')).join('-');
  return `${stem}.svg`;
}

/** How a text is set; size in CSS pixels, TEXT_SIZE where absent. */
export interface TextStyle {
  readonly anchor?: 'start' | 'middle' | 'end';
  readonly size?: number;
  readonly fill: string;
  readonly family: string;
  /** The paper's colour, where lines may pass behind the text. */
  readonly halo?: string;
}

/** CSS pixels of plot text; nothing smaller is set. */
export const TEXT_SIZE = 11;

/** Text with its baseline at (x, y); raised characters (10⁻⁶) are set smaller and higher. */
export function text(x: number, y: number, content: string, style: TextStyle): Markup {
  const size = style.size ?? TEXT_SIZE;
  const halo = style.halo === undefined ? {} : { stroke: style.halo, 'stroke-width': 3, 'paint-order': 'stroke' };
  const attributes = {
    x: round(x),
    y: round(y),
    'font-size': size,
    'font-family': style.family,
    'text-anchor': style.anchor ?? 'start',
    fill: style.fill,
    ...halo,
  };
  return element('text', attributes, ...spans(content, size));
}

function spans(content: string, size: number): readonly (Markup | string)[] {
  const lift = round(size * 0.4);
  let isUp = false;
  return raisedRuns(content).map(run => {
    const shift = run.isRaised === isUp ? 0 : run.isRaised ? -lift : lift;
    isUp = run.isRaised;
    const attributes = run.isRaised ? { 'font-size': round(size * 0.75) } : {};
    return shift === 0 && !run.isRaised ? run.text : element('tspan', { dy: shift, ...attributes }, run.text);
  });
}

/** Text that opens with a name of the model, set as mathematics: `K_p / N` with a lowered p. */
export function namedText(x: number, y: number, name: string, rest: string, style: TextStyle, math: string): Markup {
  const size = style.size ?? TEXT_SIZE;
  let depth = 0;
  const runs = nameSpans(name).map(span => {
    const wanted = span.script === 'normal' ? 0 : span.script === 'sub' ? size * 0.25 : -size * 0.4;
    const attributes = {
      'font-family': math,
      'font-size': round(span.script === 'normal' ? size * 1.2 : size * 0.9),
      ...(span.italic ? { 'font-style': 'italic' } : {}),
      ...(wanted === depth ? {} : { dy: round(wanted - depth) }),
    };
    depth = wanted;
    return element('tspan', attributes, span.text);
  });
  const plain = text(x, y, rest, style);
  const back =
    depth === 0 || rest === '' ? plain.children : [element('tspan', { dy: round(-depth) }, ...plain.children)];
  return { ...plain, children: [...runs, ...back] };
}

/** A straight line. */
export function line(x1: number, y1: number, x2: number, y2: number, stroke: string, width: number = 1): Markup {
  return element('line', {
    x1: round(x1),
    y1: round(y1),
    x2: round(x2),
    y2: round(y2),
    stroke,
    'stroke-width': width,
  });
}

/** To a hundredth of a pixel, which no eye sees and which keeps files short. */
export function round(pixels: number): number {
  return Math.round(pixels * 100) / 100;
}

/** Style of the figures at the ticks. */
export function tickStyle(palette: Palette, anchor: 'start' | 'middle' | 'end'): TextStyle {
  return { anchor, fill: palette.soft, family: palette.figures };
}
