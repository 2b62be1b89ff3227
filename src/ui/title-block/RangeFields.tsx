/** The two ends of a slider's range, in the slider's place: Enter keeps them, Escape does not, blank ends let it go. */

import { type FormEvent, useEffect, useId, useRef, useState } from 'react';
import { actions } from '../store/index.ts';
import { rangeFault, type SliderRange } from './slider-range.ts';

interface RangeFieldsProps {
  readonly name: string;
  readonly range: SliderRange;
  readonly isTyped: boolean;
  readonly onClose: () => void;
}

export function RangeFields({ name, range, isTyped, onClose }: RangeFieldsProps) {
  const id = useId();
  const first = useRef<HTMLInputElement>(null);
  const [fault, setFault] = useState<string | null>(null);
  useEffect(() => first.current?.select(), []);

  const keep = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const written = new FormData(event.currentTarget);
    const low = String(written.get('low') ?? '').trim();
    const high = String(written.get('high') ?? '').trim();
    if (low === '' && high === '') {
      if (isTyped)
        actions.edit({ kind: 'setParameter', name, range: null }, `The slider of ${name} takes its own range.`);
      return onClose();
    }
    const wrong = rangeFault(low, high);
    if (wrong !== null) return setFault(wrong);
    actions.edit(
      { kind: 'setParameter', name, range: [low, high] },
      `The slider of ${name} goes from ${low} to ${high}.`,
    );
    onClose();
  };
  return (
    <form
      className="title-block-range"
      aria-label={`Range of the slider of ${name}`}
      onSubmit={keep}
      onKeyDown={event => {
        if (event.key === 'Escape') onClose();
      }}
    >
      <input
        ref={first}
        name="low"
        className="title-block-field"
        aria-label={`Lower end of the slider of ${name}`}
        aria-invalid={fault !== null}
        aria-describedby={id}
        defaultValue={range.low}
        autoComplete="off"
      />
      <span aria-hidden="true">to</span>
      <input
        name="high"
        className="title-block-field"
        aria-label={`Upper end of the slider of ${name}`}
        aria-invalid={fault !== null}
        aria-describedby={id}
        defaultValue={range.high}
        autoComplete="off"
      />
      <button type="submit" className="quiet">
        set
      </button>
      <span id={id} className="title-block-fault" role="alert">
        {fault}
      </span>
    </form>
  );
}
