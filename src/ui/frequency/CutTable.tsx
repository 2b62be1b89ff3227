import type { CutAnswer } from '../../worker/index.ts';
import { degreesText, formatNumber, frequencyText, RaisedText } from '../figures/index.ts';
import { factorText } from './bode-content.ts';

interface CutTableProps {
  readonly cuts: readonly CutAnswer[];
  readonly onRemove: (cut: CutAnswer) => void;
}

const DIGITS = 3;

const COLUMNS = [
  'cut',
  'phase margin',
  'gain margin',
  'delay margin',
  'modulus margin',
  'disk margin',
  'largest S',
  'largest T',
];

/** The margins at every cut, one a row. */
export function CutTable({ cuts, onRemove }: CutTableProps) {
  return (
    <div className="cut-table-scroller">
      <table className="plot-values cut-table" aria-label="Margins at the cuts">
        <thead>
          <tr>
            {COLUMNS.map(column => (
              <th scope="col" key={column}>
                {column}
              </th>
            ))}
            <td />
          </tr>
        </thead>
        <tbody>
          {cuts.map(cut => (
            <tr key={cut.to.join(':')}>
              <th scope="row">{cut.name}</th>
              <Margins cut={cut} />
              <td>
                <button type="button" className="plot-save" onClick={() => onRemove(cut)}>
                  Take out {cut.name}
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Margins({ cut: { outcome } }: { readonly cut: CutAnswer }) {
  if (!outcome.ok) return <td colSpan={COLUMNS.length - 1}>{outcome.problems[0]?.message}</td>;
  const { phaseMargin, gainMarginUp, gainMarginDown, delayMargin, modulusMargin, diskMargin, ...peaks } =
    outcome.value.margins;
  const gains = [gainMarginDown, gainMarginUp].filter(margin => margin !== null);
  const cells = [
    phaseMargin && `${degreesText(phaseMargin.phaseMargin)} at ${frequencyText(phaseMargin.omega)}`,
    gains.map(({ gainMargin, omega }) => `${factorText(gainMargin)} at ${frequencyText(omega)}`).join(', ') || null,
    delayMargin && `${formatNumber(delayMargin.seconds, DIGITS)} s`,
    modulusMargin !== null && formatNumber(modulusMargin, DIGITS),
    diskMargin && `${formatNumber(diskMargin.alpha, DIGITS)}: ±${degreesText(diskMargin.phase)}`,
    peakText(peaks.sensitivity),
    peakText(peaks.complementarySensitivity),
  ];
  return cells.map((text, k) => (
    <td key={COLUMNS[k + 1]}>
      <RaisedText text={text || '—'} />
    </td>
  ));
}

function peakText(peak: { readonly magnitude: number; readonly omega: number | null } | null): string | null {
  if (peak === null) return null;
  const where = peak.omega === null ? '' : ` at ${frequencyText(peak.omega)}`;
  return `${formatNumber(peak.magnitude, DIGITS)}${where}`;
}
