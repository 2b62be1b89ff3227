/** The end of the time axis as a grip: drawn to the left it makes room for a longer time, to the right it shows a shorter one. */

import { type KeyboardEvent, type PointerEvent, useRef } from 'react';
import { formatNumber } from '../figures/index.ts';
import type { StepFrame } from './step-frame.ts';

interface HorizonGripProps {
  readonly frame: StepFrame;
  readonly onHorizon: (seconds: number) => void;
}

/** Parts of the present time within which one drag or key press stays. */
const LEAST = 0.1;
const KEY_FACTOR = 1.25;

/** The shortest figure of two digits. */
const twoDigits = (seconds: number) => Number(seconds.toPrecision(2));

/** Pixels of the pointer from the left end of the axis. */
function offsetOf(event: PointerEvent<HTMLDivElement>): number {
  return event.clientX - event.currentTarget.getBoundingClientRect().left;
}

export function HorizonGrip({ frame, onHorizon }: HorizonGripProps) {
  const drag = useRef<{ readonly offset: number; readonly horizon: number } | null>(null);
  const { left, right, bottom, horizon } = frame;
  const follow = (event: PointerEvent<HTMLDivElement>) => {
    if (drag.current === null) return;
    // The time under the pointer when the drag began stays under it.
    const part = Math.max(LEAST, offsetOf(event) / drag.current.offset);
    onHorizon(twoDigits(drag.current.horizon / part));
  };
  const step = (event: KeyboardEvent) => {
    const factor =
      event.key === 'ArrowRight' || event.key === 'ArrowUp'
        ? KEY_FACTOR
        : event.key === 'ArrowLeft' || event.key === 'ArrowDown'
          ? 1 / KEY_FACTOR
          : null;
    if (factor === null) return;
    event.preventDefault();
    onHorizon(twoDigits(horizon * factor));
  };
  return (
    <div
      className="horizon-grip"
      role="slider"
      tabIndex={0}
      aria-label="Shown until"
      aria-valuemin={0}
      aria-valuenow={horizon}
      aria-valuetext={`${formatNumber(horizon, 3)} s`}
      title="Drag to show a longer or shorter time"
      style={{ left, width: right - left + 16, top: bottom + 1 }}
      onPointerDown={event => {
        event.currentTarget.setPointerCapture(event.pointerId);
        drag.current = { offset: Math.max(1, offsetOf(event)), horizon };
      }}
      onPointerMove={follow}
      onPointerUp={() => {
        drag.current = null;
      }}
      onKeyDown={step}
    />
  );
}
