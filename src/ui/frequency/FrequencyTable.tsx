import { useState } from 'react';
import { formatNumber, RaisedText } from '../figures/index.ts';
import type { BodeContent } from './bode-content.ts';

/** Rows of the table at most. */
const ROWS = 25;

const DIGITS = 4;

/** The curves as a table behind a disclosure, made only while it is open. */
export function FrequencyTable({ content }: { readonly content: BodeContent }) {
  const [isOpen, setIsOpen] = useState(false);
  return (
    <details className="plot-table" onToggle={event => setIsOpen(event.currentTarget.open)}>
      <summary>Table of values</summary>
      {isOpen && <Values content={content} />}
    </details>
  );
}

function Values({ content: { curve } }: { readonly content: BodeContent }) {
  const { omega, magnitude, phase } = curve;
  const last = omega.length - 1;
  const indices = new Set(Array.from({ length: ROWS }, (_, k) => Math.round((k * last) / (ROWS - 1))));
  return (
    <table className="plot-values">
      <thead>
        <tr>
          <th scope="col">ω / rad/s</th>
          <th scope="col">magnitude / dB</th>
          <th scope="col">phase / °</th>
        </tr>
      </thead>
      <tbody>
        {[...indices].map(k => (
          <tr key={k}>
            <th scope="row">
              <RaisedText text={valueText(omega[k])} />
            </th>
            <td>
              <RaisedText text={valueText(magnitude[k])} />
            </td>
            <td>
              <RaisedText text={valueText(phase[k])} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function valueText(value: number | undefined): string {
  return value === undefined || !Number.isFinite(value) ? '—' : formatNumber(value, DIGITS);
}
