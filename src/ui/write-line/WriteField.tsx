/**
 * The write-a-block line's field: says what Enter will place, completes names, and floats at the place where the block goes
 * when it was opened there.
 */

import { type CSSProperties, type KeyboardEvent, useEffect, useState } from 'react';
import { readWiring, readWrittenBlock } from '../../diagram/write-a-block/index.ts';
import { writeText } from '../annotations/annotation-commands.ts';
import { shownTitle } from '../sheet/block-sentence.ts';
import { actions, type State, store, useStore } from '../store/index.ts';
import { chainedFrom, placeBlock } from './place-block.ts';
import { readQuoted } from './read-quoted.ts';
import { completed, completions, sayBefore } from './say-before.ts';
import { sheetView } from './sheet-view.ts';
import { wireToNamed } from './wire-to-named.ts';
import { WRITE_LINE_ID } from './write-line-id.ts';

const LIST_ID = 'write-names';

const diagram = (state: State) => state.document.diagram;
const writingAt = (state: State) => state.view.writingAt;
const selected = (state: State) => state.selection;

export function WriteField() {
  const [text, setText] = useState('');
  const [refusal, setRefusal] = useState<string | null>(null);
  const [active, setActive] = useState(-1);
  const [isListClosed, closeList] = useState(false);
  const sheet = useStore(diagram);
  const begun = useStore(writingAt);
  useStore(selected);
  const source = chainedFrom();
  const around = { sheet, parameters: sheet.parameters, from: source === null ? null : shownTitle(source) };
  const names = isListClosed ? [] : completions(text, around);

  const write = (next: string) => {
    setText(next);
    setRefusal(null);
    setActive(-1);
    closeList(false);
  };
  const accept = (name: string | undefined) => name !== undefined && write(completed(text, name));
  const place = () => {
    const fault = done(text);
    if (fault === null) write('');
    else setRefusal(fault);
  };
  const leave = (field: HTMLInputElement) => {
    write('');
    actions.beginWritingAt(null);
    if (begun === null) field.blur();
    else document.querySelector<HTMLElement>('.sheet')?.focus();
  };
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    const step = { ArrowDown: 1, ArrowUp: -1 }[event.key];
    if (step !== undefined && names.length > 0) setActive((active + step + names.length) % names.length);
    else if (event.key === 'Tab' && !event.shiftKey && names.length > 0) accept(names[Math.max(0, active)]);
    else if (event.key === 'Enter') names[active] === undefined ? place() : accept(names[active]);
    else if (event.key === 'Escape') active >= 0 ? closeList(true) : leave(event.currentTarget);
    else return;
    event.preventDefault();
  };
  return (
    <div className={begun === null ? 'write-entry' : 'write-entry write-floating'} style={useFloatingPlace(begun)}>
      <input
        id={WRITE_LINE_ID}
        className="write-field"
        role="combobox"
        aria-label="Write a block"
        aria-describedby="write-says"
        aria-invalid={refusal !== null}
        aria-autocomplete="list"
        aria-expanded={names.length > 0}
        aria-controls={LIST_ID}
        {...(names[active] === undefined ? {} : { 'aria-activedescendant': `${LIST_ID}-${active}` })}
        placeholder="write a block: K = 3.5 · 1/s · +- · r> · >y · @sum-"
        value={text}
        maxLength={10_000}
        spellCheck={false}
        autoComplete="off"
        onChange={event => write(event.currentTarget.value)}
        onKeyDown={onKeyDown}
      />
      <div className="write-above">
        <div id={LIST_ID} className="write-names" role="listbox" aria-label="Names">
          {names.map((name, i) => (
            <NameOption key={name} id={`${LIST_ID}-${i}`} name={name} isActive={i === active} onPick={accept} />
          ))}
        </div>
        <span id="write-says" className={refusal === null ? 'write-says' : 'write-says write-refused'} role="status">
          {refusal ?? sayBefore(text, around)}
        </span>
      </div>
    </div>
  );
}

interface NameOptionProps {
  readonly id: string;
  readonly name: string;
  readonly isActive: boolean;
  readonly onPick: (name: string) => void;
}

function NameOption({ id, name, isActive, onPick }: NameOptionProps) {
  return (
    <div
      id={id}
      role="option"
      tabIndex={-1}
      aria-selected={isActive}
      className="write-name"
      onPointerDown={event => {
        event.preventDefault();
        onPick(name);
      }}
    >
      {name}
    </div>
  );
}

/** Does what the line says. Why it cannot be done, null where it is. */
function done(text: string): string | null {
  const note = readQuoted(text);
  if (note !== null) return writeText(note);
  const wiring = readWiring(text);
  if (wiring !== null) return wireToNamed(wiring);
  const read = readWrittenBlock(text);
  if (!read.ok) return read.problems[0]?.message ?? 'That is not a block.';
  const { block, names, defines } = read.value;
  if (placeBlock(block, names, null, defines) !== null) return null;
  return store.getState().view.notice?.text ?? 'That block cannot be placed.';
}

/** Width that the floating line keeps within the window, pixels. */
const FLOATING_WIDTH = 340;

/** Where the floating line stands in the window; nothing while it is in its place at the sheet's foot. */
function useFloatingPlace(begun: State['view']['writingAt']): CSSProperties {
  const [place, setPlace] = useState<CSSProperties>({});
  useEffect(() => {
    if (begun === null) return setPlace({});
    const { x, y } = sheetView().onScreen(begun.at);
    setPlace({
      left: Math.max(8, Math.min(x - 20, window.innerWidth - FLOATING_WIDTH - 8)),
      top: Math.max(80, Math.min(y - 20, window.innerHeight - 60)),
    });
  }, [begun]);
  return place;
}
