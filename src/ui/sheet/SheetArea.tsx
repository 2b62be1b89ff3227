/** The left of the page: the sheet with its commands, the title block in its corner, the write-a-block line below. */

import './sheet.css';
import './sheet-tools.css';
import { lazy, Suspense } from 'react';
import { ReactFlowProvider } from 'reactflow';
import { WriteLine } from '../write-line/WriteLine.tsx';
import { BlockCard } from './BlockCard.tsx';
import { FindField } from './FindField.tsx';
import { Sheet } from './Sheet.tsx';
import { SheetToolbar } from './SheetToolbar.tsx';

/** After the drawing and its matrices: what is read first need not wait for what is edited later. */
const TitleBlock = lazy(() =>
  import('../title-block/TitleBlock.tsx').then(({ TitleBlock }) => ({ default: TitleBlock })),
);

export function SheetArea() {
  return (
    <ReactFlowProvider>
      <section className="sheet-area" aria-label="Sheet">
        <SheetToolbar />
        <FindField />
        <Sheet />
        <BlockCard />
        <Suspense fallback={null}>
          <TitleBlock />
        </Suspense>
        <WriteLine />
      </section>
    </ReactFlowProvider>
  );
}
