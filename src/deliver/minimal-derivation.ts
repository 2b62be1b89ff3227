/** A derivation with the minimal model in place of the drawing's, for every format alike. */

import { minimalModel } from '../analysis/minimal/index.ts';
import { fail, ok, problem, type Result, type Warning } from '../problem/index.ts';
import type { Derived } from './format.ts';

/**
 * The derivation of the minimal model: the same transfer functions, as few states as there can be, and beside it the change of state
 * that gives it. Refused where the model has too many states for exact answers. A warning says where the initial state holds
 * what the minimal model cannot.
 */
export function minimalDerivation(derived: Derived): Result<Derived> {
  const { derivation } = derived;
  const { states } = derivation.model;
  const found = minimalModel(derivation.model, 'high');
  if (found === null) {
    const message = `The model has ${states.length} states, too many to find a minimal one exactly. Export the whole model.`;
    return fail(problem('not-supported', message));
  }
  const lost: Warning[] = found.losesInitialState ? [{ code: 'initial-state-lost', blocks: [], message: LOST }] : [];
  return ok({
    ...derived,
    derivation: { ...derivation, model: found.model, warnings: [...derivation.warnings, ...lost] },
    minimal: { of: states.map(({ name }) => name), change: found.change },
  });
}

const LOST =
  'The initial state holds something that no input reaches, which the minimal model has no state for: ' +
  'its answer to the initial state is another one.';
