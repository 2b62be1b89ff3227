/** How many requirements are missed, in the verdict line; leads to the list. */

import { useAnswer } from '../answers/index.ts';
import { actions } from '../store/index.ts';
import { countText } from './assessment-text.ts';

export function RequirementVerdict() {
  const { answer } = useAnswer('requirements', null);
  if (answer === null || answer.length === 0) return null;
  const isMet = answer.every(({ status }) => status === 'met');
  return (
    <button
      type="button"
      className={`quiet ${isMet ? '' : 'verdict-wrong'}`}
      onClick={() => actions.openResultTab('requirements')}
    >
      {countText(answer)}
    </button>
  );
}
