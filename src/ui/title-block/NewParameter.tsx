/** The line that adds a parameter: its name, then its value. */

import { type FormEvent, useId } from 'react';
import { actions } from '../store/index.ts';

export function NewParameter() {
  const id = useId();
  const add = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = event.currentTarget;
    const written = new FormData(form);
    const name = String(written.get('name') ?? '').trim();
    const value = String(written.get('value') ?? '').trim() || '1';
    const problems = actions.edit({ kind: 'addParameter', parameter: { name, value } }, `Parameter ${name} added.`);
    if (problems.length > 0) return;
    form.reset();
    form.querySelector('input')?.focus();
  };
  return (
    <form className="title-block-new" onSubmit={add} aria-label="New parameter">
      <label className="unseen" htmlFor={`${id}-name`}>
        Name of the new parameter
      </label>
      <input
        id={`${id}-name`}
        name="name"
        className="title-block-field title-block-name"
        placeholder="new name"
        required
        autoComplete="off"
        spellCheck={false}
      />
      <label className="unseen" htmlFor={`${id}-value`}>
        Value of the new parameter
      </label>
      <input
        id={`${id}-value`}
        name="value"
        className="title-block-field"
        placeholder="value"
        autoComplete="off"
        spellCheck={false}
      />
      <button type="submit" className="quiet">
        add
      </button>
    </form>
  );
}
