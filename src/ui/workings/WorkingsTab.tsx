/** The tab Workings: the derivation as lines to check by hand, in the notation of the system matrix, to be copied. */

import './workings.css';
import { useAnswer } from '../answers/index.ts';
import { CopyFormula, FormulaView } from '../figures/index.ts';
import { PanelEmpty, PanelPending } from '../results/index.ts';
import { type State, useStore } from '../store/index.ts';
import { CopyText } from './CopyText.tsx';

const notation = (state: State) => state.view.notation;
const expanded = (state: State) => state.view.expanded;

export function WorkingsTab() {
  const question = { notation: useStore(notation), expanded: useStore(expanded) };
  const { answer, problems } = useAnswer('workings', question);
  const [problem] = problems;
  if (problem !== undefined) return <PanelEmpty>{problem.message}</PanelEmpty>;
  if (answer === null) return <PanelPending label="Workings" />;
  const { sections, note, text, latex, mathml } = answer;
  if (sections.length === 0) return <PanelEmpty>{note}</PanelEmpty>;
  return (
    <div className="workings">
      <p className="workings-copy">
        <CopyFormula latex={latex} mathml={mathml} /> <CopyText text={text} />
      </p>
      {note !== '' && <p>{note}</p>}
      {sections.map(({ title, remarks, lines }, k) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: sections have no identity but their place, and titles repeat.
        <section key={k}>
          <h3>{title}</h3>
          {remarks.map(remark => (
            <p key={remark}>{remark}</p>
          ))}
          <ul>
            {lines.map(line => (
              <li key={line.text}>
                <FormulaView mathml={line.mathml} text={line.text} />
              </li>
            ))}
          </ul>
        </section>
      ))}
    </div>
  );
}
