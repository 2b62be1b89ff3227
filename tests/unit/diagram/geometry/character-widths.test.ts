import { describe, expect, test } from 'vitest';
import { textWidth } from '../../../../src/diagram/geometry/index.ts';
import { fontWidths } from './font-widths.ts';

const FONTS = 'node_modules/@fontsource';
const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789()+-=/.,';
const GREEK = 'αβγδεζηθικλμνξπρστφχψωΓΔΘΛΞΠΣΦΨΩ';

/** Characters within 2.5 % of each other share one width, in their middle. */
const TOLERANCE = 0.014;

describe('the widths that text is measured by', () => {
  test.each([
    ['stix-two-text/files/stix-two-text-latin-400-normal.woff', LETTERS, false, 'math'],
    ['stix-two-text/files/stix-two-text-latin-400-italic.woff', LETTERS, true, 'math'],
    ['stix-two-text/files/stix-two-text-greek-400-normal.woff', GREEK, false, 'math'],
    ['stix-two-text/files/stix-two-text-greek-400-italic.woff', GREEK, true, 'math'],
    ['b612/files/b612-latin-400-normal.woff', LETTERS, false, 'plain'],
    ['b612-mono/files/b612-mono-latin-400-normal.woff', LETTERS, false, 'figures'],
  ] as const)('are those of %s', (file, characters, italic, face) => {
    const widths = fontWidths(`${FONTS}/${file}`);
    for (const text of characters) {
      const measured = textWidth([{ text, italic, script: 'normal' }], 1000, face);
      const published = widths.get(text) ?? Number.NaN;
      expect(Math.abs(measured - published) / published, text).toBeLessThanOrEqual(TOLERANCE);
    }
  });

  test('shrink for what is lowered or raised', () => {
    const line = textWidth([{ text: 'p', italic: false, script: 'normal' }], 20, 'math');
    const lowered = textWidth([{ text: 'p', italic: false, script: 'sub' }], 20, 'math');
    expect(lowered).toBeCloseTo(0.7 * line);
  });
});
