import type { StateSpace } from '../../compile/index.ts';
import { MathName } from '../figures/index.ts';
import { COLUMN_WIDTH, HEAD_WIDTH, type Span } from './matrix-window.ts';

interface MatrixHeadProps {
  readonly model: StateSpace;
  readonly columns: Span;
  readonly isPartial: boolean;
}

/** The names over the columns, states then inputs, and the column widths of a windowed table. */
export function MatrixHead({ model, columns, isPartial }: MatrixHeadProps) {
  const names = [...model.states, ...model.inputs].slice(columns.first, columns.end);
  return (
    <>
      {isPartial && <ColumnWidths columns={columns} />}
      <thead>
        <tr aria-rowindex={1}>
          <td className="system-matrix-corner" />
          {columns.before > 0 && <td aria-hidden="true" />}
          {names.map(({ name }, k) => (
            <th
              // biome-ignore lint/suspicious/noArrayIndexKey: a state and an input may bear one name
              key={columns.first + k}
              scope="col"
              title={name}
              aria-colindex={columns.first + k + 2}
              className={headClass(columns.first + k === model.states.length)}
            >
              <MathName name={name} />
            </th>
          ))}
          {columns.after > 0 && <td aria-hidden="true" />}
        </tr>
      </thead>
    </>
  );
}

function headClass(isFirstInput: boolean): string {
  return isFirstInput ? 'system-matrix-column-head system-matrix-first-input' : 'system-matrix-column-head';
}

function ColumnWidths({ columns }: { readonly columns: Span }) {
  const shown = Array.from({ length: columns.end - columns.first }, (_, k) => columns.first + k);
  return (
    <colgroup>
      <col style={{ width: HEAD_WIDTH }} />
      {columns.before > 0 && <col style={{ width: columns.before }} />}
      {shown.map(column => (
        <col key={column} style={{ width: COLUMN_WIDTH }} />
      ))}
      {columns.after > 0 && <col style={{ width: columns.after }} />}
    </colgroup>
  );
}
