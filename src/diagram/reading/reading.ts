/** What one reading gathers on its way through a file: the problems, capped, and how many blocks there are so far. */

import { type Problem, problem } from '../../problem/index.ts';
import { MOST_PROBLEMS } from '../limits.ts';

export interface Reading {
  readonly problems: Problem[];
  blocks: number;
}

/** A reading at its start. */
export function beginReading(): Reading {
  return { problems: [], blocks: 0 };
}

/** Notes a problem; those beyond `MOST_PROBLEMS` are let go. */
export function note(reading: Reading, ...[code, message, concerns]: Parameters<typeof problem>): void {
  if (reading.problems.length < MOST_PROBLEMS) reading.problems.push(problem(code, message, concerns));
}

/** A sheet within the drawing: ids and names of the groups around it, outermost first. */
export interface SheetPlace {
  readonly ids: readonly string[];
  readonly names: readonly string[];
}

export const TOP_SHEET: SheetPlace = { ids: [], names: [] };

/** A block's id with those of the groups around it: `outer.inner.id`. */
export function pathOf(place: SheetPlace, id: string): string {
  return [...place.ids, id].join('.');
}
