/** The page's state: four slices, the actions that change them and the selectors that read them. */

import * as actions from './actions.ts';

export type { DocumentSlice } from './document.ts';
export type { LiveSlice } from './live.ts';
export type { PointedPart, PointingSlice } from './pointing.ts';
export type { ResultsSlice } from './results.ts';
export type { SelectionSlice } from './selection.ts';
export { type State, store, useStore } from './store.ts';
export type { TolerancesSlice } from './tolerances.ts';
export type { Notice, ViewSlice } from './view.ts';
export { actions };
