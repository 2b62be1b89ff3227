/** The other way round: the entries that the block or wire that is pointed at takes part in. */

import { Fragment } from 'react';
import type { StateSpace } from '../../compile/index.ts';
import type { MatrixPlace } from '../results/index.ts';
import type { PointedPart } from '../store/index.ts';
import { EntryName } from './EntryName.tsx';
import { partTitle } from './part-title.ts';
import { entryCount, MOST_LISTED } from './trace-words.ts';

interface PartWordsProps {
  readonly model: StateSpace;
  readonly entries: readonly MatrixPlace[];
  readonly part: PointedPart;
}

export function PartWords({ model, entries, part }: PartWordsProps) {
  const listed = entries.slice(0, MOST_LISTED);
  const more = entries.length - listed.length;
  return (
    <div className="trace-words">
      <p className="trace-sentence" aria-hidden="true">
        {partTitle(part)} takes part in {entryCount(entries.length)}
        {listed.length > 0 && ': '}
        {listed.map((place, k) => (
          <Fragment key={`${place.row} ${place.column}`}>
            {k > 0 && ', '}
            <EntryName model={model} place={place} />
          </Fragment>
        ))}
        {more > 0 && ` and ${more} more`}
      </p>
    </div>
  );
}
