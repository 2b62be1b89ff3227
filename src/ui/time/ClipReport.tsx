/** What limiters did while the response ran, in words: when each clipped, and what wound up meanwhile. */

import { plainName } from '../../expression/index.ts';
import type { Response } from '../../worker/index.ts';
import { formatNumber, RaisedText } from '../figures/index.ts';

/** Lines that are shown; the rest is counted. */
const MOST_LINES = 6;

export function ClipReport({ response }: { readonly response: Response }) {
  const { clippings, hasLimiter, actual } = response;
  if (!hasLimiter || actual === null || 'reason' in actual) return null;
  if (clippings.length === 0)
    return <p className="clip-report">No limiter reaches its limits: the linear answer holds.</p>;
  return (
    <ul className="clip-report">
      {clippings.slice(0, MOST_LINES).map(clipping => (
        <li key={`${clipping.limiter} ${clipping.from}`}>
          <RaisedText text={sentence(clipping)} />
        </li>
      ))}
      {clippings.length > MOST_LINES && <li>and {clippings.length - MOST_LINES} times more</li>}
    </ul>
  );
}

function sentence({ limiter, side, from, to, windUp }: Response['clippings'][number]): string {
  const seconds = (t: number) => `${formatNumber(t, 3)} s`;
  const when = `limiter ${plainName(limiter)} at its ${side} limit from ${seconds(from)} to ${seconds(to)}`;
  if (windUp.length === 0) return `${when}.`;
  const states = windUp.map(({ state, change }) => `${plainName(state)} by ${formatNumber(change, 3)}`).join(', ');
  return `${when}; meanwhile ${states} wound up.`;
}
