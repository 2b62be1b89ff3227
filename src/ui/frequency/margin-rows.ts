/** The rows of the table of cuts: each margin in words, where it exists. */

import type { Margins, Peak } from '../../analysis/index.ts';
import { degreesText, formatNumber, frequencyText } from '../figures/index.ts';
import { factorText } from './bode-content.ts';

interface MarginRow {
  readonly label: string;
  /** Null where the margin does not exist. */
  readonly textOf: (margins: Margins) => string | null;
}

const DIGITS = 3;

const number = (value: number) => formatNumber(value, DIGITS);

export const MARGIN_ROWS: readonly MarginRow[] = [
  {
    label: 'phase margin',
    textOf: ({ phaseMargin: found }) => found && `${degreesText(found.phaseMargin)} at ${frequencyText(found.omega)}`,
  },
  { label: 'gain margin up', textOf: ({ gainMarginUp }) => gainText(gainMarginUp) },
  { label: 'gain margin down', textOf: ({ gainMarginDown }) => gainText(gainMarginDown) },
  { label: 'delay margin', textOf: ({ delayMargin: found }) => found && `${number(found.seconds)} s` },
  { label: 'modulus margin', textOf: ({ modulusMargin: found }) => (found === null ? null : number(found)) },
  { label: 'disk margin', textOf: ({ diskMargin: found }) => found && `α ${number(found.alpha)}` },
  { label: 'gain in the disk', textOf: ({ diskMargin: found }) => found && diskGains(found.gainLow, found.gainHigh) },
  { label: 'phase in the disk', textOf: ({ diskMargin: found }) => found && `±${degreesText(found.phase)}` },
  { label: 'largest |S|', textOf: ({ sensitivity }) => peakText(sensitivity) },
  { label: 'largest |T|', textOf: ({ complementarySensitivity }) => peakText(complementarySensitivity) },
];

function gainText(margin: Margins['gainMarginUp']): string | null {
  return margin && `${factorText(margin.gainMargin)} at ${frequencyText(margin.omega)}`;
}

function diskGains(low: number, high: number | null): string {
  return high === null ? `×${number(low)} and more` : `×${number(low)} to ×${number(high)}`;
}

function peakText(peak: Peak | null): string | null {
  if (peak === null) return null;
  const where = peak.omega === null ? 'at high frequencies' : `at ${frequencyText(peak.omega)}`;
  return `${number(peak.magnitude)} ${where}`;
}
