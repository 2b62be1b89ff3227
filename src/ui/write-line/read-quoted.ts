/** A text in quotes, as the write-a-block line takes it for the sheet. */

/** What stands between the quotes, the last of which may be missing; null where the line begins with none or holds no word. */
export function readQuoted(line: string): string | null {
  const [, text = ''] = /^\s*["“](.*?)["”]?\s*$/.exec(line) ?? [];
  return text.trim() === '' ? null : text.trim();
}
