/** A block's fields, opened where it stands: Enter keeps them as one edit, Escape leaves all as it was. */

import { type FormEvent, type KeyboardEvent, useLayoutEffect, useRef, useState } from 'react';
import type { Block } from '../../diagram/index.ts';
import { actions } from '../store/index.ts';
import { withNewParameters } from '../write-line/new-parameters.ts';
import { fieldEdits, fieldsOf } from './block-field-table.ts';
import { shownTitle } from './block-sentence.ts';
import { focusBlock } from './focus-block.ts';

export function BlockFields({ block }: { readonly block: Block }) {
  const form = useRef<HTMLFormElement>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  const fields = fieldsOf(block);
  useLayoutEffect(() => {
    const first = form.current?.querySelector('input');
    first?.focus();
    first?.select();
  }, []);

  const keep = () => {
    if (form.current === null) return;
    const written = new FormData(form.current);
    const edits = withNewParameters(fieldEdits(block, name => String(written.get(name) ?? '')));
    const problems = edits.length === 0 ? [] : actions.editTogether(edits);
    if (problems.length > 0) return setRefusal(problems[0]?.message ?? 'That value is not possible.');
    actions.editFields(null);
    focusBlock(block.id);
  };
  const onSubmit = (event: FormEvent) => {
    event.preventDefault();
    keep();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    event.stopPropagation();
    if (event.key === 'Escape') {
      actions.editFields(null);
      focusBlock(block.id);
    }
  };
  return (
    <form
      ref={form}
      className="fields nodrag nopan nowheel"
      aria-label={`Fields of ${shownTitle(block)}`}
      onSubmit={onSubmit}
      onKeyDown={onKeyDown}
      onDoubleClick={event => event.stopPropagation()}
      onBlur={event => {
        if (!event.currentTarget.contains(event.relatedTarget) && event.relatedTarget !== null) keep();
      }}
    >
      {fields.map(({ field, label, text }) => (
        <FieldRow key={field} id={`${block.id}-${field}`} name={field} label={label} text={text} />
      ))}
      {refusal !== null && (
        <p className="fields-refusal" role="alert">
          {refusal}
        </p>
      )}
      <button type="submit" className="unseen" tabIndex={-1}>
        Keep
      </button>
    </form>
  );
}

interface FieldRowProps {
  readonly id: string;
  readonly name: string;
  readonly label: string;
  readonly text: string;
}

function FieldRow({ id, name, label, text }: FieldRowProps) {
  return (
    <>
      <label htmlFor={id}>{label}</label>
      <input id={id} name={name} className="field" defaultValue={text} autoComplete="off" spellCheck={false} />
    </>
  );
}
