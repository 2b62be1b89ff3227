import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  addRationals,
  multiplyRationals,
  type Rational,
  rankOf,
  toFraction,
  toRows,
  ZERO,
} from '../../../src/algebra/index.ts';
import { hiddenModes, isControllable, isObservable, transferFunction } from '../../../src/analysis/index.ts';
import { minimalModel, structureReport } from '../../../src/analysis/minimal/index.ts';
import { compile, type StateSpace } from '../../../src/compile/index.ts';
import { randomDrawings } from '../../arbitraries/random-drawings.ts';
import { SEED } from '../../arbitraries/rationals.ts';

type Rows = readonly (readonly Rational[])[];

function product(a: Rows, b: Rows, columns: number): Rational[][] {
  return a.map(row =>
    Array.from({ length: columns }, (_, j) =>
      row.reduce((sum, x, k) => addRationals(sum, multiplyRationals(x, b[k]?.[j] ?? ZERO)), ZERO),
    ),
  );
}

const texts = (rows: Rows) => rows.map(row => row.map(toFraction));

function exact({ rational }: StateSpace) {
  if (rational === null) throw new Error('derived in doubles');
  const [A, B, C] = [toRows(rational.A, ZERO), toRows(rational.B, ZERO), toRows(rational.C, ZERO)];
  return { A, B, C, n: A.length, m: rational.B.columns, p: C.length };
}

/** Rank of the block Hankel matrix of the Markov parameters C Aᵏ B: the McMillan degree (Ho & Kalman 1966, Regelungstechnik 14). */
function hankelRank(model: StateSpace): number {
  const { A, B, C, n, m } = exact(model);
  const parameters: Rational[][][] = [];
  let moved: Rows = B;
  for (let k = 0; k < 2 * n; k++) {
    parameters.push(product(C, moved, m));
    moved = product(A, moved, m);
  }
  const blocks = Array.from({ length: n }, (_, i) => i);
  return rankOf(blocks.flatMap(i => C.map((_, row) => blocks.flatMap(j => parameters[i + j]?.[row] ?? []))));
}

/** Models of drawings with an input and an output, of at most 8 states. */
function eachModel(numRuns: number, holds: (model: StateSpace) => void): void {
  fc.assert(
    fc.property(randomDrawings({ blocks: 9, depth: 1 }), diagram => {
      const derived = compile(diagram, { field: 'rational' });
      if (derived.ok && derived.value.model.states.length <= 8) holds(derived.value.model);
    }),
    { seed: SEED, numRuns },
  );
}

function minimalOf(model: StateSpace) {
  const found = minimalModel(model);
  if (found === null) throw new Error('too large');
  return found;
}

describe('the minimal model', () => {
  test('has exactly the same transfer functions', () => {
    let reduced = 0;
    eachModel(250, model => {
      const minimal = minimalOf(model).model;
      if (minimal.states.length < model.states.length) reduced += 1;
      model.outputs.forEach((_, output) => {
        model.inputs.forEach((_, input) => {
          const [whole, small] = [transferFunction(model, output, input), transferFunction(minimal, output, input)];
          if (whole.route !== 'certified' || small.route !== 'certified') throw new Error('not exact');
          expect(texts([small.exact.numerator, small.exact.denominator])).toEqual(
            texts([whole.exact.numerator, whole.exact.denominator]),
          );
        });
      });
    });
    expect(reduced).toBeGreaterThan(50);
  });

  test('has as many states as the McMillan degree, is controllable and observable, and hides nothing', () => {
    eachModel(200, model => {
      const minimal = minimalOf(model).model;
      expect(minimal.states).toHaveLength(hankelRank(model));
      expect(isControllable(minimal).holds || minimal.states.length === 0).toBe(true);
      expect(isObservable(minimal).holds || minimal.states.length === 0).toBe(true);
      expect(hiddenModes(minimal)).toEqual([]);
    });
  });

  test('moves as its change of state says wherever the inputs lead: S Aᵏ B = Âᵏ B̂ and C Aᵏ B = Ĉ Âᵏ B̂', () => {
    eachModel(150, model => {
      const { model: minimal, change } = minimalOf(model);
      const [whole, small] = [exact(model), exact(minimal)];
      let [moved, own]: [Rows, Rows] = [whole.B, small.B];
      for (let k = 0; k <= whole.n; k++) {
        expect(texts(product(change, moved, whole.m))).toEqual(texts(own));
        expect(texts(product(small.C, own, whole.m))).toEqual(texts(product(whole.C, moved, whole.m)));
        [moved, own] = [product(whole.A, moved, whole.m), product(small.A, own, whole.m)];
      }
    });
  });

  test('names its states apart', () => {
    eachModel(150, model => {
      const names = minimalOf(model).model.states.map(({ name }) => name);
      expect(new Set(names).size).toBe(names.length);
    });
  });
});

describe('the structure report', () => {
  test('counts as many hidden poles as the minimal model lacks states', () => {
    let hidden = 0;
    eachModel(200, model => {
      if (model.inputs.length === 0 || model.outputs.length === 0) return;
      const report = structureReport(model);
      const count = report?.modes?.reduce((sum, { im, multiplicity }) => sum + (im === 0 ? 1 : 2) * multiplicity, 0);
      expect(count).toBe(model.states.length - (report?.minimal ?? -1));
      hidden += count ?? 0;
      for (const { states } of report?.modes ?? []) expect(states.length).toBeGreaterThan(0);
    });
    expect(hidden).toBeGreaterThan(100);
  });
});
