/** The frequency response of the chosen channel and the loops at the cuts, under the tab Frequency. */

import { FrequencyView } from '../frequency/index.ts';
import { savePlot } from './save-plot.ts';

export function FrequencyTab() {
  return <FrequencyView onSave={savePlot} />;
}
