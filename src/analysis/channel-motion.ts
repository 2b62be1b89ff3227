/**
 * What a time answer needs to know of one channel before it computes anything: a system whose states are worth following,
 * the poles that its response contains, whether it settles and at which value. Chosen exactly where the model allows.
 */

import { divideRationals, type Polynomial, toDouble, ZERO } from '../algebra/index.ts';
import type { StateSpace } from '../compile/index.ts';
import { balance, type DenseMatrix, eigenvalues, luFactors, luSolve, oneNorm } from '../numeric/index.ts';
import { type ChannelSystem, channelSystem } from './channel-system.ts';
import { companionSystem } from './companion-system.ts';
import { characteristicOf, type ExactModel, exactModel, remembered } from './exact-model.ts';
import { exactPoles, type Root, rootsOf } from './poles.ts';
import { type ReducedFraction, reducedFraction } from './transfer-functions.ts';

/** One input, one output. */
export interface ChannelMotion {
  readonly system: ChannelSystem;
  /** Whether `system` is realised from the transfer function instead of the model's own states. */
  readonly isRealised: boolean;
  /** The poles of the channel's transfer function (certified), or the eigenvalues of `system.A` (floating). */
  readonly modes: readonly Root[];
  /** Whether all modes lie in the open left half plane, so that a step leads to a final value. */
  readonly settles: boolean;
  /** Of the response to a unit step; null where it does not settle. */
  readonly finalValue: number | null;
  readonly route: 'certified' | 'floating';
}

/** What is known of the channel; null where its eigenvalues did not converge. Exact up to 32 states. */
export function channelMotion(model: StateSpace, output: number, input: number): ChannelMotion | null {
  const known = remembered(motions, model, () => new Map<string, ChannelMotion | null>());
  const key = `${output} ${input}`;
  const kept = known.get(key);
  if (kept !== undefined) return kept;
  const exact = exactModel(model, 'ordinary');
  const system = channelSystem(model.numeric, input, [output]);
  const certified = exact === null ? null : exactMotion(exact, system, output, input);
  const motion = certified ?? floatingMotion(system);
  known.set(key, motion);
  return motion;
}

const motions = new WeakMap<StateSpace, Map<string, ChannelMotion | null>>();

/** By certified poles; null where they could not be separated. */
function exactMotion(exact: ExactModel, system: ChannelSystem, output: number, input: number): ChannelMotion | null {
  const fraction = reducedFraction(exact, output, input);
  const all = exactPoles(exact);
  const isWhole = fraction.denominator.length === characteristicOf(exact).length;
  const modes = isWhole ? all : rootsOf(fraction.denominator);
  if (all === null || modes === null) return null;
  const settles = modes.every(({ re }) => re < 0);
  // Modes that the channel hides must decay, or rounding would let them into the response.
  const isStable = all.every(({ re }) => re < 0);
  const hidesGrowth = !isStable && fraction.denominator.length - 1 < system.states.length;
  return {
    system: hidesGrowth ? companionSystem(fraction) : system,
    isRealised: hidesGrowth,
    modes,
    settles,
    finalValue: settles ? finalValueOf(fraction) : null,
    route: 'certified',
  };
}

/** G(0), rounded once. */
function finalValueOf({ numerator, denominator }: ReducedFraction): number {
  const constant = (p: Polynomial) => p[p.length - 1] ?? ZERO;
  return toDouble(divideRationals(constant(numerator), constant(denominator)));
}

function floatingMotion(system: ChannelSystem): ChannelMotion | null {
  const { A } = system;
  const values = eigenvalues(A);
  if (values === null) return null;
  const modes = Array.from(values.re, (re, i) => ({ re, im: values.im[i]!, multiplicity: 1 }));
  const tolerance = 8 * A.rows * Number.EPSILON * oneNorm(balance(A).A); // backward error of the QR iteration
  const settles = modes.every(({ re }) => re < -tolerance);
  return {
    system,
    isRealised: false,
    modes,
    settles,
    finalValue: settles ? staticGain(system) : null,
    route: 'floating',
  };
}

/** D − C A⁻¹ B; null where A is singular. */
function staticGain({ A, B, C, D }: ChannelSystem): number | null {
  const factors = luFactors(A);
  if (factors === null) return null;
  const x: DenseMatrix = luSolve(factors, B);
  let gain = D.data[0]!;
  for (let i = 0; i < x.rows; i++) gain -= C.data[i]! * x.data[i]!;
  return gain;
}
