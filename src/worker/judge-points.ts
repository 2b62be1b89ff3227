/**
 * The tab's end of a judgement over tolerances: a few workers of their own share the points of a plan, a batch at a time, so that
 * progress can be shown and the whole be stopped at once. A worker that dies gives its batch back once, then the run has failed.
 */

import type { EnvelopeRequest, JudgedPoint, TolerancePlan } from '../analysis/index.ts';
import type { Diagram } from '../diagram/index.ts';
import type { Answer, JudgeQuestion } from './protocol.ts';

export interface JudgeRequest {
  readonly diagram: Diagram;
  readonly plan: TolerancePlan;
  readonly envelope: EnvelopeRequest | null;
  /** How many workers, at least one. */
  readonly workers: number;
}

export interface Judging {
  /** In the order of the plan's points; null where it was stopped or a worker died twice. */
  readonly finished: Promise<readonly JudgedPoint[] | null>;
  stop(): void;
}

/** Points that a worker is given at a time: enough that messages cost nothing, few enough that the bar moves. */
const BATCH = 8;

/**
 * @param start  makes a worker.
 * @param onProgress  is told how many points are judged, after each batch.
 */
export function judgePoints(
  start: () => Worker,
  { diagram, plan, envelope, workers }: JudgeRequest,
  onProgress: (done: number) => void,
): Judging {
  const { points, parameters } = plan;
  const judged = new Array<JudgedPoint | undefined>(points.length);
  const batches = Array.from({ length: Math.ceil(points.length / BATCH) }, (_, k) => k * BATCH);
  const running = new Set<Worker>();
  let next = 0;
  let done = 0;
  let deaths = 0;
  let settle: (outcome: readonly JudgedPoint[] | null) => void = () => {};
  const finished = new Promise<readonly JudgedPoint[] | null>(resolve => {
    settle = resolve;
  });

  const end = (outcome: readonly JudgedPoint[] | null) => {
    for (const worker of running) worker.terminate();
    running.clear();
    settle(outcome);
  };

  /** The first point of a batch not yet given out; null where all are. */
  const takeBatch = () => batches[next++] ?? null;

  function run(from: number): void {
    const worker = start();
    running.add(worker);
    let current = from;
    const ask = () => worker.postMessage(question(current));
    worker.onmessage = ({ data }: MessageEvent<Answer>) => {
      if (data.kind !== 'judge') return;
      data.judged.forEach((point, k) => {
        judged[current + k] = point;
      });
      done += data.judged.length;
      onProgress(done);
      if (done === points.length) return end(judged.filter(point => point !== undefined));
      const following = takeBatch();
      if (following === null) return;
      current = following;
      ask();
    };
    worker.onerror = event => {
      event.preventDefault();
      worker.terminate();
      running.delete(worker);
      deaths += 1;
      if (deaths > 1) end(null);
      else run(current);
    };
    ask();
  }

  const question = (from: number): JudgeQuestion => ({
    kind: 'judge',
    id: from,
    diagram,
    parameters,
    points: points.slice(from, from + BATCH),
    envelope,
  });

  for (let k = 0; k < Math.min(workers, batches.length); k++) {
    const from = takeBatch();
    if (from !== null) run(from);
  }
  return { finished, stop: () => end(null) };
}
