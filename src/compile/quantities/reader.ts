/**
 * Reads the quantities of blocks into the elements that a derivation runs over. One reader serves one derivation; a block's
 * law asks it and nothing else, so the same laws serve numbers and symbols.
 */

import { parseRational, toDouble } from '../../algebra/index.ts';
import { evaluateQuantity, polynomialAsWritten, type Scope, type Value } from '../../expression/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { Arithmetic, NumericArithmetic } from './arithmetic.ts';

/** A polynomial in s as a block means it. */
export interface PolynomialReading<T> {
  /** Descending powers, the first not zero; empty for the zero polynomial. */
  readonly coefficients: readonly T[];
  /** How many leading coefficients that were written came out as zero. */
  readonly lowered: number;
}

/** What a block's law may ask. Problems carry messages without the block's name; the caller puts it in front. */
export interface QuantityReader<T> {
  readonly arithmetic: Arithmetic<T>;
  quantity(text: string): Result<T>;
  polynomial(text: string): Result<PolynomialReading<T>>;
  /** The quantity's double, for a limit or an initial value that does not enter A, B, C or D. */
  double(text: string): Result<number>;
}

/** A reader of numbers. */
export interface NumericReader<T> extends QuantityReader<T> {
  /** The irrational texts that were read by `quantity` and `polynomial` since the last call. */
  takeIrrational(): readonly string[];
}

/** A reader for the parameters of `scope`. A text that many blocks share is evaluated once. */
export function numericReader<T>(arithmetic: NumericArithmetic<T>, scope: Scope): NumericReader<T> {
  const known = new Map<string, Result<Value>>();
  const polynomials = new Map<string, Result<readonly Value[]>>();
  let irrational: string[] = [];
  const evaluate = (text: string) => remembered(known, text, () => literal(text) ?? evaluateQuantity(text, scope));
  return {
    arithmetic,
    quantity: text => {
      const value = evaluate(text);
      if (!value.ok) return value;
      if (value.value.exact === null) irrational.push(text);
      return ok(arithmetic.fromValue(value.value));
    },
    polynomial: text => {
      const written = remembered(polynomials, text, () => polynomialAsWritten(text, scope));
      if (!written.ok) return written;
      if (written.value.some(({ exact }) => exact === null)) irrational.push(text);
      return ok(withoutLeadingZeros(written.value.map(arithmetic.fromValue), value => arithmetic.field.isZero(value)));
    },
    double: text => {
      const value = evaluate(text);
      return value.ok ? ok(value.value.double) : value;
    },
    takeIrrational: () => {
      const taken = irrational;
      if (taken.length > 0) irrational = [];
      return taken;
    },
  };
}

function remembered<V>(known: Map<string, V>, text: string, evaluate: () => V): V {
  const before = known.get(text);
  if (before !== undefined) return before;
  const value = evaluate();
  known.set(text, value);
  return value;
}

/** Decimals that format.md allows, with a minus in front or none. */
const PLAIN_DECIMAL = /^-?\d+(?:\.\d+)?(?:[eE][+-]?\d+)?$/;

/** The value of a plain decimal without the parser, null for any other text: most quantities of large drawings are. */
function literal(text: string): Result<Value> | null {
  const exact = PLAIN_DECIMAL.test(text) ? parseRational(text) : null;
  if (exact === null) return null;
  const double = toDouble(exact);
  return Number.isFinite(double) ? ok({ exact, double }) : null;
}

/** The coefficients from the first that is not zero on. */
function withoutLeadingZeros<T>(written: readonly T[], isZero: (value: T) => boolean): PolynomialReading<T> {
  const first = written.findIndex(value => !isZero(value));
  if (first < 0) return { coefficients: [], lowered: written.length - 1 };
  return { coefficients: written.slice(first), lowered: first };
}
