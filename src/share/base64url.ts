/**
 * Bytes as base64url without padding (RFC 4648, section 5): letters, digits, - and _, safe in the fragment of an address.
 * Written out here because neither Node's nor the browser's own way exists in the other.
 */

const ALPHABET = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789-_';
const VALUES = new Map(Array.from(ALPHABET, (character, value) => [character, value]));

/** The text, 4 characters for 3 bytes. */
export function toBase64Url(bytes: Uint8Array): string {
  const parts: string[] = [];
  for (let i = 0; i < bytes.length; i += 3) {
    const word = ((bytes[i] ?? 0) << 16) | ((bytes[i + 1] ?? 0) << 8) | (bytes[i + 2] ?? 0);
    const characters = [18, 12, 6, 0].map(shift => ALPHABET.charAt((word >> shift) & 63)).join('');
    parts.push(characters.slice(0, bytes.length - i + 1));
  }
  return parts.join('');
}

/** The bytes; null where a character is not of the alphabet or the length is none that an encoder gives. */
export function fromBase64Url(text: string): Uint8Array | null {
  if (text.length % 4 === 1) return null;
  const bytes = new Uint8Array(Math.floor((text.length * 3) / 4));
  let [word, bits, length] = [0, 0, 0];
  for (const character of text) {
    const value = VALUES.get(character);
    if (value === undefined) return null;
    word = ((word << 6) | value) & 0xffff;
    bits += 6;
    if (bits < 8) continue;
    bits -= 8;
    bytes[length++] = (word >> bits) & 0xff;
  }
  return bytes;
}
