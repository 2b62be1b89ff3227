/**
 * The motion of a drawing with its dead times true and its limiters acting: between the times at which something jumps or bends the
 * drawing is a linear system with known inputs (the method of steps, Bellman & Cooke 1963, Differential-Difference Equations, chapter 3;
 * piecewise linear with located switching times for the limiters). Each piece of time is taken by the matrix exponential with its
 * inputs as polynomials, and halved until what the polynomials leave out is rounding.
 */

import type { OpenedModel } from '../../compile/index.ts';
import { breakTimes } from './break-times.ts';
import { endOfClip, excess, nextClip, offsetOf } from './clip-events.ts';
import { type Piece, pieceAt, valueIn } from './history.ts';
import { type ClipState, type ModeSystem, modeSystem, type SimulatedParts } from './mode-system.ts';
import { DEGREE, legendreCoefficients, NODES, tailOf, valueWithin } from './piece-polynomials.ts';
import { type PiecePropagator, piecePropagator } from './piece-propagator.ts';
import { breaksOf, type Stimulus, valueOf } from './stimulus.ts';

export interface SimulationRequest {
  readonly opened: OpenedModel;
  /** Position of the driven input; null: none, the motion from the initial state. */
  readonly input: number | null;
  readonly stimulus: Stimulus;
  /** Positions of the outputs. */
  readonly outputs: readonly number[];
  /** s, positive. */
  readonly horizon: number;
  /** Whether the integrators start at their initial values; else everything is at rest before. Dead times hold zero before t = 0. */
  readonly fromInitial: boolean;
  /** Whether limiters act; else they hand everything through. */
  readonly clips: boolean;
}

export type Simulation =
  | {
      readonly status: 'computed';
      readonly pieces: readonly Piece[];
      /** How many signals of a piece are outputs; what feeds dead times and limiters comes after them. */
      readonly outputs: number;
    }
  /** `reason` is a sentence, ready for the screen. */
  | { readonly status: 'not-computed'; readonly reason: string };

/** Pieces that a simulation may take, and times at which limiters may switch. */
const MOST_PIECES = 50_000;
const MOST_SWITCHES = 5_000;

/** What a polynomial may leave out, as a share of the signal's largest value: a few thousand roundings. */
const SMOOTH = 2 ** -40;

/** Shortest piece and what counts as the same time, as shares of the horizon. */
const SHORTEST = 2 ** -44;
const SAME_TIME = 2 ** -46;

const stopped = (reason: string): Simulation => ({ status: 'not-computed', reason });

/** Simulates from 0 to the horizon. */
export function simulate(request: SimulationRequest): Simulation {
  const { opened, input, stimulus, horizon } = request;
  if (stimulus.kind === 'impulse' && input !== null && feedsThrough(opened, input)) {
    return stopped('An impulse reaches a dead time or a limiter at once, where it is no function of time.');
  }
  const run = beginRun(request);
  const times = [0, ...breaksOf(stimulus)];
  if (!times.every(t => run.breaks.add(t))) return stopped(tooShort(opened, horizon));
  let length = horizon / 64;
  while (run.t < horizon - run.same) {
    const trouble = settleClips(run);
    if (trouble !== null) return stopped(trouble);
    const gap = run.breaks.next(run.t) - run.t;
    const step = takePiece(run, Math.min(length, gap, ...opened.delays.map(({ seconds }) => seconds)));
    if (typeof step === 'string') return stopped(step);
    length = 2 * step;
    if (run.pieces.length > MOST_PIECES) return stopped(`The motion is too quick beside ${horizon} s to be followed.`);
  }
  return { status: 'computed', pieces: run.pieces, outputs: request.outputs.length };
}

function tooShort({ delays }: OpenedModel, horizon: number): string {
  const shortest = Math.min(...delays.map(({ seconds }) => seconds));
  return `A dead time of ${shortest} s is too short beside ${horizon} s to be followed step by step. Show a shorter time.`;
}

/** Whether an input reaches what feeds a dead time or a limiter without a state in between. */
function feedsThrough({ matrices: { D }, outputs }: OpenedModel, input: number): boolean {
  for (let i = outputs.length; i < D.rows; i++) {
    for (let k = D.rowStart[i] ?? 0; k < (D.rowStart[i + 1] ?? 0); k++) if (D.column[k] === input) return true;
  }
  return false;
}

interface Run {
  readonly request: SimulationRequest;
  readonly parts: SimulatedParts;
  readonly breaks: ReturnType<typeof breakTimes>;
  readonly pieces: Piece[];
  readonly modes: Map<
    string,
    { readonly system: ModeSystem | null; readonly propagators: Map<string, PiecePropagator> }
  >;
  /** Largest size of each signal so far. */
  readonly sizes: Float64Array;
  /** s; times nearer than this are one. */
  readonly same: number;
  t: number;
  states: Float64Array;
  clips: ClipState[];
  switches: number;
}

function beginRun(request: SimulationRequest): Run {
  const { opened, input, stimulus, outputs, horizon, fromInitial } = request;
  const same = horizon * SAME_TIME;
  const n = opened.states.length;
  const states = Float64Array.from({ length: n }, (_, i) => (fromInitial ? (opened.initialState[i] ?? 0) : 0));
  if (stimulus.kind === 'impulse' && input !== null) {
    const { B } = opened.matrices;
    for (let i = 0; i < n; i++) {
      for (let k = B.rowStart[i]!; k < B.rowStart[i + 1]!; k++) {
        if (B.column[k] === input) states[i]! += stimulus.size * B.values[k]!;
      }
    }
  }
  return {
    request,
    parts: { opened, input, outputs },
    breaks: breakTimes(
      opened.delays.map(({ seconds }) => seconds),
      horizon,
      same,
    ),
    pieces: [],
    modes: new Map(),
    sizes: new Float64Array(outputs.length + opened.delays.length + opened.limiters.length),
    same,
    t: 0,
    states,
    clips: opened.limiters.map(() => 0),
    switches: 0,
  };
}

function modeOf(run: Run) {
  const key = run.clips.join(' ');
  const known = run.modes.get(key);
  if (known !== undefined) return known;
  const mode = { system: modeSystem(run.parts, run.clips), propagators: new Map<string, PiecePropagator>() };
  run.modes.set(key, mode);
  return mode;
}

/** The inputs of the mode's system at t: the stimulus, what leaves the dead times, 1. */
function inputsAt(
  { request: { opened, stimulus, outputs }, pieces, same }: Run,
  t: number,
  side: 'before' | 'after',
): number[] {
  const delayed = opened.delays.map(({ seconds }, k) => {
    const then = t - seconds;
    if (side === 'after' ? then < -same : then <= same) return 0;
    const piece = pieceAt(pieces, then, side, same);
    return piece === undefined ? 0 : valueIn(piece, outputs.length + k, then);
  });
  return [valueOf(stimulus, t, side), ...delayed, 1];
}

/** What is read off the mode's system, from its states and inputs. */
function readings(
  { C, D }: ModeSystem,
  states: ArrayLike<number>,
  offset: number,
  inputs: readonly number[],
): number[] {
  return Array.from({ length: C.rows }, (_, i) => {
    let sum = 0;
    for (let j = 0; j < C.columns; j++) sum += C.data[i * C.columns + j]! * states[offset + j]!;
    for (let j = 0; j < D.columns; j++) sum += D.data[i * D.columns + j]! * inputs[j]!;
    return sum;
  });
}

/** Brings every limiter into a state that what feeds it agrees with, right after t; a sentence where there is none. */
function settleClips(run: Run): string | null {
  const { opened, outputs, clips } = run.request;
  const { limiters } = opened;
  const first = outputs.length + opened.delays.length;
  const seen = new Set<string>();
  for (;;) {
    const { system } = modeOf(run);
    if (system === null) return LOOP_OF_LIMITERS;
    if (!clips || limiters.length === 0) return null;
    const fed = readings(system, run.states, 0, inputsAt(run, run.t, 'after'));
    const over = limiters.findIndex((limiter, k) => {
      const size = Math.max(Math.abs(limiter.lower), Math.abs(limiter.upper), run.sizes[first + k]!);
      return excess(limiter, run.clips[k]!, fed[first + k]!) > size * SMOOTH;
    });
    if (over < 0) return null;
    seen.add(run.clips.join(' '));
    run.clips = run.clips.with(over, nextClip(limiters[over]!, run.clips[over]!, fed[first + over]!));
    if (seen.has(run.clips.join(' '))) return LOOP_OF_LIMITERS;
  }
}

const LOOP_OF_LIMITERS =
  'With its limiters acting the drawing has an algebraic loop without one solution, so its motion is not defined.';

/** Takes the next piece, `wanted` seconds at most, and returns its length; a sentence where none can be taken. */
function takePiece(run: Run, wanted: number): number | string {
  const { system } = modeOf(run);
  if (system === null) return LOOP_OF_LIMITERS;
  const shortest = run.request.horizon * SHORTEST;
  let length = wanted;
  for (;;) {
    const values = tryPiece(run, system, length);
    if (values.isFinite === false) return 'The motion grows beyond what a double holds.';
    if (length > shortest && !isSmooth(run, values.values)) {
      length /= 2;
      continue;
    }
    const end = run.request.clips ? firstSwitch(run, values.values) : null;
    if (end === null) return keepPiece(run, length, values);
    run.switches += 1;
    if (run.switches > MOST_SWITCHES) return 'The limiters switch too often to be followed.';
    const { limiter, part } = end;
    const upTo = part * length;
    if (upTo > run.same) {
      const cut = tryPiece(run, system, upTo);
      keepPiece(run, upTo, cut);
    }
    const signal = run.request.outputs.length + run.request.opened.delays.length + limiter;
    const fed = valueWithin(values.values, offsetOf(signal), part);
    run.clips = run.clips.with(limiter, nextClip(run.request.opened.limiters[limiter]!, run.clips[limiter]!, fed));
    if (!run.breaks.add(run.t)) return tooShort(run.request.opened, run.request.horizon);
    return length;
  }
}

interface TriedPiece {
  readonly values: Float64Array;
  readonly states: Float64Array;
  readonly isFinite: boolean;
}

/** All signals at the nodes of a piece from the present on. */
function tryPiece(run: Run, system: ModeSystem, length: number): TriedPiece {
  const n = run.states.length;
  const nodes = Array.from({ length: NODES }, (_, i) =>
    inputsAt(run, run.t + (length * i) / DEGREE, i === DEGREE ? 'before' : 'after'),
  );
  const coefficients = Array.from({ length: system.B.columns }, (_, k) =>
    legendreCoefficients(nodes.map(inputs => inputs[k]!)),
  );
  const states = propagatorFor(run, system, length).statesAtNodes(run.states, coefficients);
  const signals = system.C.rows;
  const values = new Float64Array(signals * NODES);
  let isFinite = true;
  nodes.forEach((inputs, i) => {
    readings(system, states, i * n, inputs).forEach((value, s) => {
      values[s * NODES + i] = value;
      if (!Number.isFinite(value)) isFinite = false;
    });
  });
  return { values, states, isFinite };
}

/** One for each length, which a mode meets again and again; lengths that agree to 13 digits are one. */
function propagatorFor(run: Run, system: ModeSystem, length: number): PiecePropagator {
  const { propagators } = modeOf(run);
  const key = length.toPrecision(13);
  const known = propagators.get(key);
  if (known !== undefined) return known;
  const made = piecePropagator(system, length);
  propagators.set(key, made);
  return made;
}

function isSmooth({ sizes }: Run, values: Float64Array): boolean {
  return sizes.every((size, s) => {
    const own = values.subarray(s * NODES, (s + 1) * NODES);
    const largest = own.reduce((most, value) => Math.max(most, Math.abs(value)), size);
    return tailOf(own) <= SMOOTH * largest;
  });
}

function firstSwitch({ request: { opened, outputs }, clips, sizes }: Run, values: Float64Array) {
  const first = outputs.length + opened.delays.length;
  let earliest: { readonly limiter: number; readonly part: number } | null = null;
  opened.limiters.forEach((limiter, k) => {
    const size = Math.max(Math.abs(limiter.lower), Math.abs(limiter.upper), sizes[first + k]!);
    const part = endOfClip(limiter, clips[k]!, values, offsetOf(first + k), size * SMOOTH);
    if (part !== null && (earliest === null || part < earliest.part)) earliest = { limiter: k, part };
  });
  return earliest as { readonly limiter: number; readonly part: number } | null;
}

function keepPiece(run: Run, length: number, { values, states }: TriedPiece): number {
  const n = run.states.length;
  const next = run.breaks.next(run.t);
  const end = run.t + length;
  // A piece that ends at a time that is known ends just there, whatever rounding its length has.
  const to = Math.abs(end - next) <= run.same ? next : end;
  const statesAfter = states.slice(DEGREE * n, NODES * n);
  run.pieces.push({ from: run.t, to, values, states: run.states, statesAfter, clips: run.clips });
  run.sizes.forEach((size, s) => {
    run.sizes[s] = values
      .subarray(s * NODES, (s + 1) * NODES)
      .reduce((most, value) => Math.max(most, Math.abs(value)), size);
  });
  run.states = statesAfter;
  run.t = to;
  return length;
}

/** Samples of the outputs at ascending times within the horizon. */
export function sampled(simulation: Extract<Simulation, { status: 'computed' }>, t: ArrayLike<number>): Float64Array[] {
  const { pieces, outputs } = simulation;
  const same = (pieces.at(-1)?.to ?? 0) * SAME_TIME;
  return Array.from({ length: outputs }, (_, signal) =>
    Float64Array.from({ length: t.length }, (__, k) => {
      const piece = pieceAt(pieces, t[k]!, 'after', same);
      return piece === undefined ? Number.NaN : valueIn(piece, signal, t[k]!);
    }),
  );
}
