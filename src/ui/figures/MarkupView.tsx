/** A markup tree on the screen: SVG and MathML elements made by React, which knows their namespaces from the outermost. */

import { createElement, type ReactNode } from 'react';
import type { Markup } from './markup.ts';

/** `stroke-width` as React names it, `class` as `className`; `aria-label` and `data-…` stay. */
function propertyName(attribute: string): string {
  if (attribute === 'class') return 'className';
  if (attribute.startsWith('aria-') || attribute.startsWith('data-')) return attribute;
  return attribute.replace(/-([a-z])/g, (_, letter: string) => letter.toUpperCase());
}

function toNode(node: Markup | string): ReactNode {
  if (typeof node === 'string') return node;
  const properties = Object.fromEntries(
    Object.entries(node.attributes).map(([name, value]) => [propertyName(name), value]),
  );
  return createElement(node.tag, properties, ...node.children.map(toNode));
}

/** The tree as it stands. */
export function MarkupView({ tree }: { readonly tree: Markup }) {
  return toNode(tree);
}
