/** Which versions of a drawing stay when there are too many: first, last, and those spread over the time between. */

/** A drawing as it was. `at` is ISO 8601, UTC. */
export interface KeptVersion {
  readonly at: string;
  readonly blocks: number;
  readonly text: string;
}

/** At most `most` (2 or more) of the versions, oldest first: again and again the one goes whose neighbours are closest in time. */
export function thinned(versions: readonly KeptVersion[], most: number): readonly KeptVersion[] {
  const left = [...versions];
  const time = (index: number): number => Date.parse(left[index]?.at ?? '');
  while (left.length > most) {
    let goes = 1;
    for (let index = 2; index < left.length - 1; index += 1) {
      if (time(index + 1) - time(index - 1) < time(goes + 1) - time(goes - 1)) goes = index;
    }
    left.splice(goes, 1);
  }
  return left;
}
