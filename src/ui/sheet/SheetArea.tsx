/** The left of the page: the sheet with its commands, the title block in its corner, the write-a-block line below. */

import './sheet.css';
import { lazy, Suspense } from 'react';
import { ReactFlowProvider } from 'reactflow';
import { Sheet } from './Sheet.tsx';

/** After the drawing and its matrices: what is read first need not wait for what is edited later. */
const TitleBlock = lazy(() =>
  import('../title-block/TitleBlock.tsx').then(({ TitleBlock }) => ({ default: TitleBlock })),
);

const SheetAids = lazy(() => import('./SheetAids.tsx').then(({ SheetAids }) => ({ default: SheetAids })));

const WriteLine = lazy(() => import('../write-line/WriteLine.tsx').then(({ WriteLine }) => ({ default: WriteLine })));

export function SheetArea() {
  return (
    <ReactFlowProvider>
      <section className="sheet-area" aria-label="Sheet">
        <Sheet />
        <Suspense fallback={null}>
          <SheetAids />
          <WriteLine />
          <TitleBlock />
        </Suspense>
      </section>
    </ReactFlowProvider>
  );
}
