/** Starts a judgement over tolerances in workers of its own and keeps the store told of it; one runs at a time. */

import workerAddress from 'virtual:derivation-worker';
import { type EnvelopeRequest, envelopeOf, type TolerancePlan, worstCases } from '../../analysis/index.ts';
import { type Judging, judgePoints } from '../../worker/index.ts';
import { actions, store, type TolerancesSlice } from '../store/index.ts';

/** Times of an envelope: a pixel or two each. */
const ENVELOPE_POINTS = 241;

/** A judgement takes what the machine has beyond the page and the derivation, four workers at most. */
const MOST_WORKERS = 4;

let running: Judging | null = null;

/** Judges the drawing on the sheet by a plan; whatever ran before is stopped. */
export async function judge(plan: TolerancePlan): Promise<void> {
  running?.stop();
  const { document, results } = store.getState();
  const { diagram } = document;
  const envelope = envelopeRequest();
  const channel = results.channel === null ? null : namesOf(results.channel.channel);
  const begun: TolerancesSlice = {
    diagram,
    plan,
    status: 'running',
    done: 0,
    worst: [],
    channel,
    step: null,
    magnitude: null,
  };
  actions.setTolerances(begun);
  const workers = Math.max(1, Math.min(MOST_WORKERS, navigator.hardwareConcurrency - 1));
  const start = () => new Worker(workerAddress, { type: 'module', name: 'tolerances' });
  const mine = judgePoints(start, { diagram, plan, envelope, workers }, done => {
    if (running === mine) actions.setTolerances({ ...begun, done });
  });
  running = mine;
  const judged = await mine.finished;
  // Stopped, or another one was begun: whoever did that has said so.
  if (running !== mine) return;
  running = null;
  if (judged === null) return actions.setTolerances({ ...begun, status: 'failed' });
  const step = envelopeOf(judged.map(point => point.step));
  const magnitude = envelopeOf(judged.map(point => point.magnitude));
  actions.setTolerances({
    ...begun,
    status: 'finished',
    done: plan.points.length,
    worst: worstCases(diagram.requirements?.length ?? 0, judged),
    step: step === null || envelope === null ? null : { ...step, time: timesOf(envelope) },
    magnitude: magnitude === null || envelope === null ? null : { ...magnitude, omega: envelope.omega },
  });
  actions.notify('Judged over the tolerances.');
}

/** Stops the judgement that runs. */
export function stopJudging(): void {
  const stopped = running;
  running = null;
  stopped?.stop();
  const { tolerances } = store.getState();
  if (tolerances !== null) actions.setTolerances({ ...tolerances, status: 'stopped' });
  actions.notify('Stopped.');
}

/** The curves of the channel on screen, where the plots have them; null without one. */
function envelopeRequest(): EnvelopeRequest | null {
  const { channel, frequency } = store.getState().results;
  if (channel === null || channel.step.status !== 'computed') return null;
  const horizon = channel.step.t.at(-1) ?? 0;
  if (!(horizon > 0)) return null;
  const omega = frequency?.response.curve.omega ?? new Float64Array();
  return { ...channel.channel, horizon, points: ENVELOPE_POINTS, omega };
}

function timesOf({ horizon, points }: EnvelopeRequest): Float64Array {
  return Float64Array.from({ length: points }, (_, k) => (horizon * k) / (points - 1));
}

function namesOf({ input, output }: { readonly input: number; readonly output: number }) {
  const model = store.getState().results.derivation?.model;
  return { input: model?.inputs[input]?.name ?? '', output: model?.outputs[output]?.name ?? '' };
}
