/**
 * What one block's law gives in the two settings of the self-check: at a complex frequency s, where states answer to the
 * inputs and to their initial values; and with the states held at given values, where only the outputs answer.
 */

import { add, type Complex, divide, modulus, multiply, ONE, real, subtract, ZERO } from './complex.ts';
import { SystemWriter } from './complex-system.ts';
import { factorComplex } from './factor-complex.ts';
import type { RawLaw } from './raw-laws.ts';
import { solveRefined } from './solve-complex.ts';

/** The complex frequency, or `held` for states held at given values. */
export type Setting = Complex | 'held';

/** States of a block and what their derivatives come to; `size` is that of the terms that made the derivative. */
export interface StateReading {
  readonly x: readonly Complex[];
  readonly derivative: readonly Complex[];
  readonly size: readonly number[];
}

/**
 * y = gains u + fromStates(values), with `values` the initial or the held values of the block's states. Vectors are as long
 * as the block has ports and states.
 */
export interface BlockBehaviour {
  readonly gains: readonly (readonly Complex[])[];
  fromStates(values: readonly number[]): readonly Complex[];
  /** The states for inputs u. */
  readStates(values: readonly number[], u: readonly Complex[]): StateReading;
}

const NO_STATES: StateReading = { x: [], derivative: [], size: [] };

/** The behaviour of a law that may have states; null where s is a pole of the block. */
export function behaviour(law: Rational | Matrices | DeadTimeLaw, setting: Setting): BlockBehaviour | null {
  if (law.kind === 'dead-time') return setting === 'held' ? null : deadTimeAt(law, setting);
  if (law.kind === 'rational') return setting === 'held' ? rationalHeld(law) : rationalAt(law, setting);
  return setting === 'held' ? matricesHeld(law) : matricesAt(law, setting);
}

type DeadTimeLaw = Extract<RawLaw, { kind: 'dead-time' }>;
type Rational = Extract<RawLaw, { kind: 'rational' }>;
type Matrices = Extract<RawLaw, { kind: 'matrices' }>;

/** y = e^(−sT) u; what is under way in a dead time is no finite state, so it starts empty. */
function deadTimeAt({ seconds }: DeadTimeLaw, s: Complex): BlockBehaviour {
  const size = Math.exp(-s.re * seconds);
  const gain = { re: size * Math.cos(s.im * seconds), im: -size * Math.sin(s.im * seconds) };
  return { gains: [[gain]], fromStates: () => [ZERO], readStates: () => NO_STATES };
}

/** Row of C and D of the controller companion form, for a proper law: c_i = b_i − b_n a_i, d = b_n. */
function outputRow({ numerator, denominator }: Rational) {
  const n = denominator.length - 1;
  const d = numerator[n] ?? 0;
  const c = Array.from({ length: n }, (_, i) => (numerator[i] ?? 0) - d * denominator[i]!);
  return { n, c, d };
}

/**
 * y = N(s)/D(s) u. Along the chain s X_i = X_{i+1} + x_i(0), so X_i = s^{i−1}/D(s) · drive + h_i, where h answers to the
 * initial values alone: from h_n = 0 downwards by divisions with s where |s| > 1, from h_1 = 0 upwards by multiplications
 * otherwise, as either loses all digits in the other's place. The chain's last link gives the drive.
 */
function rationalAt(law: Rational, s: Complex): BlockBehaviour | null {
  const { n, c } = outputRow(law);
  const powers = powersOver(law.denominator, Math.max(n, law.numerator.length), s);
  if (powers === null) return null;
  const gain = timesComplex(law.numerator, powers, ZERO);
  const chain = (values: readonly number[], u: Complex) => {
    const h = answerToInitial(values, s);
    let drive = subtract(add(u, real(values[n - 1]!)), timesComplex(law.denominator.slice(0, n), h, ZERO));
    if (!isLarge(s)) drive = subtract(drive, multiply(s, h[n - 1]!));
    return h.map((own, i) => add(multiply(powers[i]!, drive), own));
  };
  return {
    gains: [[gain]],
    fromStates: values => [n === 0 ? ZERO : timesComplex(c, chain(values, ZERO), ZERO)],
    readStates: (values, [u = ZERO]) => (n === 0 ? NO_STATES : readingAt(s, chain(values, u), values)),
  };
}

/** h_i = (h_{i+1} + x_i(0)) / s down from h_n = 0, or h_{i+1} = s h_i − x_i(0) up from h_1 = 0. */
function answerToInitial(values: readonly number[], s: Complex): Complex[] {
  const n = values.length;
  const h = new Array<Complex>(n).fill(ZERO);
  if (isLarge(s)) for (let i = n - 2; i >= 0; i--) h[i] = divide(add(h[i + 1]!, real(values[i]!)), s);
  else for (let i = 0; i < n - 1; i++) h[i + 1] = subtract(multiply(s, h[i]!), real(values[i]!));
  return h;
}

function isLarge(s: Complex): boolean {
  return modulus(s) > 1;
}

/** Derivatives s X − x(0). */
function readingAt(s: Complex, x: readonly Complex[], initial: readonly number[]): StateReading {
  return {
    x,
    derivative: x.map((value, i) => subtract(multiply(s, value), real(initial[i]!))),
    size: x.map((value, i) => modulus(s) * modulus(value) + Math.abs(initial[i]!)),
  };
}

function readingHeld(values: readonly number[], derivative: readonly Complex[]): StateReading {
  return { x: values.map(real), derivative, size: derivative.map(modulus) };
}

/** s^i / D(s) for i from 0 to highest, in powers of 1/s where those are the smaller ones; null where D(s) = 0. */
function powersOver(denominator: readonly number[], highest: number, s: Complex): Complex[] | null {
  const n = denominator.length - 1;
  const large = isLarge(s);
  const base = large ? divide(ONE, s) : s;
  const ordered = large ? [...denominator].reverse() : denominator;
  const value = ordered.reduceRight((sum, a) => add(multiply(sum, base), real(a)), ZERO);
  if (value.re === 0 && value.im === 0) return null;
  const powers: Complex[] = [];
  for (let i = 0; i <= highest; i++) {
    const scaled = large ? power(i > n ? s : base, Math.abs(n - i)) : power(s, i);
    powers.push(divide(scaled, value));
  }
  return powers;
}

function power(base: Complex, exponent: number): Complex {
  let result = ONE;
  for (let i = 0; i < exponent; i++) result = multiply(result, base);
  return result;
}

function rationalHeld(law: Rational): BlockBehaviour {
  const { c, d } = outputRow(law);
  return {
    gains: [[real(d)]],
    fromStates: values => [real(c.reduce((sum, factor, i) => sum + factor * values[i]!, 0))],
    readStates: (values, [u = ZERO]) => {
      const last = add(u, real(-values.reduce((sum, value, k) => sum + law.denominator[k]! * value, 0)));
      return readingHeld(values, [...values.slice(1).map(real), last]);
    },
  };
}

function matricesHeld({ A, B, C, D }: Matrices): BlockBehaviour {
  const times = (row: readonly number[], values: readonly number[]) =>
    real(row.reduce((sum, factor, i) => sum + factor * values[i]!, 0));
  return {
    gains: D.map(row => row.map(real)),
    fromStates: values => C.map(row => times(row, values)),
    readStates: (values, u) =>
      readingHeld(
        values,
        A.map((row, i) => timesComplex(B[i]!, u, times(row, values))),
      ),
  };
}

/** X = (sI − A)⁻¹ (x(0) + B u), Y = C X + D u. */
function matricesAt({ A, B, C, D }: Matrices, s: Complex): BlockBehaviour | null {
  const system = resolventOf(A, s);
  const factors = factorComplex(system);
  if (factors === null) return null;
  const states = (drive: readonly Complex[]): Complex[] => {
    const right = {
      re: Float64Array.from(drive, value => value.re),
      im: Float64Array.from(drive, value => value.im),
    };
    const { re, im } = solveRefined(system, factors, right);
    return Array.from(re, (value, i) => ({ re: value, im: im[i]! }));
  };
  const inputs = D[0]?.length ?? B[0]?.length ?? 0;
  const answers = Array.from({ length: inputs }, (_, j) => states(B.map(row => real(row[j]!))));
  return {
    gains: C.map((row, o) => answers.map((x, j) => timesComplex(row, x, real(D[o]![j]!)))),
    fromStates: values => {
      const x = states(values.map(real));
      return C.map(row => timesComplex(row, x, ZERO));
    },
    readStates: (values, u) =>
      readingAt(s, states(values.map((value, i) => timesComplex(B[i]!, u, real(value)))), values),
  };
}

/** sI − A. */
function resolventOf(A: Matrices['A'], s: Complex) {
  const writer = new SystemWriter();
  A.forEach((row, i) => {
    writer.add(i, s.re, s.im);
    row.forEach((a, j) => {
      if (a !== 0) writer.add(j, -a, 0);
    });
    writer.endRow();
  });
  return writer.finish();
}

function timesComplex(row: readonly number[], values: readonly Complex[], start: Complex): Complex {
  return row.reduce((sum, factor, i) => add(sum, multiply(real(factor), values[i]!)), start);
}
