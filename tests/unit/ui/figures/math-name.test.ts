import { createElement } from 'react';
import { renderToStaticMarkup } from 'react-dom/server';
import { expect, test } from 'vitest';
import { MathName, singleLetter } from '../../../../src/ui/figures/index.ts';

test('a name with an index is set with the index lowered', () => {
  expect(renderToStaticMarkup(createElement(MathName, { name: 'K_p' }))).toMatch(/<i>K<\/i><sub>.*p.*<\/sub>/);
});

test('a Greek name is its letter', () => {
  expect(renderToStaticMarkup(createElement(MathName, { name: 'omega' }))).toContain('ω');
  expect(singleLetter('omega')).toBe('ω');
});

test('a word carries no dot', () => {
  expect(singleLetter('speed')).toBeNull();
  expect(singleLetter('T_2')).toBe('T');
});
