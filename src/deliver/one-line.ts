/** Free text of the user (a title, a name) on a single line, where a line break would end a comment or a row. */

/** The text with control characters and line separators turned into spaces, runs of spaces into one, none at the ends. */
export function oneLine(text: string): string {
  return text
    .replace(/[\p{Cc}\u2028\u2029]+/gu, ' ')
    .replace(/ {2,}/g, ' ')
    .trim();
}

/** The text in lines of at most `width` characters, broken at spaces where there are any; at least one line. */
export function wrapped(text: string, width: number): string[] {
  const lines: string[] = [];
  let rest = oneLine(text);
  while (rest.length > width) {
    const space = rest.lastIndexOf(' ', width);
    const end = space > 0 ? space : width;
    lines.push(rest.slice(0, end));
    rest = rest.slice(end).trimStart();
  }
  return [...lines, rest];
}
