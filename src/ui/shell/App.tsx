/** The page: heading, sheet with its write-a-block line, results beside or under it, verdict line. */

import './shell.css';
import { DialogHost } from '../dialogs/DialogHost.tsx';
import { SheetArea } from '../sheet/SheetArea.tsx';
import { Heading } from './Heading.tsx';
import { NoticeLine } from './NoticeLine.tsx';
import { ResultsColumn } from './ResultsColumn.tsx';
import { useFileDrop } from './useFileDrop.ts';
import { useThemeAttribute } from './useThemeAttribute.ts';
import { useUndoKeys } from './useUndoKeys.ts';
import { VerdictLine } from './VerdictLine.tsx';

export function App() {
  useThemeAttribute();
  useUndoKeys();
  const drop = useFileDrop();
  return (
    <div className="page" {...drop}>
      <Heading />
      <main className="page-main">
        <SheetArea />
        <ResultsColumn />
      </main>
      <VerdictLine />
      <NoticeLine />
      <DialogHost />
    </div>
  );
}
