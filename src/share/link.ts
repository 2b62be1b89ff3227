/**
 * The share link (format.md of version 1): `#d1=` and the diagram, minified, deflated and base64url-coded. The drawing
 * travels in the fragment of the address, which no server gets to see. A link that cannot be used is refused with a message.
 */

import { deflateSync } from 'fflate';
import { type Diagram, MAXIMUM_BYTES, minifyDiagram, readDiagram } from '../diagram/index.ts';
import { fail, problem, type Result } from '../problem/index.ts';
import { fromBase64Url, toBase64Url } from './base64url.ts';
import { inflateUpTo } from './inflate.ts';

const FRAGMENT = /#d(\d+)=(.*)$/;

/** The fragment, from its `#` on; the page's address goes before it. The same diagram gives the same text. */
export function encodeLink(diagram: Diagram): string {
  const packed = deflateSync(new TextEncoder().encode(minifyDiagram(diagram)), { level: 9 });
  return `#d1=${toBase64Url(packed)}`;
}

/** Whether a text is meant as a share link, whole or just its fragment, of whatever version and in whatever state. */
export function isLink(text: string): boolean {
  return FRAGMENT.test(withoutSpace(text));
}

/**
 * The diagram of a whole address or of its fragment. Line breaks and spaces that came in on the way are passed over.
 *
 * @returns `not-readable` where there is no `#d1=` or what follows does not unpack, `wrong-version` for `#d2=` and the like,
 * `too-large` above 4 MiB, and what `readDiagram` has against the text itself.
 */
export function decodeLink(text: string): Result<Diagram> {
  const [, version, payload = ''] = FRAGMENT.exec(withoutSpace(text)) ?? [];
  if (version === undefined) {
    return fail(problem('not-readable', 'This is no share link: it holds no "#d1=". Copy the whole address.'));
  }
  if (version !== '1') {
    const message = `The link is of version ${version}; only version 1 can be read. Open the address itself in a browser.`;
    return fail(problem('wrong-version', message));
  }
  // Deflate lengthens what it cannot shorten by a thousandth at most, so a longer text is too large for certain.
  if (payload.length > 2 * MAXIMUM_BYTES) return tooLarge();
  const packed = fromBase64Url(payload);
  if (packed === null) return damaged();
  const inflated = inflateUpTo(packed, MAXIMUM_BYTES);
  if (inflated.status === 'too-large') return tooLarge();
  const json = inflated.status === 'whole' ? textOf(inflated.bytes) : null;
  return json === null ? damaged() : readDiagram(json);
}

function withoutSpace(text: string): string {
  return text.replace(/\s+/g, '');
}

/** The text of UTF-8; null where the bytes are none. */
function textOf(bytes: Uint8Array): string | null {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return null; // bytes that are no UTF-8
  }
}

function damaged(): Result<never> {
  const message = 'The link is damaged or cut short. Copy the whole address again from where it was sent.';
  return fail(problem('not-readable', message));
}

function tooLarge(): Result<never> {
  return fail(problem('too-large', 'The link unpacks to more than 4 MiB. Ask for the drawing as a file.'));
}
