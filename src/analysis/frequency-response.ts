/**
 * The response of one output to a sinusoid on one input: G(jω) from the exact zeros, poles and gain where the model's size
 * allows, else from the balanced Hessenberg form. Of the state-space model: dead time counts as its Padé approximation.
 */

import { type Rational, rational, toDouble, ZERO } from '../algebra/index.ts';
import type { StateSpace } from '../compile/index.ts';
import { balanceSystem, hessenbergSystem, responseOf } from '../numeric/index.ts';
import { channelSystem } from './channel-system.ts';
import { characteristicOf, type Effort, type ExactModel, exactModel, remembered } from './exact-model.ts';
import { exactPoles, type Root, rootsOf } from './poles.ts';
import { reducedFraction } from './transfer-functions.ts';

export interface FrequencyResponse {
  /** rad/s, as asked. */
  readonly omega: Float64Array;
  /** Real and imaginary part; both NaN at a pole on the imaginary axis, where the response does not exist. */
  readonly re: Float64Array;
  readonly im: Float64Array;
  readonly route: 'certified' | 'floating';
}

/** Zeros, poles and gain of a transfer function: gain · 2^gainExponent · ∏(s − zero) / ∏(s − pole). */
interface ZeroPoleGain {
  readonly zeros: readonly Root[];
  readonly poles: readonly Root[];
  /** gain · 2^gainExponent is the leading coefficient, which alone may overflow a double; 0 for the zero channel. */
  readonly gain: number;
  readonly gainExponent: number;
}

/** G(jω) of a channel, by positions, at angular frequencies in rad/s (finite, of either sign). O(n) or O(n²) a point. */
export function frequencyResponse(
  model: StateSpace,
  { input, output }: { readonly input: number; readonly output: number },
  omega: ArrayLike<number>,
  effort: Effort = 'ordinary',
): FrequencyResponse {
  const result = {
    omega: Float64Array.from(omega),
    re: new Float64Array(omega.length),
    im: new Float64Array(omega.length),
  };
  const { valueAt, route } = channelResponse(model, { input, output }, effort);
  result.omega.forEach((w, k) => {
    const value = valueAt(w);
    result.re[k] = value?.[0] ?? Number.NaN;
    result.im[k] = value?.[1] ?? Number.NaN;
  });
  return { ...result, route };
}

/** Real and imaginary part at an angular frequency in rad/s; null at a pole on the imaginary axis. */
export type Response = (omega: number) => readonly [re: number, im: number] | null;

/** G(jω) of a channel, by positions, as a function, and the route it takes. */
export function channelResponse(
  model: StateSpace,
  { input, output }: { readonly input: number; readonly output: number },
  effort: Effort = 'ordinary',
): { readonly valueAt: Response; readonly route: FrequencyResponse['route'] } {
  const exact = exactModel(model, effort);
  const factors = exact === null ? null : zeroPoleGain(exact, output, input);
  if (factors === null) return { valueAt: byHessenberg(model, output, input), route: 'floating' };
  return { valueAt: byFactors(factors), route: 'certified' };
}

/** The certified factors of the reduced transfer function; null where they could not be separated. */
function zeroPoleGain(exact: ExactModel, output: number, input: number): ZeroPoleGain | null {
  const kept = remembered(known, exact, () => new Map<string, ZeroPoleGain | null>());
  const key = `${output} ${input}`;
  const found = kept.get(key);
  if (found !== undefined) return found;
  const { numerator, denominator } = reducedFraction(exact, output, input);
  const isWhole = denominator.length === characteristicOf(exact).length;
  const zeros = rootsOf(numerator);
  const poles = isWhole ? exactPoles(exact) : rootsOf(denominator);
  const factors = zeros === null || poles === null ? null : { zeros, poles, ...scaledDouble(numerator[0] ?? ZERO) };
  kept.set(key, factors);
  return factors;
}

const known = new WeakMap<ExactModel, Map<string, ZeroPoleGain | null>>();

/**
 * Factors are multiplied in turns of zero and pole, and the product's power of two is kept apart, so that high orders neither
 * overflow nor underflow on the way.
 */
function byFactors({ zeros, poles, gain, gainExponent }: ZeroPoleGain): Response {
  const over = zeros.flatMap(root => new Array<Root>(root.multiplicity).fill(root));
  const under = poles.flatMap(root => new Array<Root>(root.multiplicity).fill(root));
  return omega => {
    let [re, im, exponent] = [gain, 0, gainExponent];
    for (let k = 0; k < Math.max(over.length, under.length); k++) {
      const zero = over[k];
      if (zero !== undefined) {
        const [a, b] = [-zero.re, omega - zero.im];
        [re, im] = [re * a - im * b, re * b + im * a];
      }
      const pole = under[k];
      if (pole !== undefined) {
        const [a, b] = [-pole.re, omega - pole.im];
        const size = a * a + b * b;
        if (size === 0) return null;
        [re, im] = [(re * a + im * b) / size, (im * a - re * b) / size];
      }
      const scale = Math.max(Math.abs(re), Math.abs(im));
      if (scale === 0) return [0, 0];
      const power = Math.floor(Math.log2(scale));
      re *= 2 ** -power;
      im *= 2 ** -power;
      exponent += power;
    }
    return [scaleByPower(re, exponent), scaleByPower(im, exponent)];
  };
}

/** The nearest double of x without the range of doubles: x / 2^gainExponent is near 1. */
function scaledDouble({ n, d }: Rational): Pick<ZeroPoleGain, 'gain' | 'gainExponent'> {
  const gainExponent = 4 * (n.toString(16).length - d.toString(16).length);
  const scale = 1n << BigInt(Math.abs(gainExponent));
  const gain = gainExponent > 0 ? rational(n, d * scale) : rational(n * scale, d);
  return { gain: toDouble(gain), gainExponent };
}

/** x · 2^exponent, in two steps so that the power itself stays finite. */
function scaleByPower(x: number, exponent: number): number {
  const half = Math.trunc(exponent / 2);
  return x * 2 ** half * 2 ** (exponent - half);
}

function byHessenberg(model: StateSpace, output: number, input: number): Response {
  const { A, B, C, D } = channelSystem(model.numeric, input, [output]);
  const balanced = balanceSystem(A, B, C);
  const respond = responseOf({ ...hessenbergSystem(balanced.A, balanced.B, balanced.C), D });
  return omega => {
    const value = respond(0, omega);
    return value === null ? null : [value.re[0] ?? 0, value.im[0] ?? 0];
  };
}
