/** The symbolic derivation of each drawing to start from, which is to take less than 50 ms, and of one loop in symbols. */

import { deriveSymbolic } from '../../src/compile/index.ts';
import { type Block, type Diagram, type Wire, workedDrawings } from '../../src/diagram/index.ts';
import type { Benchmark } from './bench.ts';

const GOAL_MS = 50;
const RUNS = 15;

/** One algebraic loop through `size` gains, each with a parameter of its own, around one integrator: the degenerate family. */
function ring(size: number): Diagram {
  const names = Array.from({ length: size }, (_, k) => `K_${k + 1}`);
  const gains = names.map((gain): Block => ({ id: gain, kind: 'gain', gain }));
  const chain = ['e', ...names];
  const last = chain.at(-1) ?? 'e';
  const along = names.map((id, k): Wire => ({ from: [chain[k] ?? 'e', 0], to: [id, 0] }));
  return {
    format: 'poleward-diagram',
    version: 1,
    title: '',
    parameters: names.map(name => ({ name, value: '1/2' })),
    blocks: [
      { id: 'u', kind: 'input' },
      { id: 'e', kind: 'summer', signs: '+-' },
      ...gains,
      { id: 'x', kind: 'integrator' },
      { id: 'y', kind: 'output' },
    ],
    wires: [
      { from: ['u', 0], to: ['e', 0] },
      ...along,
      { from: [last, 0], to: ['e', 1] },
      { from: [last, 0], to: ['x', 0] },
      { from: ['x', 0], to: ['y', 0] },
    ],
  };
}

/** The first time for the drawing, and the median and the longest of those that follow. */
function timesOf(diagram: Diagram): { readonly first: number; readonly median: number; readonly most: number } {
  const times = Array.from({ length: RUNS + 1 }, () => {
    const start = performance.now();
    const derived = deriveSymbolic(diagram);
    if (!derived.ok || !derived.value.finished) throw new Error(`${diagram.title} has no symbolic model`);
    return performance.now() - start;
  });
  const [first = 0, ...later] = times;
  later.sort((a, b) => a - b);
  return { first, median: later[RUNS >> 1] ?? 0, most: later.at(-1) ?? 0 };
}

const remarks = () => [
  [
    '| drawing to start from | first, ms | median, ms | most, ms | goal |',
    '| :-- | --: | --: | --: | :-- |',
    ...workedDrawings().map(({ diagram }) => {
      const { first, median, most } = timesOf(diagram);
      const cells = [diagram.title, first.toFixed(1), median.toFixed(1), most.toFixed(1)];
      return `| ${cells.join(' | ')} | ${most < GOAL_MS ? 'met' : 'missed'} |`;
    }),
  ].join('\n'),
];

const benchmark: Benchmark = {
  title: 'Derivation in symbols',
  note: `Goal: each drawing to start from in less than ${GOAL_MS} ms. Degenerate: one algebraic loop through gains with a parameter each.`,
  families: [
    {
      name: 'one loop in symbols',
      sizes: [2, 4, 8, 16, 32],
      prepare: size => {
        const drawing = ring(size);
        return () => deriveSymbolic(drawing);
      },
    },
  ],
  remarks,
};

export default benchmark;
