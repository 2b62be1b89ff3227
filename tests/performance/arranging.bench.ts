/** Arranging whole sheets: places for every block of drawings that have none. */

import { arrangeBlocks, placeUnplaced } from '../../src/diagram/arranging/index.ts';
import type { Block, Diagram, Wire } from '../../src/diagram/index.ts';
import type { Benchmark } from './bench.ts';
import { randomDrawing } from './random-drawing.ts';

const SIZES = [50, 200, 500, 1000, 2000];
const WHOLE_SHEET: ReadonlySet<string> = new Set();

/** Gains in one ring: no way through from an input, each block on a way back. */
function ring(size: number): Diagram {
  const blocks = Array.from({ length: size }, (_, i): Block => ({ id: `g${i}`, kind: 'gain', gain: '1/2' }));
  const wires = blocks.map(({ id }, i): Wire => ({ from: [id, 0], to: [`g${(i + 1) % size}`, 0] }));
  return { format: 'poleward-diagram', version: 1, title: '', parameters: [], blocks, wires };
}

const benchmark: Benchmark = {
  title: 'Arranging',
  note: 'A whole sheet, a tenth of the blocks integrators. Again: a sheet that is arranged already. Degenerate: one ring of gains.',
  families: [
    {
      name: 'without places',
      sizes: SIZES,
      prepare: size => {
        const drawing = randomDrawing({ blocks: size, seed: 7 });
        return () => placeUnplaced(drawing);
      },
    },
    {
      name: 'again',
      sizes: SIZES,
      prepare: size => {
        const drawing = placeUnplaced(randomDrawing({ blocks: size, seed: 7 }));
        return () => arrangeBlocks(drawing, WHOLE_SHEET);
      },
    },
    {
      name: 'one ring',
      sizes: SIZES,
      prepare: size => {
        const drawing = ring(size);
        return () => placeUnplaced(drawing);
      },
    },
  ],
};

export default benchmark;
