/** The words of the verdict line. */

import type { Stability } from '../../analysis/index.ts';
import type { SelfCheck, StateSpace } from '../../compile/index.ts';

/** `Stable, proved`: the word and how it is known. */
export function stabilityText({ verdict, proved }: Stability): string {
  const word = `${verdict[0]?.toUpperCase() ?? ''}${verdict.slice(1)}`;
  return proved ? `${word}, proved` : `${word}, by computed poles`;
}

/** `4 states · 2 inputs · 1 output`. */
export function sizesText({ states, inputs, outputs }: StateSpace): string {
  const parts = [count(states.length, 'state'), count(inputs.length, 'input'), count(outputs.length, 'output')];
  return parts.join(' · ');
}

/** `checked against the drawing at 3 frequencies, 1e−16` (large drawings at random states), or that the check failed. */
export function selfCheckText({ error, limit, passed, frequencies, vectors }: SelfCheck): string {
  if (frequencies + vectors === 0) return 'nothing to check yet';
  const where =
    frequencies > 0 ? count(frequencies, 'frequency', 'frequencies') : count(vectors, 'random state', 'random states');
  const figure = `${where}, ${power(error)}`;
  if (passed) return `checked against the drawing at ${figure}`;
  return `SELF-CHECK FAILED: off from the drawing at ${figure}, at most ${power(limit)} allowed. Do not use this model.`;
}

function count(n: number, one: string, many = `${one}s`): string {
  return n === 1 ? `1 ${one}` : `${n} ${many}`;
}

/** One significant digit; an error below half the spacing of doubles is no error to speak of. */
function power(x: number): string {
  return x === 0 ? '0' : x.toExponential(0).replace('e-', 'e−').replace('e+', 'e');
}
