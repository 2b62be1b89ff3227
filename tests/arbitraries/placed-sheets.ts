/** Generators of sheets whose blocks have places: apart from one another by construction, joined at random. */

import fc from 'fast-check';
import { portCounts } from '../../src/diagram/index.ts';
import type { Block, Sheet, Wire } from '../../src/diagram/types.ts';

interface Draft {
  readonly kind: 'gain' | 'summer' | 'integrator' | 'input' | 'output' | 'transfer-function' | 'state-model';
  readonly ports: number;
  readonly mirrored: boolean;
  readonly shiftX: number;
  readonly shiftY: number;
  /** For each input port, which output port of the sheet feeds it; none where negative. */
  readonly sources: readonly number[];
}

const draft: fc.Arbitrary<Draft> = fc.record({
  kind: fc.constantFrom('gain', 'summer', 'integrator', 'input', 'output', 'transfer-function', 'state-model'),
  ports: fc.integer({ min: 1, max: 6 }),
  mirrored: fc.boolean(),
  shiftX: fc.integer({ min: 0, max: 3 }),
  shiftY: fc.integer({ min: 0, max: 3 }),
  sources: fc.array(fc.integer({ min: -2, max: 1000 }), { minLength: 6, maxLength: 6 }),
});

/** What a block may shift within its cell, in grid squares of 20, and a cell's size. */
const SQUARE = 20;
const CELL = { width: 280, height: 320 } as const;

function blockOf({ kind, ports, mirrored, shiftX, shiftY }: Draft, index: number, columns: number): Block {
  const base = {
    id: `b${index}`,
    at: [
      (index % columns) * CELL.width + shiftX * SQUARE,
      Math.floor(index / columns) * CELL.height + shiftY * SQUARE,
    ] as const,
    mirrored,
  };
  switch (kind) {
    case 'gain':
      return { ...base, kind, gain: ports > 3 ? 'K_p' : '2' };
    case 'summer':
      return { ...base, kind, signs: '+-+-+-'.slice(0, ports) };
    case 'transfer-function':
      return { ...base, kind, numerator: 's + 1', denominator: 's^2 + 2*s + 5' };
    case 'state-model': {
      const row = (length: number): string[] => Array.from({ length }, () => '1');
      const many = 1 + (ports % 3);
      return {
        ...base,
        kind,
        A: [row(1)],
        B: [row(many)],
        C: Array.from({ length: many }, () => row(1)),
        D: Array.from({ length: many }, () => row(many)),
      };
    }
    default:
      return { ...base, kind };
  }
}

function joined(blocks: readonly Block[], drafts: readonly Draft[]): Sheet {
  const outputs = blocks.flatMap(block =>
    Array.from({ length: portCounts(block).outputs }, (_, port) => [block.id, port] as const),
  );
  const wires = blocks.flatMap((block, index) =>
    Array.from({ length: portCounts(block).inputs }, (_, port): Wire | null => {
      const source = drafts[index]?.sources[port] ?? -1;
      const from = outputs[source % Math.max(1, outputs.length)];
      return source < 0 || from === undefined ? null : { from, to: [block.id, port] };
    }).filter(wire => wire !== null),
  );
  return { blocks, wires };
}

/** Sheets of up to `most` blocks, at least 80 units between their frames. */
export function placedSheet(most: number): fc.Arbitrary<Sheet> {
  return fc
    .tuple(fc.array(draft, { minLength: 1, maxLength: most }), fc.integer({ min: 1, max: 4 }))
    .map(([drafts, columns]) =>
      joined(
        drafts.map((each, index) => blockOf(each, index, columns)),
        drafts,
      ),
    );
}
