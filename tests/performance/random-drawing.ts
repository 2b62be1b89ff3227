/**
 * Large random drawings for benchmarks, the same for the same seed: one block in ten an integrator, and every 250 blocks or
 * so an algebraic loop of 2 to 30 blocks. Not meant to look like anything; meant to cost what large drawings cost.
 */

import type { Block, Diagram, Wire } from '../../src/diagram/index.ts';

/** How densely a drawing is wired. */
export interface RandomDrawingOptions {
  readonly blocks: number;
  readonly seed: number;
  /**
   * Share of the sources of a block that are other static blocks, not integrators or inputs. With the fan-in of 1.3 here,
   * rows of A stay short below about 0.75 and grow with the drawing above.
   */
  readonly staticShare?: number;
  /** Blocks between the beginnings of two algebraic loops, on average; infinite for none. */
  readonly loopEvery?: number;
  /** Least and most blocks of a loop. */
  readonly loopSizes?: readonly [number, number];
}

const INPUTS = 4;
const OUTPUTS = 4;

/** A source of numbers from 0 to 1 (Park & Miller 1988, Comm. ACM 31, multiplier 48271). */
export function randomSource(seed: number): () => number {
  let state = (seed % (2 ** 31 - 2)) + 1;
  return () => {
    state = (state * 48271) % (2 ** 31 - 1);
    return state / (2 ** 31 - 1);
  };
}

/** A drawing of the given number of blocks, inputs and outputs on top. Every algebraic loop in it has a solution. */
export function randomDrawing(options: RandomDrawingOptions): Diagram {
  const { blocks: count, seed, staticShare = 0.6, loopEvery = 250, loopSizes = [2, 30] } = options;
  const random = randomSource(seed);
  const blocks: Block[] = Array.from({ length: INPUTS }, (_, i) => ({ id: `u${i}`, kind: 'input' }));
  const wires: Wire[] = [];
  const integrators = Math.max(1, Math.round(count / 10));
  const statics = count - integrators;
  const whole = (below: number) => Math.floor(random() * below);
  const wire = (from: string, to: string, port: number) => wires.push({ from: [from, 0], to: [to, port] });
  const source = (before: number): string => {
    if (before > 0 && random() < staticShare) return `b${Math.max(0, before - 1 - whole(Math.min(before, 40)))}`;
    return random() < 0.05 ? `u${whole(INPUTS)}` : `x${whole(integrators)}`;
  };
  let loopLeft = 0;
  let loopStart = '';
  for (let i = 0; i < statics; i++) {
    const id = `b${i}`;
    const begins = loopLeft === 0 && random() < 1 / loopEvery && i + loopSizes[1] < statics;
    const isSum = begins || random() < 0.3;
    blocks.push(isSum ? { id, kind: 'summer', signs: random() < 0.5 ? '+-' : '++' } : gain(id, random));
    wire(loopLeft > 0 ? `b${i - 1}` : source(i), id, 0);
    if (begins) {
      loopLeft = loopSizes[0] + whole(loopSizes[1] - loopSizes[0] + 1);
      loopStart = id;
    } else if (isSum) wire(source(i), id, 1);
    if (loopLeft > 0) {
      loopLeft -= 1;
      if (loopLeft === 0) closeLoop(id, loopStart);
    }
  }
  /** Through a gain of its own, no small fraction, so that no loop comes out singular. */
  function closeLoop(end: string, start: string): void {
    const id = `r${start}`;
    blocks.push({ id, kind: 'gain', gain: `0.${101 + whole(400)}` });
    wire(end, id, 0);
    wire(id, start, 1);
  }
  for (let i = 0; i < integrators; i++) {
    blocks.push({ id: `x${i}`, kind: 'integrator' });
    wire(source(statics), `x${i}`, 0);
  }
  for (let i = 0; i < OUTPUTS; i++) {
    blocks.push({ id: `y${i}`, kind: 'output' });
    wire(source(statics), `y${i}`, 0);
  }
  const title = `Random drawing of ${count} blocks, seed ${seed}`;
  return { format: 'poleward-diagram', version: 1, title, parameters: [], blocks, wires };
}

/** Three digits, either sign, at most 1.3 in magnitude. */
function gain(id: string, random: () => number): Block {
  const digits = 5 + Math.floor(random() * 125);
  return { id, kind: 'gain', gain: `${random() < 0.5 ? '-' : ''}${(digits / 100).toFixed(2)}` };
}
