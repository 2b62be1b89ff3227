/** The dialog that is open, if one is; its code is loaded when it is first asked for. */

import { lazy, Suspense } from 'react';
import { type State, useStore } from '../store/index.ts';

const dialog = (state: State) => state.view.dialog;

const ExportDialog = lazy(() => import('./ExportDialog.tsx').then(({ ExportDialog }) => ({ default: ExportDialog })));
const DrawingsDialog = lazy(() =>
  import('./DrawingsDialog.tsx').then(({ DrawingsDialog }) => ({ default: DrawingsDialog })),
);
const KeysDialog = lazy(() => import('./KeysDialog.tsx').then(({ KeysDialog }) => ({ default: KeysDialog })));
const CautionDialog = lazy(() =>
  import('./CautionDialog.tsx').then(({ CautionDialog }) => ({ default: CautionDialog })),
);

export function DialogHost() {
  const open = useStore(dialog);
  if (open === null) return null;
  return (
    <Suspense fallback={null}>
      {open === 'export' && <ExportDialog />}
      {open === 'drawings' && <DrawingsDialog />}
      {open === 'keys' && <KeysDialog />}
      {open === 'caution' && <CautionDialog />}
    </Suspense>
  );
}
