/** A reader of well-formed XML without namespaces, entities beyond the five, or doctype; strict about what it reads. */

export interface Element {
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  readonly children: (Element | string)[];
}

const TOKEN = /<!--(?:(?!--)[\s\S])*-->|<\/([A-Za-z]+)>|<([A-Za-z]+)((?: [A-Za-z]+="[^"<]*")*)(\/?)>|[^<]+/y;

const ENTITIES: Readonly<Record<string, string>> = { amp: '&', lt: '<', gt: '>', quot: '"', '#39': "'" };

function withoutEntities(text: string): string {
  return text.replace(/&([^;\s]*;?)/g, (whole, name: string) => {
    const character = ENTITIES[name.replace(';', '')];
    if (character === undefined || !name.endsWith(';')) throw new Error(`entity ${whole}`);
    return character;
  });
}

/** The one element of a document; comments are left out. */
export function readXml(text: string): Element {
  const root: Element = { name: '', attributes: {}, children: [] };
  const open = [root];
  TOKEN.lastIndex = 0;
  while (TOKEN.lastIndex < text.length) {
    const at = TOKEN.lastIndex;
    const match = TOKEN.exec(text);
    if (match === null) throw new Error(`not well-formed at ${text.slice(at, at + 40)}`);
    const [token, closed, opened, attributes = '', isEmpty] = match;
    const current = open.at(-1);
    if (current === undefined) throw new Error('an end without its beginning');
    if (closed !== undefined) {
      if (open.pop()?.name !== closed) throw new Error(`</${closed}> ends nothing`);
    } else if (opened !== undefined) {
      const pairs = [...attributes.matchAll(/ ([A-Za-z]+)="([^"]*)"/g)].map(([, key = '', value = '']) => [key, value]);
      const element: Element = { name: opened, attributes: Object.fromEntries(pairs), children: [] };
      current.children.push(element);
      if (isEmpty === '') open.push(element);
    } else if (!token.startsWith('<!--')) {
      current.children.push(withoutEntities(token));
    }
  }
  if (open.length !== 1) throw new Error(`<${open.at(-1)?.name}> has no end`);
  const [element, ...others] = root.children.filter(child => typeof child !== 'string' || child.trim() !== '');
  if (typeof element !== 'object' || others.length > 0) throw new Error('more than one element');
  return element;
}

/** The child elements of a name. */
export function childrenOf(element: Element, name: string): Element[] {
  return element.children.filter((child): child is Element => typeof child !== 'string' && child.name === name);
}

/** How an element reads, a fraction with a slash. */
export function textOf(element: Element): string {
  const parts = element.children.map(child => (typeof child === 'string' ? child : textOf(child)));
  return parts.join(element.name === 'mfrac' ? '/' : '');
}
