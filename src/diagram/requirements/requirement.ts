/** One line of the list of requirements that a drawing keeps, and how it is said. */

import type { Quantity } from '../types.ts';
import { type RequirementKind, requirementRule } from './requirement-kinds.ts';

/** What the loop has to do. The fields that are there are those of the kind's rule. */
export interface Requirement {
  readonly kind: RequirementKind;
  /** Names of an input and an output of the drawing. */
  readonly input?: string;
  readonly output?: string;
  /** Name of a cut, `cut 1` by its place where it has none. */
  readonly cut?: string;
  /** From and to, rad/s. */
  readonly band?: readonly [low: Quantity, high: Quantity];
  /** The bound, in the kind's unit; arithmetic with the drawing's parameters. */
  readonly most?: Quantity;
  readonly least?: Quantity;
  /** Whether it has to hold for the whole tolerance of the parameters, too. */
  readonly tolerances?: boolean;
  readonly note?: string;
}

/** The bound as written, null for a kind that has none. */
export function boundOf({ most, least }: Requirement): Quantity | null {
  return most ?? least ?? null;
}

/** `overshoot from r to F at most 25 %`, `phase margin at cut 1 at least 45°`, `stability for the whole tolerance`. */
export function requirementText(requirement: Requirement): string {
  const { words, unit } = requirementRule(requirement.kind);
  const side = requirement.most === undefined ? 'at least' : 'at most';
  const bound = boundOf(requirement);
  return [
    words.replace(/^the /, ''),
    subjectText(requirement),
    bandText(requirement),
    bound === null ? '' : `${side} ${bound}${unit === '°' ? unit : unit && ` ${unit}`}`,
    requirement.tolerances === true ? 'for the whole tolerance' : '',
  ]
    .filter(part => part !== '')
    .join(' ');
}

function subjectText({ kind, input, output, cut }: Requirement): string {
  switch (requirementRule(kind).subject) {
    case 'loop':
      return '';
    case 'channel':
      return `from ${input ?? '?'} to ${output ?? '?'}`;
    case 'cut':
      return `at ${cut ?? '?'}`;
  }
}

function bandText({ band }: Requirement): string {
  return band === undefined ? '' : `between ${band[0]} and ${band[1]} rad/s`;
}
