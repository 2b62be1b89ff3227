/** What each state is good for: which inputs reach it, which outputs show it, and what becomes of it in the minimal model. */

import type { Contribution, StructureReport } from '../../analysis/minimal/index.ts';
import type { StateSpace } from '../../compile/index.ts';
import { MathName } from '../figures/index.ts';
import { CombinationView } from './CombinationView.tsx';
import { NameList } from './NameList.tsx';

interface StateTableProps {
  readonly report: StructureReport;
  readonly model: StateSpace;
}

export function StateTable({ report, model }: StateTableProps) {
  const { states, inputs, outputs } = model;
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls has to be reached by key
    <section className="structure-scroller" aria-label="States" tabIndex={0}>
      <table className="structure-table" aria-label="What each state contributes">
        <thead>
          <tr>
            <th scope="col">state</th>
            <th scope="col">reached from</th>
            <th scope="col">shows in</th>
            <th scope="col">in the minimal model</th>
          </tr>
        </thead>
        <tbody>
          {report.contributions.map((contribution, k) => (
            <tr key={states[k]?.name}>
              <th scope="row">
                <MathName name={states[k]?.name ?? ''} />
              </th>
              <td>
                <NameList names={contribution.movedBy.map(input => inputs[input]?.name ?? '')} />
              </td>
              <td>
                <NameList names={contribution.seenIn.map(output => outputs[output]?.name ?? '')} />
              </td>
              <td>
                <Role contribution={contribution} model={model} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

function Role({ contribution, model }: { readonly contribution: Contribution; readonly model: StateSpace }) {
  switch (contribution.role) {
    case 'kept':
      return <>a state of it</>;
    case 'combined':
      return <>combined with others</>;
    case 'unseen':
      return <>left out: no output needs it</>;
    case 'unreached':
      return <>left out: no input moves it</>;
    case 'bound': {
      const terms = contribution.boundTo.map(({ state, factor }) => ({
        name: model.states[state]?.name ?? '',
        factor,
      }));
      return (
        <>
          left out: always <CombinationView terms={terms} />
        </>
      );
    }
    default:
      return contribution.role satisfies never;
  }
}
