/**
 * The title block in a corner of the sheet, as engineering drawings have it, with the parameter table above its foot. It
 * gives way to blocks: to another corner, else it folds to its title row.
 */

import './title-block.css';
import { useEffect, useRef } from 'react';
import { actions, type State, useStore } from '../store/index.ts';
import { ParameterTable } from './ParameterTable.tsx';
import { TitleFields, TitleNotes } from './TitleFields.tsx';
import { useTitleBlockPlace } from './useTitleBlockPlace.ts';

const title = (state: State) => state.document.diagram.title;

export function TitleBlock() {
  const section = useRef<HTMLElement>(null);
  const { corner, isFolded, fold } = useTitleBlockPlace(section);
  useEffect(actions.showTitleBlock, []);
  return (
    <section ref={section} className={`title-block title-block-${corner}`} aria-label="Title block">
      <div className="title-block-row">
        <span className="title-block-title">{useStore(title) || 'untitled'}</span>
        {!isFolded && <TitleFields />}
        <button
          type="button"
          className="quiet title-block-fold"
          aria-expanded={!isFolded}
          onClick={() => fold(!isFolded)}
        >
          {isFolded ? 'unfold' : 'fold'}
        </button>
      </div>
      {!isFolded && <TitleNotes />}
      {!isFolded && <ParameterTable />}
    </section>
  );
}
