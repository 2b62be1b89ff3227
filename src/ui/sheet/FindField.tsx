/** Finds a block by name, value or parameter: written above, the matches below it, Enter goes to the marked one. */

import { type KeyboardEvent, useMemo, useState } from 'react';
import type { Annotation } from '../../diagram/index.ts';
import { focusAnnotation } from '../annotations/annotation-commands.ts';
import { annotationTitle, shortTitle } from '../annotations/annotation-texts.ts';
import { findAnnotations } from '../annotations/find-annotations.ts';
import { type Found, findBlocks } from '../commands/find-blocks.ts';
import { actions, type State, useStore } from '../store/index.ts';
import { formatValue } from '../title-block/format-value.ts';
import { sheetView } from '../write-line/sheet-view.ts';
import { shownTitle } from './block-sentence.ts';
import { focusBlock, focusSheet } from './focus-block.ts';

/** More than a look takes in are only counted. */
const MOST_SHOWN = 8;

const isOpen = (state: State) => state.view.finding;

export function FindField() {
  return useStore(isOpen) ? <OpenFindField /> : null;
}

const diagram = (state: State) => state.document.diagram;
const blockValues = (state: State) => state.results.values.blocks;

function OpenFindField() {
  const sheet = useStore(diagram);
  const values = useStore(blockValues);
  const [text, setText] = useState('');
  const [marked, setMarked] = useState(0);
  const found = useMemo(() => {
    const shown = new Map(Object.entries(values).map(([id, value]) => [id, formatValue(value)]));
    return [...findBlocks(sheet, text, shown).map(foundBlock), ...findAnnotations(sheet, text).map(foundAnnotation)];
  }, [sheet, text, values]);
  const shown = found.slice(0, MOST_SHOWN);
  const close = () => {
    actions.openFinding(false);
    focusSheet();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    event.stopPropagation();
    const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
    const choice = found[marked];
    if (event.key === 'Escape') close();
    else if (step !== 0) setMarked(Math.max(0, Math.min(shown.length - 1, marked + step)));
    else if (event.key === 'Enter' && choice !== undefined) choice.go();
    else return;
    event.preventDefault();
  };
  return (
    <search className="find" onKeyDown={onKeyDown}>
      <input
        className="field"
        ref={field => field?.focus()}
        role="combobox"
        aria-label="Find a block"
        aria-expanded={shown.length > 0}
        aria-controls="find-list"
        aria-activedescendant={shown[marked] === undefined ? undefined : `find-${marked}`}
        placeholder="name, value or parameter"
        value={text}
        spellCheck={false}
        autoComplete="off"
        onChange={event => {
          setText(event.currentTarget.value);
          setMarked(0);
        }}
      />
      <button type="button" className="quiet" onClick={close}>
        Close
      </button>
      <FoundList found={shown} marked={marked} />
      <p className="find-count" role="status">
        {countSentence(text, found.length, shown.length)}
      </p>
    </search>
  );
}

/** One line of the list and what it leads to. */
interface Choice {
  readonly key: string;
  readonly title: string;
  readonly because: string;
  readonly go: () => void;
}

function foundBlock(found: Found): Choice {
  const { block, because } = found;
  return { key: `block ${block.id}`, title: shownTitle(block), because, go: () => goToFound(found) };
}

function foundAnnotation(annotation: Annotation): Choice {
  const title = annotationTitle(annotation);
  return { key: `annotation ${annotation.id}`, title, because: '', go: () => goToAnnotation(annotation) };
}

function FoundList({ found, marked }: { readonly found: readonly Choice[]; readonly marked: number }) {
  return (
    <div id="find-list" role="listbox" aria-label="Blocks found" className="find-list">
      {found.map((item, place) => (
        // biome-ignore lint/a11y/useKeyWithClickEvents: the field above takes the keys for the whole list
        <div
          key={item.key}
          id={`find-${place}`}
          role="option"
          aria-selected={place === marked}
          tabIndex={-1}
          onClick={item.go}
        >
          {item.title}
          {item.because !== '' && <span className="find-because"> {item.because}</span>}
        </div>
      ))}
    </div>
  );
}

function countSentence(text: string, found: number, shown: number): string {
  if (text.trim() === '') return '';
  if (found === 0) return `Nothing holds “${text.trim()}”.`;
  return found > shown ? `${found} found, the first ${shown} shown.` : '';
}

function goToFound({ block }: Found): void {
  actions.openFinding(false);
  actions.selectBlocks([block.id]);
  sheetView().reveal(block.at ?? [0, 0]);
  actions.notify(`Found ${shownTitle(block)}.`);
  focusBlock(block.id);
}

function goToAnnotation(annotation: Annotation): void {
  const { id, at, size } = annotation;
  actions.openFinding(false);
  actions.selectAnnotations([id]);
  sheetView().reveal([at[0] + size[0] / 2, at[1]]);
  actions.notify(`Found ${shortTitle(annotation)}.`);
  focusAnnotation(id);
}
