/**
 * Raw deflate (RFC 1951) undone piece by piece, so that a small text that would unpack to gigabytes is noticed before it
 * does: the packed bytes go in by pieces that can each grow to a megabyte at most.
 */

import { Inflate } from 'fflate';

/** Deflate packs at most 1032 to 1 (RFC 1951: 258 bytes out of two bits), so a piece unpacks to about a megabyte. */
const PIECE = 1024;

export type Inflated =
  | { readonly status: 'whole'; readonly bytes: Uint8Array }
  | { readonly status: 'damaged' }
  | { readonly status: 'too-large' };

/** @param limit  in bytes; more than that is `too-large`, and unpacking stops there. */
export function inflateUpTo(packed: Uint8Array, limit: number): Inflated {
  const pieces: Uint8Array[] = [];
  let length = 0;
  let isWhole = false;
  const stream = new Inflate((piece, isLast) => {
    pieces.push(piece);
    length += piece.length;
    isWhole ||= isLast;
  });
  try {
    for (let start = 0; start < packed.length && length <= limit; start += PIECE) {
      stream.push(packed.subarray(start, start + PIECE), start + PIECE >= packed.length);
    }
  } catch {
    return { status: 'damaged' }; // what the library throws on bytes that are no deflate stream, or end in the middle of one
  }
  if (length > limit) return { status: 'too-large' };
  return isWhole ? { status: 'whole', bytes: joined(pieces, length) } : { status: 'damaged' };
}

function joined(pieces: readonly Uint8Array[], length: number): Uint8Array {
  const bytes = new Uint8Array(length);
  let at = 0;
  for (const piece of pieces) {
    bytes.set(piece, at);
    at += piece.length;
  }
  return bytes;
}
