/**
 * A parameter's slider: the value moves with it on the sheet and in the results, and becomes one undo step when the hand or
 * the keys leave it alone. Enter or a double click opens the ends of its range.
 */

import { type KeyboardEvent, useEffect, useRef, useState } from 'react';
import { actions } from '../store/index.ts';
import { RangeFields } from './RangeFields.tsx';
import { PLACES, placeOf, textAt } from './slider-range.ts';
import { useSliderRange } from './useSliderRange.ts';

/** Milliseconds without a key after which a burst of keys is over. */
const PAUSE = 600;

/** Places that an arrow key goes with Shift held. */
const COARSE = 20;

const ARROWS: Readonly<Record<string, number>> = { ArrowLeft: -1, ArrowDown: -1, ArrowRight: 1, ArrowUp: 1 };

interface ParameterSliderProps {
  readonly name: string;
  /** The value that is shown, live while it moves. */
  readonly value: number;
  readonly unit: string;
  readonly range: readonly [string, string] | undefined;
  readonly isMoving: boolean;
}

export function ParameterSlider({ name, value, unit, range: typed, isMoving }: ParameterSliderProps) {
  const slider = useRef<HTMLInputElement>(null);
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const isHeld = useRef(false);
  const [isOpen, setOpen] = useState(false);
  const range = useSliderRange(value, typed, isMoving);
  const place = placeOf(value, range);

  useEffect(() => {
    if (slider.current !== null && !isHeld.current) slider.current.value = String(place);
  });
  useEffect(() => () => clearTimeout(timer.current), []);

  const settle = () => {
    clearTimeout(timer.current);
    isHeld.current = false;
    actions.settleParameter();
  };
  const hold = () => {
    isHeld.current = true;
    // The hand may let go anywhere on the page.
    const letGo = () => {
      window.removeEventListener('pointerup', letGo);
      window.removeEventListener('pointercancel', letGo);
      settle();
    };
    window.addEventListener('pointerup', letGo);
    window.addEventListener('pointercancel', letGo);
  };
  const move = (to: number) => {
    actions.moveParameter(name, textAt(to, range));
    clearTimeout(timer.current);
    if (!isHeld.current) timer.current = setTimeout(settle, PAUSE);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    const step = ARROWS[event.key];
    if (step !== undefined) move(bounded(place + step * (event.shiftKey ? COARSE : 1)));
    else if (event.key === 'Enter') setOpen(true);
    else if (event.key === 'Escape') actions.returnParameter();
    else return;
    event.preventDefault();
  };

  if (isOpen) {
    const close = () => {
      setOpen(false);
      requestAnimationFrame(() => slider.current?.focus());
    };
    return <RangeFields name={name} range={range} isTyped={typed !== undefined} onClose={close} />;
  }
  return (
    <input
      ref={slider}
      type="range"
      className="title-block-slider"
      aria-label={`Slider of ${name}`}
      aria-valuetext={`${value} ${unit}`.trim()}
      title={`${range.low} to ${range.high}. Enter or a double click changes the range.`}
      min={0}
      max={PLACES}
      defaultValue={place}
      onPointerDown={hold}
      onChange={event => move(Number(event.currentTarget.value))}
      onKeyDown={onKeyDown}
      onBlur={settle}
      onDoubleClick={() => setOpen(true)}
    />
  );
}

const bounded = (place: number) => Math.min(PLACES, Math.max(0, place));
