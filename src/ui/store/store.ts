/**
 * The one store of the page, made of four slices. Components read it through named selectors and change it through the
 * actions beside this file, never by themselves.
 */

import { useStore as useZustand } from 'zustand';
import { createStore } from 'zustand/vanilla';
import { type Point, startingDrawing } from '../../diagram/index.ts';
import type { DocumentSlice } from './document.ts';
import type { LiveSlice } from './live.ts';
import { NOTHING_POINTED, type PointingSlice } from './pointing.ts';
import { NO_RESULTS, type ResultsSlice } from './results.ts';
import { NOTHING_SELECTED, type SelectionSlice } from './selection.ts';
import type { TolerancesSlice } from './tolerances.ts';
import { FIRST_VIEW, type ViewSlice } from './view.ts';

export interface State {
  readonly document: DocumentSlice;
  readonly selection: SelectionSlice;
  /** Where the hand has the blocks it is dragging; null when it drags none. Becomes one edit when the drag ends. */
  readonly held: ReadonlyMap<string, Point> | null;
  /** The parameter that the hand is moving; null when it moves none. Becomes one edit when the hand lets go. */
  readonly live: LiveSlice | null;
  readonly view: ViewSlice;
  readonly results: ResultsSlice;
  readonly pointing: PointingSlice;
  /** Null before the first judgement. */
  readonly tolerances: TolerancesSlice | null;
}

export const store = createStore<State>()(() => ({
  document: { diagram: startingDrawing(), key: 'first', revision: 0, past: [], future: [] },
  selection: NOTHING_SELECTED,
  held: null,
  live: null,
  view: FIRST_VIEW,
  results: NO_RESULTS,
  pointing: NOTHING_POINTED,
  tolerances: null,
}));

/** What a selector takes from the state; the component is drawn again when that changes. */
export function useStore<T>(selector: (state: State) => T): T {
  return useZustand(store, selector);
}
