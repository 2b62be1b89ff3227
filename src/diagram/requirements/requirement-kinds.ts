/**
 * The kinds of requirement: what each is about, on which side it is bounded, and in which unit. The one table that reading,
 * the form on the page and the assessment read.
 */

/** What a requirement is about: the whole loop, one input and output, or the loop transfer at a cut. */
export type RequirementSubject = 'loop' | 'channel' | 'cut';

export interface RequirementRule {
  /** As in the middle of a sentence: `the overshoot`. */
  readonly words: string;
  readonly subject: RequirementSubject;
  /** The fields that may bound it, one of them at a time; none where it is a plain yes or no. */
  readonly bounds: readonly ('most' | 'least')[];
  /** The unit of the bound and of the measured value; empty for a plain number. */
  readonly unit: '' | '%' | 's' | 'dB' | '°' | 'rad/s';
  /** Whether it is over a band of frequencies. */
  readonly hasBand: boolean;
}

const rule = (
  words: string,
  subject: RequirementSubject,
  bounds: RequirementRule['bounds'],
  unit: RequirementRule['unit'] = '',
  hasBand = false,
): RequirementRule => ({ words, subject, bounds, unit, hasBand });

export const REQUIREMENT_KINDS = {
  stable: rule('stability', 'loop', []),
  damping: rule('the damping ratio of every pole', 'loop', ['least']),
  overshoot: rule('the overshoot', 'channel', ['most'], '%'),
  'rise-time': rule('the rise time from 10 % to 90 %', 'channel', ['most'], 's'),
  'settling-time': rule('the settling time to within 2 %', 'channel', ['most'], 's'),
  'steady-error': rule('the steady error to a unit step', 'channel', ['most']),
  bandwidth: rule('the bandwidth', 'channel', ['least', 'most'], 'rad/s'),
  magnitude: rule('the largest magnitude', 'channel', ['most'], 'dB', true),
  'gain-margin': rule('the gain margin', 'cut', ['least'], 'dB'),
  'phase-margin': rule('the phase margin', 'cut', ['least'], '°'),
  'delay-margin': rule('the delay margin', 'cut', ['least'], 's'),
  'modulus-margin': rule('the modulus margin', 'cut', ['least']),
  'disk-margin': rule('the disk margin', 'cut', ['least']),
} as const satisfies Readonly<Record<string, RequirementRule>>;

export type RequirementKind = keyof typeof REQUIREMENT_KINDS;

/** The kinds in the order in which they are offered. */
export const REQUIREMENT_KIND_NAMES = Object.keys(REQUIREMENT_KINDS) as readonly RequirementKind[];

/** The rule of a kind, by its general type. */
export function requirementRule(kind: RequirementKind): RequirementRule {
  return REQUIREMENT_KINDS[kind];
}
