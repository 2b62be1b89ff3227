/**
 * The system matrix as one table. Entries come one at a time from matrix-entries.ts, so that any notation fits; beyond
 * SMALL_MODEL states only what is in view is in the page (matrix-window.ts).
 */

import { type MouseEvent, useCallback, useId, useMemo, useRef } from 'react';
import type { StateSpace } from '../../compile/index.ts';
import type { Notation } from '../figures/index.ts';
import { type RowEntries, rowEntries } from './kept-entries.ts';
import { MatrixHead } from './MatrixHead.tsx';
import { MatrixNote } from './MatrixNote.tsx';
import { MatrixRow } from './MatrixRow.tsx';
import { type EntryAt, NOTHING, type SymbolCell, symbolEntries } from './matrix-entries.ts';
import type { MatrixPlace } from './matrix-keys.ts';
import { columnsByRow, matrixLabel, rowsOf } from './matrix-layout.ts';
import { PanelEmpty } from './PanelState.tsx';
import { useMatrixKeys } from './useMatrixKeys.ts';
import { useMatrixWindow } from './useMatrixWindow.ts';

/** `hover` follows the pointer, `walk` the arrow keys; `keep` is a click, a touch or Enter. */
export type PointedBy = 'hover' | 'walk' | 'keep';

interface SystemMatrixProps {
  readonly model: StateSpace;
  readonly notation: Notation;
  /** Entries in symbols, which then stand in place of the numbers. */
  readonly symbols?: readonly (readonly SymbolCell[])[] | null;
  /** Rows are the states then the outputs, columns the states then the inputs. */
  readonly onPoint?: (row: number, column: number, by: PointedBy) => void;
  /** The pointer or the keyboard's focus has left the entries, or Escape was pressed. */
  readonly onPointEnd?: (by: 'hover' | 'walk' | 'escape') => void;
  readonly pointed?: MatrixPlace | null;
  /** Entries that take part in what is pointed at elsewhere. */
  readonly lit?: readonly MatrixPlace[];
}

const NONE: readonly MatrixPlace[] = [];
const nothing: EntryAt = () => NOTHING;

/** A and B over C and D as one table with the names at its edges. */
export function SystemMatrix(props: SystemMatrixProps) {
  const { model, notation, symbols = null, onPoint, onPointEnd, pointed = null, lit = NONE } = props;
  const id = useId();
  const scroller = useRef<HTMLDivElement>(null);
  const entriesOfRow = useEntriesOfRows(model, notation, symbols);
  const rows = useMemo(() => rowsOf(model), [model]);
  const litColumns = useMemo(() => columnsByRow(lit), [lit]);
  const states = model.states.length;
  const columnCount = states + model.inputs.length;
  const window = useMatrixWindow(scroller, states, rows.length, columnCount);
  const cellId = useCallback((row: number, column: number) => `${id}-${row}-${column}`, [id]);
  const onKeyDown = useMatrixKeys({
    scroller,
    pointed,
    rows: rows.length,
    columns: columnCount,
    window,
    onPoint,
    onPointEnd,
  });

  if (rows.length === 0 || columnCount === 0) return <PanelEmpty>{matrixLabel(model)}</PanelEmpty>;

  const pointAt = (event: MouseEvent<HTMLElement>, by: PointedBy) => {
    const place = placeOf(event.target);
    if (place !== null) onPoint?.(place.row, place.column, by);
  };
  const inView = rows.slice(window.rows.first, window.rows.end);
  const grid = onPoint === undefined ? {} : { role: 'grid', tabIndex: 0 };
  const active = pointed === null ? {} : { 'aria-activedescendant': cellId(pointed.row, pointed.column) };
  const region =
    onPoint === undefined ? { role: 'region', tabIndex: 0, 'aria-label': 'Entries of the system matrix' } : {};
  return (
    <div className="system-matrix">
      <div className="system-matrix-scroller" ref={scroller} {...region}>
        <table
          {...grid}
          {...active}
          className={window.isPartial ? 'system-matrix-table system-matrix-windowed' : 'system-matrix-table'}
          aria-rowcount={rows.length + 1}
          aria-colcount={columnCount + 1}
          onKeyDown={onKeyDown}
          onClick={event => pointAt(event, 'keep')}
          onPointerOver={event => pointAt(event, 'hover')}
          onPointerLeave={() => onPointEnd?.('hover')}
          onBlur={() => onPointEnd?.('walk')}
        >
          <caption className="visually-hidden">{matrixLabel(model)}</caption>
          <MatrixHead model={model} columns={window.columns} isPartial={window.isPartial} />
          <tbody>
            <Spacer height={window.rows.before} />
            {inView.map(({ name, isDerivative, isFirstOutput, row }) => (
              <MatrixRow
                key={row}
                {...{ row, name, isDerivative, isFirstOutput, states, cellId }}
                entryAt={entriesOfRow(row)}
                columns={window.columns}
                pointedColumn={pointed?.row === row ? pointed.column : null}
                litColumns={litColumns.get(row)}
              />
            ))}
            <Spacer height={window.rows.after} />
          </tbody>
        </table>
      </div>
      <MatrixNote model={model} entryAt={(row, column) => entriesOfRow(row)(row, column)} window={window} />
    </div>
  );
}

/** For each row its entries; a row of numbers keeps them while its numbers stay. */
function useEntriesOfRows(
  model: StateSpace,
  notation: Notation,
  symbols: readonly (readonly SymbolCell[])[] | null,
): (row: number) => EntryAt {
  const former = useRef<RowEntries | null>(null);
  return useMemo(() => {
    if (symbols !== null) {
      const entryAt = symbolEntries(symbols);
      return (_: number) => entryAt;
    }
    const { rows } = rowEntries(former.current, model, notation);
    former.current = { model, notation, rows };
    return (row: number) => rows[row] ?? nothing;
  }, [model, notation, symbols]);
}

/** The room of the rows that are not in the page. */
function Spacer({ height }: { readonly height: number }) {
  // biome-ignore lint/a11y/noAriaHiddenOnFocusable: a row without cells takes no focus
  return height > 0 && <tr aria-hidden="true" style={{ height }} />;
}

function placeOf(target: EventTarget): MatrixPlace | null {
  const cell = target instanceof Element ? target.closest<HTMLElement>('td[data-row]') : null;
  if (cell === null) return null;
  return { row: Number(cell.dataset['row']), column: Number(cell.dataset['column']) };
}
