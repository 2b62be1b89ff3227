/** Problems and warnings as the earlier stages worded them; nothing is added but the way to what they name. */

import type { Problem, Warning } from '../../problem/index.ts';

type Finding = Problem | Warning;

interface ProblemListProps<T extends Finding> {
  readonly problems: readonly T[];
  /** `problem` refuses the model, `warning` leaves it standing. */
  readonly severity?: 'problem' | 'warning';
  /** Goes to what the finding names: its blocks on the sheet, or its parameter. */
  readonly onPick?: (problem: T) => void;
}

/** What is wrong or worth knowing, each with a way to where it is. */
export function ProblemList<T extends Finding>({ problems, severity = 'problem', onPick }: ProblemListProps<T>) {
  const label = severity === 'problem' ? 'Problems' : 'Warnings';
  return (
    <ul className={`problem-list problem-list-${severity}`} aria-label={label}>
      {problems.map((problem, index) => {
        const target = targetOf(problem);
        return (
          // biome-ignore lint/suspicious/noArrayIndexKey: two findings may say the same
          <li key={index} className="problem-list-item">
            <span className="problem-list-mark" aria-hidden="true">
              {severity === 'problem' ? '×' : '!'}
            </span>
            <span className="problem-list-message">{problem.message}</span>
            {onPick !== undefined && target !== null && (
              <button
                type="button"
                className="problem-list-pick"
                onClick={() => onPick(problem)}
                aria-label={target.label}
              >
                {target.text}
              </button>
            )}
          </li>
        );
      })}
    </ul>
  );
}

/** What the button leads to: its short text and the label that tells it from the others; null where there is nothing. */
function targetOf(problem: Finding): { readonly text: string; readonly label: string } | null {
  const { blocks } = problem;
  if (blocks.length > 0) {
    const text = blocks.length === 1 ? 'Show block' : `Show ${blocks.length} blocks`;
    return { text, label: `${text}: ${blocks.join(', ')}` };
  }
  if (!('parameter' in problem) || problem.parameter === undefined) return null;
  return { text: 'Show parameter', label: `Show parameter: ${problem.parameter}` };
}
