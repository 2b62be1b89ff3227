/**
 * The drawing's response at a complex frequency, from its raw equations and with every dead time as it is: e^(−sT), not the
 * approximant that the state-space model holds.
 */

import type { Diagram } from '../../diagram/index.ts';
import { evaluateParameters } from '../../expression/index.ts';
import { ok, type Result } from '../../problem/index.ts';
import type { Complex } from './complex.ts';
import { rawDrawing } from './raw-drawing.ts';
import { solveDrawing } from './solve-drawing.ts';

export interface DirectResponse {
  /** The dead times of the drawing in seconds, those of zero left out; empty where it has none. */
  readonly deadTimes: readonly number[];
  /** From one external input, by position, to every external output at s; null where s is a pole of a block or the drawing. */
  at(s: Complex, input: number): readonly Complex[] | null;
}

/**
 * The direct response of a diagram that `compile` found no fault with. O(unknowns) to set up; each frequency is one sparse
 * complex solution.
 */
export function directResponse(diagram: Diagram): Result<DirectResponse> {
  const parameters = evaluateParameters(diagram.parameters);
  if (!parameters.ok) return parameters;
  const drawing = rawDrawing(diagram, parameters.value, 'true');
  const laws = drawing.blocks.map(({ law }) => law);
  const states = new Array<number>(drawing.states).fill(0);
  return ok({
    deadTimes: laws.flatMap(law => (law.kind === 'dead-time' && law.seconds > 0 ? [law.seconds] : [])),
    at(s, input) {
      const drive = { inputs: drawing.inputs.map((_, j) => (j === input ? 1 : 0)), states };
      return solveDrawing(drawing, s, [drive], laws)?.[0]?.outputs ?? null;
    },
  });
}
