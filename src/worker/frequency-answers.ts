/** What is asked over frequency: one channel's response, and the loop at each cut with its margins. */

import { channelFrequency, frequencyCurve, loopTransfer, margins, orderAtZero } from '../analysis/index.ts';
import type { StateSpace } from '../compile/index.ts';
import type { Cut, Diagram } from '../diagram/index.ts';
import type { Channel, CutAnswer, CutsAnswer, FrequencyAnswer } from './protocol.ts';

/** Null where the model has no such input or output. */
export function frequencyAnswer(
  revision: number,
  diagram: Diagram,
  model: StateSpace,
  channel: Channel,
): FrequencyAnswer | null {
  if (channel.input >= model.inputs.length || channel.output >= model.outputs.length) return null;
  return { kind: 'frequency', revision, channel, response: channelFrequency(diagram, model, channel) };
}

/** The loop at each cut of a diagram that compile made a model of. */
export function cutsAnswer(revision: number, diagram: Diagram): CutsAnswer {
  return { kind: 'cuts', revision, cuts: (diagram.cuts ?? []).map((cut, k) => cutAnswer(diagram, cut, k)) };
}

/** Decades drawn beyond the outermost corner or crossover. */
const DRAWN = 1;

function cutAnswer(diagram: Diagram, { to, name }: Cut, index: number): CutAnswer {
  const called = { to, name: name ?? `cut ${index + 1}` };
  const loop = loopTransfer(diagram, to);
  if (!loop.ok) return { ...called, outcome: loop };
  const { exact, features, deadTimes, valueAt, route, closedLoop } = loop.value;
  const found = margins(loop.value);
  const shown = [...found.gainCrossovers, ...found.phaseCrossovers.slice(0, 2)].map(({ omega }) => omega);
  const request = { features, deadTimes, shown, margin: DRAWN };
  const order = orderAtZero(loop.value.openPoles, exact?.numerator);
  const curve = frequencyCurve(valueAt, request, order);
  return { ...called, outcome: { ok: true, value: { curve, margins: found, route, closedLoop } } };
}
