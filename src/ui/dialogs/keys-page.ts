/** The page of keys as text: from the tables that the handlers read, and what fields and the hand do beside them. */

import { type KeyGroup, type KeyRow, shownKeys } from '../keys/index.ts';
import { SHEET_KEYS } from '../sheet/all-sheet-keys.ts';
import { PAGE_KEYS } from '../shell/page-keys.ts';
import { KEYS_IN_FIELDS, type KeyLine, OTHER_WAYS } from './keys-in-fields.ts';

export interface KeyPage {
  readonly group: string;
  readonly lines: readonly KeyLine[];
}

const GROUPS: readonly KeyGroup[] = [
  'Place a block',
  'On the sheet',
  'On a wire',
  'Texts and frames',
  'See',
  'Everywhere',
];

/** Groups with their lines, in the page's order. */
export function keyPages(rows: readonly KeyRow[] = [...SHEET_KEYS, ...PAGE_KEYS]): readonly KeyPage[] {
  const tabled = GROUPS.map((group): KeyPage => {
    const own = rows.filter(row => row.group === group);
    return { group, lines: [...own.map(lineOf), ...(OTHER_WAYS[group] ?? [])] };
  });
  const inFields = Object.entries(KEYS_IN_FIELDS).map(([group, lines]): KeyPage => ({ group, lines }));
  return [...tabled, ...inFields];
}

function lineOf({ keys, does }: KeyRow): KeyLine {
  return { shown: shownKeys(keys), does };
}
