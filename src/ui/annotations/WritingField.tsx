/** The text of an annotation, written where it stands: Enter keeps it, Shift+Enter begins a line, Escape leaves all as it was. */

import { type KeyboardEvent, useLayoutEffect, useRef } from 'react';
import type { Annotation } from '../../diagram/index.ts';
import { focusSheet } from '../sheet/focus-block.ts';
import { actions } from '../store/index.ts';
import { focusAnnotation, keepWritten } from './annotation-commands.ts';

/** As in a file. */
const LONGEST = 10_000;

export function WritingField({ annotation }: { readonly annotation: Annotation }) {
  const field = useRef<HTMLTextAreaElement>(null);
  const isDone = useRef(false);
  useLayoutEffect(() => {
    field.current?.focus({ preventScroll: true });
    field.current?.select();
  }, []);
  const keep = () => {
    if (isDone.current || field.current === null) return;
    isDone.current = true;
    keepWritten(annotation, field.current.value);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    event.stopPropagation();
    const isKept = event.key === 'Enter' && !event.shiftKey;
    if (!isKept && event.key !== 'Escape') return;
    event.preventDefault();
    if (isKept) return keep();
    isDone.current = true;
    actions.annotate(null);
    if (annotation.id === '') focusSheet();
    else focusAnnotation(annotation.id);
  };
  const { kind, at, size } = annotation;
  return (
    <textarea
      ref={field}
      className={`annotation-field annotation-field-${kind} nopan nodrag nowheel`}
      style={{ left: at[0], top: at[1], width: size[0], ...(kind === 'text' ? { minHeight: size[1] } : {}) }}
      aria-label={kind === 'text' ? 'Text on the sheet' : 'Title of the frame'}
      placeholder={kind === 'text' ? 'write, Enter keeps it' : 'title, Enter keeps it'}
      defaultValue={annotation.text}
      maxLength={LONGEST}
      rows={1}
      onKeyDown={onKeyDown}
      onPointerDown={event => event.stopPropagation()}
      onBlur={keep}
    />
  );
}
