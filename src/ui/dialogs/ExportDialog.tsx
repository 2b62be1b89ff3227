/** Everything that can be handed over: the matrices in each format, the drawing as its file, as a picture and on paper. */

import { useState } from 'react';
import { CAUTION, FORMATS, type Format } from '../../deliver/index.ts';
import type { Notation } from '../../worker/index.ts';
import { type State, useStore } from '../store/index.ts';
import { Dialog } from './Dialog.tsx';
import { copyFormat, saveFormat } from './hand-over.ts';
import { PictureTable } from './PictureTable.tsx';

const notationOnScreen = (state: State) => state.view.notation;
const hasModel = (state: State) => state.results.derivation !== null;

export function ExportDialog() {
  const [notation, setNotation] = useState<Notation>(useStore(notationOnScreen));
  const [minimal, setMinimal] = useState(false);
  const isDerived = useStore(hasModel);
  return (
    <Dialog title="Export">
      <h3>The matrices</h3>
      {!isDerived && <p role="alert">The drawing has no model at present, so there are no matrices to export.</p>}
      <NotationChoice notation={notation} onChoose={setNotation} />
      <label className="dialog-minimal">
        <input type="checkbox" checked={minimal} onChange={event => setMinimal(event.currentTarget.checked)} /> of the
        minimal model: the fewest states with the same transfer functions
      </label>
      <FormatTable scope="model" notation={notation} minimal={minimal} isDisabled={!isDerived} />
      <p className="dialog-caution">{CAUTION}</p>
      <h3>The drawing</h3>
      <FormatTable scope="drawing" notation={notation} minimal={false} isDisabled={false} />
      <PictureTable />
    </Dialog>
  );
}

interface NotationChoiceProps {
  readonly notation: Notation;
  readonly onChoose: (notation: Notation) => void;
}

function NotationChoice({ notation, onChoose }: NotationChoiceProps) {
  return (
    <fieldset className="dialog-choices">
      <legend>Entries as</legend>
      {(['fractions', 'decimals', 'symbols'] as const).map(choice => (
        <label key={choice}>
          <input type="radio" name="notation" checked={notation === choice} onChange={() => onChoose(choice)} />{' '}
          {choice}
        </label>
      ))}
    </fieldset>
  );
}

interface FormatTableProps {
  readonly scope: Format['scope'];
  readonly notation: Notation;
  readonly minimal: boolean;
  readonly isDisabled: boolean;
}

function FormatTable({ scope, notation, minimal, isDisabled }: FormatTableProps) {
  return (
    <table
      className="dialog-table dialog-formats"
      aria-label={scope === 'model' ? 'Formats of the matrices' : 'Formats of the drawing'}
    >
      <tbody>
        {FORMATS.filter(format => format.scope === scope).map(format => (
          <tr key={format.id}>
            <th scope="row">{format.label}</th>
            <td>.{format.extension}</td>
            <td>
              {!format.isBinary && (
                <button
                  type="button"
                  className="button"
                  disabled={isDisabled}
                  aria-label={`Copy ${format.label}`}
                  onClick={() => void copyFormat(format, notation, minimal)}
                >
                  Copy
                </button>
              )}
              <button
                type="button"
                className="button"
                disabled={isDisabled}
                aria-label={`Save ${format.label}`}
                onClick={() => void saveFormat(format, notation, minimal)}
              >
                Save
              </button>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
