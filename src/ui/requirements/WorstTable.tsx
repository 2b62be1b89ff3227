/** The worst case of each requirement over the tolerances, with the values that give it. */

import { valuesAt } from '../../analysis/index.ts';
import { requirementText } from '../../diagram/index.ts';
import { formatNumber, MathName, RaisedText } from '../figures/index.ts';
import type { TolerancesSlice } from '../store/index.ts';
import { measuredText, slackText } from './assessment-text.ts';
import { setValues } from './set-values.ts';

interface WorstTableProps {
  readonly judged: TolerancesSlice;
  /** Whether the drawing on the sheet is still the one that was judged. */
  readonly isCurrent: boolean;
}

export function WorstTable({ judged, isCurrent }: WorstTableProps) {
  const { diagram, plan, worst } = judged;
  const { requirements = [] } = diagram;
  if (requirements.length === 0) return null;
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls has to be reached by key
    <section className="requirement-scroller" aria-label="Worst cases" tabIndex={0}>
      <table className="requirement-table" aria-label="Worst cases">
        <thead>
          <tr>
            <th scope="col">requirement</th>
            <th scope="col">worst</th>
            <th scope="col">missed</th>
            <th scope="col">at</th>
          </tr>
        </thead>
        <tbody>
          {requirements.map((requirement, index) => {
            const found = worst[index];
            const point = found ? plan.points[found.point] : undefined;
            if (!found || point === undefined) return null;
            const text = requirementText(requirement);
            const by = slackText(requirement, found.assessment);
            return (
              // biome-ignore lint/suspicious/noArrayIndexKey: a requirement is known by its place in the list
              <tr key={index}>
                <th scope="row">{text}</th>
                <td>
                  <RaisedText text={measuredText(requirement, found.assessment)} />
                  {by !== '' && <small>{by}</small>}
                </td>
                <td className={found.missed === 0 ? 'requirement-met' : 'requirement-missed'}>
                  <b>{found.missed === 0 ? 'at none' : `at ${found.missed}`}</b> of {plan.points.length}
                </td>
                <td>
                  <Values judged={judged} point={found.point} />
                  {point.kind !== 'drawn' && (
                    <button
                      type="button"
                      className="plot-save"
                      disabled={!isCurrent}
                      aria-label={`Set the drawing to the worst case of: ${text}`}
                      onClick={() => setValues(plan, point)}
                    >
                      set the drawing to it
                    </button>
                  )}
                </td>
              </tr>
            );
          })}
        </tbody>
      </table>
    </section>
  );
}

function Values({ judged: { plan }, point }: { readonly judged: TolerancesSlice; readonly point: number }) {
  const place = plan.points[point];
  if (place === undefined || place.kind === 'drawn') return <span>as drawn </span>;
  const values = valuesAt(plan.parameters, place);
  return (
    <span className="worst-values">
      {plan.parameters.map(({ name }, i) => (
        <span key={name}>
          <MathName name={name} /> = <RaisedText text={formatNumber(values[i] ?? 0, 4)} />{' '}
        </span>
      ))}
    </span>
  );
}
