/** The left of the page: the sheet, the title block in its corner, the write-a-block line at its lower edge. */

import './sheet.css';
import { ReactFlowProvider } from 'reactflow';
import { TitleBlock } from '../title-block/TitleBlock.tsx';
import { WriteLine } from '../write-line/WriteLine.tsx';
import { Sheet } from './Sheet.tsx';

export function SheetArea() {
  return (
    <ReactFlowProvider>
      <section className="sheet-area" aria-label="Sheet">
        <Sheet />
        <TitleBlock />
        <WriteLine />
      </section>
    </ReactFlowProvider>
  );
}
