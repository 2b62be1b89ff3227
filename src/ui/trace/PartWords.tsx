/** The other way round: the entries that the block or wire that is pointed at takes part in. */

import { Fragment } from 'react';
import type { StateSpace } from '../../compile/index.ts';
import type { MatrixPlace } from '../results/index.ts';
import type { PointedPart } from '../store/index.ts';
import { EntryName } from './EntryName.tsx';
import { partTitle } from './part-title.ts';

/** Entries that are listed; of more, the number is told. */
const MOST_LISTED = 12;

interface PartWordsProps {
  readonly model: StateSpace;
  readonly entries: readonly MatrixPlace[];
  readonly part: PointedPart;
}

export function PartWords({ model, entries, part }: PartWordsProps) {
  const count = entries.length === 1 ? '1 entry' : `${entries.length === 0 ? 'no' : entries.length} entries`;
  const listed = entries.slice(0, MOST_LISTED);
  const more = entries.length - listed.length;
  return (
    <div className="trace-words">
      <p className="trace-sentence" role="status">
        {partTitle(part)} takes part in {count}
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
