/** Reads the quantities of blocks as rational functions of the parameters. */

import { doubleField } from '../../algebra/index.ts';
import { evaluateAt, type RationalFunction, type SymbolicField, solveSymbolic } from '../../algebra/symbolic/index.ts';
import {
  type Expression,
  evaluateIn,
  evaluatePolynomialIn,
  evaluateQuantity,
  parseExpression,
  type Scope,
} from '../../expression/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import {
  type Arithmetic,
  type Numbers,
  numericReader,
  type QuantityReader,
  rationalArithmetic,
} from '../quantities/index.ts';
import { withOpaqueAtoms } from './opaque-atoms.ts';

/**
 * A reader whose elements are rational functions: each parameter a variable of its own, whatever its value is made of, and
 * each irrational part the variable that its text names. Whether a polynomial's leading coefficients are zero goes by the
 * parameters' values, so that the model has the states of the numeric one.
 *
 * @param meanings  Functions that stand in for some of the parameters.
 */
export function symbolicReader(
  field: SymbolicField,
  scope: Scope,
  meanings: ReadonlyMap<string, RationalFunction>,
): QuantityReader<RationalFunction> {
  const numbers = numericReader(rationalArithmetic, scope);
  const read = <V>(text: string, evaluate: (expression: Expression) => V | null, otherwise: () => V): Result<V> => {
    const parsed = parseExpression(text);
    if (!parsed.ok) return parsed;
    return ok(evaluate(withOpaqueAtoms(parsed.value)) ?? otherwise());
  };
  const variable = (name: string) => meanings.get(name) ?? field.variable(name);
  return {
    arithmetic: symbolicArithmetic(field, scope),
    double: numbers.double,
    quantity: text => {
      const number = numbers.quantity(text); // refuses what the numeric model refuses
      if (!number.ok) return number;
      return read(
        text,
        expression => evaluateIn(expression, field, variable),
        () => field.variable(`(${text})`),
      );
    },
    polynomial: text => {
      const number = numbers.polynomial(text);
      if (!number.ok) return number;
      const { coefficients, lowered } = number.value;
      const symbols = read(
        text,
        expression => evaluatePolynomialIn(expression, field, variable)?.slice(lowered) ?? null,
        () => coefficients.map(value => field.fromRational(value)),
      );
      return symbols.ok ? ok({ coefficients: symbols.value, lowered }) : symbols;
    },
  };
}

function symbolicArithmetic(field: SymbolicField, scope: Scope): Arithmetic<RationalFunction> {
  const valueOf = (name: string): number => {
    const value = evaluateQuantity(name, scope);
    return value.ok ? value.value.double : Number.NaN;
  };
  return {
    field,
    sum: field.add,
    allocate: length => new Array<RationalFunction>(length).fill(field.zero),
    toDouble: value => evaluateAt(value, doubleField, valueOf) ?? Number.NaN,
    magnitude: () => 1,
    solveDense: (matrix, rightSides, n, width) => {
      const solution = solveSymbolic(rowsOf(matrix, n, n), rowsOf(rightSides, n, width), field.effort);
      return solution === null ? null : solution.values.flat();
    },
  };
}

function rowsOf<T>(numbers: Numbers<T>, rows: number, columns: number): T[][] {
  return Array.from({ length: rows }, (_, i) => Array.from({ length: columns }, (_, j) => numbers[i * columns + j]!));
}
