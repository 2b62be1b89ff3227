/** A text on the sheet that is edited where it stands: Enter or leaving keeps it, Escape brings the old one back. */

import { type KeyboardEvent, useEffect, useRef } from 'react';

interface TextFieldProps {
  readonly label: string;
  readonly text: string;
  readonly placeholder?: string;
  readonly className?: string;
  /** Returns the problems where the text is refused; the field then keeps it, marked, for correction. */
  readonly onCommit: (text: string) => readonly { readonly message: string }[];
}

export function TextField({ label, text, placeholder, className, onCommit }: TextFieldProps) {
  const field = useRef<HTMLInputElement>(null);
  useEffect(() => {
    if (field.current !== null) {
      field.current.value = text;
      field.current.removeAttribute('aria-invalid');
      field.current.title = '';
    }
  }, [text]);

  const commit = () => {
    const input = field.current;
    if (input === null || input.value === text) return;
    const [problem] = onCommit(input.value);
    if (problem === undefined) return;
    input.setAttribute('aria-invalid', 'true');
    input.title = problem.message;
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Enter') commit();
    if (event.key === 'Escape') {
      event.currentTarget.value = text;
      event.currentTarget.removeAttribute('aria-invalid');
      event.currentTarget.blur();
    }
  };
  return (
    <input
      ref={field}
      className={className ?? 'title-block-field'}
      aria-label={label}
      defaultValue={text}
      placeholder={placeholder}
      spellCheck={false}
      autoComplete="off"
      onBlur={commit}
      onKeyDown={onKeyDown}
    />
  );
}
