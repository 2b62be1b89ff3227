/** Ids and names that nothing bears yet. */

import { displayName } from '../titles.ts';
import type { Sheet } from '../types.ts';

/** An id that no block of the sheet has: the stem, its illegal characters left out, with a number from 2 where it is taken. */
export function freshId(sheet: Sheet, stem: string): string {
  return freshIdAmong(new Set(sheet.blocks.map(({ id }) => id)), stem);
}

/** As `freshId`, among ids that are known already. */
export function freshIdAmong(taken: ReadonlySet<string>, stem: string): string {
  const legal = stem.replace(/^[^A-Za-z]+|[^A-Za-z0-9_]+/g, '');
  return numbered(taken, legal === '' ? 'block' : legal);
}

/** A name that no block of the sheet shows: the stem, with a number from 2 where it is taken. */
export function freshName(sheet: Sheet, stem: string): string {
  return freshNameAmong(new Set(sheet.blocks.map(displayName)), stem);
}

/** As `freshName`, among names that are known already. */
export function freshNameAmong(taken: ReadonlySet<string>, stem: string): string {
  return numbered(taken, stem);
}

/** The stem itself, else its letters with the first free number: `sum`, `sum2`, `sum3`; after `x1` comes `x2`. */
function numbered(taken: ReadonlySet<string>, stem: string): string {
  if (!taken.has(stem)) return stem;
  const letters = stem.replace(/\d+$/, '') || stem;
  let number = Math.max(2, Number(stem.slice(letters.length)) + 1);
  if (!Number.isSafeInteger(number)) number = 2;
  while (taken.has(`${letters}${number}`)) number += 1;
  return `${letters}${number}`;
}
