/** The versions kept of the drawing on screen, the newest first; one of them becomes the newest document by one undo step. */

import { useEffect, useState } from 'react';
import { type KeptVersion, versionsOf } from '../../storage/index.ts';
import { actions, store } from '../store/index.ts';
import { DrawingPicture, diagramOf } from './DrawingPicture.tsx';

export function DrawingVersions() {
  const [versions, setVersions] = useState<readonly KeptVersion[] | string>([]);
  useEffect(() => {
    void versionsOf(store.getState().document.key).then(answer =>
      setVersions(answer.ok ? answer.value.toReversed() : answer.message),
    );
  }, []);
  if (typeof versions === 'string') return <p role="alert">{versions}</p>;
  if (versions.length === 0) {
    return <p>None yet. One is kept when a drawing is opened, every ten minutes of change and at export.</p>;
  }
  return (
    <table className="dialog-table drawings-table" aria-label="Versions of this drawing">
      <tbody>
        {versions.map(version => (
          <VersionRow key={version.at} version={version} />
        ))}
      </tbody>
    </table>
  );
}

function VersionRow({ version }: { readonly version: KeptVersion }) {
  const at = `${version.at.slice(0, 19).replace('T', ' ')} UTC`;
  return (
    <tr>
      <td>
        <DrawingPicture source={async () => diagramOf(version.text)} />
      </td>
      <th scope="row">{at}</th>
      <td>{version.blocks} blocks</td>
      <td>
        <button
          type="button"
          className="button"
          aria-label={`Return to it: ${at}`}
          onClick={() => returnTo(version, at)}
        >
          Return to it
        </button>
      </td>
    </tr>
  );
}

function returnTo(version: KeptVersion, at: string): void {
  const diagram = diagramOf(version.text);
  if (diagram === null) return actions.notify('That version cannot be read.', 'refused');
  actions.returnTo(diagram, `Returned to the version of ${at}. Undo goes back to what was there.`);
  actions.openDialog(null);
}
