/** When the drawing was last kept on the device, or why it could not be. */

import { type State, useStore } from '../store/index.ts';

const kept = (state: State) => state.view.kept;

export function KeptMark() {
  const mark = useStore(kept);
  if (mark === null) return <span className="heading-kept" />;
  if ('refused' in mark) return <span className="heading-kept heading-kept-refused">not kept: {mark.refused}</span>;
  return <span className="heading-kept">kept {mark.at}</span>;
}
