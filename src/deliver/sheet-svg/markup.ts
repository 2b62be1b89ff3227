/** SVG as text: well-formed whatever the user has typed, numbers short and without a locale. */

/** Text for XML content and attribute values: marked characters escaped, characters that XML 1.0 forbids left out. */
export function escaped(text: string): string {
  return text
    .replace(/[^\t\n\r\u{20}-\u{d7ff}\u{e000}-\u{fffd}\u{10000}-\u{10ffff}]/gu, '')
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;');
}

/** A coordinate to a hundredth of a unit. */
export function coordinate(value: number): string {
  return String(Math.round(value * 100) / 100 + 0);
}

type Attributes = Readonly<Record<string, string | number>>;

/** An element around its content, which is markup already. */
export function element(name: string, attributes: Attributes, content = ''): string {
  const written = Object.entries(attributes)
    .map(([key, value]) => ` ${key}="${typeof value === 'number' ? coordinate(value) : escaped(value)}"`)
    .join('');
  return content === '' ? `<${name}${written}/>` : `<${name}${written}>${content}</${name}>`;
}
