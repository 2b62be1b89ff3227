/** Takes the focus to the write-a-block line with the first character in it. */

import { WRITE_LINE_ID } from './write-line-id.ts';

export function beginWriting(character: string): void {
  const field = document.getElementById(WRITE_LINE_ID);
  if (!(field instanceof HTMLInputElement)) return;
  field.focus();
  field.setRangeText(character, 0, field.value.length, 'end');
  field.dispatchEvent(new Event('input', { bubbles: true }));
}
