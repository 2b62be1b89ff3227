/**
 * The points at which a drawing is judged for the whole tolerance of its parameters: as drawn, at the corners, and at a seeded random
 * sample in between. A point says for each parameter that has a tolerance how far it is moved, in parts of the tolerance.
 */

import { rational, toFraction } from '../../algebra/index.ts';
import type { Diagram, Parameter } from '../../diagram/index.ts';
import { evaluateParameters, evaluateTolerance, onOneLine } from '../../expression/index.ts';
import { randomSigned } from '../../numeric/index.ts';
import { ok, type Problem, problem, type Result } from '../../problem/index.ts';

/** A parameter that has a tolerance. */
export interface ToleratedParameter {
  readonly name: string;
  /** As drawn, and the plus-or-minus amount, in the parameter's unit. */
  readonly nominal: number;
  readonly amount: number;
  /** The amount as exact text where it is rational, its shortest decimal else. */
  readonly amountText: string;
}

export interface TolerancePoint {
  readonly kind: 'drawn' | 'corner' | 'sample';
  /** For each tolerated parameter, between −1 and 1, in units of 2⁻²⁰ so that it is written exactly. */
  readonly at: readonly number[];
}

export interface TolerancePlan {
  readonly parameters: readonly ToleratedParameter[];
  /** The drawing as it is first, then the corners, then the sample. */
  readonly points: readonly TolerancePoint[];
  /** Whether every corner is among them; otherwise as many random ones as are kept. */
  readonly hasEveryCorner: boolean;
  readonly seed: number;
}

export interface SampleChoice {
  /** Points in between; 200 where it is not said. */
  readonly samples?: number;
  /** 1 to 2³¹ − 2; 1 where it is not said. */
  readonly seed?: number;
}

export const DEFAULT_SAMPLES = 200;
export const MOST_SAMPLES = 100_000;

/** Corners that are visited: all of up to ten parameters, as many random ones of more. */
const MOST_CORNERS = 1024;

/** Parts of a tolerance are multiples of this. */
const STEP = 2 ** -20;

/** The plan for a drawing; the problems of its parameters and tolerances where one has no value. One point where none has a tolerance. */
export function tolerancePlan(diagram: Diagram, choice: SampleChoice = {}): Result<TolerancePlan> {
  const parameters = toleratedParameters(diagram);
  if (!parameters.ok) return parameters;
  const { samples = DEFAULT_SAMPLES, seed = 1 } = choice;
  const count = parameters.value.length;
  const random = randomSigned(seed);
  const hasEveryCorner = 2 ** count <= MOST_CORNERS;
  const corners = hasEveryCorner ? everyCorner(count) : randomCorners(count, random);
  const inside = Array.from({ length: count === 0 ? 0 : samples }, () =>
    Array.from({ length: count }, () => Math.round(random() / STEP) * STEP),
  );
  const points: TolerancePoint[] = [{ kind: 'drawn', at: new Array<number>(count).fill(0) }];
  if (count > 0) points.push(...corners.map(at => ({ kind: 'corner', at }) as const));
  points.push(...inside.map(at => ({ kind: 'sample', at }) as const));
  return ok({ parameters: parameters.value, points, hasEveryCorner, seed });
}

function everyCorner(count: number): readonly (readonly number[])[] {
  return Array.from({ length: 2 ** count }, (_, k) =>
    Array.from({ length: count }, (__, i) => ((k >> i) & 1 ? 1 : -1)),
  );
}

function randomCorners(count: number, random: () => number): readonly (readonly number[])[] {
  return Array.from({ length: MOST_CORNERS }, () => Array.from({ length: count }, () => (random() < 0 ? -1 : 1)));
}

function toleratedParameters(diagram: Diagram): Result<readonly ToleratedParameter[]> {
  const scope = evaluateParameters(diagram.parameters);
  if (!scope.ok) return scope;
  const problems: Problem[] = [];
  const found = diagram.parameters.flatMap(({ name, tolerance }): ToleratedParameter[] => {
    const nominal = scope.value.get(name);
    if (tolerance === undefined || nominal === undefined) return [];
    const amount = evaluateTolerance(tolerance, nominal, scope.value);
    if (!amount.ok) {
      const title = `Parameter ${onOneLine(name)}, tolerance`;
      const named = amount.problems.map(({ code, message }) =>
        problem(code, `${title}: ${message}`, { parameter: name }),
      );
      problems.push(...named);
      return [];
    }
    const { exact, double } = amount.value;
    if (double === 0) return [];
    const amountText = exact === null ? String(double) : toFraction(exact);
    return [{ name, nominal: nominal.double, amount: double, amountText }];
  });
  return problems.length > 0 ? { ok: false, problems } : ok(found);
}

/** The drawing with its parameters at a point of the plan: `(value) + (part)*(amount)`, exact where value and amount are. */
export function diagramAt(
  diagram: Diagram,
  parameters: readonly ToleratedParameter[],
  { at }: TolerancePoint,
): Diagram {
  const moves = new Map(parameters.map(({ name, amountText }, i) => [name, { part: at[i] ?? 0, amountText }]));
  const moved = (parameter: Parameter): Parameter => {
    const move = moves.get(parameter.name);
    if (move === undefined || move.part === 0) return parameter;
    const part = toFraction(rational(BigInt(Math.round(move.part / STEP)), BigInt(1 / STEP)));
    return { ...parameter, value: `(${parameter.value}) + (${part})*(${move.amountText})` };
  };
  return { ...diagram, parameters: diagram.parameters.map(moved) };
}

/** The parameters' values at a point, in the order of the plan, to 15 digits: the last bit of a sum is noise to the eye. */
export function valuesAt(parameters: readonly ToleratedParameter[], { at }: TolerancePoint): readonly number[] {
  return parameters.map(({ nominal, amount }, i) => Number((nominal + (at[i] ?? 0) * amount).toPrecision(15)));
}
