/**
 * The top sheet as an engineering drawing on one A4 page, black on white: border, title block in the lower right corner, the
 * whole drawing in what is left, portrait or landscape, whichever shows it larger. One unit of the page is a millimetre.
 */

import type { Rectangle } from '../../diagram/geometry/index.ts';
import type { Diagram } from '../../diagram/index.ts';
import { oneLine } from '../one-line.ts';
import { coordinate, element, escaped } from './markup.ts';
import { paperTitle } from './paper-title.ts';
import { drawnSheet } from './sheet-svg.ts';
import { INKS, styleRules, themeClass } from './themes.ts';

type Orientation = 'landscape' | 'portrait';

interface PaperSvg {
  /** A standalone SVG document, 297 by 210 or 210 by 297. */
  readonly svg: string;
  readonly orientation: Orientation;
  /** The rules of its style element, for a page that takes none from its own text. */
  readonly rules: string;
}

/** Width and height of A4 (ISO 216), mm. */
const PAGE = { landscape: [297, 210], portrait: [210, 297] } as const;

/** Paper outside the border, mm: 20 on the left for filing, 10 elsewhere (ISO 5457:1999, from memory). */
const BORDER = { left: 20, other: 10 } as const;

/** Paper between border, drawing and title block, mm. */
const CLEARANCE = 5;

/** A unit of the title block, mm: type 14 high is 3.5 mm. */
const TITLE_UNIT = 0.25;

/** A unit of the drawing at most, mm: symbols 17 high are 6 mm. */
const LARGEST_UNIT = 0.35;

/** Share of the page's height that the title block takes at most; beyond it is set smaller. */
const TITLE_SHARE = 0.5;

interface Layout {
  readonly orientation: Orientation;
  /** Millimetres of a unit of the drawing, and where the drawing lies. */
  readonly unit: number;
  readonly free: Rectangle;
  readonly border: Rectangle;
  readonly title: Rectangle;
  readonly titleUnit: number;
}

/** @param values  the number behind a symbol, by block id. */
export function paperSvg(diagram: Diagram, values?: ReadonlyMap<string, string>): PaperSvg {
  const { area, markup } = drawnSheet(diagram, values);
  const block = paperTitle(diagram);
  const landscape = layoutOf('landscape', area, block);
  const portrait = layoutOf('portrait', area, block);
  const chosen = portrait.unit > landscape.unit ? portrait : landscape;
  const { unit, free, border, title, titleUnit, orientation } = chosen;
  const [width, height] = PAGE[orientation];
  const x = (free.left + free.right - unit * (area.left + area.right)) / 2;
  const y = (free.top + free.bottom - unit * (area.top + area.bottom)) / 2;
  const edge = { x: border.left, y: border.top, width: border.right - border.left, height: border.bottom - border.top };
  const scaled = Object.entries(edge).map(([key, value]) => [key, value / TITLE_UNIT] as const);
  const rules = styleRules('print');
  const parts = [
    element('title', {}, escaped(oneLine(diagram.title) || 'untitled')),
    element('style', {}, rules),
    element('rect', { fill: INKS.print.paper, width, height }),
    element(
      'g',
      { transform: `scale(${TITLE_UNIT})` },
      element('rect', { class: 'ink state', ...Object.fromEntries(scaled) }),
    ),
    element('g', { transform: placed(x, y, unit) }, markup.filter(part => part !== '').join('\n')),
    element('g', { transform: placed(title.left, title.top, titleUnit) }, block.markup),
  ];
  const root = {
    xmlns: 'http://www.w3.org/2000/svg',
    viewBox: `0 0 ${width} ${height}`,
    width: `${width}mm`,
    height: `${height}mm`,
    role: 'img',
    class: themeClass('print'),
  };
  const svg = `<?xml version="1.0" encoding="UTF-8"?>\n${element('svg', root, parts.join('\n'))}\n`;
  return { svg, orientation, rules };
}

/** A factor keeps five digits: a hundredth, as of a coordinate, would lose what many blocks need. */
function placed(x: number, y: number, unit: number): string {
  return `translate(${coordinate(x)} ${coordinate(y)}) scale(${Number(unit.toPrecision(5))})`;
}

/** The title block in its corner and the largest drawing beside it: above it, left of it, or over all where it hides nothing. */
function layoutOf(
  orientation: Orientation,
  area: Rectangle,
  block: { readonly width: number; readonly height: number },
): Layout {
  const [width, height] = PAGE[orientation];
  const border = { left: BORDER.left, top: BORDER.other, right: width - BORDER.other, bottom: height - BORDER.other };
  const most = Math.min((border.right - border.left) / block.width, (TITLE_SHARE * height) / block.height);
  const titleUnit = Math.min(TITLE_UNIT, most);
  const { right, bottom } = border;
  const title = { right, bottom, left: right - titleUnit * block.width, top: bottom - titleUnit * block.height };
  const inside = { left: border.left, top: border.top, right, bottom };
  const whole = { free: inset(inside), unit: unitIn(inset(inside), area) };
  const beside = [
    { ...inside, bottom: title.top },
    { ...inside, right: title.left },
  ].map(free => ({ free: inset(free), unit: unitIn(inset(free), area) }));
  const choices = hides(title, whole.free, whole.unit, area) ? beside : [whole, ...beside];
  const best = choices.reduce((a, b) => (b.unit > a.unit ? b : a));
  return { orientation, ...best, border, title, titleUnit };
}

function inset({ left, top, right, bottom }: Rectangle): Rectangle {
  return { left: left + CLEARANCE, top: top + CLEARANCE, right: right - CLEARANCE, bottom: bottom - CLEARANCE };
}

/** Millimetres of a drawing's unit where it fills the free paper; next to none where there is no paper. */
function unitIn(free: Rectangle, area: Rectangle): number {
  const across = Math.max(0, free.right - free.left) / Math.max(1, area.right - area.left);
  const down = Math.max(0, free.bottom - free.top) / Math.max(1, area.bottom - area.top);
  return Math.min(LARGEST_UNIT, across, down);
}

/** Whether the title block would stand on a drawing in the middle of the paper. */
function hides(title: Rectangle, free: Rectangle, unit: number, area: Rectangle): boolean {
  const right = (free.left + free.right + unit * (area.right - area.left)) / 2;
  const bottom = (free.top + free.bottom + unit * (area.bottom - area.top)) / 2;
  return right + CLEARANCE > title.left && bottom + CLEARANCE > title.top;
}
