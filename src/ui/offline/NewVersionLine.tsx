/** Says that a newer version of the page waits; nothing reloads until the button is pressed. */

import './new-version.css';
import { useSyncExternalStore } from 'react';
import { hasNewVersion, onNewVersion, reloadIntoNewVersion } from './new-version.ts';

export function NewVersionLine() {
  const isNew = useSyncExternalStore(onNewVersion, hasNewVersion);
  return (
    <div role="status" className={isNew ? 'new-version' : 'unseen'}>
      {isNew && (
        <>
          A new version is there. Reload when it suits you.{' '}
          <button type="button" className="button" onClick={reloadIntoNewVersion}>
            Reload
          </button>
        </>
      )}
    </div>
  );
}
