/** The drawing as a picture, whole or what is selected of it, and on paper. */

import { useState } from 'react';
import { type State, useStore } from '../store/index.ts';
import {
  canCopyPng,
  copyPng,
  copySvg,
  hasPictureSelected,
  type PictureScope,
  savePng,
  saveSvg,
} from './save-picture.ts';

const hasSelection = (state: State) => hasPictureSelected(state);

export function PictureTable() {
  const isSelected = useStore(hasSelection);
  const [wanted, setScope] = useState<PictureScope>('whole');
  const scope = isSelected ? wanted : 'whole';
  return (
    <>
      {isSelected && <ScopeChoice scope={scope} onChoose={setScope} />}
      <table className="dialog-table dialog-formats" aria-label="Pictures of the drawing">
        <tbody>
          <PictureRow
            name="SVG"
            label="Picture, lines (SVG)"
            onCopy={() => void copySvg(scope)}
            onSave={() => saveSvg(scope)}
          />
          <PictureRow
            name="PNG"
            label="Picture, points (PNG)"
            {...(canCopyPng() ? { onCopy: () => void copyPng(scope) } : {})}
            onSave={() => void savePng(scope)}
          />
          <tr>
            <th scope="row">On paper, with border and title block</th>
            <td>one page</td>
            <td>
              <button type="button" className="button" onClick={() => window.print()}>
                Print…
              </button>
            </td>
          </tr>
        </tbody>
      </table>
    </>
  );
}

interface ScopeChoiceProps {
  readonly scope: PictureScope;
  readonly onChoose: (scope: PictureScope) => void;
}

function ScopeChoice({ scope, onChoose }: ScopeChoiceProps) {
  return (
    <fieldset className="dialog-choices">
      <legend>Picture of</legend>
      {(['whole', 'selected'] as const).map(choice => (
        <label key={choice}>
          <input type="radio" name="picture" checked={scope === choice} onChange={() => onChoose(choice)} />{' '}
          {choice === 'whole' ? 'the whole drawing' : 'what is selected'}
        </label>
      ))}
    </fieldset>
  );
}

interface PictureRowProps {
  readonly name: string;
  readonly label: string;
  readonly onCopy?: () => void;
  readonly onSave: () => void;
}

function PictureRow({ name, label, onCopy, onSave }: PictureRowProps) {
  return (
    <tr>
      <th scope="row">{label}</th>
      <td>.{name.toLowerCase()}</td>
      <td>
        {onCopy !== undefined && (
          <button type="button" className="button" aria-label={`Copy ${name}`} onClick={onCopy}>
            Copy
          </button>
        )}
        <button type="button" className="button" aria-label={`Save ${name}`} onClick={onSave}>
          Save
        </button>
      </td>
    </tr>
  );
}
