/** What was just done or refused: read out at once, on screen for a few seconds. */

import { useEffect, useState } from 'react';
import { type State, useStore } from '../store/index.ts';

const notice = (state: State) => state.view.notice;

/** Long enough to read two lines: 200 words a minute and a second to look (common practice). */
const MILLISECONDS_SHOWN = 6000;

export function NoticeLine() {
  const latest = useStore(notice);
  const [gone, setGone] = useState(0);
  const serial = latest?.serial ?? 0;
  useEffect(() => {
    const timer = setTimeout(() => setGone(serial), MILLISECONDS_SHOWN);
    return () => clearTimeout(timer);
  }, [serial]);
  const shown = latest !== null && gone !== serial;
  return (
    <div role="status" className={shown ? `notice notice-${latest.tone}` : 'notice notice-none'}>
      {shown && latest.text}
    </div>
  );
}
