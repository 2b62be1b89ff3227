/** The form that a requirement is written in: its kind first, then the fields that the kind has. */

import { type FormEvent, type KeyboardEvent, useId, useState } from 'react';
import { REQUIREMENT_KIND_NAMES, type RequirementKind, requirementRule } from '../../diagram/index.ts';
import { LabelledChoice, LabelledField } from './LabelledField.tsx';
import { missingIn, type Nameable, type RequirementDraft, withKind } from './requirement-draft.ts';

interface RequirementFormProps {
  /** What the form is called: a new requirement, or one that is changed. */
  readonly title: string;
  readonly start: RequirementDraft;
  readonly names: Nameable;
  /** Takes the draft; the message where it is refused. */
  readonly onDone: (draft: RequirementDraft) => string | null;
  readonly onCancel: () => void;
}

const KINDS = REQUIREMENT_KIND_NAMES.map(kind => ({
  value: kind,
  text: requirementRule(kind).words.replace(/^the /, ''),
}));

export function RequirementForm({ title, start, names, onDone, onCancel }: RequirementFormProps) {
  const headingId = useId();
  const [draft, setDraft] = useState(start);
  const [fault, setFault] = useState<string | null>(null);
  const change = (part: Partial<RequirementDraft>) => setDraft(before => ({ ...before, ...part }));
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setFault(missingIn(draft) ?? onDone(draft));
  };
  const leave = (event: KeyboardEvent) => {
    if (event.key !== 'Escape') return;
    event.stopPropagation();
    onCancel();
  };
  return (
    <form className="requirement-form" aria-labelledby={headingId} onSubmit={submit} onKeyDown={leave}>
      <h3 id={headingId}>{title}</h3>
      <LabelledChoice
        label="What"
        value={draft.kind}
        choices={KINDS}
        isFirst
        onChange={kind => setDraft(withKind(draft, kind as RequirementKind))}
      />
      <SubjectFields draft={draft} names={names} onChange={change} />
      <BoundFields draft={draft} onChange={change} />
      <LabelledField label="Note" value={draft.note} onChange={note => change({ note })} />
      <label className="requirement-check">
        <input
          type="checkbox"
          checked={draft.tolerances}
          onChange={event => change({ tolerances: event.currentTarget.checked })}
        />{' '}
        for the whole tolerance of the parameters, too
      </label>
      {fault !== null && (
        <p className="requirement-fault" role="alert">
          {fault}
        </p>
      )}
      <p className="requirement-buttons">
        <button type="submit" className="button button-main">
          Keep
        </button>
        <button type="button" className="button" onClick={onCancel}>
          Cancel
        </button>
      </p>
    </form>
  );
}

interface PartProps {
  readonly draft: RequirementDraft;
  readonly onChange: (part: Partial<RequirementDraft>) => void;
}

function SubjectFields({ draft, names, onChange }: PartProps & { readonly names: Nameable }) {
  const { subject, hasBand } = requirementRule(draft.kind);
  return (
    <>
      {subject === 'channel' && (
        <>
          <LabelledChoice
            label="From"
            value={draft.input}
            choices={choicesOf(names.inputs, draft.input)}
            onChange={input => onChange({ input })}
          />
          <LabelledChoice
            label="To"
            value={draft.output}
            choices={choicesOf(names.outputs, draft.output)}
            onChange={output => onChange({ output })}
          />
        </>
      )}
      {subject === 'cut' && (
        <LabelledChoice
          label="At"
          value={draft.cut}
          choices={choicesOf(names.cuts, draft.cut)}
          onChange={cut => onChange({ cut })}
        />
      )}
      {hasBand && (
        <>
          <LabelledField label="Band from, rad/s" value={draft.low} onChange={low => onChange({ low })} />
          <LabelledField label="Band to, rad/s" value={draft.high} onChange={high => onChange({ high })} />
        </>
      )}
    </>
  );
}

/** The names there are, and the one that is written even where it is gone from the drawing. */
function choicesOf(names: readonly string[], written: string) {
  const all = names.includes(written) || written === '' ? names : [...names, written];
  return all.map(name => ({ value: name, text: name }));
}

const SIDES = { most: 'at most', least: 'at least' } as const;

function BoundFields({ draft, onChange }: PartProps) {
  const { bounds, unit } = requirementRule(draft.kind);
  if (bounds.length === 0) return null;
  const label = unit === '' ? SIDES[draft.side] : `${SIDES[draft.side]}, ${unit === '°' ? 'degrees' : unit}`;
  return (
    <>
      {bounds.length > 1 && (
        <LabelledChoice
          label="Side"
          value={draft.side}
          choices={bounds.map(side => ({ value: side, text: SIDES[side] }))}
          onChange={side => onChange({ side: side === 'most' ? 'most' : 'least' })}
        />
      )}
      <LabelledField label={label} value={draft.bound} onChange={bound => onChange({ bound })} />
    </>
  );
}
