/** What a plot over frequency is made from, and the words for it. Frequencies in rad/s, magnitudes in dB, phases in degrees. */

import type { FrequencyCurve, Margins } from '../../analysis/index.ts';
import { plainName } from '../../expression/index.ts';
import type { CutLoop, FrequencyAnswer } from '../../worker/index.ts';
import { degreesText, formatNumber, frequencyText, phaseMarginText } from '../figures/index.ts';
import type { Band } from '../plots/index.ts';

/** A margin drawn where it is read. */
export interface MarginMark {
  /** `gain` stands in the magnitude at a phase crossover, `phase` in the phase at a gain crossover. */
  readonly kind: 'gain' | 'phase';
  readonly omega: number;
  /** From the curve to what it is measured against: 0 dB, or an odd multiple of 180°. */
  readonly from: number;
  readonly to: number;
  readonly label: string;
}

export interface BodeContent {
  readonly title: string;
  /** For the name of a saved file. */
  readonly words: readonly string[];
  readonly curve: FrequencyCurve;
  readonly summary: string;
  readonly marks: readonly MarginMark[];
  /** Where the magnitude runs over the tolerances of the parameters, dB; absent where that was not judged. */
  readonly envelope?: Band | undefined;
}

const DIGITS = 3;

/** A channel's response, by the names of its input and output. */
export function channelContent(
  input: string,
  output: string,
  { curve, bandwidth, route }: FrequencyAnswer['response'],
  envelope?: Band,
): BodeContent {
  const [from, to] = [plainName(input), plainName(output)];
  const parts = [
    bandwidth === null ? 'no bandwidth to speak of' : `bandwidth (−3 dB) ${frequencyText(bandwidth)}`,
    peakText(curve),
    ...(route === 'direct' ? ['dead time as it is'] : []),
    ...(envelope === undefined ? [] : ['the band: over the tolerances']),
  ];
  return {
    title: `Frequency response, ${from} to ${to}`,
    words: ['frequency', input, output],
    curve,
    summary: `${from} → ${to}: ${parts.join(' · ')}`,
    marks: [],
    envelope,
  };
}

function peakText({ omega, magnitude }: FrequencyCurve): string {
  let best = -1;
  magnitude.forEach((value, k) => {
    if (Number.isFinite(value) && (best < 0 || value > (magnitude[best] ?? 0))) best = k;
  });
  if (best < 0) return 'no response';
  if (best === 0) return 'falls from low frequencies on';
  return `largest drawn ${formatNumber(magnitude[best] ?? 0, DIGITS)} dB at ${frequencyText(omega[best] ?? 0)}`;
}

/** The loop transfer at a cut. */
export function cutContent(name: string, { curve, margins, closedLoop, route }: CutLoop): BodeContent {
  return {
    title: `Loop transfer at ${name}`,
    words: ['loop', name],
    curve,
    summary: `${name}: ${cutSentence(margins, closedLoop)}${route === 'direct' ? ' · dead time as it is' : ''}`,
    marks: [...phaseMarks(margins, curve), ...gainMarks(margins)],
  };
}

function cutSentence(margins: Margins, closedLoop: CutLoop['closedLoop']): string {
  const { gainMarginUp, gainMarginDown } = margins;
  const gains = [gainMarginDown, gainMarginUp].filter(margin => margin !== null);
  const parts = [
    phaseMarginText(margins),
    gains.length === 0
      ? 'no gain margin'
      : `gain margin ${gains.map(({ gainMargin }) => factorText(gainMargin)).join(' and ')}`,
    ...(closedLoop === 'stable' ? [] : [`the closed loop is ${closedLoop}`]),
  ];
  return parts.join(' · ');
}

/** `×4 (12 dB)`. */
export function factorText(factor: number): string {
  return `×${formatNumber(factor, DIGITS)} (${formatNumber(20 * Math.log10(factor), DIGITS)} dB)`;
}

function phaseMarks({ phaseMargin }: Margins, { omega, phase }: FrequencyCurve): readonly MarginMark[] {
  if (phaseMargin === null) return [];
  const at = phase[omega.indexOf(phaseMargin.omega)];
  if (at === undefined || !Number.isFinite(at)) return [];
  const label = degreesText(phaseMargin.phaseMargin);
  return [{ kind: 'phase', omega: phaseMargin.omega, from: at, to: at - phaseMargin.phaseMargin, label }];
}

function gainMarks({ gainMarginUp, gainMarginDown }: Margins): readonly MarginMark[] {
  return [gainMarginDown, gainMarginUp].flatMap((margin): readonly MarginMark[] => {
    if (margin === null || margin.omega === 0) return [];
    const from = -20 * Math.log10(margin.gainMargin);
    return [{ kind: 'gain', omega: margin.omega, from, to: 0, label: factorText(margin.gainMargin) }];
  });
}
