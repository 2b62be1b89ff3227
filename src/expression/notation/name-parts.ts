/** Names as one writes them by hand: `omega_n` is ω with a lowered n, `J2` is J with a lowered 2, `torque` stays a word. */

import { GREEK_LETTERS } from '../greek.ts';

/** One stretch of a name: what stands on the line and what is lowered, piece by piece. */
export interface NamePart {
  readonly base: Letters;
  readonly lowered: readonly Letters[];
}

/** Letters or digits as typed; `greek` is the letter they name, null where they name none. */
export interface Letters {
  readonly typed: string;
  readonly greek: string | null;
}

const lettersOf = (typed: string): Letters => ({ typed, greek: GREEK_LETTERS.get(typed) ?? null });

const SPLIT = /^([A-Za-z]+)(\d*)((?:_[A-Za-z0-9]+)*)$/;

/**
 * The name split at its subscripts; digits after its letters are one. Anything that is no plain name (a word with digits inside, a
 * trailing underscore, spaces) is one base as typed.
 */
export function namePart(name: string): NamePart {
  const match = SPLIT.exec(name);
  if (match === null) return { base: { typed: name, greek: null }, lowered: [] };
  const [, letters = '', digits = '', rest = ''] = match;
  const lowered = [digits, ...rest.split('_')].filter(piece => piece !== '');
  return { base: lettersOf(letters), lowered: lowered.map(lettersOf) };
}

/** The parts of a name inside groups: `drive.omega` has two. */
export function nameParts(name: string): readonly NamePart[] {
  return name.split('.').map(namePart);
}

/** Whether it is written as one letter, so that it stands in italics and needs no sign in a product. */
export function isOneLetter({ typed, greek }: Letters): boolean {
  return greek !== null || /^[A-Za-z]$/.test(typed);
}

/** How it reads: the Greek letter, or as typed. */
export function shown({ typed, greek }: Letters): string {
  return greek ?? typed;
}

/** A name for places that take text only, Greek letters in place: `ω_n`, `drive.ω`. */
export function plainName(name: string): string {
  return name
    .split('.')
    .map(part => {
      const { base, lowered } = namePart(part);
      const isGreek = base.greek !== null || lowered.some(({ greek }) => greek !== null);
      if (!isGreek) return part;
      const [first, ...others] = lowered;
      const rest = first !== undefined && /^\d/.test(first.typed) && !part.includes(`_${first.typed}`) ? [] : ['_'];
      if (first === undefined) return shown(base);
      return shown(base) + rest.join('') + [first, ...others].map(shown).join('_');
    })
    .join('.');
}
