/**
 * What happens before the first picture: the drawing of the link in the address, else the one left off, else the worked
 * drawing; then the line to the worker and keeping on the device.
 */

import { readDiagram, startingDrawing } from '../../diagram/index.ts';
import { lastOpened } from '../../storage/index.ts';
import { actions } from '../store/index.ts';
import { followDocument } from './derive-on-change.ts';
import { newKey } from './new-key.ts';
import { openLinkInAddress, watchAddress } from './open-link.ts';

export async function begin(): Promise<void> {
  if (!(await openLinkInAddress())) await reopen();
  followDocument();
  // It begins with what is on the sheet then, whatever was done until it has come.
  void import('./keep-on-change.ts').then(({ keepOnChange }) => keepOnChange());
  watchAddress();
}

async function reopen(): Promise<void> {
  const last = await lastOpened();
  if (last.ok && last.value !== null) {
    const read = readDiagram(last.value.text);
    if (read.ok) return actions.openDrawing(read.value, last.value.key, 'Reopened where you left off.');
    actions.openDrawing(startingDrawing(), newKey(), 'The drawing kept last cannot be read; it stays in the list.');
    return;
  }
  actions.openDrawing(
    startingDrawing(),
    newKey(),
    'A worked drawing to start from. Empty sheet begins one of your own.',
  );
}
