import { describe, expect, test } from 'vitest';
import { rationalField } from '../../../../src/algebra/fields.ts';
import { type Rational, rational } from '../../../../src/algebra/rational.ts';
import { commonDivisor } from '../../../../src/algebra/symbolic/gcd.ts';
import {
  createSymbolicField,
  DEFAULT_LIMITS,
  evaluateAt,
  type RationalFunction,
  type SymbolicField,
  type SymbolicSolution,
  solveSymbolic,
} from '../../../../src/algebra/symbolic/index.ts';
import { functionOf, polynomialOf } from '../../../arbitraries/symbolic.ts';

/** Solves a system written as texts. */
function solved(matrix: string[][], rightSides: string[][]): SymbolicSolution | null {
  const field = createSymbolicField();
  const read = (rows: string[][]) => rows.map(row => row.map(text => functionOf(text, field)));
  return solveSymbolic(read(matrix), read(rightSides), field.effort);
}

/** The reduced Laplacian of the complete graph on `nodes` nodes, every branch with a conductance of its own. */
function completeGraph(nodes: number): string[][] {
  const conductance = (i: number, j: number) => `g${Math.min(i, j)}${Math.max(i, j)}`;
  const others = (i: number) => Array.from({ length: nodes }, (_, j) => j).filter(j => j !== i);
  return Array.from({ length: nodes - 1 }, (_, i) =>
    Array.from({ length: nodes - 1 }, (_, j) =>
      i === j
        ? others(i)
            .map(k => conductance(i, k))
            .join(' + ')
        : `-${conductance(i, j)}`,
    ),
  );
}

/**
 * Twelve blocks in a ring with twelve chords, a gain for each of the 24 wires: y = M y + u, fed at the first and the seventh.
 * Chords run from block 5k to block 7k + 3 (mod 12), every third with a minus.
 */
function ringWithChords(field: SymbolicField): { matrix: RationalFunction[][]; rightSides: RationalFunction[][] } {
  const n = 12;
  const matrix = Array.from({ length: n }, (_, i) =>
    Array.from({ length: n }, (_, j) => (i === j ? field.one : field.zero)),
  );
  const join = (from: number, to: number, gain: RationalFunction) => {
    const row = matrix[to] ?? [];
    row[from] = field.subtract(row[from] ?? field.zero, gain);
  };
  for (let k = 0; k < n; k++) {
    join(k, (k + 1) % n, field.variable(`r${k}`));
    const gain = field.variable(`c${k}`);
    join((5 * k) % n, (7 * k + 3) % n, k % 3 === 0 ? field.negate(gain) : gain);
  }
  const rightSides = matrix.map((_, i) => [i === 0 ? field.one : field.zero, i === 6 ? field.one : field.zero]);
  return { matrix, rightSides };
}

describe('a loop solved in symbols', () => {
  test("Cramer's rule for two equations", () => {
    const solution = solved(
      [
        ['a', 'b'],
        ['c', 'd'],
      ],
      [['e1'], ['f']],
    );
    expect(solution?.values).toEqual([
      [functionOf('(d*e1 - b*f)/(a*d - b*c)')],
      [functionOf('(a*f - c*e1)/(a*d - b*c)')],
    ]);
  });

  test("Mason's formula for a ring of three blocks (Proc. IRE 41, 1953, and 44, 1956)", () => {
    // x1 = K1 (u - x3), x2 = K2 x1, x3 = K3 x2: one loop of gain −K1 K2 K3.
    const solution = solved(
      [
        ['1', '0', 'K1'],
        ['-K2', '1', '0'],
        ['0', '-K3', '1'],
      ],
      [['K1'], ['0'], ['0']],
    );
    expect(solution?.values).toEqual([
      [functionOf('K1/(1 + K1*K2*K3)')],
      [functionOf('K1*K2/(1 + K1*K2*K3)')],
      [functionOf('K1*K2*K3/(1 + K1*K2*K3)')],
    ]);
    expect(solution?.determinant).toEqual(polynomialOf('1 + K1*K2*K3'));
  });

  test("Mason's formula where two loops do not touch: 1 − L1 − L2 + L1 L2, the path times what it leaves", () => {
    // u → x1 → x2 → x3 → x4 with feedback of a around 1-2 and of b around 3-4.
    const solution = solved(
      [
        ['1', '-a', '0', '0'],
        ['-p', '1', '0', '0'],
        ['0', '-q', '1', '-b'],
        ['0', '0', '-r', '1'],
      ],
      [['1'], ['0'], ['0'], ['0']],
    );
    expect(solution?.values[3]).toEqual([functionOf('p*q*r/(1 - a*p - b*r + a*p*b*r)')]);
    // x2 meets only the first loop, so the second cancels.
    expect(solution?.values[1]).toEqual([functionOf('p/(1 - a*p)')]);
  });

  test.each([
    [4, 16],
    [5, 125],
  ])("Kirchhoff's trees of the complete graph on %i nodes: Cayley counts %i, each once", (nodes, trees) => {
    const matrix = completeGraph(nodes);
    const solution = solved(
      matrix,
      matrix.map((_, i) => [i === 0 ? '1' : '0']),
    );
    const determinant = solution?.determinant.coefficients ?? [];
    expect(determinant).toHaveLength(trees);
    expect(new Set(determinant.map(coefficient => coefficient * (determinant[0] ?? 0n)))).toEqual(new Set([1n]));
  });

  test('the balanced bridge of Wheatstone carries no current, whatever the branch across it', () => {
    // Nodes: supply 1 V over R1, R2 to the left and right node; R1*x, R2*x below; G across.
    const solution = solved(
      [
        ['1/R1 + 1/(x*R1) + G', '-G'],
        ['-G', '1/R2 + 1/(x*R2) + G'],
      ],
      [['1/R1'], ['1/R2']],
    );
    expect(solution?.values).toEqual([[functionOf('x/(1 + x)')], [functionOf('x/(1 + x)')]]);
  });

  test('rows with denominators are cleared, and what no parameter needs does not stay', () => {
    const solution = solved(
      [
        ['1/J', '1/J'],
        ['1/(J*b)', '2/b'],
      ],
      [['1'], ['0']],
    );
    expect(solution?.values).toEqual([[functionOf('2*J^2/(2*J - 1)')], [functionOf('-J/(2*J - 1)')]]);
  });

  test('a zero on the diagonal only asks for another pivot', () => {
    const solution = solved(
      [
        ['0', 'a', '0'],
        ['b', '0', '0'],
        ['0', '0', 'c'],
      ],
      [['1'], ['1'], ['1']],
    );
    expect(solution?.values).toEqual([[functionOf('1/b')], [functionOf('1/a')], [functionOf('1/c')]]);
  });

  test('a core of seven unknowns is eliminated to the end, one of six goes by minors, to the same answers', () => {
    // x_i (1 + K) + Σ_j≠i x_j = 1 + K + n − 1 is solved by ones; its determinant is Kⁿ⁻¹ (K + n), all entries of two terms.
    for (const n of [6, 7]) {
      const matrix = Array.from({ length: n }, (_, i) =>
        Array.from({ length: n }, (_, j) => (i === j ? `(1 + K)*(2 + b)` : '2 + b')),
      );
      const solution = solved(
        matrix,
        matrix.map(() => [`(K + ${n})*(2 + b)`, `1`]),
      );
      expect(solution?.values).toEqual(matrix.map(() => [functionOf('1'), functionOf(`1/((K + ${n})*(2 + b))`)]));
    }
  });

  test('a determinant that vanishes identically has no solution', () => {
    expect(
      solved(
        [
          ['1', '-K'],
          ['-1/K', '1'],
        ],
        [['1'], ['0']],
      ),
    ).toBeNull();
    expect(
      solved(
        [
          ['a', 'b'],
          ['2*a', '2*b'],
        ],
        [['1'], ['0']],
      ),
    ).toBeNull();
    expect(solved([['0']], [['1']])).toBeNull();
  });

  test('a system of no equations has the empty solution, one without right sides its determinant', () => {
    expect(solved([], [])).toEqual({ values: [], determinant: polynomialOf('1') });
    expect(solved([['1 + K']], [[]])?.determinant).toEqual(polynomialOf('1'));
  });

  test('twelve blocks and 24 wires with their own gains: no entry is reducible, and the effort is small', () => {
    const field = createSymbolicField();
    const { matrix, rightSides } = ringWithChords(field);
    const solution = solveSymbolic(matrix, rightSides, field.effort);
    // A hundredth of what is allowed where nothing else is said.
    expect(field.effort.spent).toBeLessThan(DEFAULT_LIMITS.maximumOperations / 100);
    const entries = solution?.values.flat() ?? [];
    expect(entries).toHaveLength(24);
    for (const { numerator, denominator } of entries) {
      expect(commonDivisor(numerator, denominator, field.effort)).toEqual(polynomialOf('1'));
    }
    // Put back into the equations at numbers: gains k/(k + 2) in the order in which they are met.
    const numbers = new Map<string, Rational>();
    const numberOf = (name: string) => {
      const known = numbers.get(name) ?? rational(BigInt(numbers.size + 1), BigInt(numbers.size + 3));
      numbers.set(name, known);
      return known;
    };
    const at = (f: RationalFunction | undefined) => evaluateAt(f ?? field.zero, rationalField, numberOf);
    matrix.forEach((row, i) => {
      for (const m of [0, 1]) {
        const sum = row.reduce((total, entry, j) => {
          const product = rationalField.multiply(
            at(entry) ?? rationalField.zero,
            at(solution?.values[j]?.[m]) ?? rationalField.zero,
          );
          return rationalField.add(total, product);
        }, rationalField.zero);
        expect(sum).toEqual(at(rightSides[i]?.[m]));
      }
    });
  });
});
