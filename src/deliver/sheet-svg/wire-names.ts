/** The name of a signal over its wire. */

import { textWidth } from '../../diagram/geometry/index.ts';
import type { Point, Wire } from '../../diagram/index.ts';
import type { Route } from '../../diagram/routing/index.ts';
import { nameSpans } from '../../expression/index.ts';
import { textMarkup } from './shape-markup.ts';

const SIZE = 15;
const GAP = 6;

/** The wire's name over its first level piece that is long enough, else over its longest; empty where it has none. */
export function wireNameMarkup({ name }: Wire, route: Route): string {
  if (name === undefined || name === '' || route.length < 2) return '';
  const spans = nameSpans(name);
  const [x, y] = namePlace(route, textWidth(spans, SIZE, 'math'));
  return textMarkup({ kind: 'text', x, y: y - GAP, anchor: 'middle', size: SIZE, face: 'math', role: 'name', spans });
}

function namePlace(route: Route, width: number): Point {
  const pieces = route.slice(1).map((to, index) => ({ from: route[index] ?? to, to }));
  const level = pieces.filter(({ from, to }) => from[1] === to[1]);
  const length = ({ from, to }: (typeof pieces)[number]): number => Math.abs(to[0] - from[0]);
  const longest = level.toSorted((a, b) => length(b) - length(a))[0];
  const chosen = level.find(piece => length(piece) >= width + 2 * GAP) ?? longest ?? pieces[0];
  if (chosen === undefined) return route[0] ?? [0, 0];
  return [(chosen.from[0] + chosen.to[0]) / 2, (chosen.from[1] + chosen.to[1]) / 2];
}
