import type { CutAnswer } from '../../worker/index.ts';
import { RaisedText } from '../figures/index.ts';
import { MARGIN_ROWS } from './margin-rows.ts';

interface CutTableProps {
  readonly cuts: readonly CutAnswer[];
  readonly onRemove: (cut: CutAnswer) => void;
}

/** The margins at every cut: a column for each, a row for each margin. */
export function CutTable({ cuts, onRemove }: CutTableProps) {
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls has to be reached by key
    <section className="cut-table-scroller" aria-label="Cuts" tabIndex={0}>
      <table className="plot-values cut-table" aria-label="Margins at the cuts">
        <thead>
          <tr>
            <td />
            {cuts.map(cut => (
              <th scope="col" key={cut.to.join(':')}>
                {cut.name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {MARGIN_ROWS.map(({ label, textOf }) => (
            <tr key={label}>
              <th scope="row">{label}</th>
              {cuts.map(({ to, outcome }) => (
                <td key={to.join(':')}>
                  <RaisedText text={outcome.ok ? (textOf(outcome.value.margins) ?? '—') : '—'} />
                </td>
              ))}
            </tr>
          ))}
          <tr>
            <td />
            {cuts.map(cut => (
              <td key={cut.to.join(':')}>
                <button type="button" className="plot-save" onClick={() => onRemove(cut)}>
                  Take out {cut.name}
                </button>
              </td>
            ))}
          </tr>
        </tbody>
      </table>
    </section>
  );
}
