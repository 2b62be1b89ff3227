/**
 * Text from anywhere to a plain JSON value: the first stage of reading. Size and depth are measured before anything is
 * parsed, without recursion, since neither JSON nor a schema need survive what a hostile file holds.
 */

import { fail, ok, problem, type Result } from '../../problem/index.ts';
import { DEEPEST_GROUP, DEEPEST_JSON, MAXIMUM_BYTES } from '../limits.ts';

/** The value that the text holds; a byte order mark in front is passed over. Linear. */
export function readJson(text: string): Result<unknown> {
  if (utf8Length(text) > MAXIMUM_BYTES) {
    return fail(problem('too-large', 'The diagram is larger than 4 MiB. Split it into several drawings.'));
  }
  if (isTooDeep(text)) {
    const message = `The text is nested more than ${DEEPEST_JSON} deep. Groups go ${DEEPEST_GROUP} deep, so this is no diagram.`;
    return fail(problem('too-large', message));
  }
  try {
    const value: unknown = JSON.parse(text.startsWith('\uFEFF') ? text.slice(1) : text);
    return ok(value);
  } catch {
    return fail(problem('not-a-diagram', 'The text is not JSON, so it holds no diagram. Open a *.poleward.json file.'));
  }
}

/** Bytes of the text as UTF-8; a lone half of a pair counts as the three bytes of its replacement. */
function utf8Length(text: string): number {
  if (text.length > MAXIMUM_BYTES) return text.length;
  let bytes = text.length;
  for (let i = 0; i < text.length; i++) {
    const unit = text.charCodeAt(i);
    if (unit >= 0x80) bytes += 1;
    // A pair of surrogates is four bytes in two units: each adds one to its own.
    if (unit >= 0x800 && (unit < 0xd800 || unit > 0xdfff)) bytes += 1;
  }
  return bytes;
}

function isTooDeep(text: string): boolean {
  let depth = 0;
  let isInString = false;
  for (let i = 0; i < text.length; i++) {
    const character = text[i];
    if (isInString) {
      if (character === '\\') i++;
      else if (character === '"') isInString = false;
    } else if (character === '"') isInString = true;
    else if (character === '{' || character === '[') {
      depth += 1;
      if (depth > DEEPEST_JSON) return true;
    } else if (character === '}' || character === ']') depth -= 1;
  }
  return false;
}
