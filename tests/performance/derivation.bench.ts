/**
 * Deriving random drawings: the whole way from the document to the matrices with its self-check, beside scipy's sparse LU of
 * the same algebraic system with all right-hand sides, in one run.
 */

import { execFileSync, spawnSync } from 'node:child_process';
import { join } from 'node:path';
import { derive } from '../../src/compile/derive.ts';
import { flatten } from '../../src/compile/flatten/index.ts';
import { compile } from '../../src/compile/index.ts';
import { doubleArithmetic, numericReader } from '../../src/compile/quantities/index.ts';
import type { Block, Diagram } from '../../src/diagram/index.ts';
import type { Benchmark } from './bench.ts';
import { randomDrawing } from './random-drawing.ts';

const SIZES = [20, 100, 200, 1000, 2000];
const LARGE = [100, 1000, 10_000, 100_000];

/** From here on all right-hand sides would take scipy a minute: only its factorisation is timed. */
const FACTOR_ONLY = 50_000;
const SEED = 7;

const drawingOf = (blocks: number): Diagram => randomDrawing({ blocks, seed: SEED });

/** One loop through every second block: the degenerate family. */
function ring(size: number): Diagram {
  const half = Math.max(2, Math.floor(size / 2));
  const blocks: Block[] = [
    { id: 'u', kind: 'input' },
    { id: 'e', kind: 'summer', signs: '+-' },
    ...Array.from({ length: half }, (_, k): Block => ({ id: `g${k}`, kind: 'gain', gain: '1/2' })),
    { id: 'x', kind: 'integrator' },
    { id: 'y', kind: 'output' },
  ];
  const chain = ['e', ...Array.from({ length: half }, (_, k) => `g${k}`)];
  return {
    format: 'poleward-diagram',
    version: 1,
    title: '',
    parameters: [],
    blocks,
    wires: [
      { from: ['u', 0], to: ['e', 0] },
      ...chain.slice(1).map((id, k) => ({ from: [chain[k] ?? 'e', 0], to: [id, 0] }) as const),
      { from: [chain.at(-1) ?? 'e', 0], to: ['e', 1] },
      { from: [chain.at(-1) ?? 'e', 0], to: ['x', 0] },
      { from: ['x', 0], to: ['y', 0] },
    ],
  };
}

/** Row, column and value of each entry. */
type Triplets = [number[], number[], number[]];

/** I − M over the signals of gains and summing points, and the columns that states and inputs drive. */
function algebraicSystem({ blocks, wires }: Diagram): {
  n: number;
  columns: number;
  matrix: Triplets;
  sides: Triplets;
} {
  const unknowns = new Map<string, number>();
  const drives = new Map<string, number>();
  for (const { id, kind } of blocks) {
    if (kind === 'gain' || kind === 'summer') unknowns.set(id, unknowns.size);
    else if (kind === 'integrator' || kind === 'input') drives.set(id, drives.size);
  }
  const matrix: Triplets = [[], [], []];
  const sides: Triplets = [[], [], []];
  const add = (to: Triplets, row: number, column: number, value: number) => {
    to[0].push(row);
    to[1].push(column);
    to[2].push(value);
  };
  for (const index of unknowns.values()) add(matrix, index, index, 1);
  const byId = new Map(blocks.map(block => [block.id, block]));
  for (const { from, to } of wires) {
    const row = unknowns.get(to[0]);
    const target = byId.get(to[0]);
    if (row === undefined || target === undefined) continue;
    const weight =
      target.kind === 'gain' ? quotient(target.gain) : target.kind === 'summer' ? signOf(target.signs, to[1]) : 0;
    const unknown = unknowns.get(from[0]);
    if (unknown !== undefined) add(matrix, row, unknown, -weight);
    else add(sides, row, drives.get(from[0]) ?? 0, weight);
  }
  return { n: unknowns.size, columns: drives.size, matrix, sides };
}

const signOf = (signs: string, port: number) => (signs[port] === '-' ? -1 : 1);

function quotient(text: string): number {
  const [numerator, denominator = '1'] = text.split('/');
  return Number(numerator) / Number(denominator);
}

/** Until the compiler has settled. */
const WARM_UP_MS = 400;

function median(work: () => unknown, runs = 15): number {
  const warmUntil = performance.now() + WARM_UP_MS;
  do work();
  while (performance.now() < warmUntil);
  const times = Array.from({ length: runs }, () => {
    const start = performance.now();
    work();
    return performance.now() - start;
  });
  return times.sort((a, b) => a - b)[runs >> 1] ?? 0;
}

function hasScipy(): boolean {
  return spawnSync('python3', ['-c', 'import scipy.sparse']).status === 0;
}

function besideScipy(): readonly string[] {
  if (!hasScipy()) return ['scipy is not installed (Debian: python3-scipy), so there is nothing to compare with.'];
  const script = join(process.cwd(), 'tests', 'performance', 'splu_reference.py');
  const lines: string[] = [];
  lines.push(
    '| blocks | derived in doubles, ms | with the self-check, ms | splu alone, ms | ratio | splu + all right-hand sides, ms | ratio |',
  );
  lines.push(
    '| -----: | ---------------------: | ----------------------: | -------------: | ----: | ------------------------------: | ----: |',
  );
  for (const size of LARGE) {
    const drawing = drawingOf(size);
    const ours = median(() => derive(flatten(drawing), numericReader(doubleArithmetic, new Map())));
    const whole = median(() => compile(drawing, { field: 'double' }));
    const answer = execFileSync('python3', [script], {
      input: JSON.stringify({ ...algebraicSystem(drawing), solves: size < FACTOR_ONLY }),
      encoding: 'utf8',
      env: { ...process.env, OPENBLAS_NUM_THREADS: '1' },
      maxBuffer: 1 << 28,
    });
    const { factor, solve } = JSON.parse(answer) as { factor: number; solve: number | null }; // our own script's answer
    const cells = [
      size,
      ours.toFixed(2),
      whole.toFixed(2),
      factor.toFixed(2),
      `${(ours / factor).toFixed(2)}x`,
      solve === null ? 'not timed' : solve.toFixed(1),
      solve === null ? '' : `${(ours / solve).toFixed(3)}x`,
    ];
    lines.push(`| ${cells.join(' | ')} |`);
  }
  return [
    lines.join('\n'),
    'Derived: from the document to the matrices (flattening, equations, loops, elimination, names), each ratio against what stands before it. With the self-check: all of compile.',
    'Goals against splu + all right-hand sides: 0.5x at 1,000 and 0.1x at 10,000 blocks; against splu alone 4x at 100,000.',
  ];
}

const benchmark: Benchmark = {
  title: 'Derivation',
  note: 'Random drawings, a tenth of the blocks integrators, a loop of 2 to 30 blocks every 250. Degenerate: one loop through half of the blocks.',
  families: [
    {
      name: 'exact',
      sizes: SIZES,
      prepare: size => {
        const drawing = drawingOf(size);
        return () => compile(drawing, { field: 'rational' });
      },
    },
    {
      name: 'doubles',
      sizes: [...SIZES, 10_000],
      prepare: size => {
        const drawing = drawingOf(size);
        return () => compile(drawing, { field: 'double' });
      },
    },
    {
      name: 'one loop, exact',
      sizes: [10, 20, 50, 100, 200],
      prepare: size => {
        const drawing = ring(size);
        return () => compile(drawing, { field: 'rational' });
      },
    },
  ],
  remarks: besideScipy,
};

export default benchmark;
