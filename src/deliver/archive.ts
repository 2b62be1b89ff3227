/** Several files in one zip whose bytes depend on nothing but the files: no clock, no time zone. */

import { strToU8, zipSync } from 'fflate';

/**
 * The date that every member bears, the first that zip can hold (PKWARE APPNOTE 4.4.6 counts from 1980). Built from local
 * parts because the library reads local parts back, so that the bytes are the same in every time zone; noon, which no
 * change to summer time skips.
 */
const memberDate = () => new Date(1980, 0, 1, 12);

/** The archive, members in the order given. */
export function zipped(members: readonly { readonly name: string; readonly content: string | Uint8Array }[]) {
  const files = members.map(
    ({ name, content }) => [name, typeof content === 'string' ? strToU8(content) : content] as const,
  );
  return zipSync(Object.fromEntries(files), { level: 9, mtime: memberDate() });
}
