/** A diagram as the fragment of an address, and back. */

export { decodeLink, encodeLink, isLink } from './link.ts';
