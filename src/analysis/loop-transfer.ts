/**
 * The loop transfer L at a cut: minus the signal that comes back for a unit signal put in, every other loop closed. Exact
 * where the drawing has no dead time and is of ordinary size; with dead time from the drawing's raw equations, e^(−sT) true.
 */

import { addPolynomials, negateRational } from '../algebra/index.ts';
import { compile, type DirectResponse, directResponse } from '../compile/index.ts';
import type { Diagram, PortReference } from '../diagram/index.ts';
import { fail, ok, problem, type Result } from '../problem/index.ts';
import { exactModel } from './exact-model.ts';
import { channelResponse, type Response } from './frequency-response.ts';
import { openedDiagram } from './opened-loop.ts';
import { poles, type Root, rootsOf } from './poles.ts';
import { type Stability, stability } from './stability.ts';
import { type ReducedFraction, reducedFraction } from './transfer-functions.ts';

export interface LoopTransfer {
  /** L(jω), ω in rad/s; null at a pole of L on the imaginary axis. */
  readonly valueAt: Response;
  /** L as a reduced fraction, 0 over 1 where the wire is in no loop; null with dead time and for large models. */
  readonly exact: ReducedFraction | null;
  /** `certified`: from the exact fraction; `direct`: the raw equations with true dead time; `floating`: the model in doubles. */
  readonly route: 'certified' | 'direct' | 'floating';
  /** Seconds; those of the whole drawing. */
  readonly deadTimes: readonly number[];
  /** Poles and zeros that bend L and the closed loop: the drawing's with dead time approximated. */
  readonly features: readonly Root[];
  /** Poles of L, those that it cancels among them where it is not exact. */
  readonly openPoles: readonly Root[];
  /** Stability of the closed drawing's state-space model. */
  readonly closedLoop: Stability['verdict'];
}

/** The loop transfer at the wire that ends at `to` on the top sheet, or why there is none. */
export function loopTransfer(diagram: Diagram, to: PortReference): Result<LoopTransfer> {
  const opened = openedDiagram(diagram, to);
  if (opened === null) {
    return fail(problem('missing-port', `No wire ends at port ${to[1]} of block ${to[0]}. Put the cut on a wire.`));
  }
  const derived = compile(opened);
  if (!derived.ok) return derived;
  const direct = directResponse(opened);
  if (!direct.ok) return direct;
  const closed = compile(diagram);
  if (!closed.ok) return closed;
  const { model } = derived.value;
  const exact = exactModel(model, 'ordinary');
  const back = exact === null ? null : reducedFraction(exact, 0, 0);
  const fraction =
    back === null ? null : { numerator: back.numerator.map(negateRational), denominator: back.denominator };
  const openPoles = (fraction === null ? null : rootsOf(fraction.denominator)) ?? poles(model).poles;
  const common = {
    openPoles,
    deadTimes: direct.value.deadTimes,
    features: [...poles(closed.value.model).poles, ...featuresOf(fraction), ...poles(model).poles],
    closedLoop: stability(closed.value.model).verdict,
  };
  const { valueAt, route } = channelResponse(model, { input: 0, output: 0 });
  const inModel: Response = omega => negated(valueAt(omega));
  if (common.deadTimes.length > 0)
    return ok({ ...common, exact: null, route: 'direct', valueAt: trueDelays(direct.value, inModel) });
  return ok({ ...common, exact: route === 'certified' ? fraction : null, route, valueAt: inModel });
}

/**
 * At rest a dead time changes nothing, and the model has no trouble with blocks whose pole is at zero. Every frequency is
 * solved once: crossings and peaks are looked for on the same grid.
 */
function trueDelays(direct: DirectResponse, inModel: Response): Response {
  const known = new Map<number, ReturnType<Response>>();
  return omega => {
    const kept = known.get(omega);
    if (kept !== undefined) return kept;
    const [value] = omega === 0 ? [] : (direct.at({ re: 0, im: omega }, 0) ?? []);
    const found = omega === 0 ? inModel(0) : negated(value === undefined ? null : [value.re, value.im]);
    known.set(omega, found);
    return found;
  };
}

function negated(value: readonly [number, number] | null): readonly [number, number] | null {
  return value === null ? null : [-value[0], -value[1]];
}

/** Zeros of L and of 1 + L. */
function featuresOf(fraction: ReducedFraction | null): readonly Root[] {
  if (fraction === null) return [];
  const { numerator, denominator } = fraction;
  return [...(rootsOf(numerator) ?? []), ...(rootsOf(addPolynomials(numerator, denominator)) ?? [])];
}
