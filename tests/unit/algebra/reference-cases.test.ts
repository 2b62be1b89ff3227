/** The exact room alone against tests/reference/cases: from the exact matrices of a case to its poles, zeros and transfer functions. */

import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import {
  certifiedRoots,
  characteristicFactors,
  characteristicPolynomial,
  findCertifiedRoots,
  fromRows,
  invariantZeroPolynomial,
  multiplyPolynomials,
  type Polynomial,
  parseRational,
  type Rational,
  type SparseMatrix,
  toFraction,
  transferNumerators,
} from '../../../src/algebra/index.ts';

interface ExpectedRoot {
  readonly re: number;
  readonly im: number;
  readonly multiplicity: number;
}

interface Expectation {
  readonly inputs: readonly string[];
  readonly outputs: readonly string[];
  readonly exact?: Readonly<Record<'A' | 'B' | 'C' | 'D', readonly (readonly string[])[]>> | null;
  readonly poles?: readonly ExpectedRoot[];
  readonly zeros?: readonly ExpectedRoot[];
  readonly transferFunctions?: readonly {
    readonly input: string;
    readonly output: string;
    readonly numeratorExact?: readonly string[];
    readonly denominatorExact?: readonly string[];
  }[];
}

interface Case {
  readonly name: string;
  readonly expect: Expectation;
  readonly variants?: readonly { readonly expect: Expectation }[];
}

const folder = new URL('../../reference/cases/', import.meta.url);
const cases = readdirSync(folder)
  .filter(file => file.endsWith('.json'))
  .map(file => JSON.parse(readFileSync(new URL(file, folder), 'utf8')) as Case);

function rationalOf(text: string): Rational {
  const value = parseRational(text);
  if (value === null) throw new Error(`not a fraction: ${text}`);
  return value;
}

function matrixOf(rows: readonly (readonly string[])[], columns: number): SparseMatrix<Rational> {
  return fromRows(
    rows.map(row => row.map(rationalOf)),
    columns,
    ({ n }) => n === 0n,
  );
}

/** Every set of exact matrices in the cases, with what is expected of it. */
const models = cases.flatMap(({ name, expect: main, variants = [] }) =>
  [main, ...variants.map(variant => variant.expect)].flatMap((expected, k) => {
    if (!expected.exact) return [];
    const { A, B, C, D } = expected.exact;
    const [n, m] = [A.length, (expected.inputs ?? main.inputs).length];
    return [
      {
        name: k === 0 ? name : `${name}, variant ${k}`,
        A: matrixOf(A, n),
        B: matrixOf(B, m),
        C: matrixOf(C, n),
        D: matrixOf(D, m),
        inputs: expected.inputs ?? main.inputs,
        outputs: expected.outputs ?? main.outputs,
        poles: expected.poles,
        zeros: expected.zeros,
        transferFunctions: expected.transferFunctions ?? [],
      },
    ];
  }),
);

function written(p: Polynomial): string {
  return p.map(toFraction).join(' ');
}

describe('published and recomputed cases', () => {
  test('there are some forty of them', () => {
    expect(models.length).toBeGreaterThan(40);
  });

  test.each(models.filter(({ poles }) => poles !== undefined))('$name: every pole is the nearest double', model => {
    const expected = (model.poles ?? []).map(({ re, im, multiplicity }) => [re, im, multiplicity]);
    for (const roots of [
      certifiedRoots(characteristicPolynomial(model.A)),
      findCertifiedRoots(characteristicFactors(model.A)),
    ]) {
      expect(roots?.map(({ re, im, multiplicity }) => [re, im, multiplicity])).toEqual(expected);
    }
  });

  test.each(models.filter(({ zeros }) => zeros !== undefined))(
    '$name: every invariant zero is the nearest double',
    model => {
      const { A, B, C, D, zeros = [] } = model;
      const found = certifiedRoots(invariantZeroPolynomial(A, B, C, D));
      const expected = zeros.map(({ re, im, multiplicity }) => [re, im, multiplicity]);
      expect(found.map(({ re, im, multiplicity }) => [re, im, multiplicity])).toEqual(expected);
    },
  );

  test.each(models.filter(({ transferFunctions }) => transferFunctions.length > 0))(
    '$name: every transfer function is the exact one, uncancelled',
    ({ A, B, C, D, inputs, outputs, transferFunctions }) => {
      const characteristic = characteristicPolynomial(A);
      const numerators = transferNumerators(A, B, C, D, characteristic);
      for (const { input, output, numeratorExact, denominatorExact } of transferFunctions) {
        if (!numeratorExact || !denominatorExact) continue;
        const found = numerators[outputs.indexOf(output)]?.[inputs.indexOf(input)] ?? [];
        const numerator = numeratorExact.map(rationalOf).filter((c, i, all) => i > 0 || all.length > 1 || c.n !== 0n);
        const left = multiplyPolynomials(found, denominatorExact.map(rationalOf));
        expect(written(left)).toBe(written(multiplyPolynomials(numerator, characteristic)));
      }
    },
  );
});
