/** One row of the system matrix. Made anew only when what it shows changes, not when another row is pointed at. */

import { memo } from 'react';
import { FormulaView, MathName, RaisedText, singleLetter } from '../figures/index.ts';
import type { EntryAt, MatrixEntry } from './matrix-entries.ts';
import type { Span } from './matrix-window.ts';

interface MatrixRowProps {
  readonly row: number;
  readonly name: string;
  readonly isDerivative: boolean;
  /** Whether the dashed line stands above it. */
  readonly isFirstOutput: boolean;
  readonly entryAt: EntryAt;
  readonly columns: Span;
  /** The first input's column, where the dashed line stands. */
  readonly states: number;
  readonly pointedColumn: number | null;
  readonly litColumns: ReadonlySet<number> | undefined;
  readonly cellId: (row: number, column: number) => string;
}

/** One row of the system matrix: the derivative of a state, or an output, from states and inputs. */
export const MatrixRow = memo(function MatrixRow(props: MatrixRowProps) {
  const { row, columns } = props;
  const places = Array.from({ length: columns.end - columns.first }, (_, k) => columns.first + k);
  return (
    <tr aria-rowindex={row + 2} className={props.isFirstOutput ? 'system-matrix-first-output' : undefined}>
      <th scope="row" className="system-matrix-row-head" title={props.name}>
        {props.isDerivative ? <Derivative name={props.name} /> : <MathName name={props.name} />}
      </th>
      {columns.before > 0 && <td aria-hidden="true" />}
      {places.map(column => (
        <td
          key={column}
          id={props.cellId(row, column)}
          data-row={row}
          data-column={column}
          aria-colindex={column + 2}
          aria-current={column === props.pointedColumn || undefined}
          className={cellClass(props, column)}
        >
          <Entry entry={props.entryAt(row, column)} />
        </td>
      ))}
      {columns.after > 0 && <td aria-hidden="true" />}
    </tr>
  );
});

function cellClass({ states, pointedColumn, litColumns }: MatrixRowProps, column: number): string | undefined {
  const names: string[] = [];
  if (column === states) names.push('system-matrix-first-input');
  if (litColumns?.has(column)) names.push('system-matrix-lit');
  if (column === pointedColumn) names.push('system-matrix-pointed');
  return names.length > 0 ? names.join(' ') : undefined;
}

function Entry({ entry }: { readonly entry: MatrixEntry }) {
  if (entry.isZero) return <span className="system-matrix-zero">0</span>;
  if (entry.mathml !== undefined) return <FormulaView mathml={entry.mathml} text={entry.text} />;
  return (
    <span title={entry.whole ?? undefined}>
      {entry.isRounded && <span className="system-matrix-rounded">≈</span>}
      <RaisedText text={entry.text} />
    </span>
  );
}

/** Letters that end at the x-height, over which the dot stands lower. */
const LOW_LETTER = /^[acegmnopqrsuvwxyzαγεηικμνοπρςστυφχψω]$/;

function dottedClass(letter: string): string {
  return LOW_LETTER.test(letter) ? 'system-matrix-dotted system-matrix-dotted-low' : 'system-matrix-dotted';
}

/** ω̇ for a letter, its dot drawn since few faces carry it over every one; d/dt in front of a word. */
export function Derivative({ name }: { readonly name: string }) {
  const letter = singleLetter(name);
  return (
    <>
      <span className="visually-hidden">derivative of </span>
      {letter === null && (
        <span className="system-matrix-rate" aria-hidden="true">
          d/dt{' '}
        </span>
      )}
      <span className={letter === null ? undefined : dottedClass(letter)}>
        <MathName name={name} />
      </span>
    </>
  );
}
