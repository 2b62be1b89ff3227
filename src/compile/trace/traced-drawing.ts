/** A drawing made ready for tracing: its graph, its parts, and how its states and those of the model belong together. */

import type { Diagram } from '../../diagram/index.ts';
import { evaluateParameters, type Scope } from '../../expression/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import { type FlatDrawing, flatten } from '../flatten/index.ts';
import { readContributions } from '../kinds/index.ts';
import { numericReader, rationalArithmetic } from '../quantities/index.ts';
import type { StateSpace } from '../state-space.ts';
import { type ActionGraph, actionGraph } from './action-graph.ts';
import { type DrawingParts, drawingParts } from './traced-parts.ts';

export interface TracedDrawing {
  readonly diagram: Diagram;
  readonly model: StateSpace;
  readonly drawing: FlatDrawing;
  readonly scope: Scope;
  readonly graph: ActionGraph;
  readonly parts: DrawingParts;
  /** Names of the blocks' own states, in document order: the model's unless the drawing differentiates. */
  readonly ownStates: readonly string[];
  /** Whether the model's states are just these. */
  readonly hasOwnStates: boolean;
}

/**
 * Prepares a drawing for any number of traces; linear in its size. Irrational quantities are taken as the exact values of their
 * doubles, as in the model. Problems are those of `compile`.
 *
 * @param model  What was derived from the diagram.
 */
export function traceable(diagram: Diagram, model: StateSpace): Result<TracedDrawing> {
  const scope = evaluateParameters(diagram.parameters);
  if (!scope.ok) return scope;
  const drawing = flatten(diagram);
  const readings = readContributions(drawing.blocks, numericReader(rationalArithmetic, scope.value));
  if (!readings.ok) return readings;
  const { contributions } = readings.value;
  const ownStates = contributions.flatMap((own, b) =>
    (own?.states ?? []).map(({ suffix }) => drawing.blocks[b]!.name + suffix),
  );
  return ok({
    ...{ diagram, model, drawing, ownStates },
    scope: scope.value,
    graph: actionGraph(drawing, contributions),
    parts: drawingParts(drawing),
    hasOwnStates:
      ownStates.length === model.states.length && model.states.every(({ name }, i) => name === ownStates[i]),
  });
}
