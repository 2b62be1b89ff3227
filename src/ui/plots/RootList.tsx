import { formatUnit, RaisedText, singleRootText } from '../figures/index.ts';
import type { PlacedRoot } from './pole-map-marks.ts';

/** The roots of a map as a table behind a disclosure, for a map that stands without one. */
export function RootList({ placed }: { readonly placed: readonly PlacedRoot[] }) {
  return (
    <details className="plot-table">
      <summary>Table of values</summary>
      <table className="plot-values">
        <thead>
          <tr>
            <th scope="col">kind</th>
            <th scope="col">
              value / <RaisedText text={formatUnit('s^-1')} />
            </th>
            <th scope="col">multiplicity</th>
          </tr>
        </thead>
        <tbody>
          {placed.map(({ root, kind }) => (
            <tr key={`${kind} ${root.re} ${root.im}`}>
              <th scope="row">{kind}</th>
              <td>
                <RaisedText text={singleRootText(root)} />
              </td>
              <td>{root.multiplicity}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </details>
  );
}
