/**
 * The symbolic view: the same derivation as compile's, over the rational functions of the parameters. On demand, since its
 * cost has no bound but the effort that it is given.
 */

import {
  createSymbolicField,
  type EffortLimits,
  type EffortOutcome,
  type RationalFunction,
  withinEffort,
} from '../../algebra/symbolic/index.ts';
import type { Diagram } from '../../diagram/index.ts';
import { evaluateParameters } from '../../expression/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import { derive } from '../derive.ts';
import { flatten } from '../flatten/index.ts';
import type { SignalName, SystemMatrices } from '../state-space.ts';
import { expandedParameters } from './expanded-parameters.ts';
import { symbolicReader } from './symbolic-reader.ts';
import { vanishingFactors } from './undefined-at.ts';

/** A model whose entries are rational functions of the parameters. */
export interface SymbolicModel {
  readonly states: readonly SignalName[];
  readonly inputs: readonly SignalName[];
  readonly outputs: readonly SignalName[];
  readonly matrices: SystemMatrices<RationalFunction>;
  /** Names, as in `StateSpace`. */
  readonly shiftedStates: readonly string[];
  /**
   * Factors of denominators that are zero at the values that the parameters have: there the general expressions have no value, and
   * the numeric model is another one, perhaps with fewer states. Empty where the general model holds.
   */
  readonly vanishing: readonly string[];
}

export interface SymbolicOptions {
  /** Of the symbolic field; its own where none are given. */
  readonly limits?: Partial<EffortLimits>;
  /** Whether derived parameters, `wn` with the value `sqrt(k/m)`, are written out; otherwise they keep their names. */
  readonly expanded?: boolean;
}

/**
 * The model in symbols, or the limit of effort at which it was given up: formulas that long tell nobody anything. Each
 * parameter is a symbol, whatever it is defined by; `sqrt(k)`, `pi` and the like stay as they were written. Problems are
 * those of `compile`. Its states are those of `compile`, except where a differentiating drawing is singular for just the
 * values that its parameters have: compare the names.
 */
export function deriveSymbolic(
  diagram: Diagram,
  { limits = {}, expanded = false }: SymbolicOptions = {},
): Result<EffortOutcome<SymbolicModel>> {
  const parameters = evaluateParameters(diagram.parameters);
  if (!parameters.ok) return parameters;
  const drawing = flatten(diagram);
  const field = createSymbolicField(limits);
  const outcome = withinEffort(() => {
    const meanings = expanded ? expandedParameters(diagram.parameters, field) : new Map<string, RationalFunction>();
    return derive(drawing, symbolicReader(field, parameters.value, meanings));
  });
  if (!outcome.finished) return ok(outcome);
  if (!outcome.value.ok) return outcome.value;
  const { states, inputs, outputs, matrices, shiftedStates } = outcome.value.value;
  const vanishing = vanishingFactors(matrices, parameters.value);
  const names = states.map(({ initial: _, ...name }) => name);
  return ok({ finished: true, value: { states: names, inputs, outputs, matrices, shiftedStates, vanishing } });
}
