/**
 * The functions and constants an expression may use (format.md, Expressions), with their double-precision meaning. What
 * stays exact (abs, min, max, the sqrt of a square) is decided in arithmetic.ts.
 */

interface FunctionEntry {
  /** Fewest and most arguments. */
  readonly takes: readonly [least: number, most: number];
  /** NaN where the function has no real value. */
  readonly double: (...x: number[]) => number;
}

const one = (double: (x: number) => number): FunctionEntry => ({
  takes: [1, 1],
  double: x => double(x ?? Number.NaN),
});

/** A logarithm has no value at zero: its pole is no −∞ that a later division could turn into a harmless zero. */
const logarithm = (of: (x: number) => number) => one(x => (x > 0 ? of(x) : Number.NaN));

const FUNCTIONS = {
  sqrt: one(Math.sqrt),
  exp: one(Math.exp),
  ln: logarithm(Math.log),
  log10: logarithm(Math.log10),
  sin: one(Math.sin),
  cos: one(Math.cos),
  tan: one(Math.tan),
  asin: one(Math.asin),
  acos: one(Math.acos),
  atan: one(Math.atan),
  atan2: { takes: [2, 2], double: (y, x) => Math.atan2(y ?? Number.NaN, x ?? Number.NaN) },
  sinh: one(Math.sinh),
  cosh: one(Math.cosh),
  tanh: one(Math.tanh),
  abs: one(Math.abs),
  min: { takes: [1, Number.POSITIVE_INFINITY], double: Math.min },
  max: { takes: [1, Number.POSITIVE_INFINITY], double: Math.max },
} as const satisfies Readonly<Record<string, FunctionEntry>>;

export type FunctionName = keyof typeof FUNCTIONS;

/** The names of all functions, in the order of format.md. */
export const FUNCTION_NAMES: readonly FunctionName[] = Object.keys(FUNCTIONS).filter(isFunctionName);

/** Whether `name` is that of a function. */
export function isFunctionName(name: string): name is FunctionName {
  return Object.hasOwn(FUNCTIONS, name);
}

/** Fewest and most arguments of a function. */
export function argumentsOf(name: FunctionName): readonly [least: number, most: number] {
  return FUNCTIONS[name].takes;
}

/** The function in double precision; NaN where it has no real value or an argument is NaN. */
export function applyFunction(name: FunctionName, values: readonly number[]): number {
  if (values.some(Number.isNaN)) return Number.NaN;
  const entry: FunctionEntry = FUNCTIONS[name];
  return entry.double(...values);
}

/** π and Euler's number, rounded to doubles. */
export const CONSTANTS: ReadonlyMap<string, number> = new Map([
  ['pi', Math.PI],
  ['e', Math.E],
]);

/** The name of the Laplace variable in polynomials. */
export const LAPLACE_VARIABLE = 's';
