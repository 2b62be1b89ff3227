/** The answers over frequency beside the sheet: the chosen channel, the loop at each cut, the table of margins. */

import './frequency.css';

export { FrequencyView } from './FrequencyView.tsx';
