import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type Rational, rational, toDouble, toRows, ZERO } from '../../../src/algebra/index.ts';
import { compile, type Derivation, type SystemMatrices } from '../../../src/compile/index.ts';
import type { Diagram } from '../../../src/diagram/index.ts';
import { randomDrawings } from '../../arbitraries/random-drawings.ts';
import { SEED } from '../../arbitraries/rationals.ts';
import { isSolvable, modelTransfer, transferMatrix } from './raw-equations.ts';

const MATRICES = ['A', 'B', 'C', 'D'] as const;

/** Values of s that are poles of none of the blocks that random drawings are made of. */
const POINTS = [rational(13n, 7n), rational(-29n, 11n)];

/** The derivation, null where the drawing is refused. */
function derived(diagram: Diagram, field: 'rational' | 'double' = 'rational'): Derivation | null {
  const result = compile(diagram, { field });
  return result.ok ? result.value : null;
}

function written<T>(matrices: SystemMatrices<T>, zero: T): Record<(typeof MATRICES)[number], T[][]> {
  return {
    A: toRows(matrices.A, zero),
    B: toRows(matrices.B, zero),
    C: toRows(matrices.C, zero),
    D: toRows(matrices.D, zero),
  };
}

function exact({ model }: Derivation) {
  if (model.rational === null) throw new Error('derived in doubles');
  return written<Rational>(model.rational, ZERO);
}

function holdsFor(drawings: fc.Arbitrary<Diagram>, numRuns: number, holds: (diagram: Diagram) => void): void {
  fc.assert(fc.property(drawings, holds), { seed: SEED, numRuns });
}

describe('without differentiation', () => {
  const drawings = randomDrawings({ blocks: 10, depth: 2 });

  test('the model has exactly the transfer matrix of the drawing’s own equations', () => {
    holdsFor(drawings, 400, diagram => {
      const derivation = derived(diagram);
      if (derivation === null) return;
      for (const s of POINTS) {
        const own = transferMatrix(diagram, s);
        const ofModel = modelTransfer(exact(derivation), s);
        if (own !== null && ofModel !== null) expect(ofModel).toEqual(own);
      }
    });
  });

  test('a drawing is refused exactly where the determinant over all its signals vanishes', () => {
    let refused = 0;
    holdsFor(randomDrawings({ blocks: 6, depth: 1 }), 1000, diagram => {
      const result = compile(diagram, { field: 'rational' });
      expect(result.ok).toBe(isSolvable(diagram, 'infinity'));
      if (result.ok) return;
      refused += 1;
      expect(new Set(result.problems.map(({ code }) => code))).toEqual(new Set(['loop-without-solution']));
    });
    expect(refused).toBeGreaterThan(10);
  });

  test('the self-check passes for whatever is derived, in either field', () => {
    holdsFor(drawings, 300, diagram => {
      for (const field of ['rational', 'double'] as const) {
        const derivation = derived(diagram, field);
        if (derivation !== null) expect(derivation.selfCheck.passed, `error ${derivation.selfCheck.error}`).toBe(true);
      }
    });
  });

  test('doubles give the rounded fractions, within what nearly singular loops leave', () => {
    holdsFor(drawings, 300, diagram => {
      const [fractions, doubles] = [derived(diagram), derived(diagram, 'double')];
      if (fractions === null || doubles === null) return;
      if (fractions.warnings.some(({ code }) => code === 'nearly-singular-loop')) return;
      const right = exact(fractions);
      const rounded = written(doubles.model.numeric, 0);
      for (const key of MATRICES) {
        const size = Math.max(1, ...right[key].flat().map(value => Math.abs(toDouble(value))));
        right[key].forEach((row, i) => {
          row.forEach((value, j) => {
            expect(Math.abs((rounded[key][i]?.[j] ?? Number.NaN) - toDouble(value))).toBeLessThan(1e-9 * size);
          });
        });
      }
    });
  });

  test('the numeric matrices are the nearest doubles of the exact ones', () => {
    holdsFor(drawings, 100, diagram => {
      const derivation = derived(diagram);
      if (derivation === null) return;
      const right = exact(derivation);
      for (const key of MATRICES) {
        expect(toRows(derivation.model.numeric[key], 0)).toEqual(right[key].map(row => row.map(toDouble)));
      }
    });
  });
});

describe('the document', () => {
  const drawings = randomDrawings({ blocks: 8, depth: 2 });

  test('reordering blocks permutes states, inputs and outputs only', () => {
    holdsFor(drawings, 300, diagram => {
      const reordered = { ...diagram, blocks: [...diagram.blocks].reverse(), wires: [...diagram.wires].reverse() };
      const [before, after] = [derived(diagram), derived(reordered)];
      expect(after === null).toBe(before === null);
      if (before !== null && after !== null) expect(entriesByName(after)).toEqual(entriesByName(before));
    });
  });

  test('renaming blocks changes names only', () => {
    holdsFor(drawings, 200, diagram => {
      const named = { ...diagram, blocks: diagram.blocks.map((block, i) => ({ ...block, name: `name ${i}` })) };
      const [before, after] = [derived(diagram), derived(named)];
      expect(after === null).toBe(before === null);
      if (before !== null && after !== null) expect(exact(after)).toEqual(exact(before));
    });
  });

  test('a group is its sheet, drawn in its place', () => {
    holdsFor(randomDrawings({ blocks: 6, depth: 2 }), 300, diagram => {
      const [grouped, plain] = [derived(diagram), derived(inlined(diagram))];
      expect(plain === null).toBe(grouped === null);
      if (grouped === null || plain === null) return;
      expect(exact(plain)).toEqual(exact(grouped));
      expect(plain.model.states.map(({ name }) => name)).toEqual(grouped.model.states.map(({ name }) => name));
    });
  });
});

describe('with differentiation', () => {
  const drawings = randomDrawings({ blocks: 8, differentiates: true });

  test('the model has exactly the transfer matrix of the drawing’s own equations', () => {
    let reduced = 0;
    holdsFor(drawings, 600, diagram => {
      const derivation = derived(diagram);
      if (derivation === null) return;
      if (derivation.model.shiftedStates.length > 0) reduced += 1;
      for (const s of POINTS) {
        const own = transferMatrix(diagram, s);
        const ofModel = modelTransfer(exact(derivation), s);
        if (own !== null && ofModel !== null) expect(ofModel).toEqual(own);
      }
    });
    expect(reduced).toBeGreaterThan(10);
  });

  test('the self-check passes for whatever is derived', () => {
    holdsFor(drawings, 300, diagram => {
      const derivation = derived(diagram);
      if (derivation !== null) expect(derivation.selfCheck.passed, `error ${derivation.selfCheck.error}`).toBe(true);
    });
  });

  test('derivatives of inputs are refused for exactly those outputs that grow with s', () => {
    let refused = 0;
    holdsFor(drawings, 600, diagram => {
      const result = compile(diagram, { field: 'rational' });
      const improper = result.ok ? [] : result.problems.filter(({ code }) => code === 'derivative-of-input');
      if (!result.ok && improper.length === 0) return; // refused for its loops
      refused += improper.length;
      expect(improper.length).toBe(growingEntries(diagram));
    });
    expect(refused).toBeGreaterThan(10);
  });

  test('loops are refused where the static part is singular, or the whole for every s', () => {
    holdsFor(drawings, 600, diagram => {
      const result = compile(diagram, { field: 'rational' });
      const refusedForLoops = !result.ok && result.problems.some(({ code }) => code === 'loop-without-solution');
      const isRegular = POINTS.some(s => isSolvable(diagram, s));
      expect(refusedForLoops).toBe(!isSolvable(diagram, 'infinity') || !isRegular);
    });
  });
});

describe('every kind at once, groups and dead time among them', () => {
  const KINDS = [
    'delay',
    'differentiator',
    'gain',
    'group',
    'input',
    'integrator',
    'limiter',
    'output',
    'state-model',
    'summer',
    'transfer-function',
  ];

  test('the model has exactly the transfer matrix of the drawing’s own equations', () => {
    const compared = new Set<string>();
    holdsFor(randomDrawings({ blocks: 8, depth: 2, differentiates: true }), 400, diagram => {
      const derivation = derived(diagram);
      if (derivation === null) return;
      for (const s of POINTS) {
        const own = transferMatrix(diagram, s);
        const ofModel = modelTransfer(exact(derivation), s);
        if (own === null || ofModel === null) continue;
        expect(ofModel).toEqual(own);
        if (own.flat().length > 0) for (const { kind } of diagram.blocks) compared.add(kind);
      }
    });
    expect([...compared].sort()).toEqual(KINDS);
  });
});

/** How many entries of the transfer matrix grow without bound: at s = 10⁴⁰ they are far above 10²⁰, others below. */
function growingEntries(diagram: Diagram): number {
  const far = transferMatrix(diagram, rational(10n ** 40n));
  if (far === null) throw new Error('no block of these drawings has a pole there');
  return far.flat().filter(value => Math.abs(toDouble(value)) > 1e20).length;
}

/** Every entry under the names of its row and column. */
function entriesByName({ model }: Derivation): ReadonlyMap<string, Rational> {
  const [states, inputs, outputs] = [model.states, model.inputs, model.outputs].map(names =>
    names.map(({ name }) => name),
  );
  const { A, B, C, D } =
    model.rational === null ? { A: [], B: [], C: [], D: [] } : written<Rational>(model.rational, ZERO);
  const entries = new Map<string, Rational>();
  const add = (what: string, rows: Rational[][], down: readonly string[] = [], across: readonly string[] = []) => {
    rows.forEach((row, i) => {
      row.forEach((value, j) => {
        entries.set(`${what} ${down[i]} ${across[j]}`, value);
      });
    });
  };
  add('A', A, states, states);
  add('B', B, states, inputs);
  add('C', C, outputs, states);
  add('D', D, outputs, inputs);
  return new Map([...entries].sort(([a], [b]) => (a < b ? -1 : 1)));
}

/** The drawing with each group's blocks on the sheet itself, its input and output blocks as gains of one. */
function inlined(diagram: Diagram): Diagram {
  const { blocks, wires } = inlinedSheet(diagram);
  return { ...diagram, blocks, wires };
}

function inlinedSheet(sheet: Pick<Diagram, 'blocks' | 'wires'>): Pick<Diagram, 'blocks' | 'wires'> {
  const blocks: Diagram['blocks'][number][] = [];
  const wires: Diagram['wires'][number][] = [];
  const ends = new Map<string, { readonly inputs: string[]; readonly outputs: string[] }>();
  for (const block of sheet.blocks) {
    if (block.kind !== 'group') {
      blocks.push(block);
      continue;
    }
    const inside = inlinedSheet(block.sheet);
    const idOf = (id: string) => `${block.id}_${id}`;
    const boundary = (kind: string) => inside.blocks.filter(inner => inner.kind === kind).map(({ id }) => idOf(id));
    ends.set(block.id, { inputs: boundary('input'), outputs: boundary('output') });
    for (const inner of inside.blocks) {
      const place = { id: idOf(inner.id), name: `${block.id}.${inner.name ?? inner.id}` };
      const isEnd = inner.kind === 'input' || inner.kind === 'output';
      blocks.push(isEnd ? { ...place, kind: 'gain', gain: '1' } : { ...inner, ...place });
    }
    for (const { from, to } of inside.wires) wires.push({ from: [idOf(from[0]), from[1]], to: [idOf(to[0]), to[1]] });
  }
  for (const { from, to } of sheet.wires) {
    const source = ends.get(from[0])?.outputs[from[1]];
    const target = ends.get(to[0])?.inputs[to[1]];
    wires.push({ from: source === undefined ? from : [source, 0], to: target === undefined ? to : [target, 0] });
  }
  return { blocks, wires };
}
