/** What drives the input, from where, until when, and which outputs are shown beside the chosen one. */

import { useId, useRef } from 'react';
import { plainName } from '../../expression/index.ts';
import { actions } from '../store/index.ts';
import { readSignal } from './read-signal.ts';
import { STIMULUS_WORDS, type StimulusKind, type TimeDraft } from './time-draft.ts';

interface StimulusFieldsProps {
  readonly draft: TimeDraft;
  /** Outputs that may be shown beside the chosen one. */
  readonly otherOutputs: readonly string[];
  readonly onChange: (part: Partial<TimeDraft>) => void;
}

const KINDS = Object.keys(STIMULUS_WORDS) as readonly StimulusKind[];

export function StimulusFields({ draft, otherOutputs, onChange }: StimulusFieldsProps) {
  const id = useId();
  return (
    <fieldset className="stimulus" aria-label="Input signal">
      <p className="stimulus-field">
        <label htmlFor={id}>input</label>
        <select
          id={id}
          className="field"
          value={draft.kind}
          onChange={event => onChange({ kind: event.currentTarget.value as StimulusKind })}
        >
          {KINDS.map(kind => (
            <option key={kind} value={kind}>
              {STIMULUS_WORDS[kind]}
            </option>
          ))}
        </select>
      </p>
      <KindFields draft={draft} onChange={onChange} />
      <Field label="until / s" hint="by the poles" value={draft.horizon} onChange={horizon => onChange({ horizon })} />
      {draft.kind !== 'none' && (
        <label className="stimulus-check">
          <input
            type="checkbox"
            checked={draft.fromInitial}
            onChange={event => onChange({ fromInitial: event.currentTarget.checked })}
          />{' '}
          from initial values
        </label>
      )}
      {otherOutputs.map(name => (
        <label key={name} className="stimulus-check">
          <input
            type="checkbox"
            checked={draft.others.includes(name)}
            onChange={event =>
              onChange({
                others: event.currentTarget.checked
                  ? [...draft.others, name]
                  : draft.others.filter(other => other !== name),
              })
            }
          />{' '}
          with {plainName(name)}
        </label>
      ))}
    </fieldset>
  );
}

interface PartProps {
  readonly draft: TimeDraft;
  readonly onChange: (part: Partial<TimeDraft>) => void;
}

function KindFields({ draft, onChange }: PartProps) {
  switch (draft.kind) {
    case 'none':
      return null;
    case 'recorded':
      return <SignalFile draft={draft} onChange={onChange} />;
    case 'sine':
      return (
        <>
          <Field label="size" value={draft.size} onChange={size => onChange({ size })} />
          <Field label="ω / rad/s" value={draft.omega} onChange={omega => onChange({ omega })} />
        </>
      );
    case 'pulse':
      return (
        <>
          <Field label="size" value={draft.size} onChange={size => onChange({ size })} />
          <Field label="width / s" value={draft.width} onChange={width => onChange({ width })} />
        </>
      );
    default:
      return <Field label="size" value={draft.size} onChange={size => onChange({ size })} />;
  }
}

interface FieldProps {
  readonly label: string;
  readonly value: string;
  readonly hint?: string;
  readonly onChange: (value: string) => void;
}

function Field({ label, value, hint, onChange }: FieldProps) {
  const id = useId();
  return (
    <p className="stimulus-field">
      <label htmlFor={id}>{label}</label>
      <input
        id={id}
        className="field"
        value={value}
        placeholder={hint}
        inputMode="decimal"
        autoComplete="off"
        onChange={event => onChange(event.currentTarget.value)}
      />
    </p>
  );
}

/** The file is read in the page; nothing of it is kept with the drawing. */
function SignalFile({ draft, onChange }: PartProps) {
  const file = useRef<HTMLInputElement>(null);
  const take = async (chosen: File | undefined) => {
    if (chosen === undefined) return;
    const read = readSignal(chosen.name, await chosen.text());
    if (!read.ok) return actions.notify(read.message, 'refused');
    onChange({ recorded: read.signal });
    actions.notify(`${chosen.name}: ${read.signal.time.length} samples.`);
  };
  return (
    <p className="stimulus-field stimulus-file">
      <span>{draft.recorded?.name ?? 'time and value in two columns'}</span>
      <button type="button" className="button" onClick={() => file.current?.click()}>
        Choose a file…
      </button>
      <input
        ref={file}
        type="file"
        accept=".csv,.txt,.tsv,text/csv,text/plain"
        aria-label="Recorded signal"
        className="unseen"
        tabIndex={-1}
        onChange={event => {
          void take(event.currentTarget.files?.[0]);
          event.currentTarget.value = '';
        }}
      />
    </p>
  );
}
