/** Whether a text is XML, as far as an SVG file of ours goes. */

/** Throws where tags are not balanced, attributes not quoted, or a bare & or < stands in the text (XML 1.0, section 2.1). */
export function checkWellFormed(xml: string): void {
  const open: string[] = [];
  const body = xml.replace(/^<\?xml version="1\.0" encoding="UTF-8"\?>\n/, '');
  const tag = /<(\/?)([a-z]+)((?: [a-z-]+="[^"<&]*(?:&(?:amp|lt|gt|quot);[^"<&]*)*")*)(\/?)>/gi;
  const text = body.replace(tag, (_, closing: string, name: string, __, empty: string) => {
    if (closing === '/' && open.pop() !== name) throw new Error(`</${name}> closes nothing`);
    if (closing === '' && empty === '') open.push(name);
    return '';
  });
  if (open.length > 0) throw new Error(`${open.join()} left open`);
  const stray = /<|&(?!(?:amp|lt|gt|quot);)/.exec(text);
  if (stray !== null) throw new Error(`stray ${text.slice(stray.index, stray.index + 20)}`);
}
