/** Lines that show, while blocks are dragged, that they stand in line with their neighbours: centres and edges. */

import type { Rectangle } from '../../diagram/geometry/index.ts';

/** One line: along x at `at` (a vertical one) or along y, from one block to the other. */
export interface AlignmentLine {
  readonly axis: 'x' | 'y';
  readonly at: number;
  readonly from: number;
  readonly to: number;
}

/** Frames nearer than this to a line count as on it, sheet units: less than a pixel at the largest zoom. */
const EXACT = 0.2;

/**
 * Lines between the moving frame and the others, one for each of the six positions (left, centre, right; top, centre, bottom)
 * that some neighbour shares: to the nearest such neighbour. Centres first; an edge is left out where the centre's line says
 * the same of the same two blocks.
 *
 * @param reach  how far a neighbour may be, sheet units.
 */
export function alignmentLines(
  moving: Rectangle,
  others: readonly Rectangle[],
  reach: number,
): readonly AlignmentLine[] {
  return [...linesAlong('x', moving, others, reach), ...linesAlong('y', moving, others, reach)];
}

interface Span {
  readonly low: number;
  readonly high: number;
}

function linesAlong(
  axis: 'x' | 'y',
  moving: Rectangle,
  others: readonly Rectangle[],
  reach: number,
): readonly AlignmentLine[] {
  const here = spanOf(moving, axis);
  const across = spanOf(moving, axis === 'x' ? 'y' : 'x');
  const shown = new Set<Rectangle>();
  const lines: AlignmentLine[] = [];
  for (const position of [middleOf, lowOf, highOf]) {
    const at = position(here);
    const nearest = others
      .filter(other => Math.abs(position(spanOf(other, axis)) - at) <= EXACT)
      .map(other => ({ other, span: spanOf(other, axis === 'x' ? 'y' : 'x') }))
      .filter(({ span }) => gap(span, across) <= reach)
      .sort((a, b) => gap(a.span, across) - gap(b.span, across))[0];
    if (nearest === undefined || shown.has(nearest.other)) continue;
    shown.add(nearest.other);
    const from = Math.min(nearest.span.low, across.low);
    lines.push({ axis, at, from, to: Math.max(nearest.span.high, across.high) });
  }
  return lines;
}

function spanOf({ left, right, top, bottom }: Rectangle, axis: 'x' | 'y'): Span {
  return axis === 'x' ? { low: left, high: right } : { low: top, high: bottom };
}

const middleOf = ({ low, high }: Span): number => (low + high) / 2;
const lowOf = ({ low }: Span): number => low;
const highOf = ({ high }: Span): number => high;
const gap = (a: Span, b: Span): number => Math.max(0, a.low - b.high, b.low - a.high);
