/**
 * A formula or a drawing as a tree of elements, before there is any DOM: the screen shows it (MarkupView), the clipboard
 * and saved files take it as text. Attribute names are those of the standards (MathML Core, SVG 2).
 */

/** One element of a drawing or a formula. */
export interface Markup {
  readonly tag: string;
  readonly attributes: Readonly<Record<string, string | number>>;
  readonly children: readonly (Markup | string)[];
}

/** One element. */
export function element(
  tag: string,
  attributes: Readonly<Record<string, string | number>> = {},
  ...children: readonly (Markup | string)[]
): Markup {
  return { tag, attributes, children };
}

const ESCAPES: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };

function escaped(text: string): string {
  return text.replace(/[&<>"]/g, character => ESCAPES[character] ?? character);
}

/** The tree as XML text, attributes in the order given. */
export function markupText(node: Markup | string): string {
  if (typeof node === 'string') return escaped(node);
  const attributes = Object.entries(node.attributes).map(([name, value]) => ` ${name}="${escaped(String(value))}"`);
  const open = `<${node.tag}${attributes.join('')}`;
  return node.children.length === 0 ? `${open}/>` : `${open}>${node.children.map(markupText).join('')}</${node.tag}>`;
}
