/** What the loop has to do, under the tab Requirements: the list, its form, and the judgement over tolerances. */

import { useRef, useState } from 'react';
import { flushSync } from 'react-dom';
import { requirementText } from '../../diagram/index.ts';
import { useAnswer } from '../answers/index.ts';
import { PanelEmpty } from '../results/index.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { countText } from './assessment-text.ts';
import { RequirementForm } from './RequirementForm.tsx';
import { RequirementTable } from './RequirementTable.tsx';
import { draftOf, nameable, newDraft, type RequirementDraft, requirementOf } from './requirement-draft.ts';
import { TolerancePanel } from './TolerancePanel.tsx';
import './requirements.css';

const diagram = (state: State) => state.document.diagram;

/** Which requirement the form is about: its place in the list, or a new one. */
type Editing = number | 'new' | null;

export function RequirementsTab() {
  const drawing = useStore(diagram);
  const { requirements = [] } = drawing;
  const { answer, isPending } = useAnswer('requirements', null);
  const [editing, setEditing] = useState<Editing>(null);
  const add = useRef<HTMLButtonElement>(null);
  const names = nameable(drawing);
  const edited = typeof editing === 'number' ? requirements[editing] : undefined;
  const isOpen = editing === 'new' || edited !== undefined;
  // An answer that is shorter or longer is of the list before the last edit.
  const assessments = answer !== null && answer.length === requirements.length ? answer : null;

  const close = () => {
    // The button comes back with the form's going, and takes the focus that would be lost.
    flushSync(() => setEditing(null));
    add.current?.focus();
  };
  const keep = (draft: RequirementDraft): string | null => {
    const requirement = requirementOf(draft);
    const said = `${editing === 'new' ? 'Added' : 'Changed'}: ${requirementText(requirement)}.`;
    const problems = actions.edit(
      edited === undefined || editing === 'new' || editing === null
        ? { kind: 'addRequirement', requirement }
        : { kind: 'setRequirement', index: editing, requirement },
      said,
    );
    if (problems.length > 0) return problems[0]?.message ?? 'It cannot be kept.';
    close();
    return null;
  };
  const remove = (index: number) => {
    const gone = requirements[index];
    if (gone === undefined) return;
    actions.edit({ kind: 'removeRequirement', index }, `Removed: ${requirementText(gone)}.`);
    close();
  };

  return (
    <>
      {requirements.length === 0 ? (
        <PanelEmpty>
          Nothing is required yet. A requirement is kept in the drawing and judged at every change, here and by the
          command line.
        </PanelEmpty>
      ) : (
        <>
          <p className="requirement-count" aria-busy={isPending}>
            {assessments === null ? 'Judging…' : `${countText(assessments)}.`}
          </p>
          <RequirementTable
            requirements={requirements}
            assessments={assessments}
            onChange={setEditing}
            onRemove={remove}
          />
        </>
      )}
      {isOpen ? (
        <RequirementForm
          key={String(editing)}
          title={edited === undefined ? 'A new requirement' : 'Change the requirement'}
          start={edited === undefined ? newDraft(names) : draftOf(edited, names)}
          names={names}
          onDone={keep}
          onCancel={close}
        />
      ) : null}
      <p className="requirement-buttons">
        <button type="button" className="button" ref={add} hidden={isOpen} onClick={() => setEditing('new')}>
          Add a requirement
        </button>
      </p>
      <TolerancePanel />
    </>
  );
}
