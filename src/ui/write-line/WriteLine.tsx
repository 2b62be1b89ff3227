/** The line at the sheet's lower edge: what is written on paper becomes a block; beside it the parts with their keys. */

import { shownTitle } from '../sheet/block-sentence.ts';
import './write-line.css';
import { type KeyboardEvent, useState } from 'react';
import { readWrittenBlock } from '../../diagram/write-a-block/index.ts';
import { actions } from '../store/index.ts';
import { PART_MIME, PARTS, type Part } from './parts.ts';
import { placeBlock, placePart } from './place-block.ts';
import { WRITE_LINE_ID } from './write-line-id.ts';

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

function WriteField() {
  const [text, setText] = useState('');
  const [refusal, setRefusal] = useState<string | null>(null);
  const preview = previewOf(text);
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key === 'Escape') {
      setText('');
      setRefusal(null);
      actions.beginWritingAt(null);
      event.currentTarget.blur();
    }
    if (event.key !== 'Enter') return;
    const read = readWrittenBlock(text);
    if (!read.ok) return setRefusal(read.problems[0]?.message ?? 'That is not a block.');
    if (placeBlock(read.value.block, read.value.names, null) === null) return;
    setText('');
    setRefusal(null);
  };
  return (
    <div className="write-entry">
      <input
        id={WRITE_LINE_ID}
        className="write-field"
        aria-label="Write a block"
        aria-describedby="write-says"
        aria-invalid={refusal !== null}
        placeholder="write a block: 3.5 · K_p · 1/s · +- · r> · >y"
        value={text}
        maxLength={10_000}
        spellCheck={false}
        autoComplete="off"
        onChange={event => {
          setText(event.currentTarget.value);
          setRefusal(null);
        }}
        onKeyDown={onKeyDown}
      />
      <span id="write-says" className={refusal === null ? 'write-says' : 'write-says write-refused'} role="status">
        {refusal ?? preview}
      </span>
    </div>
  );
}

/** What Enter will place, empty while nothing can be said. */
function previewOf(text: string): string {
  if (text.trim() === '') return '';
  const read = readWrittenBlock(text);
  return read.ok ? `Enter places ${shownTitle({ ...read.value.block, id: '' })}` : '';
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
