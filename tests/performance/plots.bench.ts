/** How long the drawing of a plot takes before the browser sees it. */

import type { Root } from '../../src/ui/figures/index.ts';
import { SCREEN } from '../../src/ui/plots/palette.ts';
import { poleMapDrawing } from '../../src/ui/plots/pole-map-drawing.ts';
import type { StepContent } from '../../src/ui/plots/step-content.ts';
import { stepDrawing } from '../../src/ui/plots/step-drawing.ts';
import type { Benchmark } from './bench.ts';

const SIZE = { width: 560, height: 207 };

function stepOf(points: number, value: (k: number) => number): StepContent {
  const time = Float64Array.from({ length: points }, (_, k) => (14 * k) / (points - 1));
  const values = Float64Array.from({ length: points }, (_, k) => value(k / points));
  return { input: 'r', output: 'F', outputUnit: 'N', curves: [{ label: 'linear', time, values }], metrics: null };
}

/** Damped oscillation over the whole plot. */
const damped = (part: number) => 1 - Math.exp(-5 * part) * Math.cos(40 * part);

function poles(count: number): readonly Root[] {
  return Array.from({ length: count }, (_, k) => ({
    re: -1 - k,
    im: k % 2 === 0 ? 3 * k : -3 * k + 3,
    multiplicity: 1,
  }));
}

const POINTS = [100, 300, 1000, 10_000, 100_000];
const COUNTS = [1, 4, 16, 64, 128];

const benchmark: Benchmark = {
  title: 'Drawings of plots',
  note: 'From samples or poles to the tree of elements, without React and layout. Degenerate: a curve that never moves.',
  families: [
    {
      name: 'step response, points',
      sizes: POINTS,
      prepare: size => {
        const content = stepOf(size, damped);
        return () => stepDrawing(content, SIZE, SCREEN);
      },
    },
    {
      name: 'constant response, points',
      sizes: POINTS,
      prepare: size => {
        const content = stepOf(size, () => 0);
        return () => stepDrawing(content, SIZE, SCREEN);
      },
    },
    {
      name: 'pole map, poles',
      sizes: COUNTS,
      prepare: size => {
        const roots = poles(size);
        return () => poleMapDrawing(roots, [], 'all', { width: 260, height: 190 }, SCREEN);
      },
    },
  ],
};

export default benchmark;
