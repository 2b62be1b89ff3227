/** link ∘ open over random drawings. */

import fc from 'fast-check';
import { expect, test } from 'vitest';
import { decodeLink, encodeLink } from '../../../src/share/index.ts';
import { anyDiagram } from '../../arbitraries/diagrams.ts';
import { SEED } from '../../arbitraries/rationals.ts';

test('a link opens as the drawing that it was made of', () => {
  fc.assert(
    fc.property(anyDiagram, diagram => {
      expect(decodeLink(encodeLink(diagram))).toEqual({ ok: true, value: diagram });
    }),
    { seed: SEED },
  );
});

test('a link holds nothing that an address would have to escape', () => {
  fc.assert(
    fc.property(anyDiagram, diagram => {
      expect(encodeLink(diagram)).toMatch(/^#d1=[A-Za-z0-9_-]+$/);
    }),
    { seed: SEED },
  );
});

test('a link with a character changed or lost is refused or opens as some drawing, and never throws', () => {
  fc.assert(
    fc.property(anyDiagram, fc.nat(), fc.constantFrom('', 'A', '_', '%', ' '), (diagram, place, put) => {
      const link = encodeLink(diagram);
      const at = 4 + (place % (link.length - 4));
      const decoded = decodeLink(link.slice(0, at) + put + link.slice(at + 1));
      expect(typeof decoded.ok).toBe('boolean');
    }),
    { seed: SEED },
  );
});
