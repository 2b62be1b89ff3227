import type { StateSpace } from '../../compile/index.ts';
import { ENTRY_DIGITS, type EntryAt, whyNoFractions } from './matrix-entries.ts';
import type { MatrixWindow } from './useMatrixWindow.ts';

interface MatrixNoteProps {
  readonly model: StateSpace;
  readonly entryAt: EntryAt;
  readonly window: MatrixWindow;
}

/** What has to be said under the entries: that some are rounded, and why there are no exact ones. */
export function MatrixNote({ model, entryAt, window }: MatrixNoteProps) {
  const reason = whyNoFractions(model);
  // A windowed table keeps the line, so that nothing moves while it is scrolled.
  const hasRounded = window.isPartial || isAnyRounded(entryAt, window);
  if (reason === null && !hasRounded) return null;
  return (
    <p className="system-matrix-note">
      {reason !== null && `${reason} `}
      {hasRounded && `≈ rounded to ${ENTRY_DIGITS} digits.`}
    </p>
  );
}

function isAnyRounded(entryAt: EntryAt, { rows, columns }: MatrixWindow): boolean {
  for (let row = rows.first; row < rows.end; row++) {
    for (let column = columns.first; column < columns.end; column++) {
      if (entryAt(row, column).isRounded) return true;
    }
  }
  return false;
}
