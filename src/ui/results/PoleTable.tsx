/** Poles and zeros as a table; what stands in it is worded in figures/roots.ts. */

import { type Motion, motionOf, RaisedText, type Root, type RootRow, rootRows, rootText } from '../figures/index.ts';

/** A hidden pole and why it is one. */
interface HiddenRoot extends Root {
  readonly isUncontrollable: boolean;
  readonly isUnobservable: boolean;
}

interface PoleTableProps {
  /** Both of each conjugate pair, as the model file lists them. */
  readonly poles: readonly Root[];
  /** null: not computed. */
  readonly zeros: readonly Root[] | null;
  /** How the poles are known. */
  readonly route: 'certified' | 'floating';
  /** What is proved holds for doubles that stand in for irrational values. */
  readonly standsIn?: boolean;
  /** Poles that no transfer function shows. */
  readonly hidden?: readonly HiddenRoot[];
  /** For `aria-details` of the pole map beside it. */
  readonly id?: string;
}

const KNOWN_BY: Readonly<Record<PoleTableProps['route'], string>> = {
  certified: 'every digit proved',
  floating: 'by QR, not certified',
};

const FOR_STAND_INS = ', with doubles in place of irrational values';

/** Poles with damping, frequency and time constant, zeros below them. */
export function PoleTable({ poles, zeros, route, standsIn = false, hidden = [], id }: PoleTableProps) {
  const hasMultiple = [...poles, ...(zeros ?? [])].some(({ multiplicity }) => multiplicity > 1);
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls has to be reached by key
    <section className="pole-table-scroller" aria-label="Table of poles and zeros" tabIndex={0}>
      <table className="pole-table" id={id}>
        <caption className="pole-table-caption">
          {KNOWN_BY[route]}
          {standsIn && FOR_STAND_INS}
        </caption>
        <PoleHead hasMultiple={hasMultiple} />
        <tbody>
          {rootRows(poles).map(row => (
            <RootLine
              key={`${row.re} ${row.im}`}
              row={row}
              motion={motionOf(row)}
              hasMultiple={hasMultiple}
              hidden={hidden.find(({ re, im }) => re === row.re && Math.abs(im) === Math.abs(row.im))}
            />
          ))}
          {poles.length === 0 && <NoneLine what="no poles" />}
        </tbody>
        <tbody className="pole-table-zeros">
          {rootRows(zeros ?? []).map(row => (
            <RootLine key={`${row.re} ${row.im}`} row={row} motion={null} hasMultiple={hasMultiple} />
          ))}
          {zeros === null && <NoneLine what="zeros not computed" />}
          {zeros?.length === 0 && <NoneLine what="no zeros" />}
        </tbody>
      </table>
    </section>
  );
}

function PoleHead({ hasMultiple }: { readonly hasMultiple: boolean }) {
  return (
    <thead className="pole-table-head">
      <tr>
        <th scope="col">
          pole / <RaisedText text="s⁻¹" />
        </th>
        <th scope="col" title="damping ratio" aria-label="damping ratio">
          <i className="pole-table-symbol">ζ</i>
        </th>
        <th scope="col" title="undamped natural frequency, rad/s" aria-label="natural frequency in radians per second">
          <i className="pole-table-symbol">
            ω<sub>0</sub>
          </i>
        </th>
        <th scope="col" title="time constant, seconds" aria-label="time constant in seconds">
          <i className="pole-table-symbol">τ</i> / s
        </th>
        {hasMultiple && (
          <th scope="col" title="multiplicity" aria-label="multiplicity">
            mult.
          </th>
        )}
      </tr>
    </thead>
  );
}

interface RootLineProps {
  readonly row: RootRow;
  readonly motion: Motion | null;
  readonly hasMultiple: boolean;
  readonly hidden?: HiddenRoot | undefined;
}

/** One root; a zero has no motion of its own. */
function RootLine({ row, motion, hasMultiple, hidden }: RootLineProps) {
  const whole = row.isPair ? `${row.re} ± ${row.im}j` : `${row.re}`;
  return (
    <tr className={motion !== null && row.re > 0 ? 'pole-table-growing' : undefined}>
      <th scope="row" title={whole}>
        {motion === null && 'zero '}
        <RaisedText text={rootText(row)} />
        {hidden !== undefined && (
          <span className="pole-table-hidden" title={whyHidden(hidden)}>
            {hidden.multiplicity < row.multiplicity ? `hidden ${hidden.multiplicity} of ${row.multiplicity}` : 'hidden'}
          </span>
        )}
      </th>
      <td>{motion?.damping}</td>
      <td>
        <RaisedText text={motion?.frequency ?? ''} />
      </td>
      <td>
        <RaisedText text={motion?.timeConstant ?? ''} />
      </td>
      {hasMultiple && <td>{row.multiplicity > 1 ? row.multiplicity : ''}</td>}
    </tr>
  );
}

function whyHidden({ isUncontrollable, isUnobservable }: HiddenRoot): string {
  const why = [isUncontrollable ? 'no input reaches it' : '', isUnobservable ? 'no output shows it' : ''];
  return `In no transfer function: ${why.filter(text => text !== '').join(' and ') || 'no input and output share it'}.`;
}

function NoneLine({ what }: { readonly what: string }) {
  return (
    <tr>
      <th scope="row" className="pole-table-none">
        {what}
      </th>
      <td colSpan={3} />
    </tr>
  );
}
