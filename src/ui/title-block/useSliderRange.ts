/** The range of a parameter's slider: the typed one, else one around the value as it was when the slider took hold of it. */

import { useRef } from 'react';
import { rangeAround, type SliderRange, typedRange } from './slider-range.ts';

/** @param isMoving  whether the slider is what moves the value: its range then stays. */
export function useSliderRange(
  value: number,
  typed: readonly [string, string] | undefined,
  isMoving: boolean,
): SliderRange {
  const former = useRef<{ readonly value: number; readonly range: SliderRange } | null>(null);
  const before = former.current;
  const isKept = before !== null && (isMoving || before.value === value);
  const range = isKept ? before.range : rangeAround(value);
  former.current = { value, range };
  return typedRange(typed) ?? range;
}
