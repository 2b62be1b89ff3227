/**
 * A text on the sheet that is edited where it stands: Enter or leaving keeps it, Escape brings the old one back. What is
 * wrong with it stands under it in words.
 */

import { type KeyboardEvent, type ReactNode, useEffect, useId, useRef, useState } from 'react';

interface TextFieldProps {
  readonly label: string;
  readonly text: string;
  readonly placeholder?: string;
  readonly className?: string;
  /** The text as printed, over the field while nobody edits it. */
  readonly shown?: ReactNode;
  /** What is wrong with the text that is kept. */
  readonly fault?: string | undefined;
  /** Returns the problems where the text is refused; the field then keeps it, marked, for correction. */
  readonly onCommit: (text: string) => readonly { readonly message: string }[];
}

export function TextField({ label, text, placeholder, className, shown, fault, onCommit }: TextFieldProps) {
  const id = useId();
  const field = useRef<HTMLInputElement>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  useEffect(() => {
    if (field.current !== null) field.current.value = text;
    setRefusal(null);
  }, [text]);

  const commit = () => {
    const input = field.current;
    if (input === null) return;
    const [problem] = input.value === text ? [] : onCommit(input.value);
    setRefusal(problem?.message ?? null);
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Enter') commit();
    if (event.key === 'Escape') {
      event.currentTarget.value = text;
      setRefusal(null);
      event.currentTarget.blur();
    }
  };
  const wrong = refusal ?? fault ?? null;
  return (
    <>
      <span className={shown === undefined ? 'title-block-entry' : 'title-block-entry title-block-printed'}>
        <input
          ref={field}
          className={className ?? 'title-block-field'}
          aria-label={label}
          aria-invalid={wrong !== null}
          aria-describedby={wrong === null ? undefined : id}
          defaultValue={text}
          placeholder={placeholder}
          spellCheck={false}
          autoComplete="off"
          onBlur={commit}
          onKeyDown={onKeyDown}
        />
        {shown !== undefined && (
          <span className="title-block-shown" aria-hidden="true">
            {shown}
          </span>
        )}
      </span>
      {wrong !== null && (
        <span id={id} className="title-block-fault" role="alert">
          {wrong}
        </span>
      )}
    </>
  );
}
