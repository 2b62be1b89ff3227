/** The line at the sheet's lower edge: what is written on paper becomes a block; beside it the parts with their keys. */

import './write-line.css';
import { PART_MIME, PARTS, type Part } from './parts.ts';
import { placePart } from './place-block.ts';
import { WriteField } from './WriteField.tsx';

export function WriteLine() {
  return (
    <div className="write-line">
      <WriteField />
      <div className="write-parts" role="toolbar" aria-label="Parts">
        {PARTS.map(part => (
          <PartButton key={part.id} part={part} />
        ))}
      </div>
    </div>
  );
}

function PartButton({ part }: { readonly part: Part }) {
  return (
    <button
      type="button"
      className="write-part"
      draggable
      title={`${part.label}: press ${part.key} on the sheet, or drag it there`}
      aria-keyshortcuts={part.key}
      onDragStart={event => {
        event.dataTransfer.setData(PART_MIME, part.id);
        event.dataTransfer.effectAllowed = 'copy';
      }}
      onClick={() => placePart(part.id, null)}
    >
      <span className="unseen">Place {part.label}</span>
      <span className="write-symbol" aria-hidden="true">
        {part.symbol}
      </span>
      <span className="write-key" aria-hidden="true">
        {part.key}
      </span>
    </button>
  );
}
