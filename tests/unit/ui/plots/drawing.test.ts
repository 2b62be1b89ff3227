import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { element, markupText } from '../../../../src/ui/figures/index.ts';
import { namedText, plotFileName } from '../../../../src/ui/plots/drawing.ts';
import { FILE, SCREEN, svgFile, text } from '../../../../src/ui/plots/index.ts';

describe('a saved plot', () => {
  const drawing = {
    width: 20,
    height: 10,
    title: 'a < b',
    description: 'what is seen',
    paper: '#ffffff',
    marks: [element('line', { x1: 0, stroke: '#1e2b38' })],
  };

  test('is an SVG document with title, description and paper', () => {
    expect(svgFile(drawing)).toBe(
      '<?xml version="1.0" encoding="UTF-8"?>\n' +
        '<svg xmlns="http://www.w3.org/2000/svg" width="20" height="10" viewBox="0 0 20 10">' +
        '<title>a &lt; b</title><desc>what is seen</desc><rect width="20" height="10" fill="#ffffff"/>' +
        '<line x1="0" stroke="#1e2b38"/></svg>\n',
    );
  });

  test('has a name that every system takes', () => {
    expect(plotFileName('step', 'u/1', 'drive.F')).toBe('step-u-1-drive.F.svg');
  });
});

describe('text of a plot', () => {
  test('sets raised characters smaller and higher and comes back down', () => {
    const marks = text(0, 0, '10⁻⁶ m', { fill: 'black', family: 'serif', size: 10 });
    expect(markupText(marks)).toContain('>10<tspan dy="-4" font-size="7.5">−6</tspan><tspan dy="4"> m</tspan></text>');
  });

  test('sets the index of a name lower and comes back up for the unit', () => {
    const marks = markupText(namedText(0, 0, 'K_p', ' / N', { fill: 'black', family: 'sans', size: 10 }, 'serif'));
    expect(marks).toMatch(/font-style="italic">K<\/tspan>/);
    expect(marks).toMatch(/dy="2.5"[^>]*>p<\/tspan><tspan dy="-2.5"> \/ N<\/tspan>/);
  });
});

describe('the inks of a saved plot', () => {
  const tokens = readFileSync(new URL('../../../../src/ui/theme/tokens.css', import.meta.url), 'utf8');
  const light = tokens.slice(0, tokens.indexOf('@media'));

  test.each(['paper', 'ink', 'soft', 'line', 'curve', 'wrong'] as const)('%s is the light sheet’s', name => {
    const variable = /var\((--[a-z-]+)\)/.exec(SCREEN[name])?.[1];
    expect(new RegExp(`${variable}: (#[0-9a-f]{6});`).exec(light)?.[1]).toBe(FILE[name]);
  });
});
