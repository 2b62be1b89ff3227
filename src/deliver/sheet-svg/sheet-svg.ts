/**
 * A whole sheet as one SVG file: squared paper, wires, blocks, title block, drawn of the same geometry as the sheet on
 * the screen. Nothing in it refers outside, and the same diagram gives the same bytes.
 */

import {
  annotationArea,
  annotationDrawing,
  blockDrawing,
  blockRectangle,
  enclosing,
  GRID,
  type Rectangle,
  type SheetGeometry,
  sheetBounds,
  sheetGeometry,
} from '../../diagram/geometry/index.ts';
import type { Diagram, Sheet } from '../../diagram/index.ts';
import { ownParts, type Routes, routeWires } from '../../diagram/routing/index.ts';
import { oneLine } from '../one-line.ts';
import { coordinate, element, escaped } from './markup.ts';
import { dotMarkup, shapeMarkup, wireMarkup } from './shape-markup.ts';
import { INKS, styleRules, type Theme, themeClass } from './themes.ts';
import { type TitleBlock, titleBlock } from './title-block.ts';
import { wireNameMarkup } from './wire-names.ts';

export interface SheetSvgOptions {
  readonly theme?: Theme;
  /** Squared paper behind the drawing. */
  readonly grid?: boolean;
  readonly titleBlock?: boolean;
  /** Ids of the blocks that are drawn, with the wires between them; all where left out. */
  readonly selection?: ReadonlySet<string>;
  /** Ids of the annotations that are drawn where `selection` is given; none where left out. */
  readonly annotations?: ReadonlySet<string>;
  /** The number behind a symbol, by block id, as it is shown under the block. */
  readonly values?: ReadonlyMap<string, string>;
}

/** Paper around the drawing. */
const MARGIN = 2 * GRID;

/** Paper between the drawing and the title block. */
const CLEARANCE = GRID;

/** What a sheet with nothing on it measures. */
const EMPTY: Rectangle = { left: 0, top: 0, right: 20 * GRID, bottom: 10 * GRID };

/**
 * The sheet of a diagram as a standalone SVG document, one sheet unit a pixel, light theme on plain paper with the
 * title block unless asked otherwise. Blocks without a place are drawn at the origin: arrange the sheet first.
 */
export function sheetSvg(diagram: Diagram, options: SheetSvgOptions = {}): string {
  const { area: content, taken, markup } = drawnSheet(selectedSheet(diagram, options), options.values);
  const block = options.titleBlock === false ? null : titleBlock(diagram);
  const corner = block === null ? null : titleBlockCorner(block, content, taken);
  const paper = paperAround(content, block, corner);
  const theme = options.theme ?? 'light';
  const parts = [
    element('title', {}, escaped(oneLine(diagram.title) || 'untitled')),
    element('style', {}, styleRules(theme)),
    element('rect', { fill: INKS[theme].paper, ...box(paper) }),
    options.grid === true ? squares(paper) : '',
    ...markup,
  ];
  if (block !== null && corner !== null) {
    parts.push(
      element('g', { transform: `translate(${coordinate(corner.left)} ${coordinate(corner.top)})` }, block.markup),
    );
  }
  const { x, y, width, height } = box(paper);
  const viewBox = [x, y, width, height].map(coordinate).join(' ');
  const root = { xmlns: 'http://www.w3.org/2000/svg', viewBox, width, height, role: 'img', class: themeClass(theme) };
  return `<?xml version="1.0" encoding="UTF-8"?>\n${element('svg', root, parts.filter(part => part !== '').join('\n'))}\n`;
}

/** What is drawn of a sheet, in its own units. */
interface DrawnSheet {
  /** What all of it takes. */
  readonly area: Rectangle;
  /** What its parts take. */
  readonly taken: readonly Rectangle[];
  readonly markup: readonly string[];
}

/** Annotations, wires and blocks of a sheet, in the order in which they lie on the paper. */
export function drawnSheet(sheet: Sheet, values: SheetSvgOptions['values']): DrawnSheet {
  const geometry = sheetGeometry(sheet);
  const routes = routeWires(sheet, geometry);
  return {
    area: drawnArea(sheet, geometry, routes),
    taken: obstacles(sheet, geometry, routes),
    markup: [
      ...annotationsMarkup(sheet),
      ...ownParts(sheet, routes).map(wireMarkup),
      ...routes.dots.map(dotMarkup),
      ...blocksMarkup(sheet, geometry, values),
      ...sheet.wires.map((wire, index) => wireNameMarkup(wire, routes.wires[index]?.points ?? [])),
    ],
  };
}

function selectedSheet(
  { blocks, wires, annotations = [] }: Diagram,
  { selection, annotations: chosen }: SheetSvgOptions,
): Sheet {
  if (selection === undefined) return { blocks, wires, annotations };
  return {
    blocks: blocks.filter(({ id }) => selection.has(id)),
    wires: wires.filter(({ from, to }) => selection.has(from[0]) && selection.has(to[0])),
    annotations: annotations.filter(({ id }) => chosen?.has(id) === true),
  };
}

/** Blocks, labels, annotations and wires together. */
function drawnArea(sheet: Sheet, geometry: SheetGeometry, routes: Routes): Rectangle {
  const bounds = sheetBounds(sheet, geometry) ?? EMPTY;
  return enclosing([bounds, ...(sheet.annotations ?? []).map(annotationArea), ...wirePieces(routes)]) ?? EMPTY;
}

function annotationsMarkup({ annotations = [] }: Sheet): readonly string[] {
  return annotations.map(annotation => {
    const [x, y] = annotation.at;
    const shapes = annotationDrawing(annotation)
      .map(shape => shapeMarkup(shape))
      .join('');
    const place = `translate(${coordinate(x)} ${coordinate(y)})`;
    return shapes === '' ? '' : element('g', { class: annotation.kind, transform: place }, shapes);
  });
}

function wirePieces({ wires }: Routes): readonly Rectangle[] {
  return wires.flatMap(({ points }) =>
    points.slice(1).map(([x1, y1], index) => {
      const [x0, y0] = points[index] ?? [x1, y1];
      return { left: Math.min(x0, x1), right: Math.max(x0, x1), top: Math.min(y0, y1), bottom: Math.max(y0, y1) };
    }),
  );
}

function obstacles(sheet: Sheet, geometry: SheetGeometry, routes: Routes): readonly Rectangle[] {
  const blocks = sheet.blocks.flatMap(block => {
    const placed = geometry.get(block.id);
    if (placed === undefined) return [];
    const [x, y] = block.at ?? [0, 0];
    const labels = placed.labels.map(({ area }) => ({
      left: x + area.left,
      right: x + area.right,
      top: y + area.top,
      bottom: y + area.bottom,
    }));
    return [blockRectangle(block, placed), ...labels];
  });
  return [...blocks, ...(sheet.annotations ?? []).map(annotationArea), ...wirePieces(routes)];
}

/** Lower right: as high beside the drawing as it hides nothing, under it otherwise. */
function titleBlockCorner(block: TitleBlock, content: Rectangle, taken: readonly Rectangle[]): Rectangle {
  const right = Math.max(content.right, content.left + block.width);
  const left = right - block.width;
  const highest = Math.max(content.top, content.bottom - block.height);
  const blocking = taken.filter(area => area.right > left - CLEARANCE);
  const lowest = Math.max(content.top - CLEARANCE, ...blocking.map(({ bottom }) => bottom)) + CLEARANCE;
  const top = Math.max(highest, lowest);
  return { left, right, top, bottom: top + block.height };
}

function paperAround(content: Rectangle, block: TitleBlock | null, corner: Rectangle | null): Rectangle {
  const all = enclosing(block === null || corner === null ? [content] : [content, corner]) ?? content;
  const down = (value: number): number => Math.floor((value - MARGIN) / GRID) * GRID;
  const up = (value: number): number => Math.ceil((value + MARGIN) / GRID) * GRID;
  return { left: down(all.left), top: down(all.top), right: up(all.right), bottom: up(all.bottom) };
}

function box({ left, top, right, bottom }: Rectangle) {
  return { x: left, y: top, width: right - left, height: bottom - top };
}

function squares({ left, top, right, bottom }: Rectangle): string {
  const lines: string[] = [];
  for (let x = left; x <= right; x += GRID) lines.push(`M${x} ${top}V${bottom}`);
  for (let y = top; y <= bottom; y += GRID) lines.push(`M${left} ${y}H${right}`);
  return element('path', { class: 'squares', d: lines.join('') });
}

function blocksMarkup(
  sheet: Sheet,
  geometry: SheetGeometry,
  values: ReadonlyMap<string, string> | undefined,
): string[] {
  return sheet.blocks.flatMap(block => {
    const placed = geometry.get(block.id);
    if (placed === undefined) return [];
    const [x, y] = block.at ?? [0, 0];
    const shapes = blockDrawing(block, placed, values?.get(block.id)).map(shapeMarkup).join('');
    return [element('g', { transform: `translate(${coordinate(x)} ${coordinate(y)})` }, shapes)];
  });
}
