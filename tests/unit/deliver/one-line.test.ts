/** Free text on one line, and in lines of a width. */

import { expect, test } from 'vitest';
import { oneLine, wrapped } from '../../../src/deliver/one-line.ts';

test('line breaks, tabs, escapes and line separators become a space', () => {
  expect(oneLine(' a\r\nb\tc\u001b[0m\u2028d  e ')).toBe('a b c [0m d e');
});

test('a long text is broken at spaces, a long word where it has to be', () => {
  expect(wrapped('one two three', 8)).toEqual(['one two', 'three']);
  expect(wrapped('abcdefghij', 4)).toEqual(['abcd', 'efgh', 'ij']);
  expect(wrapped('', 4)).toEqual(['']);
});
