/**
 * A drawing's equations solved directly in exact fractions, at one rational value of s: one dense row for each output port,
 * straight from format.md. Slow and simple on purpose; it is what derivations are held against.
 */

import {
  addRationals,
  divideRationals,
  multiplyRationals,
  ONE,
  type Rational,
  rational,
  subtractRationals,
  ZERO,
} from '../../../src/algebra/index.ts';
import type { Block, Diagram, Sheet } from '../../../src/diagram/index.ts';
import {
  evaluateParameters,
  evaluatePolynomial,
  evaluateQuantity,
  type Scope,
  type Value,
} from '../../../src/expression/index.ts';
import { valueOf } from '../../unit/results.ts';

/** A value of s, or the limit at infinity of what is proper, with everything that differentiates left out. */
export type Point = Rational | 'infinity';

interface Equations {
  readonly scope: Scope;
  readonly point: Point;
  /** Number of each unknown `path:port`. */
  readonly unknowns: Map<string, number>;
  /** For each unknown what it takes from input ports `path:port`. */
  readonly rows: { readonly port: string; readonly gain: Rational }[][];
  /** Unknown at each wired input port. */
  readonly sources: Map<string, number>;
}

/**
 * The transfer matrix at a point, outputs × inputs; null where the equations have no unique solution there.
 */
export function transferMatrix(diagram: Diagram, point: Point): Rational[][] | null {
  const equations = equationsOf(diagram, point);
  const inputs = diagram.blocks.filter(({ kind }) => kind === 'input');
  const outputs = diagram.blocks.filter(({ kind }) => kind === 'output');
  const n = equations.rows.length;
  const matrix = matrixOf(equations).map((row, i) => [
    ...row,
    ...inputs.map(({ id }) => (equations.unknowns.get(`${id}:0`) === i ? ONE : ZERO)),
  ]);
  if (!reduce(matrix, n)) return null;
  return outputs.map(({ id }) => {
    const unknown = equations.sources.get(`${id}:0`);
    return inputs.map((_, j) => (unknown === undefined ? ZERO : (matrix[unknown]?.[n + j] ?? ZERO)));
  });
}

/** Whether the equations have a unique solution at a point. */
export function isSolvable(diagram: Diagram, point: Point): boolean {
  const equations = equationsOf(diagram, point);
  return reduce(matrixOf(equations), equations.rows.length);
}

/** C (sI − A)⁻¹ B + D, exactly; null where s is an eigenvalue of A. */
export function modelTransfer(
  { A, B, C, D }: Record<'A' | 'B' | 'C' | 'D', readonly (readonly Rational[])[]>,
  s: Rational,
): Rational[][] | null {
  const n = A.length;
  const matrix = A.map((row, i) => [...row.map((a, j) => subtractRationals(i === j ? s : ZERO, a)), ...(B[i] ?? [])]);
  if (!reduce(matrix, n)) return null;
  return D.map((row, o) =>
    row.map((d, j) =>
      (C[o] ?? []).reduce((total, c, i) => addRationals(total, multiplyRationals(c, matrix[i]?.[n + j] ?? ZERO)), d),
    ),
  );
}

function equationsOf(diagram: Diagram, point: Point): Equations {
  const scope = valueOf(evaluateParameters(diagram.parameters));
  const equations: Equations = { scope, point, unknowns: new Map(), rows: [], sources: new Map() };
  addSheet(equations, diagram, '', true);
  return equations;
}

function addSheet(equations: Equations, sheet: Sheet, path: string, isTop: boolean): void {
  for (const block of sheet.blocks) {
    const own = path + block.id;
    if (block.kind === 'group') addSheet(equations, block.sheet, `${own}.`, false);
    else {
      const gains = isTop && block.kind === 'input' ? [[]] : gainsAt(block, equations);
      if (isTop && block.kind === 'output') continue;
      gains.forEach((row, port) => {
        equations.unknowns.set(`${own}:${port}`, equations.rows.length);
        equations.rows.push(row.map((gain, from) => ({ port: `${own}:${from}`, gain })));
      });
    }
  }
  for (const { from, to } of sheet.wires) {
    const source = equations.unknowns.get(portName(sheet, path, from, 'output'));
    if (source !== undefined) equations.sources.set(portName(sheet, path, to, 'input'), source);
  }
}

/** The port that a wire's end is: of a group, the port of the input or output block at that place. */
function portName(sheet: Sheet, path: string, [id, port]: readonly [string, number], kind: 'input' | 'output'): string {
  const block = sheet.blocks.find(other => other.id === id);
  if (block?.kind !== 'group') return `${path}${id}:${port}`;
  const boundary = block.sheet.blocks.filter(inner => inner.kind === kind)[port];
  return `${path}${id}.${boundary?.id}:0`;
}

const exact = ({ exact: value }: Value): Rational => {
  if (value === null) throw new Error('these drawings have no irrational quantities');
  return value;
};

/** Gains from inputs to outputs at the point. */
function gainsAt(block: Block, { scope, point }: Equations): Rational[][] {
  const quantity = (text: string) => exact(valueOf(evaluateQuantity(text, scope)));
  const polynomial = (text: string) => valueOf(evaluatePolynomial(text, scope)).map(exact);
  switch (block.kind) {
    case 'gain':
      return [[quantity(block.gain)]];
    case 'summer':
      return [[...block.signs].map(sign => (sign === '+' ? ONE : rational(-1n)))];
    case 'integrator':
      return [[quotientAt([ONE], [ONE, ZERO], point)]];
    case 'differentiator':
      return [[quotientAt([ONE, ZERO], [ONE], point)]];
    case 'transfer-function':
      return [[quotientAt(polynomial(block.numerator), polynomial(block.denominator), point)]];
    case 'delay': {
      const bottom = padeDenominator(quantity(block.time), block.order ?? 2);
      const top = bottom.map((c, i) => ((bottom.length - 1 - i) % 2 === 0 ? c : multiplyRationals(c, rational(-1n))));
      return [[quotientAt(top, bottom, point)]];
    }
    case 'state-model': {
      const read = (rows: readonly (readonly string[])[]) => rows.map(row => row.map(quantity));
      const model = { A: read(block.A), B: read(block.B), C: read(block.C), D: read(block.D) };
      const gains = point === 'infinity' ? model.D : modelTransfer(model, point);
      if (gains === null) throw new Error('s is a pole of a block');
      return gains;
    }
    case 'limiter':
    case 'input':
    case 'output':
      return [[ONE]];
    case 'group':
      return [];
    default:
      return block satisfies never;
  }
}

/** N(s)/D(s), coefficients descending. At infinity the constant of the polynomial part. */
function quotientAt(numerator: readonly Rational[], denominator: readonly Rational[], point: Point): Rational {
  if (point !== 'infinity') return divideRationals(horner(numerator, point), horner(denominator, point));
  const rest = [...numerator];
  let constant = ZERO;
  while (rest.length >= denominator.length) {
    constant = divideRationals(rest[0] ?? ZERO, denominator[0] ?? ONE);
    const factor = constant;
    denominator.forEach((d, i) => {
      rest[i] = subtractRationals(rest[i] ?? ZERO, multiplyRationals(factor, d));
    });
    rest.shift();
  }
  return numerator.length >= denominator.length ? constant : ZERO;
}

function horner(coefficients: readonly Rational[], s: Rational): Rational {
  return coefficients.reduce((sum, c) => addRationals(multiplyRationals(sum, s), c), ZERO);
}

/** Σ (2N − k)! N! / ((2N)! k! (N − k)!) (sT)^k, descending. */
function padeDenominator(time: Rational, order: number): Rational[] {
  const factorial = (k: number): bigint => (k <= 1 ? 1n : BigInt(k) * factorial(k - 1));
  return Array.from({ length: order + 1 }, (_, i) => {
    const k = order - i;
    const coefficient = rational(
      factorial(2 * order - k) * factorial(order),
      factorial(2 * order) * factorial(k) * factorial(order - k),
    );
    return Array.from({ length: k }).reduce<Rational>(product => multiplyRationals(product, time), coefficient);
  });
}

/** Rows of y − Σ gain · y_source = 0. */
function matrixOf({ rows, sources }: Equations): Rational[][] {
  return rows.map((terms, i) => {
    const row = rows.map((_, j) => (i === j ? ONE : ZERO));
    for (const { port, gain } of terms) {
      const source = sources.get(port);
      if (source !== undefined) row[source] = subtractRationals(row[source] ?? ZERO, gain);
    }
    return row;
  });
}

/** Gauss and Jordan on the first n columns, in place; false where they are dependent. */
function reduce(matrix: Rational[][], n: number): boolean {
  for (let column = 0; column < n; column++) {
    const at = matrix.findIndex((row, i) => i >= column && row[column]?.n !== 0n);
    const pivotRow = matrix[at];
    if (pivotRow === undefined) return false;
    [matrix[at], matrix[column]] = [matrix[column] ?? [], pivotRow];
    const pivot = pivotRow[column] ?? ONE;
    pivotRow.forEach((value, j) => {
      pivotRow[j] = divideRationals(value, pivot);
    });
    matrix.forEach((row, i) => {
      const factor = row[column] ?? ZERO;
      if (i === column || factor.n === 0n) return;
      pivotRow.forEach((value, j) => {
        row[j] = subtractRationals(row[j] ?? ZERO, multiplyRationals(factor, value));
      });
    });
  }
  return true;
}
