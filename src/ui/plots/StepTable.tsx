import { useState } from 'react';
import { formatNumber, formatPadded, formatUnit, MathName, RaisedText } from '../figures/index.ts';
import { nearestSample } from './curve-path.ts';
import { type StepContent, VALUE_DIGITS } from './step-content.ts';

interface StepTableProps {
  readonly content: StepContent;
  /** Seconds. */
  readonly horizon: number;
}

/** Rows of the table: every twentieth of the horizon. */
const INTERVALS = 20;

/** The curves as a table behind a disclosure, made only while it is open. */
export function StepTable({ content, horizon }: StepTableProps) {
  const [isOpen, setIsOpen] = useState(false);
  return (
    <details className="plot-table" onToggle={event => setIsOpen(event.currentTarget.open)}>
      <summary>Table of values</summary>
      {isOpen && <Values content={content} horizon={horizon} />}
    </details>
  );
}

function Values({ content, horizon }: StepTableProps) {
  const [first] = content.curves;
  if (first === undefined) return <p>No samples.</p>;
  const unit = content.outputUnit === undefined ? '' : ` / ${formatUnit(content.outputUnit)}`;
  const indices = Array.from({ length: INTERVALS + 1 }, (_, k) => nearestSample(first.time, (horizon * k) / INTERVALS));
  return (
    <table className="plot-values">
      <thead>
        <tr>
          <th scope="col">t / s</th>
          {content.curves.map(({ label }) => (
            <th scope="col" key={label}>
              <MathName name={content.output} />
              <RaisedText text={unit} />
              {content.curves.length > 1 && ` ${label}`}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {[...new Set(indices)].map(index => (
          <ValueRow key={index} content={content} time={first.time[index] ?? 0} />
        ))}
      </tbody>
    </table>
  );
}

function ValueRow({ content, time }: { readonly content: StepContent; readonly time: number }) {
  return (
    <tr>
      <th scope="row">
        <RaisedText text={formatNumber(time, VALUE_DIGITS)} />
      </th>
      {content.curves.map(curve => (
        <td key={curve.label}>
          <ValueText value={curve.values[nearestSample(curve.time, time)]} />
        </td>
      ))}
    </tr>
  );
}

function ValueText({ value }: { readonly value: number | undefined }) {
  if (value === undefined || !Number.isFinite(value)) return '—';
  return <RaisedText text={value === 0 ? '0' : formatPadded(value, VALUE_DIGITS)} />;
}
