/** The words for a judged requirement. */

import type { Assessment } from '../../analysis/index.ts';
import { type Requirement, requirementRule } from '../../diagram/index.ts';
import { formatNumber } from '../figures/index.ts';

const DIGITS = 4;

/** `23.39 %`, `45.2°`, `0.5`. */
export function withUnit({ kind }: Requirement, figure: number): string {
  const { unit } = requirementRule(kind);
  return `${formatNumber(figure, DIGITS)}${unit === '°' || unit === '' ? unit : `\u00a0${unit}`}`;
}

/** The measured figure, or why there is none. */
export function measuredText(
  requirement: Requirement,
  { value, reason }: Pick<Assessment, 'value' | 'reason'>,
): string {
  return value === null ? reason : withUnit(requirement, value);
}

/** `inside by 1.61 %`; empty without a figure. */
export function slackText(requirement: Requirement, { slack }: Pick<Assessment, 'slack'>): string {
  if (slack === null) return '';
  return `${slack >= 0 ? 'inside' : 'outside'} by ${withUnit(requirement, Math.abs(slack))}`;
}

export const STATUS_WORDS = { met: 'met', missed: 'missed', unchecked: 'not checked' } as const;

/** `All 5 requirements met`, `2 of 5 requirements not met`. */
export function countText(assessments: readonly Pick<Assessment, 'status'>[]): string {
  const all = assessments.length;
  const missed = assessments.filter(({ status }) => status !== 'met').length;
  const noun = all === 1 ? 'requirement' : 'requirements';
  if (missed > 0) return `${missed} of ${all} ${noun} not met`;
  return all === 1 ? 'the requirement is met' : `all ${all} ${noun} met`;
}
