/**
 * The column beside the sheet: system matrix, poles and zeros, the choice of channel and tab, problems. Presentational: all
 * data come as properties, all wishes leave as callbacks; nothing here knows the store or the worker.
 */

import './results.css';
import './system-matrix.css';

export type { Channel } from './ChannelPicker.tsx';
export { ChannelPicker } from './ChannelPicker.tsx';
export { Derivative } from './MatrixRow.tsx';
export type { MatrixPlace } from './matrix-keys.ts';
export { Panel } from './Panel.tsx';
export { PanelEmpty, PanelPending } from './PanelState.tsx';
export { PoleTable } from './PoleTable.tsx';
export { ProblemList } from './ProblemList.tsx';
export { ShortChoice } from './ShortChoice.tsx';
export type { PointedBy } from './SystemMatrix.tsx';
export { SystemMatrix } from './SystemMatrix.tsx';
export type { Tab } from './TabStrip.tsx';
export { TabPanel, TabStrip } from './TabStrip.tsx';
