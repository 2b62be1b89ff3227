/**
 * JSON laid out for people: a row of a matrix stays on one line however long it is, and so does whatever is short; the rest
 * goes an item a line. The content is that of JSON.stringify, in the order of the keys.
 */

/** Longest line that is not the row of a matrix, indentation apart. */
const LINE_WIDTH = 100;

type Json = string | number | boolean | null | readonly Json[] | { readonly [key: string]: Json };

/** The text, ended by a line break; indentation is two spaces. Plain data only, no undefined. */
export function layOutJson(value: object): string {
  return `${laidOut(JSON.parse(JSON.stringify(value)) as Json, '')}\n`;
}

function laidOut(value: Json, indentation: string): string {
  if (value === null || typeof value !== 'object') return JSON.stringify(value);
  const inner = `${indentation}  `;
  const isList = Array.isArray(value);
  if (isList && value.every(item => item === null || typeof item !== 'object')) return inOneLine(value);
  const short = inOneLine(value);
  if (short.length <= LINE_WIDTH && indentation !== '') return short;
  const items = isList
    ? value.map(item => laidOut(item, inner))
    : Object.entries(value).map(([key, item]) => `${JSON.stringify(key)}: ${laidOut(item, inner)}`);
  const [open, close] = isList ? '[]' : '{}';
  return `${open}\n${items.map(item => inner + item).join(',\n')}\n${indentation}${close}`;
}

/** With a space behind each comma and colon, and inside the braces of an object. */
function inOneLine(value: Json): string {
  if (value === null || typeof value !== 'object') return JSON.stringify(value);
  if (Array.isArray(value)) return `[${value.map(inOneLine).join(', ')}]`;
  const members = Object.entries(value).map(([key, item]) => `${JSON.stringify(key)}: ${inOneLine(item)}`);
  return members.length === 0 ? '{}' : `{ ${members.join(', ')} }`;
}
