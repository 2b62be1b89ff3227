/** The left of the page: the sheet with its commands, the title block in its corner, the write-a-block line below. */

import './sheet.css';
import './sheet-tools.css';
import { ReactFlowProvider } from 'reactflow';
import { TitleBlock } from '../title-block/TitleBlock.tsx';
import { WriteLine } from '../write-line/WriteLine.tsx';
import { BlockCard } from './BlockCard.tsx';
import { FindField } from './FindField.tsx';
import { Sheet } from './Sheet.tsx';
import { SheetToolbar } from './SheetToolbar.tsx';

export function SheetArea() {
  return (
    <ReactFlowProvider>
      <section className="sheet-area" aria-label="Sheet">
        <SheetToolbar />
        <FindField />
        <Sheet />
        <BlockCard />
        <TitleBlock />
        <WriteLine />
      </section>
    </ReactFlowProvider>
  );
}
