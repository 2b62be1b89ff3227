/** A field and a choice with their label over them, as the form of a requirement has them. */

import { useEffect, useId, useRef } from 'react';

interface LabelledFieldProps {
  readonly label: string;
  readonly value: string;
  readonly onChange: (value: string) => void;
}

export function LabelledField({ label, value, onChange }: LabelledFieldProps) {
  const id = useId();
  return (
    <p className="requirement-field">
      <label htmlFor={id}>{label}</label>
      <input
        id={id}
        className="field"
        value={value}
        autoComplete="off"
        onChange={event => onChange(event.currentTarget.value)}
      />
    </p>
  );
}

interface LabelledChoiceProps extends LabelledFieldProps {
  readonly choices: readonly { readonly value: string; readonly text: string }[];
  /** Whether it takes the focus when it appears. */
  readonly isFirst?: boolean;
}

export function LabelledChoice({ label, value, choices, onChange, isFirst = false }: LabelledChoiceProps) {
  const id = useId();
  const select = useRef<HTMLSelectElement>(null);
  useEffect(() => {
    if (isFirst) select.current?.focus();
  }, [isFirst]);
  return (
    <p className="requirement-field">
      <label htmlFor={id}>{label}</label>
      <select
        id={id}
        ref={select}
        className="field"
        value={value}
        disabled={choices.length === 0}
        onChange={event => onChange(event.currentTarget.value)}
      >
        {choices.length === 0 && <option value="">none in the drawing</option>}
        {choices.map(choice => (
          <option key={choice.value} value={choice.value}>
            {choice.text}
          </option>
        ))}
      </select>
    </p>
  );
}
