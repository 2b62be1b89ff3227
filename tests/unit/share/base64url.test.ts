/** The alphabet, against the test vectors of RFC 4648 (section 10, padding left out) and against Node's own encoder. */

import fc from 'fast-check';
import { expect, test } from 'vitest';
import { fromBase64Url, toBase64Url } from '../../../src/share/base64url.ts';

const VECTORS = [
  ['', ''],
  ['f', 'Zg'],
  ['fo', 'Zm8'],
  ['foo', 'Zm9v'],
  ['foob', 'Zm9vYg'],
  ['fooba', 'Zm9vYmE'],
  ['foobar', 'Zm9vYmFy'],
] as const;

test.each(VECTORS)('"%s" is written "%s" and read back', (plain, coded) => {
  expect(toBase64Url(Buffer.from(plain))).toBe(coded);
  expect(fromBase64Url(coded)).toEqual(new Uint8Array(Buffer.from(plain)));
});

test('bytes are written as Node writes them, and read back', () => {
  fc.assert(
    fc.property(fc.uint8Array({ maxLength: 200 }), bytes => {
      const coded = toBase64Url(bytes);
      expect(coded).toBe(Buffer.from(bytes).toString('base64url'));
      expect(fromBase64Url(coded)).toEqual(bytes);
    }),
    { seed: 4648 },
  );
});

test('what no encoder writes is not read', () => {
  for (const text of ['A', 'AAAAA', 'Zg==', 'a+b/', 'Zm 9v', 'é']) expect(fromBase64Url(text)).toBeNull();
});
