import type { StateSpace } from '../../compile/index.ts';
import { MathName } from '../figures/index.ts';
import { Derivative, type MatrixPlace } from '../results/index.ts';

/** `ω̇ ← T`: the row and the column of an entry. */
export function EntryName({ model, place }: { readonly model: StateSpace; readonly place: MatrixPlace }) {
  const { states, inputs, outputs } = model;
  const row = [...states, ...outputs][place.row]?.name ?? '';
  const column = [...states, ...inputs][place.column]?.name ?? '';
  return (
    <span className="trace-entry">
      {place.row < states.length ? <Derivative name={row} /> : <MathName name={row} />}
      {' ← '}
      <MathName name={column} />
    </span>
  );
}
