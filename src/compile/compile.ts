/** Diagram to state space, with its check: the one entry to this folder besides the symbolic view and the matrices alone. */

import type { Diagram } from '../diagram/index.ts';
import { evaluateParameters } from '../expression/index.ts';
import type { Result } from '../problem/index.ts';
import { type CompileOptions, deriveModel } from './derive-model.ts';
import { selfCheck } from './self-check/index.ts';
import type { Derivation, SelfCheck, StateSpace } from './state-space.ts';

/** What `deriveModel` says of the diagram, with its self-check. */
export function compile(diagram: Diagram, options: CompileOptions = {}): Result<Derivation> {
  const derived = deriveModel(diagram, options);
  if (!derived.ok) return derived;
  return { ok: true, value: { ...derived.value, selfCheck: checkModel(diagram, derived.value.model) } };
}

/** Checks the model that `deriveModel` made of the diagram; no other may be handed over. */
export function checkModel(diagram: Diagram, model: StateSpace): SelfCheck {
  const parameters = evaluateParameters(diagram.parameters);
  if (!parameters.ok) throw new Error('a diagram without values has no model to check');
  return selfCheck(diagram, parameters.value, model);
}
