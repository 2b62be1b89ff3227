/** The workings of a drawing in exact numbers, or in symbols of its parameters within a limit of effort. */

import type { Rational } from '../../algebra/index.ts';
import { createSymbolicField, type RationalFunction, withinEffort } from '../../algebra/symbolic/index.ts';
import type { Diagram } from '../../diagram/index.ts';
import { evaluateParameters } from '../../expression/index.ts';
import { flatten } from '../flatten/index.ts';
import { numericReader, rationalArithmetic } from '../quantities/index.ts';
import { expandedParameters, symbolicReader } from '../symbolic/index.ts';
import { type WorkingSection, workingsOver } from './workings-over.ts';

/** Sections of lines over either field. */
export type Workings =
  | { readonly field: 'rational'; readonly sections: readonly WorkingSection<Rational>[] }
  | { readonly field: 'symbolic'; readonly sections: readonly WorkingSection<RationalFunction>[] };

/** In numbers, irrational quantities by their doubles; null where `workingsOver` has none. */
export function exactWorkings(diagram: Diagram): Workings | null {
  const parameters = evaluateParameters(diagram.parameters);
  if (!parameters.ok) return null;
  const sections = workingsOver(flatten(diagram), numericReader(rationalArithmetic, parameters.value));
  return sections === null ? null : { field: 'rational', sections };
}

/**
 * In symbols; null also where the effort of the symbolic field does not suffice.
 *
 * @param expanded  Whether derived parameters are written out.
 */
export function symbolicWorkings(diagram: Diagram, expanded = false): Workings | null {
  const parameters = evaluateParameters(diagram.parameters);
  if (!parameters.ok) return null;
  const field = createSymbolicField();
  const outcome = withinEffort(() => {
    const meanings = expanded ? expandedParameters(diagram.parameters, field) : new Map<string, RationalFunction>();
    return workingsOver(flatten(diagram), symbolicReader(field, parameters.value, meanings));
  });
  return outcome.finished && outcome.value !== null ? { field: 'symbolic', sections: outcome.value } : null;
}
