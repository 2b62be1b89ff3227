/** The shapes of the sheet's geometry, routes and lines of text as SVG elements. */

import { SCRIPT_SCALE, SCRIPT_SHIFT, type Shape, type TextShape, textWidth } from '../../diagram/geometry/index.ts';
import type { Point } from '../../diagram/index.ts';
import type { Route } from '../../diagram/routing/index.ts';
import type { Span } from '../../expression/index.ts';
import { coordinate, element, escaped } from './markup.ts';

/** One shape, in the coordinates of its block. */
export function shapeMarkup(shape: Shape): string {
  switch (shape.kind) {
    case 'rectangle': {
      const { x, y, width, height, corner } = shape;
      const round = corner > 0 ? { rx: corner } : {};
      return element('rect', { class: `ink paper ${shape.ink}`, x, y, width, height, ...round });
    }
    case 'circle':
      return element('circle', { class: `ink paper ${shape.ink}`, cx: shape.x, cy: shape.y, r: shape.radius });
    case 'line':
      return element('path', { class: `ink ${shape.ink}`, d: pathThrough(shape.points) });
    case 'text':
      return textMarkup(shape);
    default:
      return shape satisfies never;
  }
}

const SOFT_ROLES: ReadonlySet<TextShape['role']> = new Set(['unit', 'value', 'caption', 'port']);

/** A line of text, its scripts lowered and raised; empty where it has no spans. */
export function textMarkup({ x, y, anchor, size, face, role, spans }: TextShape, isStrong = false): string {
  if (spans.length === 0) return '';
  const place = anchor === 'start' ? {} : { 'text-anchor': anchor };
  const tone = `${SOFT_ROLES.has(role) ? ' soft' : ''}${isStrong ? ' strong' : ''}`;
  const width = textWidth(spans, size, face);
  const fitted = role === 'symbol' && width > FITTED ? { textLength: width, lengthAdjust: 'spacingAndGlyphs' } : {};
  return element(
    'text',
    { class: `${face}${tone}`, x, y, 'font-size': size, ...place, ...fitted },
    spanMarkup(spans, size),
  );
}

/** A symbol wider than this keeps to its frame where the reader's font is wider than the one it was measured in. */
const FITTED = 36;

function spanMarkup(spans: readonly Span[], size: number): string {
  let sunk = 0;
  return spans
    .map(({ text, italic, script }) => {
      const wanted = script === 'sub' ? SCRIPT_SHIFT.sub : script === 'sup' ? -SCRIPT_SHIFT.sup : 0;
      const dy = (wanted - sunk) * size;
      sunk = wanted;
      const attributes = {
        ...(dy === 0 ? {} : { dy }),
        ...(italic ? { 'font-style': 'italic' } : {}),
        ...(script === 'normal' ? {} : { 'font-size': size * SCRIPT_SCALE }),
      };
      return Object.keys(attributes).length === 0 ? escaped(text) : element('tspan', attributes, escaped(text));
    })
    .join('');
}

/** Path data of straight pieces through the points. */
export function pathThrough(points: readonly Point[]): string {
  return points.map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${coordinate(x)} ${coordinate(y)}`).join('');
}

/** Length and half the width of an arrowhead. */
const ARROW = { length: 9, half: 3.5 } as const;

/** A wire with its arrowhead at the input port. */
export function wireMarkup(route: Route): string {
  const tip = route.at(-1);
  const before = route.at(-2);
  if (tip === undefined || before === undefined) return '';
  const alongX = Math.sign(tip[0] - before[0]);
  const alongY = Math.sign(tip[1] - before[1]);
  const base: Point = [tip[0] - alongX * ARROW.length, tip[1] - alongY * ARROW.length];
  const left: Point = [base[0] - alongY * ARROW.half, base[1] + alongX * ARROW.half];
  const right: Point = [base[0] + alongY * ARROW.half, base[1] - alongX * ARROW.half];
  const line = element('path', { class: 'ink line', d: pathThrough([...route.slice(0, -1), base]) });
  return line + element('path', { class: 'solid', d: `${pathThrough([tip, left, right])}Z` });
}

/** Radius of a branching point's dot. */
const DOT = 3;

/** A filled dot where wires part. */
export function dotMarkup([x, y]: Point): string {
  return element('circle', { class: 'solid', cx: x, cy: y, r: DOT });
}
