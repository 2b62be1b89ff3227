/** Zeros and extrema of a function of frequency between samples, refined to the last digits of a double. */

/** A function of angular frequency; not finite where it has no value. */
export type FrequencyFunction = (omega: number) => number;

/** Most steps: bisection alone halves a bracket 64 times. */
const MOST_STEPS = 200;

/** The zeros between samples of opposite sign, ascending; a pole that changes sign is none. */
export function zerosBetween(f: FrequencyFunction, samples: ArrayLike<number>): readonly number[] {
  const found: number[] = [];
  let [before, valueBefore] = [Number.NaN, Number.NaN];
  for (let k = 0; k < samples.length; k++) {
    const [omega, value] = [samples[k] ?? 0, f(samples[k] ?? 0)];
    if (value === 0) found.push(omega);
    else if (valueBefore * value < 0) {
      const zero = bisected(f, before, omega);
      if (Math.abs(f(zero)) <= Math.max(Math.abs(valueBefore), Math.abs(value))) found.push(zero);
    }
    [before, valueBefore] = [omega, value];
  }
  return found;
}

/** The zero in a bracket by halving it and by the secant in turns, until no double lies between. */
function bisected(f: FrequencyFunction, from: number, to: number): number {
  let [a, b, fa, fb] = [from, to, f(from), f(to)];
  for (let step = 0; step < MOST_STEPS; step++) {
    const secant = b - (fb * (b - a)) / (fb - fa);
    const isInside = step % 2 === 0 && secant > a && secant < b;
    const middle = isInside ? secant : a + (b - a) / 2;
    if (middle <= a || middle >= b) break;
    const value = f(middle);
    if (value === 0) return middle;
    if (value * fa < 0) [b, fb] = [middle, value];
    else [a, fa] = [middle, value];
  }
  return Math.abs(fa) < Math.abs(fb) ? a : b;
}

/** Part of a bracket that golden-section search keeps (Kiefer 1953, Proc. AMS 4). */
const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** Where a maximum is flat, a relative change of the frequency below this cannot be seen in doubles. */
const FLAT = 2 ** -28;

/** The places of local maxima between samples, ascending; those at the ends are not among them. */
export function maximaBetween(f: FrequencyFunction, samples: ArrayLike<number>): readonly number[] {
  const values = Array.from(samples, f);
  const found: number[] = [];
  for (let k = 1; k + 1 < values.length; k++) {
    const value = values[k] ?? Number.NaN;
    if (value >= (values[k - 1] ?? Number.NaN) && value > (values[k + 1] ?? Number.NaN)) {
      found.push(goldenMaximum(f, samples[k - 1] ?? 0, samples[k + 1] ?? 0));
    }
  }
  return found;
}

function goldenMaximum(f: FrequencyFunction, from: number, to: number): number {
  let [a, b] = [from, to];
  let [left, right] = [b - GOLDEN * (b - a), a + GOLDEN * (b - a)];
  let [atLeft, atRight] = [f(left), f(right)];
  while (b - a > FLAT * b) {
    if (atLeft < atRight) {
      [a, left, atLeft] = [left, right, atRight];
      right = a + GOLDEN * (b - a);
      atRight = f(right);
    } else {
      [b, right, atRight] = [right, left, atLeft];
      left = b - GOLDEN * (b - a);
      atLeft = f(left);
    }
  }
  return atLeft > atRight ? left : right;
}
