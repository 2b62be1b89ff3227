/**
 * What works on the drawing once it stands: the toolbar, keys and clipboard, the find field and the card of the block that is
 * pointed at. Loaded right after the drawing, with the commands behind them.
 */

import './sheet-tools.css';
import './far.css';
import '../theme/contrast.css';
import { lazy, Suspense, useEffect } from 'react';
import { useNewText } from '../annotations/useNewText.ts';
import { followPrinting } from '../printing/printed-sheet.ts';
import { usePageKeys } from '../shell/usePageKeys.ts';
import { type State, useStore } from '../store/index.ts';
import { BlockCard } from './BlockCard.tsx';
import { FindField } from './FindField.tsx';
import { SheetToolbar } from './SheetToolbar.tsx';
import { useClipboard } from './useClipboard.ts';
import { useSheetKeys } from './useSheetKeys.ts';

/** Loaded once an entry is pointed at or a hidden mode is marked. */
const TraceMarks = lazy(() => import('../trace/index.ts').then(room => ({ default: room.TraceMarks })));

const hasMarks = ({ pointing: { entry, hidden } }: State) => entry !== null || hidden.length > 0;

function EntryMarks() {
  return useStore(hasMarks) ? (
    <Suspense>
      <TraceMarks />
    </Suspense>
  ) : null;
}

export function SheetAids() {
  usePageKeys();
  useSheetKeys();
  useClipboard();
  useNewText();
  useEffect(followPrinting, []);
  return (
    <>
      <SheetToolbar />
      <FindField />
      <BlockCard />
      <EntryMarks />
    </>
  );
}
