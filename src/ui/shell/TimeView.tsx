/** The response over time, under the tab Time. */

import { TimeTab } from '../time/index.ts';
import { savePlot } from './save-plot.ts';

export function TimeView() {
  return <TimeTab onSave={savePlot} />;
}
