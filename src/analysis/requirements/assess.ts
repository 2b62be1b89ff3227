/** Whether a drawing does what is required of it, and by how much: each requirement of its list against the measured figure. */

import type { StateSpace } from '../../compile/index.ts';
import { boundOf, type Diagram, type Requirement } from '../../diagram/index.ts';
import { evaluateParameters, evaluateQuantity } from '../../expression/index.ts';
import { type Measurement, measurer } from './measure.ts';

export interface Assessment {
  readonly requirement: Requirement;
  /** `unchecked`: it names what is not in the drawing, or its bound has no value. */
  readonly status: 'met' | 'missed' | 'unchecked';
  /** The measured figure in the kind's unit; null where there is none. */
  readonly value: number | null;
  /** The bound as a number, null for a kind that has none and where it has no value. */
  readonly bound: number | null;
  /** How far inside its bound the figure lies, in the kind's unit, negative outside; null without a figure or a bound. */
  readonly slack: number | null;
  /** Why there is no figure, or why it is unchecked: ready for the screen, a whole sentence. Empty where the figure says it. */
  readonly reason: string;
}

/** Every requirement of the drawing, in its order, against the model that `compile` made of the drawing. */
export function assess(diagram: Diagram, model: StateSpace): readonly Assessment[] {
  const { requirements = [] } = diagram;
  if (requirements.length === 0) return [];
  const scope = evaluateParameters(diagram.parameters);
  if (!scope.ok) return requirements.map(requirement => unchecked(requirement, scope.problems[0]?.message ?? ''));
  const measure = measurer({ diagram, model, scope: scope.value });
  return requirements.map(requirement => {
    const text = boundOf(requirement);
    const bound = text === null ? null : evaluateQuantity(text, scope.value);
    if (bound !== null && !bound.ok) return unchecked(requirement, bound.problems[0]?.message ?? '');
    const measured = measure(requirement);
    if (!measured.ok) return unchecked(requirement, measured.problems[0]?.message ?? '');
    return against(requirement, measured.value, bound?.value.double ?? null);
  });
}

function unchecked(requirement: Requirement, reason: string): Assessment {
  return { requirement, status: 'unchecked', value: null, bound: null, slack: null, reason };
}

function against(requirement: Requirement, measured: Measurement, bound: number | null): Assessment {
  const without = { requirement, value: null, bound, slack: null };
  switch (measured.kind) {
    case 'holds':
      return { ...without, status: measured.holds ? 'met' : 'missed', reason: sentence(measured.reason) };
    case 'none':
      return { ...without, status: 'missed', reason: sentence(measured.reason) };
    case 'unlimited':
      // At least any bound, and never at most one.
      return {
        ...without,
        status: requirement.most === undefined ? 'met' : 'missed',
        reason: sentence(measured.reason),
      };
    case 'value': {
      if (bound === null) return { ...without, status: 'unchecked', reason: 'It has no bound to be compared with.' };
      const slack = requirement.most === undefined ? measured.value - bound : bound - measured.value;
      return { requirement, status: slack >= 0 ? 'met' : 'missed', value: measured.value, bound, slack, reason: '' };
    }
  }
}

const sentence = (text: string) => `${text.charAt(0).toUpperCase()}${text.slice(1)}.`;
