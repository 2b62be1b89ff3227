/** The list of requirements with what was measured: met or missed, and by how much. */

import type { Assessment } from '../../analysis/index.ts';
import { type Requirement, requirementText } from '../../diagram/index.ts';
import { RaisedText } from '../figures/index.ts';
import { measuredText, STATUS_WORDS, slackText } from './assessment-text.ts';

interface RequirementTableProps {
  readonly requirements: readonly Requirement[];
  /** Of the same drawing, in the same order; null where they are on their way. */
  readonly assessments: readonly Assessment[] | null;
  readonly onChange: (index: number) => void;
  readonly onRemove: (index: number) => void;
}

export function RequirementTable({ requirements, assessments, onChange, onRemove }: RequirementTableProps) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls has to be reached by key
    <section className="requirement-scroller" aria-label="Requirements" tabIndex={0}>
      <table className="requirement-table" aria-label="Requirements">
        <thead>
          <tr>
            <th scope="col">requirement</th>
            <th scope="col">measured</th>
            <th scope="col">status</th>
            <th scope="col">
              <span className="unseen">change</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {requirements.map((requirement, index) => (
            <RequirementRow
              // biome-ignore lint/suspicious/noArrayIndexKey: a requirement is known by its place in the list
              key={index}
              requirement={requirement}
              assessment={assessments?.[index] ?? null}
              onChange={() => onChange(index)}
              onRemove={() => onRemove(index)}
            />
          ))}
        </tbody>
      </table>
    </section>
  );
}

interface RequirementRowProps {
  readonly requirement: Requirement;
  readonly assessment: Assessment | null;
  readonly onChange: () => void;
  readonly onRemove: () => void;
}

function RequirementRow({ requirement, assessment, onChange, onRemove }: RequirementRowProps) {
  const text = requirementText(requirement);
  return (
    <tr>
      <th scope="row">
        {text}
        {requirement.note !== undefined && <small>{requirement.note}</small>}
      </th>
      <td>{assessment === null ? '…' : <RaisedText text={measuredText(requirement, assessment)} />}</td>
      <td className={`requirement-${assessment?.status ?? 'pending'}`}>
        {assessment === null ? '…' : <Status requirement={requirement} assessment={assessment} />}
      </td>
      <td>
        <button type="button" className="plot-save" aria-label={`Change: ${text}`} onClick={onChange}>
          change
        </button>{' '}
        <button type="button" className="plot-save" aria-label={`Remove: ${text}`} onClick={onRemove}>
          remove
        </button>
      </td>
    </tr>
  );
}

function Status({ requirement, assessment }: { readonly requirement: Requirement; readonly assessment: Assessment }) {
  const by = slackText(requirement, assessment);
  return (
    <>
      <b>{STATUS_WORDS[assessment.status]}</b>
      {by !== '' && (
        <>
          , <RaisedText text={by} />
        </>
      )}
    </>
  );
}
