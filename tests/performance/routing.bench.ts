/** Routing: all wires of an arranged sheet, and again what a block's move by one square touches. */

import { placeUnplaced } from '../../src/diagram/arranging/index.ts';
import { GRID, sheetGeometry } from '../../src/diagram/geometry/index.ts';
import type { Block, Diagram, Wire } from '../../src/diagram/index.ts';
import { rerouteMoved, routeWires } from '../../src/diagram/routing/index.ts';
import type { Benchmark } from './bench.ts';
import { randomDrawing } from './random-drawing.ts';

const SIZES = [50, 100, 200, 500, 1000];
const MOVED = 20;

/** The drawing of `size` blocks, arranged. */
const arranged = (size: number): Diagram => placeUnplaced(randomDrawing({ blocks: size, seed: 7 }));

/** One source that drives gains in a column: every wire of one net. */
function fan(size: number): Diagram {
  const gains = Array.from({ length: size }, (_, i): Block => ({ id: `g${i}`, kind: 'gain', gain: '2' }));
  const wires = gains.map(({ id }): Wire => ({ from: ['u', 0], to: [id, 0] }));
  const blocks: Block[] = [{ id: 'u', kind: 'input' }, ...gains];
  return placeUnplaced({ format: 'poleward-diagram', version: 1, title: '', parameters: [], blocks, wires });
}

/** The sheet with one block a square further down. */
function moved(drawing: Diagram, index: number): Diagram {
  const down = (block: Block): Block => {
    const [x, y] = block.at ?? [0, 0];
    return { ...block, at: [x, y + GRID] };
  };
  return { ...drawing, blocks: drawing.blocks.map((block, i) => (i === index ? down(block) : block)) };
}

const benchmark: Benchmark = {
  title: 'Routing',
  note: `Sizes are blocks; a drawing has about 1.3 wires a block. After a move: one block a square down, ${MOVED} different blocks in turn, geometry at hand. Degenerate: all wires from one output. Goals: all of 1,000 wires within 300 ms, after a move within 4 ms at 200 blocks.`,
  families: [
    {
      name: 'all wires',
      sizes: SIZES,
      prepare: size => {
        const drawing = arranged(size);
        const geometry = sheetGeometry(drawing);
        return () => routeWires(drawing, geometry);
      },
    },
    {
      name: 'after a move',
      sizes: SIZES,
      prepare: size => {
        const before = arranged(size);
        const routes = routeWires(before);
        const moves = Array.from({ length: MOVED }, (_, k) => {
          const sheet = moved(before, Math.floor((k * before.blocks.length) / MOVED));
          return { sheet, geometry: sheetGeometry(sheet) };
        });
        let next = 0;
        return () => {
          const move = moves[next++ % MOVED];
          if (move === undefined) throw new Error('no move');
          return rerouteMoved(routes, before, move.sheet, move.geometry);
        };
      },
    },
    {
      name: 'one output',
      sizes: SIZES,
      prepare: size => {
        const drawing = fan(size);
        const geometry = sheetGeometry(drawing);
        return () => routeWires(drawing, geometry);
      },
    },
  ],
};

export default benchmark;
