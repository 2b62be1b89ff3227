/** The drawing in the address's fragment, opened as a new drawing; a bad link leaves the work in hand untouched. */

import { actions } from '../store/index.ts';
import { newKey } from './new-key.ts';

const LINK_START = '#d1=';

/** Opens the address's drawing and clears the fragment, so that reloading comes back to the work done since. */
export async function openLinkInAddress(): Promise<boolean> {
  const fragment = window.location.hash;
  if (!fragment.startsWith(LINK_START)) return false;
  window.history.replaceState(null, '', window.location.pathname + window.location.search);
  const { decodeLink } = await import('../../share/index.ts');
  const decoded = decodeLink(fragment);
  if (!decoded.ok) {
    actions.notify(decoded.problems[0]?.message ?? 'That link does not hold a drawing.', 'refused');
    return false;
  }
  actions.openDrawing(decoded.value, newKey(), `Opened from the link: ${decoded.value.title || 'untitled'}.`);
  return true;
}

/** Opens a link pasted into the address bar of an open page. */
export function watchAddress(): void {
  window.addEventListener('hashchange', () => void openLinkInAddress());
}
