/** The share link of the drawing on screen, copied with its length stated. */

import { actions, store } from '../store/index.ts';
import { copyText } from './copy-text.ts';

/** Past this length some mail programs and chat tools cut an address (common practice, no standard fixes it). */
const LONG_LINK = 8000;

export async function shareLink(): Promise<void> {
  const { encodeLink } = await import('../../share/index.ts');
  const address = new URL(window.location.href);
  address.hash = encodeLink(store.getState().document.diagram);
  const link = address.href;
  const length = `${link.length.toLocaleString('en')} characters`;
  const advice = link.length > LONG_LINK ? ' Some programs cut links this long: send the file instead.' : '';
  if (await copyText(link)) actions.notify(`Link copied, ${length}.${advice}`);
  else {
    window.history.replaceState(null, '', address.hash);
    actions.notify(`This browser does not let the page copy. The link is in the address bar, ${length}.`, 'refused');
  }
}
