/** The times at which something jumps or bends: those of the stimulus and of the limiters, and all of them again after every dead time. */

export interface BreakTimes {
  /** The first one after t, within the horizon; the horizon itself where there is none. */
  next(t: number): number;
  /** Adds a time and what dead times make of it. False where there would be too many to be followed. */
  add(t: number): boolean;
}

/** Times that are followed: beyond, a dead time is too short beside the horizon. */
const MOST_TIMES = 20_000;

/** @param tolerance  s; times nearer to each other are one. */
export function breakTimes(delays: readonly number[], horizon: number, tolerance: number): BreakTimes {
  const times: number[] = [horizon];

  /** Position of the first time that is not before t. */
  const placeOf = (t: number) => {
    let low = 0;
    let high = times.length;
    while (low < high) {
      const middle = (low + high) >> 1;
      if (times[middle]! < t) low = middle + 1;
      else high = middle;
    }
    return low;
  };
  const isKnown = (t: number) => {
    const place = placeOf(t - tolerance);
    return place < times.length && times[place]! <= t + tolerance;
  };

  return {
    next: t => times[placeOf(t + tolerance)] ?? horizon,
    add(first) {
      const open = [first];
      for (let t = open.pop(); t !== undefined; t = open.pop()) {
        if (t >= horizon || (t > 0 && isKnown(t))) continue;
        if (times.length >= MOST_TIMES) return false;
        if (t > 0) times.splice(placeOf(t), 0, t);
        for (const seconds of delays) open.push(t + seconds);
      }
      return true;
    },
  };
}
