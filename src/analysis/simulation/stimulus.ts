/** What the input of a simulation does, from t = 0 on. */

export type Stimulus =
  | { readonly kind: 'none' }
  | { readonly kind: 'step' | 'impulse' | 'ramp'; readonly size: number }
  | { readonly kind: 'sine'; readonly size: number /** rad/s */; readonly omega: number }
  | { readonly kind: 'pulse'; readonly size: number /** s */; readonly width: number }
  /** Straight lines between the samples, the first and the last value held outside them. Times in s, ascending. */
  | { readonly kind: 'recorded'; readonly time: readonly number[]; readonly values: readonly number[] };

/** The value at t; at a jump the one from the side that is asked for. An impulse is made by the state that it leaves. */
export function valueOf(stimulus: Stimulus, t: number, side: 'before' | 'after'): number {
  switch (stimulus.kind) {
    case 'none':
    case 'impulse':
      return 0;
    case 'step':
      return stimulus.size;
    case 'ramp':
      return stimulus.size * t;
    case 'sine':
      return stimulus.size * Math.sin(stimulus.omega * t);
    case 'pulse':
      return t < stimulus.width || (t === stimulus.width && side === 'before') ? stimulus.size : 0;
    case 'recorded':
      return recordedAt(stimulus.time, stimulus.values, t, side);
    default:
      return stimulus satisfies never;
  }
}

/** Times at which it or its slope jumps, 0 left out. */
export function breaksOf(stimulus: Stimulus): readonly number[] {
  if (stimulus.kind === 'pulse') return [stimulus.width];
  return stimulus.kind === 'recorded' ? stimulus.time.filter(t => t > 0) : [];
}

function recordedAt(time: readonly number[], values: readonly number[], t: number, side: 'before' | 'after'): number {
  let low = 0;
  let high = time.length;
  // The first sample beyond t; two samples at one time are a jump, and `side` says which of them counts.
  while (low < high) {
    const middle = (low + high) >> 1;
    const isBeyond = side === 'after' ? time[middle]! > t : time[middle]! >= t;
    if (isBeyond) high = middle;
    else low = middle + 1;
  }
  if (low === 0) return values[0] ?? 0;
  if (low === time.length) return values[time.length - 1] ?? 0;
  const [from, to] = [time[low - 1]!, time[low]!];
  const part = to > from ? (t - from) / (to - from) : 1;
  return values[low - 1]! + part * (values[low]! - values[low - 1]!);
}
