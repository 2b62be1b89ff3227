import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, test } from 'vitest';
import { element, MarkupView, markupText } from '../../../../src/ui/figures/index.ts';

const tree = element(
  'svg',
  { width: 10, 'aria-label': 'a "b"' },
  element('line', { x1: 0, 'stroke-width': 2, class: 'thin' }),
  element('text', {}, '1 < 2 & 3'),
);

describe('a tree of elements', () => {
  test('is written as XML with its text and attributes escaped', () => {
    expect(markupText(tree)).toBe(
      '<svg width="10" aria-label="a &quot;b&quot;"><line x1="0" stroke-width="2" class="thin"/><text>1 &lt; 2 &amp; 3</text></svg>',
    );
  });

  test('comes out of React with the same elements and attribute names', () => {
    expect(renderToStaticMarkup(createElement(MarkupView, { tree }))).toBe(
      '<svg width="10" aria-label="a &quot;b&quot;"><line x1="0" stroke-width="2" class="thin"></line><text>1 &lt; 2 &amp; 3</text></svg>',
    );
  });
});
