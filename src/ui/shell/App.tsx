/** The page: heading, sheet with its write-a-block line, results beside or under it, verdict line. */

import './shell.css';
import { lazy, Suspense } from 'react';
import { DialogHost } from '../dialogs/DialogHost.tsx';
import { NewVersionLine } from '../offline/NewVersionLine.tsx';
import { SheetArea } from '../sheet/SheetArea.tsx';
import { Heading } from './Heading.tsx';
import { NoticeLine } from './NoticeLine.tsx';
import { useFileDrop } from './useFileDrop.ts';
import { useThemeAttribute } from './useThemeAttribute.ts';
import { VerdictLine } from './VerdictLine.tsx';

/** Beside the sheet, and with the model's first answer: it need not hold up the drawing. */
const ResultsColumn = lazy(() =>
  import('./ResultsColumn.tsx').then(({ ResultsColumn }) => ({ default: ResultsColumn })),
);

export function App() {
  useThemeAttribute();
  const drop = useFileDrop();
  return (
    <div className="page" {...drop}>
      <Heading />
      <main className="page-main">
        <SheetArea />
        <Suspense fallback={<section className="results" aria-label="Results" />}>
          <ResultsColumn />
        </Suspense>
      </main>
      <VerdictLine />
      <NewVersionLine />
      <NoticeLine />
      <DialogHost />
    </div>
  );
}
